package loadmark.evidence;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What is wrong with a file as such, with a path or with the command line. */
class BadInputTest {
  /** Far above what any of them needs; it stops a run that hangs. */
  private static final Duration PATIENCE = Duration.ofSeconds(10);

  private static final int TEN_MEGABYTES = 10_000_000;
  private static final int DEEP = 10_000;

  private static final String GOOD =
      """
      resistor r = 1 kΩ
      wire in -- r -- ground
      port input = in -- ground
      load probe shunt in -- ground = 1 MΩ
      sweep 10 Hz to 1 kHz
      limit change 1 %
      """;

  @TempDir Path folder = Path.of("");

  @Test
  void theGoodFileIsKept() {
    assertThat(Run.reading(GOOD, "check", "-").status()).isEqualTo(Run.KEPT);
  }

  @Test
  void missingFile() {
    refused(Run.of("check", folder.resolve("nowhere.zin").toString()), "nowhere.zin:1:1: error: ");
  }

  @Test
  void directoryAsFile() {
    refused(Run.of("check", folder.toString()), folder + ":1:1: error: ");
  }

  @Test
  void missingFileForCurve() {
    refused(Run.of("curve", folder.resolve("nowhere.zin").toString()), "nowhere.zin:1:1: error: ");
  }

  @Test
  void outputInAFolderThatIsNotThere() {
    Path output = folder.resolve("no/such/folder/report.txt");
    refused(Run.reading(GOOD, "check", "--output", output.toString(), "-"), "report.txt");
    assertThat(output.getParent()).doesNotExist();
  }

  @Test
  void outputThatIsAFolder() {
    refused(
        Run.reading(GOOD, "check", "--output", folder.toString(), "-"),
        folder.getFileName().toString());
  }

  @Test
  void outputOverAnOrdinaryFileAsIfItWereAFolder() throws IOException {
    Path file = Files.writeString(folder.resolve("plain.txt"), "kept as it is");
    refused(
        Run.reading(GOOD, "check", "--output", file.resolve("report.txt").toString(), "-"),
        "report.txt");
    assertThat(file).hasContent("kept as it is");
  }

  @Test
  void anEarlierReportStaysWhereTheInputIsWrong() throws IOException {
    Path earlier = Files.writeString(folder.resolve("report.txt"), "an earlier report");
    String wrong = GOOD.replace("1 kHz", "1 Hz");
    refused(Run.reading(wrong, "check", "--output", earlier.toString(), "-"), "-:5:7: error: ");
    assertThat(earlier).hasContent("an earlier report");
    try (Stream<Path> files = Files.list(folder)) {
      assertThat(files).containsExactly(earlier);
    }
  }

  @Test
  void oneMissingAmongSeveralFiles() throws IOException {
    Path good = Files.writeString(folder.resolve("good.zin"), GOOD);
    Run run =
        Run.of("check", "--format", "json", good.toString(), folder.resolve("none.zin").toString());
    assertThat(run.status()).isEqualTo(Run.INVALID);
    assertThat(run.json().path("files").path(0).path("verdict").asText()).isEqualTo("kept");
    assertThat(run.json().path("files").path(1).path("verdict").asText()).isEqualTo("invalid");
    assertThat(run.json().path("files").path(1).path("cases")).isEmpty();
  }

  static Stream<String> longLines() {
    return Stream.of(
        "x".repeat(TEN_MEGABYTES),
        "resistor r = " + "1 + ".repeat(TEN_MEGABYTES / 4) + "1",
        "resistor r = " + "9".repeat(TEN_MEGABYTES) + " Ω",
        "network \"" + "long ".repeat(TEN_MEGABYTES / 5),
        "wire a" + " -- b".repeat(TEN_MEGABYTES / 5),
        "(".repeat(TEN_MEGABYTES));
  }

  @ParameterizedTest(name = "{index}")
  @MethodSource("longLines")
  void aLineOfTenMegabytes(String line) {
    refusedWithPatience(line + "\n", "-:1:");
  }

  @ParameterizedTest
  @ValueSource(strings = {"resistor r = ", "let x = ", "load p shunt in -- ground = "})
  void tenThousandNestedBrackets(String start) {
    refusedWithPatience(start + "(".repeat(DEEP) + "1 Ω" + ")".repeat(DEEP) + "\n", "-:1:");
  }

