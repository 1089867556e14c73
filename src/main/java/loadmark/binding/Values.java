package loadmark.binding;

import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.quantity.Dimension;
import loadmark.quantity.LetterCode;
import loadmark.quantity.Quantity;
import loadmark.quantity.Unit;
import loadmark.quantity.Units;
import loadmark.syntax.Expression;
import loadmark.syntax.Name;
import loadmark.syntax.Statement;

/**
 * Reads expressions as values: arithmetic with dimensions, over the file's {@code let}s. Every slip
 * becomes one finding, and an empty result says that it was reported.
 */
final class Values {
  private final Findings findings;
  private final Map<String, Expression> lets = new LinkedHashMap<>();
  private final Map<String, Optional<Quantity>> known = new HashMap<>();
  private final Set<String> underway = new HashSet<>();
  private final Set<String> brokenLets = new HashSet<>();

  Values(Findings findings) {
    this.findings = findings;
  }

  /** Takes in every {@code let}, with the command line's values in place of the file's. */
  void declare(List<Statement> statements, Map<String, Expression> overrides) {
    Map<String, Statement.Let> first = new HashMap<>();
    for (Statement statement : statements) {
      if (statement instanceof Statement.Let let) {
        String name = let.name().text();
        Statement.Let earlier = first.putIfAbsent(name, let);
        if (earlier != null) {
          Declarations.reportDuplicate(findings, let.name(), earlier.name(), "value");
        } else if (Arithmetic.isFunction(name) || Declarations.isTaken(name)) {
          Declarations.reportTaken(findings, let.name());
        } else {
          lets.put(name, let.value());
        }
      } else if (statement instanceof Statement.Broken broken && broken.word().equals("let")) {
        broken.declared().ifPresent(name -> brokenLets.add(name.text()));
      }
    }
    overrides.forEach(
        (name, value) -> {
          if (lets.containsKey(name)) {
            override(name, value);
          } else if (!brokenLets.contains(name)) {
            findings.error(
                "undefined-value",
                value.span(),
                "the file has no value `" + name + "`",
                Nearest.find(name, lets.keySet())
                    .map(near -> "did you mean `" + near + "`?")
                    .orElse("only a value that the file names with let can be set"));
          }
        });
  }

  /** Puts another value in the place of the file's, which must be of the same kind. */
  private void override(String name, Expression value) {
    Optional<Dimension> own = resolve(name).map(Quantity::dimension);
    Optional<Dimension> other = evaluate(value).map(Quantity::dimension);
    if (own.isPresent() && other.isPresent() && !own.equals(other)) {
      findings.error(
          isBareNumber(value) ? "missing-unit" : "wrong-dimension",
          value.span(),
          "this is "
              + other.get().describe()
              + "; in the file `"
              + name
              + "` is "
              + own.get().describe());
      return;
    }
    lets.put(name, value);
    known.clear();
  }

  /** Works out every {@code let}, so that slips in unused ones are found too. */
  void readAll() {
    for (String name : lets.keySet()) {
      resolve(name);
    }
  }

  boolean isDeclared(String name) {
    return lets.containsKey(name);
  }

  /** The value of an expression where the statement asks for one thing. */
  OptionalDouble read(Expression expression, Expected expected) {
    Optional<Quantity> quantity = readOneOf(expression, List.of(expected));
    return quantity.isPresent()
        ? OptionalDouble.of(quantity.get().value())
        : OptionalDouble.empty();
  }

  /** The value of an expression where the statement takes one of several things. */
  Optional<Quantity> readOneOf(Expression expression, List<Expected> choices) {
    boolean bare = isBareNumber(expression);
    boolean length = choices.size() == 1 && choices.get(0).dimension().equals(Dimension.LENGTH);
    Optional<Quantity> read = evaluate(expression, length);
    if (read.isEmpty()) {
      return read;
    }
    Quantity quantity = read.get();
    if (bare) {
      if (choices.size() != 1 || !choices.get(0).takesBareNumber()) {
        String number = ((Expression.Literal) core(expression)).number();
        findings.error(
            "missing-unit",
            expression.span(),
            "the unit is missing: " + Expected.words(choices) + " is expected",
            "write, for example, "
                + number
                + " "
                + choices.get(0).example().substring(choices.get(0).example().indexOf(' ') + 1));
        return Optional.empty();
      }
      quantity = new Quantity(quantity.value(), choices.get(0).dimension());
    }
    for (Expected choice : choices) {
      if (choice.dimension().equals(quantity.dimension())) {
        return inRange(expression, quantity.value(), choice)
            ? Optional.of(quantity)
            : Optional.empty();
      }
    }
    findings.error(
        "wrong-dimension",
        expression.span(),
        "this is "
            + quantity.dimension().describe()
            + "; "
            + Expected.words(choices)
            + " is expected");
    return Optional.empty();
  }

  /** The value of an expression, whatever it is. */
  Optional<Quantity> evaluate(Expression expression) {
    return evaluate(expression, false);
  }

  /** Whether this is a single literal that names no unit: its statement may fix it. */
  static boolean isBareNumber(Expression expression) {
    return core(expression) instanceof Expression.Literal literal
        && literal.unit().map(unit -> Units.findPrefix(unit.text()).isPresent()).orElse(true);
  }

  /** Whether a word behind a number is a unit or a prefix. */
  static boolean isKnownUnit(String text) {
    return Units.find(text).isPresent() || Units.findPrefix(text).isPresent();
  }

  /** What stands inside brackets and signs. */
  private static Expression core(Expression expression) {
    Expression inner = expression;
    while (true) {
      if (inner instanceof Expression.Grouped grouped) {
        inner = grouped.inside();
      } else if (inner instanceof Expression.Signed signed) {
        inner = signed.operand();
      } else {
        return inner;
      }
    }
  }

