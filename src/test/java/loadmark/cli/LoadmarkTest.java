package loadmark.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LoadmarkTest {
  /** 100 Ω against 900 Ω: the load takes a tenth. */
  private static final String BROKEN =
      """
      network "Stand-in"
      resistor source = 100 Ω
      wire in -- source -- ground
      port input = in -- ground
      load meter shunt in -- ground = 900 Ω
      sweep 10 Hz to 1 MHz
      limit change 2 %
      """;

  private static final String KEPT = BROKEN.replace("2 %", "20 %");

  @TempDir Path folder;

  private record Run(int status, String out, String err) {}

  private static Run run(String... arguments) {
    return runWith("", arguments);
  }

  private static Run runWith(String input, String... arguments) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int status =
        Loadmark.run(
            arguments,
            new ByteArrayInputStream(input.getBytes(StandardCharsets.UTF_8)),
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8));
    return new Run(
        status, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
  }

  private String file(String name, String text) throws IOException {
    return Files.writeString(folder.resolve(name), text).toString();
  }

  @Test
  void brokenFileIsToldOnStandardOutputWithStatusOne() {
    Run run = runWith(BROKEN, "check", "-");
    assertThat(run.err()).isEmpty();
    assertThat(run.out())
        .startsWith("BROKEN   -\n         Stand-in\n         1 judgement, broken")
        .contains("BROKEN     line 7    limit change 2 %\n")
        .contains("worst     change 10.00 % at 10 Hz; allowed: at most 2 %\n")
        .contains("without   100.0 Ω ∠ 0°    100.0 Ω + j0 Ω\n")
        .contains("with      90.00 Ω ∠ 0°    90.00 Ω + j0 Ω\n")
        .contains("broken    10 Hz to 1 MHz\n");
    assertThat(run.status()).isEqualTo(1);
  }

  @Test
  void keptFileHasStatusZero() {
    Run run = runWith(KEPT, "check", "--quiet", "-");
    assertThat(run).isEqualTo(new Run(0, "kept     -\n", ""));
  }

  @Test
  void oneBadFileDoesNotKeepTheOthersFromBeingJudged() throws IOException {
    String kept = file("kept.zin", KEPT);
    String missing = folder.resolve("missing.zin").toString();
    Run run = run("check", missing, folder.toString(), kept);
    assertThat(run.err())
        .startsWith(missing + ":1:1: error: ")
        .contains("\n" + folder + ":1:1: error: ");
    assertThat(run.out())
        .startsWith("kept     " + kept + "\n")
        .contains("3 files: 2 invalid, 1 kept\n");
    assertThat(run.status()).isEqualTo(2);
  }

  @Test
  void jsonStaysValidWhateverIsWrong() throws IOException {
    String kept = file("kept.zin", KEPT);
    Run run = run("check", "--format", "json", kept, folder.resolve("missing.zin").toString());
    JsonNode root = new ObjectMapper().readTree(run.out());
    assertThat(root.path("diagnostics")).isEmpty();
    assertThat(root.path("files").path(0).path("verdict").asText()).isEqualTo("kept");
    assertThat(root.path("files").path(0).path("sha256").asText()).matches("[0-9a-f]{64}");
    JsonNode missing = root.path("files").path(1);
    assertThat(missing.path("verdict").asText()).isEqualTo("invalid");
    assertThat(missing.has("sha256")).isFalse();
    assertThat(missing.path("diagnostics").path(0).path("code").asText()).isEqualTo("no-such-file");
    assertThat(run.err()).contains("missing.zin:1:1: error: ");
    assertThat(run.status()).isEqualTo(2);
  }

  @Test
  void sha256IsThatOfTheBytes() throws IOException {
    Run run = run("check", "--format", "json", file("empty.zin", ""));
    JsonNode root = new ObjectMapper().readTree(run.out());
    // FIPS 180-4 defines the function; the digest of no bytes is in every published vector set.
    assertThat(root.path("files").path(0).path("sha256").asText())
        .isEqualTo("e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855");
    assertThat(run.status()).isEqualTo(2);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "chekc a.zin | 1:10 | there is no command `chekc` | did you mean `check`?",
        "check --fromat json a.zin | 1:16 | check has no option --fromat | did you mean `--format`?",
        "check --format jsno a.zin | 1:16 | there is no format `jsno` | did you mean `json`?",
        "check --out a.txt a.zin | 1:16 | check has no option --out | did you mean `--output`?",
        "check --set=r=2\uFFFD\uFFFD a.zin | 1:16"
            + " | characters of this argument are lost: the locale is not UTF-8"
            + " | set LC_ALL=C.UTF-8, or write `ohm` for Ω and `u` for µ",
        "check --at 3 a.zin | 1:16 | check has no option --at | --at belongs to curve",
        "check | 1:10 | check needs a FILE | a network file, or - for standard input",
        "check a.zin --port | 1:22 | --port needs a value | ",
        "check --sweep --port a.zin | 1:16 | --sweep needs a value | ",
        "check --port a --port b a.zin | 1:25 | --port is given twice | ",
        "check --quiet=3 a.zin | 1:16 | --quiet takes no value | ",
        "check - - | 1:18 | standard input can be read only once | ",
        "curve a.zin b.zin | 1:22 | curve takes one FILE alone | ",
        "--format json | 1:10 | there is no option --format before a command"
            + " | options come after the command",
      })
  void slipOnTheCommandLineIsToldInOurWords(
      String arguments, String place, String message, String hint) {
    Run run = run(arguments.split(" "));
    assertThat(run.err()).startsWith("command line:" + place + ": error: " + message + "\n");
    if (hint != null) {
      assertThat(run.err()).endsWith("hint: " + hint + "\n");
    }
    assertThat(run.err().split("error: ")).hasSize(2);
    assertThat(run.status()).isEqualTo(2);
  }

  @Test
  void slipOnTheCommandLineIsJsonToo() throws IOException {
    Run run = run("check", "--format=json", "--prot", "input", "a.zin");
    JsonNode root = new ObjectMapper().readTree(run.out());
    assertThat(root.path("files")).isEmpty();
    assertThat(root.path("diagnostics").path(0).path("code").asText()).isEqualTo("unknown-option");
    assertThat(root.path("diagnostics").path(0).path("hint").asText())
        .isEqualTo("did you mean `--port`?");
    assertThat(run.err()).contains("check has no option --prot");
    assertThat(run.status()).isEqualTo(2);
  }

  @Test
  void unknownPortNamesTheNearest() {
    Run run = runWith(BROKEN, "check", "--port", "inptu", "-");
    assertThat(run.out()).isEmpty();
    assertThat(run.err())
        .startsWith("-:1:1: error: this file has no port `inptu`, which --port asks for\n")
        .contains("did you mean `--port input`?");
    assertThat(run.status()).isEqualTo(2);
  }

  @Test
  void slipInAnOptionsValueIsPlacedInIt() {
    Run run = runWith(BROKEN, "check", "--sweep", "10 Hz bis 1 MHz", "-");
    assertThat(run.out()).isEmpty();
    assertThat(run.err()).startsWith("--sweep:1:").contains(": error: ");
    assertThat(run.status()).isEqualTo(2);
  }

  @Test
  void curveHasTheBareNetworkFirst() {
    Run run = runWith(BROKEN, "curve", "--at", "1 kHz, 2 kHz", "--format", "csv", "-");
    assertThat(run.err()).isEmpty();
    assertThat(
            run.out().lines().map(l -> l.split(",", -1)).map(c -> c[1] + " " + c[2] + " " + c[3]))
        .containsExactly(
            "case hz re_ohm", "bare 1000 100", "bare 2000 100", "meter 1000 90", "meter 2000 90");
    assertThat(run.status()).isZero();
  }

  @Test
  void outputIsWrittenWholeAndStandardOutputStaysEmpty() throws IOException {
    Path target = folder.resolve("report.json");
    Run run = runWith(BROKEN, "check", "--format", "json", "--output", target.toString(), "-");
    assertThat(run).isEqualTo(new Run(1, "", ""));
    assertThat(new ObjectMapper().readTree(target.toFile()).path("files")).hasSize(1);
    try (Stream<Path> left = Files.list(folder)) {
      assertThat(left).containsExactly(target);
    }
  }

  @Test
  void unwritableOutputIsAFindingAndLeavesNothing() throws IOException {
    String target = folder.resolve("no").resolve("report.txt").toString();
    Run run = runWith(KEPT, "check", "--output", target, "-");
    assertThat(run.out()).isEmpty();
    assertThat(run.err()).startsWith(target + ":1:1: error: ");
    assertThat(run.status()).isEqualTo(2);
    try (Stream<Path> left = Files.list(folder)) {
      assertThat(left).isEmpty();
    }
    Run json = runWith(KEPT, "check", "--format", "json", "--output", target, "-");
    assertThat(new ObjectMapper().readTree(json.out()).path("diagnostics").path(0).path("code"))
        .hasToString("\"not-writable\"");
  }

  @Test
  void nothingIsWrittenWhereNothingCouldBeJudged() throws IOException {
    Path target = Files.writeString(folder.resolve("report.txt"), "earlier");
    Run run = runWith("", "check", "--output", target.toString(), "-");
    assertThat(run.status()).isEqualTo(2);
    assertThat(target).hasContent("earlier");
  }

  @Test
  void inputIsNeverOverwritten() throws IOException {
    String input = file("a.zin", KEPT);
    Run run = run("check", "--output", input, input);
    assertThat(run.err()).contains("error: ");
    assertThat(run.status()).isEqualTo(2);
    assertThat(Path.of(input)).hasContent(KEPT);
  }

  @Test
  void readerThatGoesAwayChangesNoStatus() {
    assertThat(runInto("Broken pipe", KEPT, "check", "-")).isEqualTo(new Run(0, "", ""));
    assertThat(runInto("Broken pipe", BROKEN, "check", "-")).isEqualTo(new Run(1, "", ""));
    assertThat(runInto("Broken pipe", BROKEN, "curve", "-")).isEqualTo(new Run(0, "", ""));
  }

  @Test
  void fullDiskIsToldWithStatusTwo() {
    Run full = new Run(2, "", "loadmark: standard output could not be written\n");
    assertThat(runInto("No space left on device", KEPT, "check", "-")).isEqualTo(full);
    assertThat(runInto("No space left on device", KEPT, "curve", "-")).isEqualTo(full);
  }

  /** Standard output takes nothing and says why. */
  private static Run runInto(String failure, String input, String... arguments) {
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    OutputStream failing =
        new OutputStream() {
          @Override
          public void write(int b) throws IOException {
            throw new IOException(failure);
          }
        };
    int status =
        Loadmark.run(
            arguments,
            new ByteArrayInputStream(input.getBytes(StandardCharsets.UTF_8)),
            failing,
            err);
    return new Run(status, "", err.toString(StandardCharsets.UTF_8));
  }

  @Test
  void emptyNamesAreSlipsOnTheCommandLine() {
    assertThat(run("check", "").err())
        .startsWith("command line:1:16: error: the name of a FILE is empty\n");
    assertThat(run("check", "--output", "", "a.zin").err())
        .startsWith("command line:1:16: error: --output needs a name\n");
  }

  @Test
  void frequencyGivenTwiceIsShownOnce() {
    Run run = runWith(KEPT, "curve", "--format", "csv", "--at", "1 Hz, 1 Hz", "-");
    assertThat(run).isEqualTo(runWith(KEPT, "curve", "--format", "csv", "--at", "1 Hz", "-"));
    assertThat(run.status()).isZero();
  }

  @Test
  void reportInTheReadmeIsWhatTheToolPrints() throws IOException {
    String readme = Files.readString(Path.of("README.md"));
    String command = "(`loadmark check --case all examples/thermistor-tap.zin`):\n\n```\n";
    int from = readme.indexOf(command) + command.length();
    assertThat(from).isGreaterThan(command.length());
    assertThat(run("check", "--case", "all", "examples/thermistor-tap.zin").out())
        .isEqualTo(readme.substring(from, readme.indexOf("```", from)));
  }

  @Test
  void faultOfTheToolIsOneLineWithStatusThree() {
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    OutputStream faulty =
        new OutputStream() {
          @Override
          public void write(int b) {
            throw new IllegalStateException("a secret of the inside");
          }
        };
    int status =
        Loadmark.run(
            new String[] {"--version"}, new ByteArrayInputStream(new byte[0]), faulty, err);
    assertThat(err.toString(StandardCharsets.UTF_8))
        .startsWith("loadmark: this is a fault of loadmark, not of your input; please report it")
        .doesNotContain("secret", "Exception")
        .hasLineCount(1);
    assertThat(status).isEqualTo(3);
  }
}
