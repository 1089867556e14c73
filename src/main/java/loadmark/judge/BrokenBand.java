package loadmark.judge;

import loadmark.network.Band;

/**
 * A stretch of the scope where a limit is broken.
 *
 * @param band its ends; where the scope ends first, the scope's end
 * @param worst the worst point in it
 */
public record BrokenBand(Band band, Worst worst) {}
