package loadmark.evidence;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import loadmark.touchstone.Complex;
import loadmark.touchstone.MeasuredData;
import loadmark.touchstone.PortRelation;
import loadmark.touchstone.Touchstone;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** {@code curve --format s1p} against the same curve as JSON. */
class CurveDataTest {
  /** Out of order and one twice: the file has each once, rising. */
  private static final String AT = "1 MHz, 0 Hz, 50 Hz, 1234.5 Hz, 33 kHz, 50 Hz";

  private static final int DISTINCT = 5;

  private static final String CAPACITOR =
      """
      capacitor c = 1 nF
      wire in -- c -- ground
      port input = in -- ground
      load probe shunt in -- ground = 10 MΩ
      """;

  @TempDir Path folder = Path.of("");

  static List<Path> examples() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.filter(f -> f.toString().endsWith(".zin")).sorted().toList();
    }
  }

  private static Run curve(Path file, String... more) {
    return Run.of(
        Stream.concat(Stream.of("curve", "--at", AT, file.toString()), Stream.of(more))
            .toArray(String[]::new));
  }

  @ParameterizedTest
  @MethodSource("examples")
  void everyCurveReadsBackToTheLastDigit(Path example) {
    for (JsonNode curve : curve(example, "--format", "json").json().path("curves")) {
      String port = curve.path("port").asText();
      String shown = curve.path("case").asText();
      Run run = curve(example, "--port", port, "--case", shown, "--format", "s1p");
      boolean whole = !hasGap(curve.path("re_ohm"));
      assertThat(run.status()).as(run.err()).isEqualTo(whole ? Run.KEPT : Run.INVALID);
      if (whole) {
        assertThat(run.out())
            .contains("! file " + example + "\n! port " + port + "\n! case " + shown + "\n");
        assertSame(read(run.out()), curve);
      } else {
        assertThat(run.err()).contains("error: format s1p holds impedances alone");
        assertThat(run.out()).isEmpty();
      }
    }
  }

  private static boolean hasGap(JsonNode column) {
    for (JsonNode value : column) {
      if (value.isNull()) {
        return true;
      }
    }
    return false;
  }

  private static MeasuredData read(String text) {
    Findings findings = new Findings();
    MeasuredData data =
        Touchstone.read(new SourceText("curve.s1p", text), findings)
            .orElseThrow(() -> new AssertionError(findings.sorted() + text));
    assertThat(findings.sorted()).isEmpty();
    return data;
  }

  private static void assertSame(MeasuredData data, JsonNode curve) {
    assertThat(data.size()).isEqualTo(DISTINCT);
    for (int i = 0; i < curve.path("hz").size(); i++) {
      Complex z =
          data.find(curve.path("hz").get(i).asDouble())
              .flatMap(PortRelation::findImpedance)
              .orElseThrow()
              .at(1, 1);
      assertThat(z.re()).isEqualTo(curve.path("re_ohm").get(i).asDouble());
      assertThat(z.im()).isEqualTo(curve.path("im_ohm").get(i).asDouble());
    }
  }

  @Test
  void severalCurvesAreRefusedWithWhatThereIsToChooseFrom() {
    Run run = curve(Path.of("examples", "thermistor-tap.zin"), "--format", "s1p");
    assertThat(run.status()).isEqualTo(Run.INVALID);
    assertThat(run.out()).isEmpty();
    assertThat(run.err())
        .contains(":1:1: error: format s1p holds one port in one case, and this file has 4 of them")
        .endsWith("hint: choose with --case (bare, logger, meter, all)\n");
  }

  @Test
  void openImpedanceIsRefusedAndNothingIsWritten() throws IOException {
    Path file = Files.writeString(folder.resolve("c.zin"), CAPACITOR);
    Path output = folder.resolve("c.s1p");
    Run run = curve(file, "--case", "bare", "--format", "s1p", "--output", output.toString());
    assertThat(run.status()).isEqualTo(Run.INVALID);
    assertThat(run.err())
        .contains("error: format s1p holds impedances alone; at DC this one is open")
        .hasLineCount(4);
    assertThat(output).doesNotExist();
    Run loaded = curve(file, "--case", "probe", "--format", "s1p", "--output", output.toString());
    assertThat(loaded).isEqualTo(new Run(Run.KEPT, "", ""));
    assertThat(read(Files.readString(output)).fromHz()).isZero();
  }

  @Test
  void checkHasNoSuchFormat() {
    Run run = Run.of("check", "--format", "s1p", "examples/thermistor-tap.zin");
    assertThat(run.status()).isEqualTo(Run.INVALID);
    assertThat(run.err())
        .startsWith("command line:1:16: error: check has no format `s1p`\n")
        .endsWith("hint: --format s1p belongs to curve\n");
  }
}