  @ParameterizedTest
  @ValueSource(strings = {"-", "2^", "sqrt(", "1 Ω || ("})
  void tenThousandOfAnythingThatNests(String one) {
    String closing = one.endsWith("(") ? ")".repeat(DEEP) : "";
    refusedWithPatience("let x = " + one.repeat(DEEP) + "1" + closing + "\n", "-:1:");
  }

  @Test
  void aLongSumIsNoNesting() {
    String sum = "load sum shunt in -- ground = 1 MΩ" + " + 1 Ω".repeat(150) + "\n";
    Run run = withPatience(GOOD + sum);
    assertThat(run.status()).as(run.err()).isEqualTo(Run.KEPT);
  }

  @Test
  void ofManySlipsTheFirstTwentyFiveAreShown() {
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < 40; i++) {
      text.append("let v").append(i).append(" = 10 KΩ\n");
    }
    Run run = Run.reading(text + GOOD, "check", "-");
    assertThat(run.status()).isEqualTo(Run.INVALID);
    assertThat(run.err().lines().filter(l -> l.contains(": error: "))).hasSize(25);
    assertThat(run.err()).contains("15 more");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "chek FILE",
        "check",
        "check --wobble FILE",
        "check --format html FILE",
        "check --port nowhere FILE",
        "check --case nothing FILE",
        "check --sweep 10 FILE",
        "check --sweep '1 kHz to 10 Hz' FILE",
        "check --sweep '10 KHz to 1 MHz' FILE",
        "check --output",
        "curve",
        "curve --at 1,5kHz FILE",
        "curve --at '10 KHz' FILE",
        "curve --at '5 Ω' FILE",
        "curve --at '-1 Hz' FILE",
        "curve --at '' FILE",
        "curve --port nowhere FILE",
        "curve FILE FILE",
      })
  void theCommandLineIsWrong(String line) throws IOException {
    Path file = Files.writeString(folder.resolve("good.zin"), GOOD);
    Run run = Run.of(words(line, file));
    assertThat(run.status()).as(line).isEqualTo(Run.INVALID);
    assertThat(run.out()).isEmpty();
    assertThat(run.err()).isNotBlank();
    OutsideWords.areKeptFrom(run);
  }

  @Test
  void aWrongCommandLineIsToldInJsonToo() throws IOException {
    Path file = Files.writeString(folder.resolve("good.zin"), GOOD);
    Run run = Run.of("check", "--format", "json", "--port", "nowhere", file.toString());
    assertThat(run.status()).isEqualTo(Run.INVALID);
    JsonNode root = run.json();
    assertThat(root.path("format").asText()).isEqualTo("loadmark/check/1");
    assertThat(root.findValuesAsText("message")).isNotEmpty();
  }

  @Test
  void limitsOutsideAnOverridingSweepAreNamedAndSkipped() {
    String text = GOOD + "limit magnitude below 2 kΩ at 100 Hz\n";
    Run run = Run.reading(text, "check", "--sweep", "200 Hz to 1 kHz", "-");
    assertThat(run.status()).isEqualTo(Run.KEPT);
    assertThat(run.err()).contains("-:7:");
  }

  @Test
  void nothingLeftToJudgeIsStatusTwo() {
    String text = GOOD.replace("limit change 1 %", "limit change 1 % at 100 Hz");
    Run run = Run.reading(text, "check", "--sweep", "200 Hz to 1 kHz", "-");
    assertThat(run.status()).isEqualTo(Run.INVALID);
    OutsideWords.areKeptFrom(run);
  }

  private static void refusedWithPatience(String text, String place) {
    refused(withPatience(text), place);
  }

  private static Run withPatience(String text) {
    byte[] bytes = text.getBytes(UTF_8);
    return assertTimeoutPreemptively(PATIENCE, () -> Run.reading(bytes, "check", "-"));
  }

  private static void refused(Run run, String told) {
    assertThat(run.status()).isEqualTo(Run.INVALID);
    assertThat(run.err()).contains(told);
    assertThat(run.err().length()).isLessThan(100_000);
    OutsideWords.areKeptFrom(run);
  }

  /** Splits at spaces outside single quotes; FILE stands for the file. */
  private static String[] words(String line, Path file) {
    String[] pieces = line.split("'", -1);
    Stream.Builder<String> words = Stream.builder();
    for (int i = 0; i < pieces.length; i++) {
      if (i % 2 == 1) {
        words.add(pieces[i]);
      } else {
        for (String word : pieces[i].strip().split(" +", -1)) {
          if (!word.isEmpty()) {
            words.add(word.equals("FILE") ? file.toString() : word);
          }
        }
      }
    }
    return words.build().toArray(String[]::new);
  }
}
