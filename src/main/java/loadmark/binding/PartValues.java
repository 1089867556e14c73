package loadmark.binding;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Predicate;
import loadmark.diagnostic.Findings;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Value;
import loadmark.quantity.LetterCode;
import loadmark.syntax.Expression;
import loadmark.syntax.Expression.Operator;
import loadmark.syntax.Statement;
import loadmark.syntax.Statement.PartKind;
import loadmark.syntax.Statement.PropertyKind;

/** Reads the value of a two-terminal part with its properties. */
final class PartValues {
  /**
   * What a part statement says.
   *
   * @param rated in W for a resistor, V for a capacitor
   */
  record PartValue(OnePort value, OptionalDouble rated) {}

  private final Values values;
  private final Impedances impedances;
  private final Tolerances tolerances;
  private final Predicate<String> isName;
  private final Findings findings;

  /**
   * @param isName whether anything in the file has a name, so that a letter code that begins with a
   *     letter would be doubtful
   */
  PartValues(Values values, Impedances impedances, Predicate<String> isName, Findings findings) {
    this.values = values;
    this.impedances = impedances;
    this.tolerances = new Tolerances(values, findings);
    this.isName = isName;
    this.findings = findings;
  }

  Optional<PartValue> read(Statement.Part part) {
    Map<PropertyKind, Statement.Property> properties = sort(part);
    if (part.kind() == PartKind.IMPEDANCE) {
      return impedances.read(part.value()).map(v -> new PartValue(v, OptionalDouble.empty()));
    }
    ElementKind kind = mainKind(part.kind());
    Optional<Value> value = readValue(part, properties, expected(kind));
    Optional<Parasitics> parasitics = readParasitics(properties);
    Optional<OptionalDouble> rated = readRating(part.kind(), properties);
    if (value.isEmpty() || parasitics.isEmpty() || rated.isEmpty()) {
      return Optional.empty();
    }
    OnePort whole = assemble(part.kind(), new OnePort.Element(kind, value.get()), parasitics.get());
    return Optional.of(new PartValue(whole, rated.get()));
  }

  /** What the properties of a part add to it; empty where a property is absent. */
  private record Parasitics(
      Optional<OnePort> seriesResistance,
      Optional<OnePort> seriesInductance,
      Optional<OnePort> parallelCapacitance,
      Optional<OnePort> leakage,
      OptionalDouble selfResonanceHz) {}

  private static OnePort assemble(PartKind kind, OnePort.Element main, Parasitics add) {
    OnePort core = main;
    if (add.leakage().isPresent()) {
      core = OnePort.parallel(List.of(core, add.leakage().get()));
    }
    List<OnePort> arm = new ArrayList<>();
    arm.add(core);
    add.seriesResistance().ifPresent(arm::add);
    add.seriesInductance().ifPresent(arm::add);
    List<OnePort> side = new ArrayList<>();
    side.add(OnePort.series(arm));
    add.parallelCapacitance().ifPresent(side::add);
    if (kind == PartKind.INDUCTOR && add.selfResonanceHz().isPresent()) {
      double omega = 2 * Math.PI * add.selfResonanceHz().getAsDouble();
      double farad = 1 / (omega * omega * main.value().nominal());
      side.add(OnePort.of(ElementKind.CAPACITANCE, farad));
    }
    return OnePort.parallel(side);
  }

  private Map<PropertyKind, Statement.Property> sort(Statement.Part part) {
    Map<PropertyKind, Statement.Property> sorted = new EnumMap<>(PropertyKind.class);
    for (Statement.Property property : part.properties()) {
      if (!suits(part.kind(), property.kind())) {
        findings.error(
            "unsuitable-property",
            property.span(),
            "`" + property.kind().words() + "` is no property of a part of this kind",
            suitable(part.kind()));
      } else if (sorted.putIfAbsent(property.kind(), property) != null) {
        findings.error(
            "repeated-property",
            property.span(),
            "`" + property.kind().words() + "` stands here twice");
      }
    }
    return sorted;
  }

  private static String suitable(PartKind kind) {
    StringBuilder words = new StringBuilder();
    for (PropertyKind property : PropertyKind.values()) {
      if (suits(kind, property)) {
        words.append(words.isEmpty() ? "it takes " : ", ").append(property.words());
      }
    }
    return words.isEmpty() ? "write it into the impedance's expression" : words.toString();
  }

  private static boolean suits(PartKind kind, PropertyKind property) {
    return switch (kind) {
      case RESISTOR ->
          switch (property) {
            case PARALLEL_CAPACITANCE, SERIES_INDUCTANCE, RATED, TOLERANCE -> true;
            default -> false;
          };
      case CAPACITOR ->
          switch (property) {
            case SERIES_RESISTANCE, SERIES_INDUCTANCE, LEAKAGE, RATED, TOLERANCE -> true;
            default -> false;
          };
      case INDUCTOR ->
          switch (property) {
            case SERIES_RESISTANCE, SELF_RESONANCE, TOLERANCE -> true;
            default -> false;
          };
      case IMPEDANCE -> false;
    };
  }

