package loadmark.report;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loadmark.quantity.Engineering;

/** Rows of comma-separated values (RFC 4180, but for lines ended by a line feed). */
final class Csv {
  private static final String NEEDS_QUOTES = ",\"\r\n";
  private static final String STARTS_FORMULA = "=+-@\t\r";

  private final StringBuilder text = new StringBuilder();
  private final List<String> row = new ArrayList<>();

  Csv(String header) {
    text.append(header).append('\n');
  }

  /** Text that others wrote: a spreadsheet is kept from taking it as a formula. */
  Csv name(String name) {
    boolean formula = !name.isEmpty() && STARTS_FORMULA.indexOf(name.charAt(0)) >= 0;
    return word(formula ? "'" + name : name);
  }

  Csv word(String word) {
    boolean quote = word.chars().anyMatch(c -> NEEDS_QUOTES.indexOf(c) >= 0);
    row.add(quote ? '"' + word.replace("\"", "\"\"") + '"' : word);
    return this;
  }

  /** The shortest decimal that reads back the same double; {@code inf}; empty for not a number. */
  Csv number(double value) {
    if (Double.isNaN(value)) {
      return word("");
    }
    return word(Double.isInfinite(value) ? (value > 0 ? "inf" : "-inf") : Engineering.exact(value));
  }

  Csv number(OptionalDouble value) {
    return value.isPresent() ? number(value.getAsDouble()) : word("");
  }

  void end() {
    text.append(String.join(",", row)).append('\n');
    row.clear();
  }

  @Override
  public String toString() {
    return text.toString();
  }
}
