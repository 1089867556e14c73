package loadmark.binding;

import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.quantity.Dimension;
import loadmark.quantity.Quantity;
import loadmark.syntax.Expression;

/** Arithmetic on quantities, with their dimensions checked. */
final class Arithmetic {
  private static final Set<String> FUNCTIONS =
      Set.of("sqrt", "ln", "log10", "exp", "abs", "min", "max", "pi");

  private Arithmetic() {}

  static boolean isFunction(String name) {
    return FUNCTIONS.contains(name);
  }

  static Optional<Quantity> apply(
      Expression.Operation operation, Quantity left, Quantity right, Findings findings) {
    if (isLevel(left) || isLevel(right)) {
      findings.error(
          "arithmetic",
          operation.operatorSpan(),
          "a value in dB takes no part in arithmetic",
          "write it as a single value");
      return Optional.empty();
    }
    double a = left.value();
    double b = right.value();
    if (operation.operator() == Expression.Operator.DIVIDED && b == 0) {
      findings.error(
          "arithmetic", operation.right().span(), "this is zero: nothing is divided by it");
      return Optional.empty();
    }
    return switch (operation.operator()) {
      case TIMES -> of(a * b, left.dimension().times(right.dimension()));
      case DIVIDED -> of(a / b, left.dimension().over(right.dimension()));
      case POWER -> power(operation, left, right, findings);
      case PLUS, MINUS -> {
        if (!left.dimension().equals(right.dimension())) {
          findings.error(
              "wrong-dimension",
              operation.operatorSpan(),
              left.dimension().describe()
                  + " and "
                  + right.dimension().describe()
                  + " cannot be "
                  + (operation.operator() == Expression.Operator.PLUS ? "added" : "subtracted"));
          yield Optional.empty();
        }
        yield of(
            operation.operator() == Expression.Operator.PLUS ? a + b : a - b, left.dimension());
      }
      case PARALLEL -> throw new IllegalArgumentException("|| is no arithmetic");
    };
  }

  static Optional<Quantity> call(
      Expression.Invocation call, Quantity[] arguments, Findings findings) {
    String name = call.name().text();
    if (!isFunction(name) || name.equals("pi")) {
      findings.error(
          "undefined-value",
          call.name().span(),
          "there is no function `" + name + "`",
          Nearest.find(name, FUNCTIONS)
              .map(near -> "did you mean `" + near + "`?")
              .orElse("there are sqrt, ln, log10, exp, abs, min and max"));
      return Optional.empty();
    }
    boolean many = name.equals("min") || name.equals("max");
    if (many ? arguments.length == 0 : arguments.length != 1) {
      findings.error(
          "arithmetic",
          call.span(),
          name + " takes " + (many ? "one or more values" : "one value"));
      return Optional.empty();
    }
    Quantity first = arguments[0];
    for (Quantity argument : arguments) {
      if (isLevel(argument)) {
        findings.error("arithmetic", call.span(), "a value in dB takes no part in arithmetic");
        return Optional.empty();
      }
      if (!argument.dimension().equals(first.dimension())) {
        findings.error(
            "wrong-dimension",
            call.span(),
            name
                + " compares values of one kind, not "
                + first.dimension().describe()
                + " with "
                + argument.dimension().describe());
        return Optional.empty();
      }
    }
    return switch (name) {
      case "abs" -> of(Math.abs(first.value()), first.dimension());
      case "min", "max" -> of(extreme(name, arguments), first.dimension());
      case "sqrt" -> root(call, first, findings);
      default -> ofNumber(call, first, findings);
    };
  }

  private static Optional<Quantity> ofNumber(
      Expression.Invocation call, Quantity argument, Findings findings) {
    String name = call.name().text();
    if (!argument.dimension().equals(Dimension.NUMBER)) {
      findings.error(
          "wrong-dimension",
          call.span(),
          name + " takes a plain number, not " + argument.dimension().describe());
      return Optional.empty();
    }
    double x = argument.value();
    double value =
        switch (name) {
          case "ln" -> Math.log(x);
          case "log10" -> Math.log10(x);
          case "exp" -> Math.exp(x);
          default -> throw new IllegalArgumentException(name);
        };
    if (!Double.isFinite(value)) {
      findings.error("out-of-range", call.span(), name + " has no value here");
      return Optional.empty();
    }
    return of(value, Dimension.NUMBER);
  }

  private static Optional<Quantity> root(
      Expression.Invocation call, Quantity argument, Findings findings) {
    Optional<Dimension> dimension = argument.dimension().findRoot();
    if (dimension.isEmpty()) {
      findings.error(
          "wrong-dimension", call.span(), argument.dimension().describe() + " has no square root");
      return Optional.empty();
    }
    if (argument.value() < 0) {
      findings.error("out-of-range", call.span(), "a negative value has no square root");
      return Optional.empty();
    }
    return of(Math.sqrt(argument.value()), dimension.get());
  }

  private static Optional<Quantity> power(
      Expression.Operation operation, Quantity base, Quantity exponent, Findings findings) {
    if (!exponent.dimension().equals(Dimension.NUMBER)) {
      findings.error(
          "wrong-dimension",
          operation.right().span(),
          "an exponent is a plain number, not " + exponent.dimension().describe());
      return Optional.empty();
    }
    double value = Math.pow(base.value(), exponent.value());
    if (base.dimension().equals(Dimension.NUMBER)) {
      return of(value, Dimension.NUMBER);
    }
    int whole = (int) Math.rint(exponent.value());
    if (whole != exponent.value() || Math.abs(whole) > 8) {
      findings.error(
          "wrong-dimension",
          operation.right().span(),
          base.dimension().describe() + " can only be raised to a small whole number");
      return Optional.empty();
    }
    return of(value, base.dimension().power(whole));
  }

  private static double extreme(String name, Quantity[] arguments) {
    double value = arguments[0].value();
    for (Quantity argument : arguments) {
      value =
          name.equals("min")
              ? Math.min(value, argument.value())
              : Math.max(value, argument.value());
    }
    return value;
  }

  private static boolean isLevel(Quantity quantity) {
    return quantity.dimension().level() != 0;
  }

  private static Optional<Quantity> of(double value, Dimension dimension) {
    return Optional.of(new Quantity(value, dimension));
  }
}
