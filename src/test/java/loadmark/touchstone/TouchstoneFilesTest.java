package loadmark.touchstone;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.FindingPrinter;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every folder of {@code src/test/touchstone}: the findings of its file, no finding more, and the
 * impedances that the format's definition gives.
 */
class TouchstoneFilesTest {
  /** Some roundings, in the largest of which 1 − S loses nothing. */
  private static final double ROUNDING = 1e-14;

  static List<DataFolder> folders() {
    return DataFolder.all().toList();
  }

  private static Optional<MeasuredData> read(SourceText source, Findings findings) {
    return Touchstone.read(source, findings);
  }

  private static SourceText source(DataFolder folder) {
    Findings findings = new Findings();
    SourceText source =
        Touchstone.decode(folder.data().toString(), folder.bytes(), findings).orElseThrow();
    assertThat(findings.sorted()).isEmpty();
    return source;
  }

  private static List<String> told(Findings findings) {
    return findings.sorted().stream()
        .map(
            f ->
                "%d:%d %s %s"
                    .formatted(f.place().line(), f.place().column(), f.severity().word(), f.code()))
        .toList();
  }

  @ParameterizedTest
  @MethodSource("folders")
  void findingsAreThoseThatAreExpected(DataFolder folder) {
    Findings findings = new Findings();
    Optional<MeasuredData> data = read(source(folder), findings);
    String printed = new FindingPrinter(false).print(findings.sorted());
    assertThat(told(findings)).as(printed).containsExactlyElementsOf(folder.findings());
    assertThat(data.isPresent()).isEqualTo(!folder.isRefused());
    assertThat(findings.sorted()).allSatisfy(f -> assertThat(f.message()).doesNotEndWith("."));
  }

  @ParameterizedTest
  @MethodSource("folders")
  void lineEndsChangeNothing(DataFolder folder) {
    SourceText lineFeeds = source(folder);
    for (String end : List.of("\r\n", "\r")) {
      Findings findings = new Findings();
      String text = lineFeeds.text().replace("\n", end);
      assertThat(read(new SourceText(lineFeeds.name(), text), findings).isPresent())
          .isEqualTo(!folder.isRefused());
      assertThat(told(findings)).containsExactlyElementsOf(folder.findings());
    }
  }

  @ParameterizedTest
  @MethodSource("folders")
  void impedancesAreThoseOfTheDefinition(DataFolder folder) {
    if (folder.isRefused()) {
      assertThat(folder.impedances()).isEmpty();
      return;
    }
    MeasuredData data = read(source(folder), new Findings()).orElseThrow();
    assertThat(folder.impedances()).isNotEmpty();
    folder.impedances().forEach(line -> check(data, line.split(" +", -1)));
  }

  private static void check(MeasuredData data, String[] words) {
    double hz = Double.parseDouble(words[0]);
    Optional<PortRelation> relation = data.find(hz);
    assertThat(relation.isPresent()).isEqualTo(!words[1].equals("outside"));
    if (relation.isEmpty()) {
      return;
    }
    Optional<Matrix> impedance = relation.get().findImpedance();
    assertThat(impedance.isPresent()).as(words[0]).isEqualTo(!words[1].equals("open"));
    if (impedance.isPresent()) {
      Complex z = impedance.get().at(words[1].charAt(0) - '0', words[1].charAt(1) - '0');
      Complex expected = new Complex(Double.parseDouble(words[2]), Double.parseDouble(words[3]));
      assertThat(z.minus(expected).magnitude())
          .as(words[0] + " Hz: " + z)
          .isCloseTo(0, within(ROUNDING * expected.magnitude()));
    }
  }
}
