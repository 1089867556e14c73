package loadmark.quantity;

import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A value whose letter stands for the decimal point and tells the multiplier: {@code 4K7}, {@code
 * R47}, {@code 470K}, {@code 4n7} (IEC 60062:2016, section 5; the small k for resistors is common
 * practice).
 *
 * @param value in Ω, F or H
 * @param dimensions what the value can be: a resistance, a capacitance, an inductance
 * @param letterFirst whether it begins with its letter, and so looks like a name
 */
public record LetterCode(double value, Set<Dimension> dimensions, boolean letterFirst) {
  private static final Pattern CODE = Pattern.compile("([0-9]*)([RKkMGTmunµμpFH])([0-9]*)");

  public LetterCode {
    dimensions = Set.copyOf(dimensions);
  }

  /** The code written so, without any space; empty where it is none. */
  public static Optional<LetterCode> find(String text) {
    Matcher parts = CODE.matcher(text);
    if (!parts.matches() || text.length() == 1) {
      return Optional.empty();
    }
    String whole = parts.group(1);
    String fraction = parts.group(3);
    String number = (whole.isEmpty() ? "0" : whole) + (fraction.isEmpty() ? "" : "." + fraction);
    char letter = parts.group(2).charAt(0);
    return Optional.of(
        new LetterCode(Units.scaled(number, factor(letter)), dimensions(letter), whole.isEmpty()));
  }

  private static double factor(char letter) {
    return switch (letter) {
      case 'T' -> 1e12;
      case 'G' -> 1e9;
      case 'M' -> 1e6;
      case 'K', 'k' -> 1e3;
      case 'm' -> 1e-3;
      case 'u', 'µ', 'μ' -> 1e-6;
      case 'n' -> 1e-9;
      case 'p' -> 1e-12;
      default -> 1;
    };
  }

  private static Set<Dimension> dimensions(char letter) {
    return switch (letter) {
      case 'm' -> Set.of(Dimension.RESISTANCE, Dimension.CAPACITANCE, Dimension.INDUCTANCE);
      case 'u', 'µ', 'μ', 'n' -> Set.of(Dimension.CAPACITANCE, Dimension.INDUCTANCE);
      case 'p', 'F' -> Set.of(Dimension.CAPACITANCE);
      case 'H' -> Set.of(Dimension.INDUCTANCE);
      default -> Set.of(Dimension.RESISTANCE);
    };
  }
}
