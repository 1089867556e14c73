package loadmark.judge;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import loadmark.network.Criterion;
import loadmark.network.OnePort;
import loadmark.response.Level;

/** Levels of positive criteria, from an excess that is the logarithm of a ratio. */
final class Levels {
  private Levels() {}

  /** Where the value is {@code most} times exp(excess). */
  static List<Level> ofMost(
      Criterion criterion, Optional<OnePort> reference, double most, double excess) {
    return positive(criterion, reference, most * Math.exp(excess)).toList();
  }

  /** Where the value is past one end of a window by the factor exp(excess). */
  static List<Level> ofWindow(
      Criterion criterion, OptionalDouble from, OptionalDouble to, double excess) {
    double over = to.orElse(Double.NaN) * Math.exp(excess);
    double under = from.orElse(Double.NaN) * Math.exp(-excess);
    return Stream.of(over, under)
        .flatMap(value -> positive(criterion, Optional.empty(), value))
        .toList();
  }

  private static Stream<Level> positive(
      Criterion criterion, Optional<OnePort> reference, double value) {
    return value > 0 && value < Double.POSITIVE_INFINITY
        ? Stream.of(Level.of(criterion, reference, value))
        : Stream.empty();
  }
}
