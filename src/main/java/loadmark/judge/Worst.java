package loadmark.judge;

import java.util.OptionalDouble;
import loadmark.response.Ohms;

/**
 * The worst point of a limit over its scope, broken or not.
 *
 * @param hz where; 0 for DC
 * @param value in the unit of the criterion; empty where it has no bound
 * @param valueOhm for {@code change} with a bound in Ω: |Z_with − Z_without| there; empty where it
 *     has no bound, or where the limit has none in Ω
 * @param without the reference's impedance there
 * @param with the loaded impedance there
 */
public record Worst(
    double hz, OptionalDouble value, OptionalDouble valueOhm, Ohms without, Ohms with) {}
