package loadmark.evidence;

import static org.assertj.core.api.Assertions.assertThat;

import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;

/** A chain of a hundred parts over six decades. */
class LongChainTest {
  private static final int CELLS = 25;

  /** Two sums of products in different orders, at most a few hundred roundings apart. */
  private static final double ROUNDING = 1e-9;

  @Test
  void aChainOfAHundredPartsIsJudged() {
    Judged judged = Judged.text(chain());
    double hz = judged.limit("meter", "input", "change").at("/worst/hz").asDouble();
    double expected = ClosedForm.change(input(hz, true), input(hz, false));
    assertThat(judged.worst("meter", "input", "change"))
        .isCloseTo(expected, org.assertj.core.api.Assertions.within(ROUNDING * expected));
    assertThat(judged.status()).isIn(Run.KEPT, Run.BROKEN);
  }

  /** Cells of a series resistor and inductor, a shunt capacitor and a shunt resistor. */
  private static String chain() {
    StringBuilder text = new StringBuilder();
    for (int k = 1; k <= CELLS; k++) {
      text.append("resistor  r%d = %d Ω\n".formatted(k, 10 + k));
      text.append("inductor  l%d = %d µH\n".formatted(k, 5 + k));
      text.append("capacitor c%d = %d pF\n".formatted(k, 90 + 3 * k));
      text.append("resistor  g%d = %d kΩ\n".formatted(k, 20 + k));
      text.append("wire n%d -- r%d -- m%d -- l%d -- n%d\n".formatted(k - 1, k, k, k, k));
      text.append("wire n%d -- c%d -- ground\n".formatted(k, k));
      text.append("wire n%d -- g%d -- ground\n".formatted(k, k));
    }
    text.append("port input = n0 -- ground\n");
    text.append("load meter shunt n%d -- ground = 1 MΩ || 50 pF\n".formatted(CELLS));
    text.append("sweep 10 Hz to 10 MHz\n");
    text.append("limit change 1 %\n");
    return text.toString();
  }

  /** The same, folded up from its far end. */
  private static Complex input(double hz, boolean loaded) {
    Complex meter = ClosedForm.parallel(ClosedForm.r(1e6), ClosedForm.c(hz, 50e-12));
    Complex z = Complex.ZERO;
    for (int k = CELLS; k >= 1; k--) {
      Complex shunt =
          ClosedForm.parallel(ClosedForm.c(hz, (90 + 3 * k) * 1e-12), ClosedForm.r((20 + k) * 1e3));
      if (k < CELLS) {
        shunt = ClosedForm.parallel(shunt, z);
      } else if (loaded) {
        shunt = ClosedForm.parallel(shunt, meter);
      }
      z = ClosedForm.series(ClosedForm.r(10 + k), ClosedForm.l(hz, (5 + k) * 1e-6), shunt);
    }
    return z;
  }
}
