package loadmark.quantity;

import java.math.BigDecimal;
import java.text.Normalizer;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/**
 * The units of the language and the SI prefixes before them (BIPM, The International System of
 * Units, 9th edition, 2019, sections 2.3 and 3.1).
 */
public final class Units {
  /** Metres per second, exact (the same brochure, section 2.2). */
  private static final double SPEED_OF_LIGHT = 299_792_458;

  private static final Map<String, Double> PREFIXES =
      Map.of(
          "f", 1e-15, "p", 1e-12, "n", 1e-9, "µ", 1e-6, "m", 1e-3, "k", 1e3, "M", 1e6, "G", 1e9,
          "T", 1e12);

  /** Units that take a prefix, in the order in which a reader is offered them. */
  private static final Map<String, Dimension> PREFIXED = new LinkedHashMap<>();

  /** Units that stand alone. */
  private static final Map<String, Unit> BARE =
      Map.of(
          "%", new Unit(1e-2, Dimension.NUMBER, "%"),
          "ppm", new Unit(1e-6, Dimension.NUMBER, "ppm"),
          "dB", new Unit(1, Dimension.LEVEL, "dB"),
          "deg", new Unit(1, Dimension.ANGLE, "deg"),
          "°", new Unit(1, Dimension.ANGLE, "deg"),
          "lsb", new Unit(1, Dimension.CODE, "lsb"),
          "c", new Unit(SPEED_OF_LIGHT, Dimension.SPEED, "c"));

  private static final List<String> PER_METRE = List.of("Ω", "H", "S", "F", "s");

  /** What people write in full or in another way, in lower case, and the unit they mean. */
  private static final Map<String, String> SPELT =
      Map.ofEntries(
          Map.entry("ohm", "Ω"),
          Map.entry("ohms", "Ω"),
          Map.entry("ωs", "Ω"),
          Map.entry("farad", "F"),
          Map.entry("farads", "F"),
          Map.entry("henry", "H"),
          Map.entry("hertz", "Hz"),
          Map.entry("siemens", "S"),
          Map.entry("volt", "V"),
          Map.entry("volts", "V"),
          Map.entry("amp", "A"),
          Map.entry("ampere", "A"),
          Map.entry("watt", "W"),
          Map.entry("watts", "W"),
          Map.entry("sec", "s"),
          Map.entry("metre", "m"),
          Map.entry("meter", "m"),
          Map.entry("percent", "%"),
          Map.entry("degree", "deg"),
          Map.entry("degrees", "deg"));

  static {
    PREFIXED.put("Ω", Dimension.RESISTANCE);
    PREFIXED.put("F", Dimension.CAPACITANCE);
    PREFIXED.put("H", Dimension.INDUCTANCE);
    PREFIXED.put("S", Dimension.CONDUCTANCE);
    PREFIXED.put("Hz", Dimension.FREQUENCY);
    PREFIXED.put("s", Dimension.TIME);
    PREFIXED.put("m", Dimension.LENGTH);
    PREFIXED.put("V", Dimension.VOLTAGE);
    PREFIXED.put("A", Dimension.CURRENT);
    PREFIXED.put("W", Dimension.POWER);
    PREFIXED.put("rad", Dimension.ANGLE);
  }

  private Units() {}

  /**
   * Why a text is no unit, and what to write instead.
   *
   * @param code that of the finding
   */
  public record Reason(String code, String message, String hint) {}

  /** The unit written so; empty where there is none. */
  public static Optional<Unit> find(String text) {
    String unified = unify(text);
    Unit bare = BARE.get(unified);
    if (bare != null) {
      return Optional.of(bare);
    }
    boolean perMetre = unified.endsWith("/m");
    String word = perMetre ? unified.substring(0, unified.length() - 2) : unified;
    Optional<Unit> found = findSimple(word);
    if (!perMetre) {
      return found;
    }
    return found
        .filter(u -> PER_METRE.stream().anyMatch(u.symbol()::endsWith))
        .map(u -> new Unit(u.factor(), u.dimension().over(Dimension.LENGTH), u.symbol() + "/m"));
  }

  private static Optional<Unit> findSimple(String word) {
    Dimension own = PREFIXED.get(word);
    if (own != null) {
      return Optional.of(new Unit(base(own), own, word));
    }
    if (word.isEmpty()) {
      return Optional.empty();
    }
    Double factor = PREFIXES.get(word.substring(0, 1));
    Dimension dimension = PREFIXED.get(word.substring(1));
    return factor == null || dimension == null
        ? Optional.empty()
        : Optional.of(new Unit(factor * base(dimension), dimension, word));
  }

