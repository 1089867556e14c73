package loadmark.evidence;

import static loadmark.evidence.Text.farad;
import static loadmark.evidence.Text.henry;
import static loadmark.evidence.Text.hertz;
import static loadmark.evidence.Text.ohm;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.stream.DoubleStream;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Ladders and filters whose impedance a closed form gives. */
class PublishedLaddersTest {
  /** What the tool promises for values it works out, relative. */
  private static final double CLOSED_FORM = 1e-9;

  /** Where a squared reflection falls far below one, its digits are those of Z near its match. */
  private static final double REFLECTION = 1e-12;

  private static final double[] OMEGA = {0.05, 0.3, 0.7, 0.95, 1, 1.1, 1.7, 4};

  /**
   * Matthaei, Young, Jones, Microwave Filters, Impedance-Matching Networks, and Coupling
   * Structures, 1964, §4.05: g_k = 2 sin((2k−1)π/2n) between equal ends, |Γ|² = ω²ⁿ/(1+ω²ⁿ).
   */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4, 5, 7, 9})
  void butterworthLadder(int n) {
    double[] g = butterworth(n);
    Complex[] z = Curve.bare(ladder(g), hz(OMEGA));
    for (int i = 0; i < OMEGA.length; i++) {
      double power = Math.pow(OMEGA[i], 2 * n);
      reflects(z[i], power / (1 + power));
    }
  }

  /** The same source: n = 3, shunt capacitor first, ω = 1. */
  @Test
  void butterworthOfThirdOrderIsOneMinusTwoJAtItsCutOff() {
    Complex z = Curve.bare(ladder(butterworth(3)), hz(1))[0];
    assertThat(ClosedForm.apart(z, new Complex(1, -2))).isLessThan(CLOSED_FORM);
  }

  /** The same source, table 4.05-2 (a): n = 5, 0.5 dB; the printed digits, one off in the last. */
  @Test
  void chebyshevElementsAreThoseOfTheTable() {
    double[] printed = {1.7058, 1.2296, 2.5408, 1.2296, 1.7058};
    assertThat(chebyshev(5, 0.5)).containsExactly(printed, within(0.00015));
  }

  /** The same source: |Γ|² = ε²Tₙ²/(1+ε²Tₙ²), ε² = 10^(r/10) − 1. */
  @ParameterizedTest
  @CsvSource({"3, 0.1", "5, 0.5", "7, 0.01", "9, 1"})
  void chebyshevLadder(int n, double ripple) {
    Complex[] z = Curve.bare(ladder(chebyshev(n, ripple)), hz(OMEGA));
    for (int i = 0; i < OMEGA.length; i++) {
      double wave = (Math.pow(10, ripple / 10) - 1) * Math.pow(polynomial(n, OMEGA[i]), 2);
      reflects(z[i], wave / (1 + wave));
    }
  }

  /** In its pass band the return loss falls to 10·log10((1+ε²)/ε²): 9.636 dB for 0.5 dB. */
  @Test
  void chebyshevReturnLossTouchesItsBound() {
    double edge = 1 / (2 * Math.PI);
    String text =
        ladder(chebyshev(5, 0.5))
            + "sweep 1 mHz to "
            + hertz(edge)
            + "\nlimit return loss 9.6 dB in 1 Ω\n";
    Judged judged = Judged.text(text);
    double epsilon2 = Math.pow(10, 0.05) - 1;
    double least = 10 * Math.log10((1 + epsilon2) / epsilon2);
    assertThat(judged.status()).isEqualTo(Run.KEPT);
    assertThat(judged.worst("bare", "input", "return loss"))
        .isCloseTo(least, within(CLOSED_FORM * least))
        .isCloseTo(9.636, within(0.0005));
  }

  /** Textbook: F(2n+1)/F(2n) for n rungs of 1 Ω in series and 1 Ω across. */
  @ParameterizedTest
  @CsvSource({"1, 2, 1", "2, 5, 3", "3, 13, 8", "4, 34, 21", "5, 89, 55"})
  void unitResistorLadder(int n, double numerator, double denominator) {
    assertThat(unitLadder(n))
        .isCloseTo(numerator / denominator, within(CLOSED_FORM * numerator / denominator));
  }

  /** Textbook: the golden ratio, from which 30 rungs are 1e-25 away. */
  @Test
  void longUnitResistorLadder() {
    double golden = (1 + Math.sqrt(5)) / 2;
    assertThat(unitLadder(30)).isCloseTo(golden, within(CLOSED_FORM * golden));
  }

  private static double unitLadder(int rungs) {
    StringBuilder text = new StringBuilder("port input = n0 -- ground\n");
    for (int k = 1; k <= rungs; k++) {
      text.append("resistor s%d = 1 Ω\nresistor p%d = 1 Ω\n".formatted(k, k));
      text.append("wire n%d -- s%d -- n%d -- p%d -- ground\n".formatted(k - 1, k, k, k));
    }
    Complex[] z = Curve.bare(text.toString(), 0, 1e3);
    assertThat(z[0]).isEqualTo(new Complex(z[0].getReal()));
    assertThat(z[1].getReal()).isCloseTo(z[0].getReal(), within(CLOSED_FORM));
    return z[1].getReal();
  }

  /** Textbook: an R–2R ladder closed by 2R shows 2R into each of its series resistors. */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4, 5, 6, 7, 8})
  void rTwoRLadder(int rungs) {
    double ohm = 12.5e3;
    StringBuilder text = new StringBuilder("port input = n0 -- ground\n");
    for (int k = 1; k <= rungs; k++) {
      text.append("resistor s%d = %s\n".formatted(k, ohm(ohm)));
      text.append("resistor p%d = %s\n".formatted(k, ohm(2 * ohm)));
      text.append("wire n%d -- s%d -- n%d -- p%d -- ground\n".formatted(k - 1, k, k, k));
    }
    text.append("resistor end = %s\nwire n%d -- end -- ground\n".formatted(ohm(2 * ohm), rungs));
    Complex z = Curve.bare(text.toString(), 1e3)[0];
    assertThat(ClosedForm.apart(z, new Complex(2 * ohm))).isLessThan(CLOSED_FORM);
  }

  /** Textbook: n equal sections, R = C = 1, far end open. */
  @Test
  void rcLadder() {
    Complex[] two = Curve.bare(rcLadder(2), hz(OMEGA));
    Complex[] three = Curve.bare(rcLadder(3), hz(OMEGA));
    for (int i = 0; i < OMEGA.length; i++) {
      Complex s = new Complex(0, OMEGA[i]);
      same(two[i], polynomial(s, 1, 3, 1).divide(polynomial(s, 0, 2, 1)));
      same(three[i], polynomial(s, 1, 6, 5, 1).divide(polynomial(s, 0, 3, 4, 1)));
    }
  }

  private static String rcLadder(int sections) {
    StringBuilder text = new StringBuilder("port input = n0 -- ground\n");
    for (int k = 1; k <= sections; k++) {
      text.append("resistor r%d = 1 Ω\ncapacitor c%d = 1 F\n".formatted(k, k));
      text.append("wire n%d -- r%d -- n%d -- c%d -- ground\n".formatted(k - 1, k, k, k));
    }
    return text.toString();
  }

  /** Foster, A Reactance Theorem, Bell System Technical Journal 3, 1924. */
  @ParameterizedTest
  @ValueSource(
      strings = {
        """
        inductor l = 1 H
        capacitor c = 2 F
        capacitor tank_c = 2 F
        inductor tank_l = 0.5 H
        wire in -- l -- a -- c -- b -- tank_c -- ground
        wire b -- tank_l -- ground
        port input = in -- ground
        """,
        """
        inductor l1 = 1 H
        capacitor c1 = 1 F
        inductor l2 = 2 H
        capacitor c2 = 1 F
        wire in -- l1 -- a -- l2 -- b -- c2 -- ground
        wire a -- c1 -- ground
        port input = in -- ground
        """
      })
  void reactanceTheorem(String network) {
    double[] omega = {0.3, 0.9, 2};
    double[] printed = {-1.2018315, 2.7128655, 1.4166667};
    double step = 1e-5;
    for (int i = 0; i < omega.length; i++) {
      double w = omega[i];
      Complex[] z = Curve.bare(network, hz(w, w - step, w + step));
      Complex s = new Complex(0, w);
      same(z[0], polynomial(s, 1, 0, 4, 0, 2).divide(polynomial(s, 0, 2, 0, 2)));
      // Half a unit of the last printed digit.
      assertThat(z[0].getImaginary()).isCloseTo(printed[i], within(0.5e-7 + 1e-9));
      double slope = (z[2].getImaginary() - z[1].getImaginary()) / (2 * step);
      assertThat(slope).isGreaterThanOrEqualTo(Math.abs(z[0].getImaginary()) / w);
    }
  }

  /**
   * 50 Ω and 1 ns as n sections of a series inductor and a shunt capacitor, open: the first zero of
   * Z is at (2n/√(LC))·sin(π/(4n+2)); formula. There the phase steps from −90° to 90°.
   */
  @ParameterizedTest
  @CsvSource({"1, 159.155", "2, 196.726", "4, 221.096", "8, 234.959", "16, 242.333"})
  void lumpedLineResonates(int n, double printedMegahertz) {
    double henry = 50e-9;
    double farad = 20e-12;
    StringBuilder text = new StringBuilder("port input = n0 -- ground\n");
    for (int k = 1; k <= n; k++) {
      text.append("inductor l%d = %s\n".formatted(k, henry(henry / n)));
      text.append("capacitor c%d = %s\n".formatted(k, farad(farad / n)));
      text.append("wire n%d -- l%d -- n%d -- c%d -- ground\n".formatted(k - 1, k, k, k));
    }
    text.append("sweep 1 MHz to 300 MHz\nlimit phase -100 deg to 0 deg\n");
    JsonNode bands = Judged.text(text.toString()).limit("bare", "input", "phase").path("bands");
    double zero =
        2 * n / Math.sqrt(henry * farad) * Math.sin(Math.PI / (4 * n + 2)) / (2 * Math.PI);
    double edge = bands.path(0).path("from_hz").asDouble();
    assertThat(edge).isCloseTo(zero, within(CLOSED_FORM * zero));
    assertThat(edge).isCloseTo(printedMegahertz * 1e6, within(500.0));
  }

  private static double[] butterworth(int n) {
    double[] g = new double[n];
    for (int k = 1; k <= n; k++) {
      g[k - 1] = 2 * Math.sin((2 * k - 1) * Math.PI / (2 * n));
    }
    return g;
  }

  private static double[] chebyshev(int n, double rippleDecibels) {
    double beta = Math.log(1 / Math.tanh(rippleDecibels / (40 * Math.log10(Math.E))));
    double gamma = Math.sinh(beta / (2 * n));
    double[] g = new double[n];
    g[0] = 2 * Math.sin(Math.PI / (2 * n)) / gamma;
    for (int k = 2; k <= n; k++) {
      double a = Math.sin((2 * k - 1) * Math.PI / (2 * n));
      double before = Math.sin((2 * k - 3) * Math.PI / (2 * n));
      double b = gamma * gamma + Math.pow(Math.sin((k - 1) * Math.PI / n), 2);
      g[k - 1] = 4 * before * a / (b * g[k - 2]);
    }
    return g;
  }

  /** Tₙ(ω). */
  private static double polynomial(int n, double omega) {
    return omega <= 1
        ? Math.cos(n * Math.acos(omega))
        : Math.cosh(n * Math.log(omega + Math.sqrt(omega * omega - 1)));
  }

  /** Shunt capacitor first, then series inductor, in turn; closed by 1 Ω. */
  private static String ladder(double... g) {
    StringBuilder text = new StringBuilder("port input = n0 -- ground\n");
    int node = 0;
    for (int k = 0; k < g.length; k++) {
      if (k % 2 == 0) {
        text.append("capacitor x%d = %s\n".formatted(k, farad(g[k])));
        text.append("wire n%d -- x%d -- ground\n".formatted(node, k));
      } else {
        text.append("inductor x%d = %s\n".formatted(k, henry(g[k])));
        text.append("wire n%d -- x%d -- n%d\n".formatted(node, k, node + 1));
        node++;
      }
    }
    return text.append("resistor end = 1 Ω\nwire n%d -- end -- ground\n".formatted(node))
        .toString();
  }

  private static void reflects(Complex z, double power) {
    double reflection = z.subtract(1).divide(z.add(1)).abs();
    assertThat(reflection * reflection)
        .isCloseTo(power, within(CLOSED_FORM * power + REFLECTION * Math.sqrt(power)));
  }

  private static void same(Complex actual, Complex expected) {
    assertThat(ClosedForm.apart(actual, expected))
        .as("%s against %s", actual, expected)
        .isLessThanOrEqualTo(CLOSED_FORM);
  }

  /** Coefficients from the constant up. */
  private static Complex polynomial(Complex s, double... coefficients) {
    Complex sum = Complex.ZERO;
    for (int k = coefficients.length - 1; k >= 0; k--) {
      sum = sum.multiply(s).add(coefficients[k]);
    }
    return sum;
  }

  private static double[] hz(double... omega) {
    return DoubleStream.of(omega).map(w -> w / (2 * Math.PI)).toArray();
  }
}
