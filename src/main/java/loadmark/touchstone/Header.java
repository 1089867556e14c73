package loadmark.touchstone;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;

/** What the keywords of a file say before its data. */
final class Header {
  private static final String COUNT = "[1-9][0-9]{0,8}";

  private static final int MOST_PORTS = 2;

  private final Lines lines;
  private final Findings findings;
  private final Map<Keyword, Span> places = new EnumMap<>(Keyword.class);
  private final List<Double> references = new ArrayList<>();
  private int ports;
  private int referenceWords;
  private int frequencies;
  private Order full = Order.COLUMNS;
  private boolean triangle;

  Header(Lines lines, Findings findings) {
    this.lines = lines;
    this.findings = findings;
  }

  /** Takes in a keyword and its values on the current line. */
  void readKeyword(Keyword keyword) {
    if (places.putIfAbsent(keyword, lines.place(0)) != null) {
      findings.error("data-keyword", lines.place(0), keyword.quoted() + " is given twice");
      return;
    }
    switch (keyword) {
      case VERSION -> readValue(keyword, "2\\.0", "2.0");
      case PORTS -> readPorts();
      case FREQUENCIES ->
          readValue(keyword, COUNT, "a count").ifPresent(n -> frequencies = Integer.parseInt(n));
      case NOISE_FREQUENCIES -> readValue(keyword, "[0-9]+", "a count");
      case ORDER ->
          readValue(keyword, "12_21|21_12", "12_21 or 21_12")
              .ifPresent(v -> full = v.equals("12_21") ? Order.ROWS : Order.COLUMNS);
      case MATRIX ->
          readValue(keyword, "(?i)full|lower|upper", "Full, Lower or Upper")
              .ifPresent(v -> triangle = !v.equalsIgnoreCase("full"));
      case REFERENCE -> readReferences(1);
      case MIXED_MODE ->
          findings.error(
              "data-keyword",
              lines.place(0),
              "mixed-mode data is not read",
              "write the data out again as single-ended");
      default ->
          findings.error("data-keyword", lines.place(0), keyword.quoted() + " has no place here");
    }
  }

  private void readPorts() {
    readValue(Keyword.PORTS, COUNT, "1 or 2")
        .ifPresent(
            n -> {
              ports = Integer.parseInt(n);
              if (ports > MOST_PORTS) {
                findings.error(
                    "data-ports",
                    lines.place(1),
                    "this is data of " + n + " ports: one or two are read");
              }
            });
  }

  private Optional<String> readValue(Keyword keyword, String pattern, String expected) {
    if (lines.count() == 2 && lines.word(1).matches(pattern)) {
      return Optional.of(lines.word(1));
    }
    findings.error(
        "data-keyword-value",
        lines.count() > 1 ? lines.place(1) : lines.place(0),
        keyword.quoted() + " wants " + expected + ", and nothing else");
    return Optional.empty();
  }

  /** Reference resistances may go on over further lines. */
  void readReferences(int from) {
    for (int i = from; i < lines.count(); i++) {
      if (++referenceWords <= MOST_PORTS) {
        References.read(lines, i, findings).ifPresent(references::add);
      }
    }
  }

  /** The place of the count of frequencies. */
  Span countPlace() {
    return places.getOrDefault(Keyword.FREQUENCIES, lines.whole());
  }

  /** How many frequencies the file says it has; 0 where that is not known. */
  int frequencies() {
    return frequencies;
  }

  /**
   * What all of it comes to; the current line begins the data.
   *
   * @return empty, with findings, where the data could not be understood
   */
  Optional<Layout> toLayout(Options options) {
    int before = findings.errorCount();
    require(Keyword.PORTS);
    require(Keyword.FREQUENCIES);
    if (ports == 2 && !triangle) {
      require(Keyword.ORDER);
    }
    boolean known = ports == 1 || ports == 2;
    if (known && places.containsKey(Keyword.REFERENCE) && referenceWords != ports) {
      findings.error(
          "data-reference",
          places.getOrDefault(Keyword.REFERENCE, lines.whole()),
          "reference resistances: " + referenceWords + ", ports: " + ports);
    }
    if (!known || findings.errorCount() > before) {
      return Optional.empty();
    }
    Order order = ports == 1 ? Order.ONE_PORT : triangle ? Order.TRIANGLE : full;
    return Optional.of(
        new Layout(
            options,
            false,
            order,
            references.size() == ports
                ? references
                : Collections.nCopies(ports, options.referenceOhm())));
  }

  private void require(Keyword keyword) {
    if (!places.containsKey(keyword)) {
      findings.error(
          "data-keyword-missing", lines.place(0), keyword.quoted() + " is missing above the data");
    }
  }
}