  /** Angles are kept in degrees, so that those which people write stay exact. */
  private static double base(Dimension dimension) {
    return dimension.equals(Dimension.ANGLE) ? Math.toDegrees(1) : 1;
  }

  /** The factor of a prefix that stands without a unit: 1000 for {@code k}. */
  public static OptionalDouble findPrefix(String text) {
    Double factor = PREFIXES.get(unify(text));
    return factor == null ? OptionalDouble.empty() : OptionalDouble.of(factor);
  }

  /** What to tell about a text that {@link #find} does not know. */
  public static Reason explain(String text) {
    String word = unify(text);
    if (word.equals("K")) {
      return new Reason("wrong-prefix", "`K` is no prefix", "kilo is written `k`");
    }
    Optional<String> near = nearest(word);
    if (near.isEmpty()) {
      return new Reason(
          "unknown-unit",
          "`" + text + "` is no unit",
          "units are " + String.join(", ", PREFIXED.keySet()) + ", %, ppm, dB, deg, °, lsb and c");
    }
    boolean sameLetters = near.get().equalsIgnoreCase(word);
    String message =
        sameLetters
            ? "`" + text + "` is no unit: capital and small letters differ"
            : "`" + text + "` is no unit";
    boolean prefix = sameLetters && near.get().substring(1).equals(word.substring(1));
    return new Reason(
        prefix ? "wrong-prefix" : "unknown-unit", message, "write `" + near.get() + "`");
  }

  /** The unit that differs in the case of its letters only, or is spelt out. */
  private static Optional<String> nearest(String word) {
    Optional<String> alone =
        sameLetters(word, PREFIXED.keySet()).or(() -> sameLetters(word, BARE.keySet()));
    if (alone.isPresent() || word.length() < 2) {
      return alone;
    }
    return nearestPrefix(word.substring(0, 1))
        .flatMap(p -> sameLetters(word.substring(1), PREFIXED.keySet()).map(unit -> p + unit));
  }

  /** `M` and `m` are both prefixes, so only the other letters can be in the wrong case. */
  private static Optional<String> nearestPrefix(String letter) {
    return Stream.of(letter, letter.toLowerCase(Locale.ROOT), letter.toUpperCase(Locale.ROOT))
        .map(Units::unify)
        .filter(PREFIXES::containsKey)
        .findFirst();
  }

  private static Optional<String> sameLetters(String text, Collection<String> units) {
    if (text.endsWith("/m")) {
      return sameLetters(text.substring(0, text.length() - 2), PER_METRE).map(u -> u + "/m");
    }
    String meant = SPELT.getOrDefault(text.toLowerCase(Locale.ROOT), text);
    return units.stream().filter(unit -> unit.equalsIgnoreCase(meant)).findFirst();
  }

  /** A number in a unit, in SI base units: see {@link #scaled(String, double)}. */
  public static double scaled(String number, Unit unit) {
    return scaled(number, unit.factor());
  }

  /**
   * A decimal number times a factor, rounded once, so that {@code 4.7} with 1e-9 is the double
   * 4.7e-9.
   *
   * @param number decimal digits, with a point and an exponent if need be
   * @return infinite or zero where the number or the product is too large or too small for a double
   */
  public static double scaled(String number, double factor) {
    double alone = Double.parseDouble(number);
    if (factor == 1 || alone == 0 || Double.isInfinite(alone)) {
      return alone * factor;
    }
    return new BigDecimal(number).multiply(BigDecimal.valueOf(factor)).doubleValue();
  }

  /** One form for the signs that Unicode has twice, and for {@code u} and {@code ohm}. */
  private static String unify(String text) {
    // NFC makes the ohm sign U+2126 the Greek letter; the micro sign is only its compatible form.
    String one = Normalizer.normalize(text, Normalizer.Form.NFC).replace('μ', 'µ');
    if (one.equals("u") || (one.startsWith("u") && PREFIXED.containsKey(unitOf(one)))) {
      one = "µ" + one.substring(1);
    }
    return one.replace("ohm", "Ω");
  }

  private static String unitOf(String prefixed) {
    String unit = prefixed.substring(1).replace("ohm", "Ω");
    return unit.endsWith("/m") ? unit.substring(0, unit.length() - 2) : unit;
  }
}
