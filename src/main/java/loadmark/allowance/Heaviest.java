package loadmark.allowance;

import java.util.Optional;
import loadmark.network.Limit;

/**
 * The heaviest load that keeps every limit at every frequency.
 *
 * @param multiple k: with Z_L/k in place of a shunt load, or k·Z_L in place of a series load, the
 *     limits are just kept
 * @param beside for a load that is R, C or R‖C: how far each may go beside the other
 * @param stoppedBy the limit that k stops at; empty where k may be anything
 */
public record Heaviest(Amount multiple, Optional<Beside> beside, Optional<Limit> stoppedBy) {

  /**
   * One of R and C while the other is as it is.
   *
   * @param resistance Ω, beside the load's own capacitance: the least (shunt) or the largest
   *     (series)
   * @param capacitance F, beside the load's own resistance: the largest (shunt) or the least
   *     (series)
   */
  public record Beside(Amount resistance, Amount capacitance) {}
}
