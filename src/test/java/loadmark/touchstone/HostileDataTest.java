package loadmark.touchstone;

import static java.nio.charset.StandardCharsets.ISO_8859_1;
import static java.nio.charset.StandardCharsets.UTF_16;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.FindingPrinter;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever the bytes, there is either data or an error at a place in the file. */
class HostileDataTest {
  private static final long SEED = 65_537;

  /** What slips are made of. */
  private static final String PIECES = "0123456789.eE+-,!#[]\t \r\nRSYZ_naiNHkGz\u001a\u00b5";

  /** Errors above the data may still add a few to those that stop the reading. */
  private static final int MOST_FINDINGS = 2 * Touchstone.MOST_ERRORS;

  private static final List<DataFolder> FOLDERS = DataFolder.all().toList();

  static List<Long> seeds() {
    return new Random(SEED).longs(100).boxed().toList();
  }

  private static Optional<MeasuredData> read(String name, byte[] bytes, Findings findings) {
    return Touchstone.decode(name, bytes, findings).flatMap(s -> Touchstone.read(s, findings));
  }

  private static void assertRightOrTold(String name, byte[] bytes, Object shown) {
    Findings findings = new Findings();
    Optional<MeasuredData> data = read(name, bytes, findings);
    assertThat(findings.hasErrors()).as("%s", shown).isEqualTo(data.isEmpty());
    assertThat(findings.sorted().size()).as("%s", shown).isLessThanOrEqualTo(MOST_FINDINGS);
    assertThat(findings.sorted())
        .allSatisfy(
            f -> {
              assertThat(f.code()).startsWith("data-");
              assertThat(f.place().line())
                  .isLessThanOrEqualTo(Math.max(1, f.place().source().lines().size()));
              assertThat(f.message().length()).isLessThan(200);
            });
    assertThat(new FindingPrinter(false).print(findings.sorted())).isNotNull();
    data.ifPresent(HostileDataTest::assertFinite);
  }

  private static void assertFinite(MeasuredData data) {
    for (int point = 0; point < data.size(); point++) {
      PortRelation relation = data.find(data.hz(point)).orElseThrow();
      assertThat(relation.voltage().isFinite()).isTrue();
      assertThat(relation.current().isFinite()).isTrue();
      assertThat(point == 0 || data.hz(point) > data.hz(point - 1)).isTrue();
    }
    double middle = data.fromHz() + (data.toHz() - data.fromHz()) / 2;
    assertThat(data.find(middle).orElseThrow().current().isFinite()).isTrue();
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void randomBytesAreRefused(long seed) {
    Random random = new Random(seed);
    byte[] bytes = new byte[random.nextInt(2000)];
    random.nextBytes(bytes);
    assertRightOrTold("data.s" + (1 + random.nextInt(2)) + "p", bytes, seed);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void randomSlipsInGoodFilesAreToldOrHarmless(long seed) {
    Random random = new Random(seed);
    for (int trial = 0; trial < 20; trial++) {
      DataFolder folder = FOLDERS.get(random.nextInt(FOLDERS.size()));
      StringBuilder text = new StringBuilder(new String(folder.bytes(), ISO_8859_1));
      int slips = 1 + random.nextInt(4);
      for (int i = 0; i < slips; i++) {
        int at = random.nextInt(text.length() + 1);
        int end = Math.min(text.length(), at + random.nextInt(6));
        int from = random.nextInt(PIECES.length());
        int to = Math.min(PIECES.length(), from + random.nextInt(4));
        text.replace(at, end, PIECES.substring(from, to));
      }
      assertRightOrTold(
          folder.data().toString(),
          text.toString().getBytes(ISO_8859_1),
          "seed " + seed + ":\n" + text);
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"1 ", "x", "[", "#", "!", "\t", "\r", "1e", "\uD835"})
  void onePieceAMillionTimesIsNoTrouble(String piece) {
    String text = piece.repeat(1_000_000);
    Findings findings = new Findings();
    assertThat(Touchstone.read(new SourceText("data.s1p", text), findings)).isEmpty();
    assertThat(findings.errorCount()).isPositive();
    assertThat(findings.sorted().size()).isLessThan(MOST_FINDINGS);
    assertThat(findings.sorted()).allSatisfy(f -> assertThat(f.message().length()).isLessThan(200));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "x 1 1",
        "1 1",
        "1 1 1",
        "[x]",
        "#",
        "# x",
        "[End]",
        "1 x 1",
        "-1 1 1",
        "[Reference] x"
      })
  void oneLineAHundredThousandTimesIsNoTrouble(String line) {
    String rows = (line + "\n").repeat(100_000);
    for (String start : List.of("", "# Hz Z RI R 1\n0 0 0\n", "[Version] 2.0\n#\n")) {
      Findings findings = new Findings();
      SourceText source = new SourceText("data.s1p", start + rows);
      assertThat(Touchstone.read(source, findings).isEmpty()).isEqualTo(findings.hasErrors());
      assertThat(findings.sorted().size()).isBetween(1, MOST_FINDINGS);
    }
  }

  @Test
  void otherEncodingsAreOneFinding() {
    Findings findings = new Findings();
    assertThat(read("data.s1p", "# Hz Z RI R 1\n1 1 1\n".getBytes(UTF_16), findings)).isEmpty();
    assertThat(findings.sorted()).extracting(Finding::code).containsExactly("data-not-text");
  }

  @Test
  void tooManyBytesAreOneFinding() {
    Findings findings = new Findings();
    assertThat(read("data.s1p", new byte[Touchstone.MOST_BYTES + 1], findings)).isEmpty();
    assertThat(findings.sorted()).extracting(Finding::code).containsExactly("data-too-large");
  }
}
