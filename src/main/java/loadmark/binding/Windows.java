package loadmark.binding;

import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.diagnostic.Findings;
import loadmark.network.Bound;
import loadmark.quantity.Dimension;
import loadmark.quantity.Quantity;
import loadmark.syntax.Expression;
import loadmark.syntax.Statement.Window;

/**
 * Reads windows: {@code 45 Ω to 55 Ω}, {@code 50 Ω ± 20 %}, {@code above 1 kΩ}, {@code below 5 Ω}.
 */
final class Windows {
  private final Values values;
  private final Findings findings;

  Windows(Values values, Findings findings) {
    this.values = values;
    this.findings = findings;
  }

  Optional<Bound> read(Window window, Expected expected) {
    if (window instanceof Window.Above above) {
      OptionalDouble least = values.read(above.bound(), expected);
      return least.isPresent() ? Optional.of(Bound.atLeast(least.getAsDouble())) : Optional.empty();
    }
    if (window instanceof Window.Below below) {
      OptionalDouble most = values.read(below.bound(), expected);
      return most.isPresent() ? Optional.of(Bound.atMost(most.getAsDouble())) : Optional.empty();
    }
    if (window instanceof Window.Around around) {
      return readAround(around.value(), expected);
    }
    Window.Between between = (Window.Between) window;
    OptionalDouble from = values.read(between.from(), expected);
    OptionalDouble to = values.read(between.to(), expected);
    if (from.isEmpty() || to.isEmpty()) {
      return Optional.empty();
    }
    if (from.getAsDouble() >= to.getAsDouble()) {
      findings.error(
          "window-order",
          between.from().span().to(between.to().span()),
          "the window does not go from a lower to a higher value",
          expected.dimension().equals(Dimension.ANGLE)
              ? "a window across 180 deg goes on counting: 170 deg to 190 deg"
              : "put the lower one first");
      return Optional.empty();
    }
    return Optional.of(Bound.between(from.getAsDouble(), to.getAsDouble()));
  }

  private Optional<Bound> readAround(Expression.Toleranced around, Expected expected) {
    OptionalDouble middle = values.read(around.value(), expected);
    Optional<Double> half =
        middle.isEmpty()
            ? Optional.empty()
            : readHalfWidth(around.amount(), middle.getAsDouble(), expected);
    if (half.isEmpty()) {
      return Optional.empty();
    }
    double from = middle.getAsDouble() - half.get();
    double to = middle.getAsDouble() + half.get();
    if (expected.range() == Expected.Range.POSITIVE && from <= 0) {
      findings.error(
          "tolerance", around.amount().span(), "this window reaches down to zero or below");
      return Optional.empty();
    }
    return Optional.of(Bound.between(from, to));
  }

  private Optional<Double> readHalfWidth(Expression amount, double middle, Expected expected) {
    if (Values.isBareNumber(amount)) {
      findings.error(
          "tolerance", amount.span(), "the unit is missing", "write, for example, ± 20 %");
      return Optional.empty();
    }
    Optional<Quantity> read = values.evaluate(amount);
    if (read.isEmpty()) {
      return Optional.empty();
    }
    boolean ratio = read.get().dimension().equals(Dimension.NUMBER);
    if (!ratio && !read.get().dimension().equals(expected.dimension())) {
      findings.error(
          "wrong-dimension",
          amount.span(),
          "this is "
              + read.get().dimension().describe()
              + "; a ratio or "
              + expected.noun()
              + " is expected");
      return Optional.empty();
    }
    double half = ratio ? Math.abs(middle) * read.get().value() : read.get().value();
    return values.inRange(amount, half, expected.in(Expected.Range.POSITIVE))
        ? Optional.of(half)
        : Optional.empty();
  }
}
