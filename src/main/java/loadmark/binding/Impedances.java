package loadmark.binding;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Value;
import loadmark.quantity.Dimension;
import loadmark.quantity.Quantity;
import loadmark.syntax.Expression;
import loadmark.syntax.Expression.Operator;

/**
 * Reads expressions as impedances: quantities in Ω, S, F or H, in series by + and parallel by ||.
 */
final class Impedances {
  private static final Expected ELEMENT =
      new Expected(
          Dimension.RESISTANCE, "a value in Ω, S, F or H", "10 kΩ", "", Expected.Range.POSITIVE);

  private final Values values;
  private final Findings findings;

  private final Tolerances tolerances;

  Impedances(Values values, Findings findings) {
    this.values = values;
    this.tolerances = new Tolerances(values, findings);
    this.findings = findings;
  }

  Optional<OnePort> read(Expression expression) {
    if (expression instanceof Expression.Grouped grouped) {
      return read(grouped.inside());
    }
    if (expression instanceof Expression.Operation operation) {
      switch (operation.operator()) {
        case PLUS, PARALLEL -> {
          return join(operation);
        }
        case MINUS -> {
          findings.error(
              "impedance-arithmetic",
              operation.operatorSpan(),
              "impedances are joined by + (in series) and || (in parallel), not by -");
          return Optional.empty();
        }
        default -> {}
      }
    }
    if (expression instanceof Expression.Toleranced toleranced) {
      return readElement(toleranced.value())
          .flatMap(
              element ->
                  tolerances
                      .read(
                          toleranced.amount(), element.value().nominal(), dimension(element.kind()))
                      .map(value -> new OnePort.Element(element.kind(), value)));
    }
    return readElement(expression).map(element -> element);
  }

  private Optional<OnePort> join(Expression.Operation operation) {
    Operator operator = operation.operator();
    List<Expression> operands = new ArrayList<>();
    flatten(operation, operator, operands);
    List<OnePort> members = new ArrayList<>(operands.size());
    boolean whole = true;
    int capacitors = 0;
    for (Expression operand : operands) {
      Optional<OnePort> member = read(operand);
      whole &= member.isPresent();
      member.ifPresent(members::add);
      if (member.orElse(null) instanceof OnePort.Element element
          && element.kind() == ElementKind.CAPACITANCE) {
        capacitors++;
      }
    }
    if (!whole) {
      return Optional.empty();
    }
    if (operator == Operator.PARALLEL) {
      return Optional.of(OnePort.parallel(members));
    }
    if (capacitors > 1) {
      findings.warning(
          "capacitors-in-series",
          operation.operatorSpan(),
          "+ joins in series: these capacitances come to less than each of them",
          "capacitors side by side are joined by ||");
    }
    return Optional.of(OnePort.series(members));
  }

  /** {@code a + b + c} as one list; done in a loop, since a chain may be long. */
  private static void flatten(
      Expression.Operation top, Operator operator, List<Expression> operands) {
    Expression left = top;
    while (left instanceof Expression.Operation operation && operation.operator() == operator) {
      operands.add(0, operation.right());
      left = operation.left();
    }
    operands.add(0, left);
  }

  private Optional<OnePort.Element> readElement(Expression expression) {
    if (Values.isBareNumber(expression)) {
      findings.error(
          "missing-unit",
          expression.span(),
          "the unit is missing: in an impedance it tells the element",
          "Ω or S for a resistance, F for a capacitance, H for an inductance");
      return Optional.empty();
    }
    Optional<Quantity> quantity = values.evaluate(expression);
    if (quantity.isEmpty()) {
      return Optional.empty();
    }
    Dimension dimension = quantity.get().dimension();
    Optional<ElementKind> kind = findKind(dimension);
    if (kind.isEmpty()) {
      findings.error(
          "wrong-dimension",
          expression.span(),
          "this is " + dimension.describe() + "; an impedance is made of values in Ω, S, F and H");
      return Optional.empty();
    }
    double value = quantity.get().value();
    return values.inRange(expression, value, ELEMENT)
        ? Optional.of(new OnePort.Element(kind.get(), Value.exact(value)))
        : Optional.empty();
  }

  private static Optional<ElementKind> findKind(Dimension dimension) {
    for (ElementKind kind : ElementKind.values()) {
      if (dimension(kind).equals(dimension)) {
        return Optional.of(kind);
      }
    }
    return Optional.empty();
  }

  private static Dimension dimension(ElementKind kind) {
    return switch (kind) {
      case RESISTANCE -> Dimension.RESISTANCE;
      case CONDUCTANCE -> Dimension.CONDUCTANCE;
      case CAPACITANCE -> Dimension.CAPACITANCE;
      case INDUCTANCE -> Dimension.INDUCTANCE;
    };
  }
}
