package loadmark.evidence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every example runs, comes to what it is meant to come to, and looks as it did last. What it is
 * meant to come to is worked out from closed forms in {@link ExampleImpedances}.
 */
class ExamplesTest {
  private static final Path EXAMPLES = Path.of("examples");

  /** What the tool promises for a worst value and for an edge, relative. */
  private static final double PROMISE = 1e-9;

  /** Roundings of a closed form on its own. */
  private static final double ROUNDING = 1e-12;

  static Stream<String> names() throws IOException {
    try (Stream<Path> files = Files.list(EXAMPLES)) {
      return files
          .map(f -> f.getFileName().toString())
          .filter(f -> f.endsWith(".zin"))
          .map(f -> f.substring(0, f.length() - ".zin".length()))
          .sorted()
          .toList()
          .stream();
    }
  }

  static List<Expectation> expectations() {
    return ExampleExpectations.all();
  }

  @Test
  void everyExampleIsExpectedSomewhereAndListedInTheReadme() throws IOException {
    assertThat(names()).containsExactlyInAnyOrderElementsOf(ExampleExpectations.FILES.keySet());
    String readme = Files.readString(EXAMPLES.resolve("README.md"));
    for (Map.Entry<String, Boolean> file : ExampleExpectations.FILES.entrySet()) {
      assertThat(readme)
          .containsPattern(
              "`" + file.getKey() + "\\.zin` \\|.*\\| " + (file.getValue() ? "kept" : "broken"));
      assertThat(Files.readString(EXAMPLES.resolve(file.getKey() + ".zin")))
          .startsWith("# Decides: ");
    }
  }

  /** The examples as such, before the tool has said anything. */
  @ParameterizedTest
  @MethodSource("expectations")
  void theClosedFormComesToTheVerdictIntended(Expectation expected) {
    assertThat(Scan.of(expected).worstStrain() <= 1).isEqualTo(expected.kept());
  }

  @ParameterizedTest
  @MethodSource("names")
  void theVerdictIsTheOneIntended(String name) {
    Judged judged = Judged.path("examples/" + name + ".zin");
    boolean kept = ExampleExpectations.FILES.getOrDefault(name, false);
    assertThat(judged.verdict()).isEqualTo(kept ? "kept" : "broken");
    assertThat(judged.status()).isEqualTo(kept ? Run.KEPT : Run.BROKEN);
    assertThat(judged.file().path("diagnostics")).isEmpty();
  }

  @ParameterizedTest
  @MethodSource("names")
  void nothingIsJudgedThatIsNotExpected(String name) {
    Set<String> found = new TreeSet<>();
    for (JsonNode one : Judged.path("examples/" + name + ".zin").file().path("cases")) {
      for (JsonNode limit : one.path("limits")) {
        found.add(
            one.path("case").asText() + one.path("port").asText() + limit.path("limit").asText());
      }
    }
    Set<String> expected = new TreeSet<>();
    for (Expectation e : expectations()) {
      if (e.example().equals(name)) {
        expected.add(e.caseName() + e.port() + e.measure().kind());
      }
    }
    assertThat(found).isEqualTo(expected);
  }

  @ParameterizedTest
  @MethodSource("expectations")
  void eachLimitComesToWhatTheClosedFormSays(Expectation expected) {
    Judged judged = Judged.path("examples/" + expected.example() + ".zin");
    JsonNode one = judged.caseOf(expected.caseName(), expected.port());
    assertThat(words(one.path("loads"))).isEqualTo(expected.loads());
    assertThat(words(one.path("against"))).isEqualTo(expected.against());
    JsonNode limit =
        judged
            .limits(expected.caseName(), expected.port(), expected.measure().kind())
            .get(expected.which());
    assertThat(limit.path("verdict").asText()).isEqualTo(expected.kept() ? "kept" : "broken");
    assertThat(limit.path("from_hz").asDouble()).isEqualTo(expected.fromHz());
    assertThat(limit.path("to_hz").asDouble()).isEqualTo(expected.toHz());

    Scan scan = Scan.of(expected);
    JsonNode worst = limit.path("worst");
    double hz = worst.path("hz").asDouble();
    double value = scan.worstValue();
    assertThat(worst.path("value").asDouble())
        .isCloseTo(value, within(PROMISE * Math.abs(value) + ROUNDING));
    assertThat(expected.strain(hz))
        .isCloseTo(scan.worstStrain(), within(PROMISE * Math.abs(scan.worstStrain())));
    near(worst.path("with"), expected.seen().z(expected.port(), expected.loads(), hz));
    near(worst.path("without"), expected.seen().z(expected.port(), expected.against(), hz));

    assertThat(limit.path("bands")).hasSize(scan.bands());
    for (JsonNode band : limit.path("bands")) {
      isAnEdge(expected, band.path("from_hz").asDouble(), expected.fromHz());
      isAnEdge(expected, band.path("to_hz").asDouble(), expected.toHz());
      assertThat(expected.strain(band.path("worst_hz").asDouble())).isGreaterThan(1);
    }
  }

  @ParameterizedTest
  @MethodSource("names")
  void theReportLooksAsItDid(String name) throws IOException {
    Run run = Run.of("check", "examples/" + name + ".zin");
    assertThat(run.err()).isEmpty();
    assertThat(run.out().lines().filter(line -> line.codePointCount(0, line.length()) > 100))
        .isEmpty();
    Golden.matchesText(name + ".txt", run.out());
    Golden.matchesJson(
        name + ".json", Run.of("check", "--format", "json", "examples/" + name + ".zin").out());
  }

  /** The limit turns from kept to broken, or back, within 1e-9 of here; or the scope ends. */
  private static void isAnEdge(Expectation expected, double hz, double end) {
    if (hz != end) {
      double below = expected.strain(hz * (1 - PROMISE)) - 1;
      double above = expected.strain(hz * (1 + PROMISE)) - 1;
      assertThat(below * above).as("edge at %s Hz", hz).isNotPositive();
    }
  }

  private static void near(JsonNode ohms, Complex expected) {
    if (expected.isInfinite()) {
      assertThat(ohms.path("open").asBoolean()).isTrue();
      return;
    }
    Complex z = new Complex(ohms.path("re").asDouble(), ohms.path("im").asDouble());
    assertThat(ClosedForm.apart(z, expected))
        .as("%s against %s", z, expected)
        .isLessThanOrEqualTo(PROMISE);
  }

  private static Set<String> words(JsonNode array) {
    return new TreeSet<>(
        StreamSupport.stream(array.spliterator(), false).map(JsonNode::asText).toList());
  }
}
