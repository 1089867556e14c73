package loadmark.judge;

import java.util.OptionalDouble;
import java.util.function.Function;

/**
 * Tells a value without a bound from a high one. Rounding leaves a large number where a lossless
 * resonance divides by zero; what gives it away is that it still grows as 1/distance nearer than
 * any quality factor below 1e9 lets it.
 */
final class Pole {
  private static final double NEAREST = 1e-9;
  private static final double FARTHEST = 1e-6;

  /** A pole grows tenfold from each distance to the next. */
  private static final double GROWTH = 4;

  private Pole() {}

  /** The peak, its values empty where they have no bound. */
  static Sample check(Gauge gauge, Sample peak) {
    if (!(peak.reading() instanceof Reading.Known known) || !known.broken()) {
      return peak;
    }
    boolean value = grows(gauge, peak, Reading.Known::value);
    boolean ohm = grows(gauge, peak, Reading.Known::valueOhm);
    if (!value && !ohm) {
      return peak;
    }
    boolean all = (value || known.value().isEmpty()) && (ohm || known.valueOhm().isEmpty());
    OptionalDouble none = OptionalDouble.empty();
    return new Sample(
        peak.loading(),
        new Reading.Known(
            value ? none : known.value(),
            ohm ? none : known.valueOhm(),
            all ? Double.POSITIVE_INFINITY : known.excess(),
            known.slack(),
            known.spread()));
  }

  private static boolean grows(
      Gauge gauge, Sample peak, Function<Reading.Known, OptionalDouble> value) {
    double near = size(peak, value);
    for (double away = NEAREST; away <= FARTHEST; away *= 10) {
      double below = size(gauge.at(peak.hz() / (1 + away)), value);
      double above = size(gauge.at(peak.hz() * (1 + away)), value);
      if (!(near > GROWTH * Math.max(below, above))) {
        return false;
      }
      near = Math.min(below, above);
    }
    return true;
  }

  /** Not a number where there is none, so that no comparison holds. */
  private static double size(Sample sample, Function<Reading.Known, OptionalDouble> value) {
    return sample.reading() instanceof Reading.Known known
        ? Math.abs(value.apply(known).orElse(Double.NaN))
        : Double.NaN;
  }
}