  /** Reports a value out of its range; true where it is in. */
  boolean inRange(Expression expression, double value, Expected expected) {
    boolean finite = Double.isFinite(value);
    boolean in =
        finite
            && switch (expected.range()) {
              case POSITIVE -> value > 0;
              case NOT_NEGATIVE -> value >= 0;
              case ANY -> true;
            };
    if (in) {
      return true;
    }
    String wanted = expected.range() == Expected.Range.NOT_NEGATIVE ? "0 or more" : "more than 0";
    String is =
        finite
            ? value == 0 ? "zero" : "negative"
            : Double.isNaN(value) ? "no number" : "larger than any number that can be kept";
    findings.error(
        "out-of-range",
        expression.span(),
        "this value is "
            + is
            + "; "
            + expected.noun()
            + (finite ? " of " + wanted : "")
            + " is expected");
    return false;
  }

  private Optional<Quantity> evaluate(Expression expression, boolean length) {
    if (expression instanceof Expression.Literal literal) {
      return readLiteral(literal, length);
    }
    if (expression instanceof Expression.Reference reference) {
      return readReference(reference.name());
    }
    if (expression instanceof Expression.Grouped grouped) {
      return evaluate(grouped.inside(), length);
    }
    if (expression instanceof Expression.Signed signed) {
      return evaluate(signed.operand(), length)
          .map(q -> signed.negative() ? new Quantity(-q.value(), q.dimension()) : q);
    }
    if (expression instanceof Expression.Operation operation) {
      Optional<Quantity> left = evaluate(operation.left(), length);
      Optional<Quantity> right = evaluate(operation.right(), length);
      if (operation.operator() == Expression.Operator.PARALLEL) {
        findings.error(
            "impedance-arithmetic",
            operation.operatorSpan(),
            "|| joins impedances; a single value is expected here",
            "an impedance part takes an expression with || and +: impedance z = …");
        return Optional.empty();
      }
      return left.isEmpty() || right.isEmpty()
          ? Optional.empty()
          : Arithmetic.apply(operation, left.get(), right.get(), findings);
    }
    if (expression instanceof Expression.Invocation call) {
      return readCall(call, length);
    }
    if (expression instanceof Expression.Toleranced toleranced) {
      findings.error(
          "tolerance",
          toleranced.amount().span(),
          "a tolerance stands once, at the end of a part's or an impedance's value");
      return Optional.empty();
    }
    findings.error("syntax", expression.span(), "a value is expected here, not a quoted text");
    return Optional.empty();
  }

  private Optional<Quantity> readLiteral(Expression.Literal literal, boolean length) {
    if (literal.unit().isEmpty()) {
      return Optional.of(new Quantity(literal.value(), Dimension.NUMBER));
    }
    Expression.Unit written = literal.unit().get();
    Optional<Unit> unit = Units.find(written.text());
    OptionalDouble prefix = length ? OptionalDouble.empty() : Units.findPrefix(written.text());
    if (prefix.isPresent()) {
      double value = Units.scaled(literal.number(), prefix.getAsDouble());
      return Optional.of(new Quantity(value, Dimension.NUMBER));
    }
    if (unit.isPresent()) {
      double value = Units.scaled(literal.number(), unit.get());
      return Optional.of(new Quantity(value, unit.get().dimension()));
    }
    String text = literal.number() + written.text();
    if (literal.adjoined() && LetterCode.find(text).isPresent()) {
      findings.error(
          "letter-code",
          literal.span(),
          "a letter code is read only as the whole value of a resistor, capacitor or inductor",
          "write the number with its unit");
      return Optional.empty();
    }
    Units.Reason why = Units.explain(written.text());
    findings.error(why.code(), written.span(), why.message(), why.hint());
    return Optional.empty();
  }

  private Optional<Quantity> readReference(Name name) {
    if (name.text().equals("pi") && !lets.containsKey("pi")) {
      return Optional.of(new Quantity(Math.PI, Dimension.NUMBER));
    }
    if (brokenLets.contains(name.text())) {
      return Optional.empty();
    }
    if (!lets.containsKey(name.text())) {
      findings.error(
          "undefined-value",
          name.span(),
          "there is no value `" + name.text() + "`",
          Nearest.find(name.text(), lets.keySet())
              .map(near -> "did you mean `" + near + "`?")
              .orElse("name a value with a line of its own: let " + name.text() + " = …"));
      return Optional.empty();
    }
    if (underway.contains(name.text())) {
      findings.error("circular-value", name.span(), "the value `" + name.text() + "` needs itself");
      return Optional.empty();
    }
    return resolve(name.text());
  }

  private Optional<Quantity> resolve(String name) {
    Optional<Quantity> before = known.get(name);
    if (before != null) {
      return before;
    }
    underway.add(name);
    Expression expression = Objects.requireNonNull(lets.get(name));
    Optional<Quantity> value = evaluate(expression, false);
    if (value.isPresent() && !Double.isFinite(value.get().value())) {
      inRange(expression, value.get().value(), Expected.COUNT);
      value = Optional.empty();
    }
    underway.remove(name);
    known.put(name, value);
    return value;
  }

  private Optional<Quantity> readCall(Expression.Invocation call, boolean length) {
    Quantity[] arguments = new Quantity[call.arguments().size()];
    boolean whole = true;
    for (int i = 0; i < arguments.length; i++) {
      Optional<Quantity> argument = evaluate(call.arguments().get(i).value(), length);
      if (argument.isPresent()) {
        arguments[i] = argument.get();
      } else {
        whole = false;
      }
    }
    return whole ? Arithmetic.call(call, arguments, findings) : Optional.empty();
  }
}
