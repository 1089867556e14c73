package loadmark.evidence;

import static java.nio.charset.StandardCharsets.UTF_8;
import static java.util.Comparator.comparing;
import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.api.io.TempDir;

/**
 * Every folder of {@code src/test/mistakes} holds a file with slips and what must be said about
 * them: one finding a line, its place, severity and code, and no finding more.
 */
class MistakesTest {
  private static final Path MISTAKES = Path.of("src/test/mistakes");

  /** Far above what any of them needs; it stops a run that hangs. */
  private static final Duration PATIENCE = Duration.ofSeconds(10);

  @TempDir Path folder = Path.of("");

  @TestFactory
  Stream<DynamicTest> theFindingsAreThoseThatAreExpected() throws IOException {
    return mistakes().map(m -> DynamicTest.dynamicTest(m.toString(), () -> judgeAsJson(m)));
  }

  @TestFactory
  Stream<DynamicTest> peopleReadThePlaceAndNothingIsWritten() throws IOException {
    return mistakes()
        .filter(MistakesTest::hasError)
        .map(m -> DynamicTest.dynamicTest(m.toString(), () -> judgeAsText(m)));
  }

  private static void judgeAsJson(Path mistake) {
    Run run = runWithPatience("check", "--format", "json", input(mistake));
    List<String> found = new ArrayList<>();
    for (JsonNode d : run.json().path("files").path(0).path("diagnostics")) {
      found.add(
          "%d:%d %s %s"
              .formatted(
                  d.path("line").asInt(),
                  d.path("column").asInt(),
                  d.path("severity").asText(),
                  d.path("code").asText()));
      assertThat(d.path("message").asText()).isNotBlank();
    }
    assertThat(found).as(run.out()).containsExactlyElementsOf(expected(mistake));
    assertThat(run.status()).isEqualTo(hasError(mistake) ? Run.INVALID : Run.KEPT);
    assertThat(run.json().path("files").path(0).path("verdict").asText())
        .isEqualTo(hasError(mistake) ? "invalid" : "kept");
    OutsideWords.areKeptFrom(run);
  }

  private void judgeAsText(Path mistake) throws IOException {
    Path empty = Files.createDirectory(folder.resolve(mistake));
    Path output = empty.resolve("report.txt");
    Run run = runWithPatience("check", "--output", output.toString(), input(mistake));
    assertThat(run.status()).isEqualTo(Run.INVALID);
    for (String finding : expected(mistake)) {
      String[] words = finding.split(" ", -1);
      assertThat(run.err()).contains(input(mistake) + ":" + words[0] + ": " + words[1] + ": ");
    }
    OutsideWords.areKeptFrom(run);
    try (Stream<Path> written = Files.list(empty)) {
      assertThat(written).isEmpty();
    }
  }

  private static Run runWithPatience(String... arguments) {
    return assertTimeoutPreemptively(PATIENCE, () -> Run.of(arguments));
  }

  private static Stream<Path> mistakes() throws IOException {
    try (Stream<Path> all = Files.list(MISTAKES)) {
      return all.filter(Files::isDirectory).sorted(comparing(Path::toString)).toList().stream()
          .map(MISTAKES::relativize);
    }
  }

  private static String input(Path mistake) {
    return MISTAKES.resolve(mistake).resolve("input.zin").toString();
  }

  private static boolean hasError(Path mistake) {
    return expected(mistake).stream().anyMatch(line -> line.contains(" error "));
  }

  private static List<String> expected(Path mistake) {
    try {
      return Files.readAllLines(MISTAKES.resolve(mistake).resolve("expected.txt"), UTF_8).stream()
          .map(line -> line.replaceFirst("#.*", "").strip())
          .filter(line -> !line.isEmpty())
          .toList();
    } catch (IOException e) {
      throw new AssertionError(mistake + " expects nothing", e);
    }
  }
}
