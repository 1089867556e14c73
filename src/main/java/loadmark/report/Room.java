package loadmark.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import loadmark.allowance.Amount;
import loadmark.allowance.Heaviest;
import loadmark.network.Load;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.quantity.Engineering;

/**
 * How much room there is, for people. Numbers are rounded to the safe side, so that what is printed
 * is kept too.
 */
final class Room {
  static final String NOTHING = "–";

  private static final MathContext UP =
      new MathContext(Engineering.DEFAULT_DIGITS, RoundingMode.CEILING);
  private static final MathContext DOWN =
      new MathContext(Engineering.DEFAULT_DIGITS, RoundingMode.FLOOR);

  private Room() {}

  /** {@code fine from 2.859 times its impedance on (line 12)}. */
  static String heaviest(Load load, Heaviest heaviest) {
    String line = heaviest.stoppedBy().map(l -> "line " + l.line()).orElse("");
    return switch (heaviest.multiple().state()) {
      case ANY -> "fine however heavy";
      case UNDETERMINED -> NOTHING;
      case NONE -> "none: " + line + " leaves no room for it";
      case NUMBER -> "fine " + size(load, heaviest.multiple().value()) + " (" + line + ")";
    };
  }

  private static String size(Load load, double multiple) {
    boolean shunt = load.placement() == Load.Placement.SHUNT;
    double impedance = shunt ? 1 / multiple : multiple;
    if (load.value() instanceof OnePort.Element element) {
      double value = element.value().nominal();
      boolean grows =
          element.kind() == ElementKind.RESISTANCE || element.kind() == ElementKind.INDUCTANCE;
      Optional<String> unit = unit(element.kind());
      if (unit.isPresent()) {
        return bound(grows ? value * impedance : value / impedance, unit.get(), shunt == grows);
      }
    }
    return bound(impedance, "", shunt).replaceFirst(" on$", "")
        + " times its impedance"
        + (shunt ? " on" : "");
  }

  private static Optional<String> unit(ElementKind kind) {
    return switch (kind) {
      case RESISTANCE -> Optional.of("Ω");
      case CAPACITANCE -> Optional.of("F");
      case INDUCTANCE -> Optional.of("H");
      case CONDUCTANCE -> Optional.empty();
    };
  }

  /** {@code from 886.4 kΩ on}, {@code up to 3.215 pF}. */
  private static String bound(double value, String unit, boolean least) {
    String shown = safe(value, unit, least);
    return least ? "from " + shown + " on" : "up to " + shown;
  }

  /** {@code ≥ 886.4 kΩ}, {@code any}, {@code none}. */
  static String cell(Amount amount, String unit, boolean least) {
    return switch (amount.state()) {
      case NUMBER -> (least ? "≥ " : "≤ ") + safe(amount.value(), unit, least);
      case ANY -> "any";
      case NONE -> "none";
      case UNDETERMINED -> NOTHING;
    };
  }

  private static String safe(double value, String unit, boolean least) {
    double rounded = BigDecimal.valueOf(value).round(least ? UP : DOWN).doubleValue();
    return unit.isEmpty()
        ? Engineering.plain(rounded, "", Engineering.DEFAULT_DIGITS)
        : Engineering.result(rounded, unit);
  }

  /** Of a load that is R‖C: what each may be beside the other. */
  static List<String> beside(Load load, Heaviest heaviest) {
    List<String> lines = new ArrayList<>();
    boolean shunt = load.placement() == Load.Placement.SHUNT;
    if (heaviest.beside().isPresent() && !(load.value() instanceof OnePort.Element)) {
      Heaviest.Beside beside = heaviest.beside().get();
      lines.add(
          "beside its own resistance "
              + phrase(beside.capacitance(), ElementKind.CAPACITANCE, !shunt));
      lines.add(
          "beside its own capacitance "
              + phrase(beside.resistance(), ElementKind.RESISTANCE, shunt));
    }
    return lines;
  }

  private static String phrase(Amount amount, ElementKind kind, boolean least) {
    return switch (amount.state()) {
      case NUMBER -> "fine " + bound(amount.value(), unit(kind).orElseThrow(), least);
      case ANY -> "any " + kind.name().toLowerCase(Locale.ROOT);
      case NONE -> "no " + kind.name().toLowerCase(Locale.ROOT);
      case UNDETERMINED -> NOTHING;
    };
  }
}
