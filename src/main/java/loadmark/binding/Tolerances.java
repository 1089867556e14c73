package loadmark.binding;

import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.network.Value;
import loadmark.quantity.Dimension;
import loadmark.quantity.Quantity;
import loadmark.syntax.Expression;
import loadmark.syntax.Statement;

/** Reads tolerances: {@code ± 1 %}, {@code ± 0.5 pF}, {@code tolerance -20 % to +80 %}. */
final class Tolerances {
  private final Values values;
  private final Findings findings;

  Tolerances(Values values, Findings findings) {
    this.values = values;
    this.findings = findings;
  }

  /** {@code nominal ± amount}, the amount as a ratio or in the value's own dimension. */
  Optional<Value> read(Expression amount, double nominal, Dimension dimension) {
    return readShare(amount, nominal, dimension)
        .flatMap(
            share -> {
              if (share < 0) {
                findings.error("tolerance", amount.span(), "a tolerance is not negative");
                return Optional.empty();
              }
              return Optional.of(new Value(nominal, nominal * (1 - share), nominal * (1 + share)));
            });
  }

  /** The property {@code tolerance LOW to HIGH}. */
  Optional<Value> read(Statement.Property property, double nominal, Dimension dimension) {
    Expression highAt = property.second().orElse(property.value());
    Optional<Double> low = readShare(property.value(), nominal, dimension);
    Optional<Double> high = readShare(highAt, nominal, dimension);
    if (low.isEmpty() || high.isEmpty()) {
      return Optional.empty();
    }
    if (low.get() > 0 || high.get() < 0) {
      findings.error(
          "tolerance",
          property.span(),
          "a tolerance goes from below the value to above it",
          "write, for example, tolerance -20 % to +80 %");
      return Optional.empty();
    }
    return Optional.of(new Value(nominal, nominal * (1 + low.get()), nominal * (1 + high.get())));
  }

  private Optional<Double> readShare(Expression amount, double nominal, Dimension dimension) {
    if (Values.isBareNumber(amount)) {
      findings.error(
          "tolerance",
          amount.span(),
          "a tolerance always has a unit",
          "write, for example, ± 1 %, or the amount in the value's own unit");
      return Optional.empty();
    }
    Optional<Quantity> read = values.evaluate(amount);
    if (read.isEmpty()) {
      return Optional.empty();
    }
    double share;
    if (read.get().dimension().equals(Dimension.NUMBER)) {
      share = read.get().value();
    } else if (read.get().dimension().equals(dimension)) {
      share = nominal == 0 ? Double.NaN : read.get().value() / nominal;
    } else {
      findings.error(
          "tolerance",
          amount.span(),
          "this is "
              + read.get().dimension().describe()
              + "; a tolerance is a ratio, or "
              + dimension.describe()
              + " as the value is");
      return Optional.empty();
    }
    if (!(Math.abs(share) < 1)) {
      findings.error(
          "tolerance",
          amount.span(),
          nominal == 0 ? "a link of 0 Ω has no tolerance" : "a tolerance stays below 100 %");
      return Optional.empty();
    }
    return Optional.of(share);
  }
}
