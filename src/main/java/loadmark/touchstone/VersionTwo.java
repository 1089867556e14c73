package loadmark.touchstone;

import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.diagnostic.Span;

/** Reads version 2.0: keywords in brackets, then rows. */
final class VersionTwo {
  private final Lines lines;
  private final Findings findings;
  private final OptionLines optionLines;
  private final Header header;

  VersionTwo(Lines lines, Findings findings) {
    this.lines = lines;
    this.findings = findings;
    this.optionLines = new OptionLines(lines, findings);
    this.header = new Header(lines, findings);
  }

  /** Reads from the current line on; empty where there are no rows to be read. */
  Optional<Points> read() {
    if (findKeyword().filter(k -> k == Keyword.VERSION).isEmpty()) {
      findings.error(
          "data-no-version", lines.place(0), "a file with keywords begins with `[Version] 2.0`");
      return Optional.empty();
    }
    int before = findings.errorCount();
    header.readKeyword(Keyword.VERSION);
    if (findings.errorCount() > before || !readHeader()) {
      return Optional.empty();
    }
    Optional<Layout> layout = header.toLayout(optionLines.options());
    lines.next();
    return layout.map(this::readRows);
  }

  /** Whether the data was reached. */
  private boolean readHeader() {
    boolean inReference = false;
    int most = findings.errorCount() + Touchstone.MOST_ERRORS;
    while (findings.errorCount() < most && lines.next()) {
      if (lines.isOptions()) {
        optionLines.read();
        inReference = false;
      } else if (lines.isKeyword()) {
        Optional<Keyword> keyword = findKeyword();
        if (keyword.filter(k -> k == Keyword.NETWORK_DATA).isPresent()) {
          return true;
        }
        inReference = keyword.filter(k -> k == Keyword.REFERENCE).isPresent();
        if (keyword.filter(k -> k == Keyword.BEGIN_INFORMATION).isPresent()) {
          if (!skipInformation()) {
            return false;
          }
        } else if (keyword.isPresent()) {
          header.readKeyword(keyword.get());
        } else {
          reportUnknown();
        }
      } else if (inReference) {
        header.readReferences(0);
      } else {
        findings.error(
            "data-keyword-missing",
            lines.place(0),
            "data stands behind " + Keyword.NETWORK_DATA.quoted());
        return false;
      }
    }
    if (findings.errorCount() < most) {
      findings.error("data-empty", lines.end(), "the file has no " + Keyword.NETWORK_DATA.quoted());
    }
    return false;
  }

  private Optional<Keyword> findKeyword() {
    return Keyword.find(lines.word(0));
  }

  private void reportUnknown() {
    String word = lines.quoted(0);
    findings.error(
        "data-keyword",
        lines.place(0),
        "there is no keyword " + word,
        Nearest.find(lines.word(0), Keyword.words())
            .map(n -> "did you mean `" + n + "`?")
            .orElse("a keyword of version 2.0 is expected, such as " + Keyword.PORTS.word()));
  }

  /** Whether it ends. */
  private boolean skipInformation() {
    Span begin = lines.place(0);
    while (lines.next()) {
      if (lines.isKeyword()
          && findKeyword().filter(k -> k == Keyword.END_INFORMATION).isPresent()) {
        return true;
      }
    }
    findings.error(
        "data-keyword", begin, Keyword.END_INFORMATION.quoted() + " is missing behind this");
    return false;
  }

  private Points readRows(Layout layout) {
    int before = findings.errorCount();
    RowReader reader = new RowReader(lines, optionLines, layout, findings);
    Points points = reader.read();
    if (!reader.isStopped()) {
      readEnd();
      boolean known = header.frequencies() > 0 && findings.errorCount() == before;
      if (known && reader.rows() != header.frequencies()) {
        findings.error(
            "data-rows",
            header.countPlace(),
            Keyword.FREQUENCIES.quoted()
                + " says "
                + header.frequencies()
                + "; rows in the file: "
                + reader.rows());
      }
    }
    return points;
  }

  /** Noise data says nothing of a loading; what is behind the end is not looked at. */
  private void readEnd() {
    boolean noise = false;
    while (lines.count() > 0) {
      Optional<Keyword> keyword = lines.isKeyword() ? findKeyword() : Optional.empty();
      if (keyword.filter(k -> k == Keyword.END).isPresent()) {
        return;
      }
      noise |= keyword.filter(k -> k == Keyword.NOISE_DATA).isPresent();
      if (!noise) {
        findings.error("data-keyword", lines.place(0), lines.quoted(0) + " has no place here");
        return;
      }
      lines.next();
    }
    findings.warning(
        "data-no-end",
        lines.end(),
        "the file ends without " + Keyword.END.quoted(),
        "is it whole?");
  }
}
