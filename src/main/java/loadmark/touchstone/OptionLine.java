package loadmark.touchstone;

import java.util.Arrays;
import java.util.HashSet;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Findings;

/** Reads {@code # GHz S MA R 50}: in any order and case, each part optional. */
final class OptionLine {
  private static final String REFERENCE = "R";
  private static final Set<String> REFUSED = Set.of("G", "H");

  private final Lines lines;
  private final Findings findings;
  private final Set<String> said = new HashSet<>();
  private FrequencyUnit unit = Options.DEFAULT.unit();
  private Parameter parameter = Options.DEFAULT.parameter();
  private Notation notation = Options.DEFAULT.notation();
  private double referenceOhm = Options.DEFAULT.referenceOhm();

  private OptionLine(Lines lines, Findings findings) {
    this.lines = lines;
    this.findings = findings;
  }

  /** Reads the current line; what is wrong with it is a finding and stays at its default. */
  static Options read(Lines lines, Findings findings) {
    return new OptionLine(lines, findings).read();
  }

  private Options read() {
    int most = findings.errorCount() + Touchstone.MOST_ERRORS;
    for (int i = 0; i < lines.count() && findings.errorCount() < most; i++) {
      // The sign may stand straight before the first word.
      String word = i == 0 ? lines.word(0).substring(1) : lines.word(i);
      if (word.equalsIgnoreCase(REFERENCE)) {
        once("reference", i);
        readReference(++i);
      } else if (!word.isEmpty()) {
        readWord(word.toUpperCase(Locale.ROOT), i);
      }
    }
    return new Options(unit, parameter, notation, referenceOhm);
  }

  private void readWord(String word, int i) {
    Optional<FrequencyUnit> foundUnit = FrequencyUnit.find(word);
    Optional<Parameter> foundParameter = find(Parameter.values(), word);
    Optional<Notation> foundNotation = find(Notation.values(), word);
    if (foundUnit.isPresent()) {
      once("frequency unit", i);
      unit = foundUnit.get();
    } else if (foundParameter.isPresent()) {
      once("parameter", i);
      parameter = foundParameter.get();
    } else if (foundNotation.isPresent()) {
      once("number format", i);
      notation = foundNotation.get();
    } else if (REFUSED.contains(word)) {
      findings.error(
          "data-parameter",
          lines.place(i),
          "hybrid parameters (" + word + ") are not read",
          "write the data out again as S, Y or Z");
    } else {
      findings.error(
          "data-option",
          lines.place(i),
          lines.quoted(i) + " is no option",
          "an option line reads `# GHz S MA R 50`: a unit from Hz to GHz; S, Y or Z; RI, MA or DB;"
              + " R and a resistance");
    }
  }

  private static <E extends Enum<E>> Optional<E> find(E[] values, String word) {
    return Arrays.stream(values).filter(v -> v.name().equals(word)).findFirst();
  }

  private void once(String kind, int i) {
    if (!said.add(kind)) {
      findings.error("data-option", lines.place(i), "the option line gives two of: " + kind);
    }
  }

  private void readReference(int i) {
    if (i >= lines.count()) {
      findings.error(
          "data-reference", lines.place(i - 1), "a resistance in ohm is missing behind R");
      return;
    }
    References.read(lines, i, findings).ifPresent(ohm -> referenceOhm = ohm);
  }
}
