package loadmark.touchstone;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** A long record is read within the memory that the tests have. */
class MillionRowsTest {
  private static final int ROWS = 1_000_000;
  private static final long SEED = 1_000_003;

  private static String text(int pairs) {
    Random random = new Random(SEED);
    StringBuilder text = new StringBuilder("! a long sweep\n# kHz S RI R 50\n");
    for (int row = 0; row < ROWS; row++) {
      text.append(1 + row).append(".25");
      for (int i = 0; i < 2 * pairs; i++) {
        text.append(' ').append(random.nextInt(2_000_000) - 1_000_000).append("e-6");
      }
      text.append('\n');
    }
    return text.toString();
  }

  private static void assertIsAll(MeasuredData data, int entries) {
    Random random = new Random(SEED);
    assertThat(data.size()).isEqualTo(ROWS);
    for (int row = 0; row < ROWS; row++) {
      for (int i = 0; i < entries; i++) {
        double re = (random.nextInt(2_000_000) - 1_000_000) / 1e6;
        double im = (random.nextInt(2_000_000) - 1_000_000) / 1e6;
        if (row % 997 == 0) {
          // By columns: 11 21 12 22.
          Matrix values = data.findValues((1 + row + 0.25) * 1000).orElseThrow();
          Complex found = entries == 1 ? values.at(1, 1) : values.at(1 + i % 2, 1 + i / 2);
          assertThat(found).as("seed %s, row %s", SEED, row).isEqualTo(new Complex(re, im));
        }
      }
    }
  }

  @Test
  void everyRowOfOnePortIsThere() {
    assertIsAll(Read.onePort(text(1)), 1);
  }

  @Test
  @Tag("thorough")
  void everyRowOfTwoPortsIsThere() {
    assertIsAll(Read.twoPort(text(4)), 4);
  }

  @Test
  void slipInTheLastRowIsToldWithItsLine() {
    String text = text(1);
    int last = text.lastIndexOf('\n', text.length() - 2);
    Findings findings = new Findings();
    SourceText slipped = new SourceText("data.s1p", text.substring(0, last) + "\n1000000.25 o 0\n");
    assertThat(Touchstone.read(slipped, findings)).isEmpty();
    assertThat(findings.sorted()).hasSize(1);
    Finding finding = findings.sorted().get(0);
    assertThat(finding.code()).isEqualTo("data-not-number");
    assertThat(finding.place().line()).isEqualTo(ROWS + 2);
    assertThat(finding.place().column()).isEqualTo(12);
  }
}
