package loadmark.diagnostic;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class FindingPrinterTest {
  private static final FindingPrinter PLAIN = new FindingPrinter(false);

  private static String print(String text, int line, int column, int length, String message) {
    Findings findings = new Findings();
    Span place = new Span(new SourceText("tap.zin", text), line, column, length);
    findings.error("code", place, message, "do it otherwise");
    return PLAIN.print(findings.sorted());
  }

  @Test
  void slipIsUnderlinedBelowItsLine() {
    assertThat(print("one\nresistor r1 = 5 pF\n", 2, 15, 4, "wrong unit"))
        .isEqualTo(
            """
            tap.zin:2:15: error: wrong unit
                resistor r1 = 5 pF
                              ^~~~
            hint: do it otherwise
            """);
  }

  @Test
  void placeBehindTheLineIsMarkedToo() {
    assertThat(print("sweep", 1, 6, 0, "m")).contains("    sweep\n         ^\n");
  }

  @Test
  void tabsAreKeptSoThatTheMarkStandsRight() {
    assertThat(print("\twire\ta -- b", 1, 7, 1, "m"))
        .contains("    \twire\ta -- b\n    \t    \t^\n");
  }

  @Test
  void charactersBeyondTheBasicPlaneCountOnce() {
    assertThat(print("\"𝛺𝛺\" x", 1, 6, 1, "m")).contains("    \"𝛺𝛺\" x\n         ^\n");
  }

  @Test
  void longLineIsCutToAWindowAroundTheSlip() {
    String text = "a".repeat(5000) + "XYZ" + "b".repeat(5000);
    String[] lines = print(text, 1, 5001, 3, "m").split("\n", -1);
    assertThat(lines[1]).hasSizeLessThan(100).contains("aXYZb").contains("…");
    assertThat(lines[2].indexOf('^')).isEqualTo(lines[1].indexOf("XYZ"));
    assertThat(lines[2]).endsWith("^~~");
  }

  @Test
  void terminalEscapesAreShownAndNeverPassed() {
    String text = "wire \u001b[31m \u202e \u0007";
    String out = print(text, 1, 6, 1, "`\u001b]0;x\u0007` is wrong\n\r");
    assertThat(out).doesNotContain("\u001b").doesNotContain("\u202e").doesNotContain("\u0007");
    assertThat(out).contains("␛[31m").contains("`␛]0;x␇` is wrong␊␍");
  }

  @Test
  void findingOfAnUnreadFileHasNoLine() {
    Findings findings = new Findings();
    findings.error("missing-file", SourceText.unread("no.zin").whole(), "no such file");
    assertThat(PLAIN.print(findings.sorted())).isEqualTo("no.zin:1:1: error: no such file\n");
  }

  @Test
  void twentyFiveAreShownAndTheRestCounted() {
    SourceText source = new SourceText("many.zin", "x\n".repeat(40));
    Findings findings = new Findings();
    IntStream.rangeClosed(1, 27)
        .forEach(line -> findings.warning("code", new Span(source, line, 1, 1), "m"));
    String out = PLAIN.print(findings.sorted());
    assertThat(out).contains("many.zin:25:1: warning: m").doesNotContain("many.zin:26");
    assertThat(out).endsWith("… and 2 more findings\n");
  }

  @Test
  void colourIsAddedOnlyOnDemand() {
    Findings findings = new Findings();
    findings.error("code", new Span(new SourceText("a", "b"), 1, 1, 1), "m");
    String coloured = new FindingPrinter(true).print(findings.sorted());
    assertThat(coloured).contains("\u001b[1;31merror:\u001b[0m");
    assertThat(coloured.replaceAll("\u001b\\[[0-9;]*m", ""))
        .isEqualTo(PLAIN.print(findings.sorted()));
  }

  @Test
  void findingsOfSeveralFilesStayTogether() {
    SourceText a = new SourceText("a.zin", "x\n\n\n");
    SourceText b = new SourceText("b.zin", "x\n\n\n");
    Findings findings = new Findings();
    findings.error("c", new Span(b, 1, 1, 1), "third");
    findings.error("c", new Span(a, 2, 1, 1), "first");
    findings.error("c", new Span(a, 2, 1, 1), "second");
    assertThat(findings.sorted().stream().map(Finding::message))
        .isEqualTo(List.of("first", "second", "third"));
  }
}
