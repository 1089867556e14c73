package loadmark.network;

import java.util.OptionalDouble;

/**
 * Where a limit's value must lie, both ends in: Ω, F, dB, degrees, or a plain ratio, as the
 * criterion says.
 *
 * @param atLeast the lower end, if any
 * @param atMost the upper end, if any
 * @param atMostOhm for {@link Criterion#CHANGE}: the largest difference in Ω; with {@code atMost}
 *     too, the easier of the two at each frequency
 */
public record Bound(OptionalDouble atLeast, OptionalDouble atMost, OptionalDouble atMostOhm) {

  public static Bound atMost(double most) {
    return new Bound(OptionalDouble.empty(), OptionalDouble.of(most), OptionalDouble.empty());
  }

  public static Bound atLeast(double least) {
    return new Bound(OptionalDouble.of(least), OptionalDouble.empty(), OptionalDouble.empty());
  }

  public static Bound between(double from, double to) {
    return new Bound(OptionalDouble.of(from), OptionalDouble.of(to), OptionalDouble.empty());
  }

  public static Bound atMostOhm(double ohm) {
    return new Bound(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.of(ohm));
  }

  public Bound orAtMostOhm(double ohm) {
    return new Bound(atLeast, atMost, OptionalDouble.of(ohm));
  }
}