  private Optional<Value> readValue(
      Statement.Part part, Map<PropertyKind, Statement.Property> properties, Expected expected) {
    Expression written = liftTolerance(part.value());
    Optional<Expression> amount = Optional.empty();
    if (written instanceof Expression.Toleranced toleranced) {
      written = toleranced.value();
      amount = Optional.of(toleranced.amount());
    }
    Optional<Double> nominal = readNominal(written, expected);
    Statement.Property property = properties.get(PropertyKind.TOLERANCE);
    if (amount.isPresent() && property != null) {
      findings.error(
          "repeated-property", property.span(), "the value has a tolerance already, behind ±");
      return Optional.empty();
    }
    if (nominal.isEmpty()) {
      return Optional.empty();
    }
    double value = nominal.get();
    if (amount.isPresent()) {
      return tolerances.read(amount.get(), value, expected.dimension());
    }
    return property == null
        ? Optional.of(Value.exact(value))
        : tolerances.read(property, value, expected.dimension());
  }

  /** The tolerance of {@code 10 kΩ + 5 Ω ± 1 %} belongs to the whole of a part's value. */
  private static Expression liftTolerance(Expression value) {
    if (value instanceof Expression.Operation operation
        && (operation.operator() == Operator.PLUS || operation.operator() == Operator.MINUS)
        && operation.right() instanceof Expression.Toleranced last) {
      Expression sum =
          new Expression.Operation(
              operation.operator(),
              operation.left(),
              last.value(),
              operation.operatorSpan(),
              operation.span());
      return new Expression.Toleranced(sum, last.amount(), operation.span());
    }
    return value;
  }

  private Optional<Double> readNominal(Expression written, Expected expected) {
    Optional<String> text = findCodeText(written);
    Optional<LetterCode> code = text.flatMap(LetterCode::find);
    if (code.isEmpty()) {
      OptionalDouble value = values.read(written, expected);
      return value.isPresent() ? Optional.of(value.getAsDouble()) : Optional.empty();
    }
    if (written instanceof Expression.Reference && isName.test(text.orElseThrow())) {
      findings.error(
          "letter-code",
          written.span(),
          "`" + text.orElseThrow() + "` may be a letter code, and something has that name",
          "write the number with its unit, or give the other thing another name");
      return Optional.empty();
    }
    if (!code.get().dimensions().contains(expected.dimension())) {
      findings.error(
          "letter-code",
          written.span(),
          "the code `" + text.orElseThrow() + "` is not for " + expected.noun(),
          "write, for example, " + expected.example());
      return Optional.empty();
    }
    double value = code.get().value();
    return values.inRange(written, value, expected) ? Optional.of(value) : Optional.empty();
  }

  /** The text of what may be a letter code: a name, or a number with letters straight behind it. */
  private Optional<String> findCodeText(Expression written) {
    if (written instanceof Expression.Reference reference && !reference.name().quoted()) {
      return Optional.of(reference.name().text());
    }
    if (written instanceof Expression.Literal literal
        && literal.adjoined()
        && literal.unit().isPresent()
        && !Values.isKnownUnit(literal.unit().get().text())) {
      return Optional.of(literal.number() + literal.unit().get().text());
    }
    return Optional.empty();
  }

  private Optional<Parasitics> readParasitics(Map<PropertyKind, Statement.Property> properties) {
    int before = findings.errorCount();
    Parasitics read =
        new Parasitics(
            readAdded(properties, PropertyKind.SERIES_RESISTANCE, ElementKind.RESISTANCE),
            readAdded(properties, PropertyKind.SERIES_INDUCTANCE, ElementKind.INDUCTANCE),
            readAdded(properties, PropertyKind.PARALLEL_CAPACITANCE, ElementKind.CAPACITANCE),
            readAdded(properties, PropertyKind.LEAKAGE, ElementKind.RESISTANCE),
            readProperty(properties, PropertyKind.SELF_RESONANCE, Expected.FREQUENCY));
    return findings.errorCount() == before ? Optional.of(read) : Optional.empty();
  }

  private Optional<OnePort> readAdded(
      Map<PropertyKind, Statement.Property> properties, PropertyKind property, ElementKind kind) {
    OptionalDouble value = readProperty(properties, property, expected(kind));
    return value.isPresent()
        ? Optional.of(OnePort.of(kind, value.getAsDouble()))
        : Optional.empty();
  }

  private OptionalDouble readProperty(
      Map<PropertyKind, Statement.Property> properties, PropertyKind kind, Expected expected) {
    Statement.Property property = properties.get(kind);
    return property == null
        ? OptionalDouble.empty()
        : values.read(property.value(), expected.in(Expected.Range.POSITIVE));
  }

  private Optional<OptionalDouble> readRating(
      PartKind kind, Map<PropertyKind, Statement.Property> properties) {
    int before = findings.errorCount();
    Expected expected = kind == PartKind.RESISTOR ? Expected.POWER : Expected.POSITIVE_VOLTAGE;
    OptionalDouble rated = readProperty(properties, PropertyKind.RATED, expected);
    return findings.errorCount() == before ? Optional.of(rated) : Optional.empty();
  }

  private static ElementKind mainKind(PartKind kind) {
    return switch (kind) {
      case RESISTOR -> ElementKind.RESISTANCE;
      case CAPACITOR -> ElementKind.CAPACITANCE;
      case INDUCTOR -> ElementKind.INDUCTANCE;
      case IMPEDANCE -> throw new IllegalArgumentException("an impedance has no main element");
    };
  }

  private static Expected expected(ElementKind kind) {
    return switch (kind) {
      case RESISTANCE -> Expected.RESISTANCE_OR_LINK;
      case CAPACITANCE -> Expected.CAPACITANCE;
      case INDUCTANCE -> Expected.INDUCTANCE;
      case CONDUCTANCE -> throw new IllegalArgumentException("no part is given as a conductance");
    };
  }
}
