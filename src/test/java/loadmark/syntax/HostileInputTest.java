package loadmark.syntax;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.FindingPrinter;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceReader;
import loadmark.diagnostic.SourceText;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Whatever comes in, no exception, and every finding stands inside the text. */
class HostileInputTest {
  private static final long SEED = 20260102;
  private static final int SAMPLE = 1_500;
  private static final int THOROUGH = 50_000;

  private static final List<String> PIECES =
      List.of(
          "resistor",
          "capacitor",
          "wire",
          "port",
          "load",
          "case",
          "limit",
          "sweep",
          "let",
          "network",
          "shunt",
          "series",
          "change",
          "magnitude",
          "phase",
          "within",
          "of",
          "in",
          "to",
          "from",
          "at",
          "dc",
          "added",
          "tolerance",
          "block",
          "end",
          "coupling",
          "r1",
          "tap",
          "k",
          "kΩ",
          "pF",
          "%",
          "°",
          "±",
          "+-",
          "--",
          "-",
          "−",
          "||",
          "|",
          "=",
          ",",
          ".",
          "(",
          ")",
          "*",
          "/",
          "^",
          "\"a b\"",
          "\"",
          "1",
          "2.5",
          "1,5",
          "1e400",
          ".5",
          "4K7",
          "3V3",
          "#",
          "\n",
          "\r\n",
          "\r",
          "\t",
          "\u0000",
          "\u202e",
          "𝛺",
          "\uD800",
          "é",
          "—",
          "H/m",
          "sqrt");

  private static final String SOUND =
      """
      network "Tap"
      resistor upper = 220 kΩ ± 1 %, rated 0.1 W, tolerance -20 % to +80 %
      wire pack -- upper -- tap
      port input = pack -- ground, driven 325 V peak behind 0.2 Ω, mains
      load conv shunt tap -- ground = 1.2 MΩ || (200 Ω + 9 pF)
      case x = probe added to conv
      sweep dc and 10 Hz to 1 MHz, 50 per decade
      limit change 2 % or 5 Ω from 10 Hz to 1 kHz for case x at port input
      limit within 20 %, 11.5 deg of 50 Ω || (50 µH + sqrt(5) * 2^-3 Ω)
      """;

  private static Findings read(String text) {
    Findings findings = new Findings();
    SourceText source = new SourceText("hostile", text);
    NetworkReader.read(source, findings);
    return findings;
  }

  @ParameterizedTest
  @CsvSource({
    "(,10000,too-deep",
    "1+,100000,too-long",
    "'- ',100000,too-long",
    "2^,100000,too-long",
    "9,100000,too-long",
    "x,100000,too-long",
  })
  void endlessExpressionIsOneFinding(String piece, int times, String code) {
    assertThat(read("let x = " + piece.repeat(times) + "1").sorted())
        .extracting(Finding::code)
        .containsExactly(code);
  }

  @Test
  void deepestAllowedNestingIsRead() {
    int depth = LineCheck.MOST_DEPTH;
    assertThat(read("let x = " + "(".repeat(depth) + "1" + ")".repeat(depth)).sorted()).isEmpty();
    assertThat(read("let x = " + "1 + ".repeat(LineCheck.MOST_OPERATORS) + "1").sorted()).isEmpty();
    assertThat(read("let x = " + "2^".repeat(LineCheck.MOST_OPERATORS) + "1").sorted()).isEmpty();
  }

  @Test
  void tooLargeIsOneFinding() {
    assertThat(read("a".repeat(SourceReader.MOST_BYTES + 1)).sorted())
        .extracting(Finding::code)
        .containsExactly("too-large");
  }

  @Test
  void endlessStatementIsOneFinding() {
    assertThat(read("wire a" + " -- b".repeat(500_000)).sorted())
        .extracting(Finding::code)
        .containsExactly("too-long");
  }

  @Test
  void hundredThousandLinesAreRead() {
    assertThat(read("wire a -- r1 -- b\n".repeat(100_000)).sorted()).isEmpty();
  }

  @Test
  void readingStopsAfterAThousandErrors() {
    assertThat(read("foo\n".repeat(100_000)).errorCount()).isEqualTo(NetworkReader.MOST_ERRORS + 1);
  }

  private static Stream<String> randomTexts(int count) {
    Random random = new Random(SEED);
    return Stream.generate(() -> random.nextBoolean() ? pieces(random) : mutated(random))
        .limit(count);
  }

  private static String pieces(Random random) {
    StringBuilder text = new StringBuilder();
    int count = 1 + random.nextInt(40);
    for (int i = 0; i < count; i++) {
      text.append(PIECES.get(random.nextInt(PIECES.size())));
      text.append(random.nextInt(4) == 0 ? "" : " ");
    }
    return text.toString();
  }

  /** A sound file with some pieces put in, taken out or doubled. */
  private static String mutated(Random random) {
    List<String> words = new ArrayList<>(List.of(SOUND.split("(?<=\\s)")));
    for (int i = 1 + random.nextInt(4); i > 0; i--) {
      int at = random.nextInt(words.size());
      switch (random.nextInt(3)) {
        case 0 -> words.remove(at);
        case 1 -> words.add(at, PIECES.get(random.nextInt(PIECES.size())) + " ");
        default -> words.add(at, words.get(random.nextInt(words.size())));
      }
    }
    return String.join("", words);
  }

  @Test
  void randomTextsGiveFindingsInsideThem() {
    randomTexts(SAMPLE).forEach(HostileInputTest::check);
  }

  @Tag("thorough")
  @Test
  void manyRandomTextsGiveFindingsInsideThem() {
    randomTexts(THOROUGH).forEach(HostileInputTest::check);
  }

  private static void check(String text) {
    String told = "seed " + SEED + ": " + text;
    Findings findings = read(text);
    List<String> lines = text.lines().toList();
    for (Finding finding : findings.sorted()) {
      int line = finding.place().line();
      assertThat(line).as(told).isBetween(1, Math.max(1, lines.size()));
      String written = lines.isEmpty() ? "" : lines.get(line - 1);
      int end = finding.place().column() - 1 + finding.place().length();
      assertThat(end).as(told).isLessThanOrEqualTo(written.codePointCount(0, written.length()));
      assertThat(finding.message()).as(told).doesNotContain("Exception").doesNotContain("<EOF>");
    }
    assertThat(new FindingPrinter(false).print(findings.sorted())).as(told).doesNotContain("\0");
  }

  @Test
  void soundFileIsWithoutFinding() {
    assertThat(read(SOUND).sorted()).isEmpty();
  }
}
