package loadmark.judge;

import java.util.Optional;
import loadmark.network.Load;

/**
 * What a broken case would be without one of its loads.
 *
 * @param worst the worst point of the first broken limit then
 */
public record Blame(Load withoutLoad, Verdict verdict, Optional<Worst> worst) {}
