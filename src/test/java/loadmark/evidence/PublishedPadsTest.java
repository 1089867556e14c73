package loadmark.evidence;

import static loadmark.evidence.Text.farad;
import static loadmark.evidence.Text.ohm;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Attenuator pads and dividers. Pads: Reference Data for Engineers, chapter on attenuators; with K
 * = 10^(dB/20) and a = ln K a pad shows Z0·coth a open, Z0·tanh a shorted, and Z0 where it is
 * matched.
 */
class PublishedPadsTest {
  private static final double CLOSED_FORM = 1e-9;
  private static final double Z0 = 50;
  private static final double HZ = 1e6;

  /** Printed to six figures: half a unit of the sixth. */
  private static final double SIX_FIGURES = 5.1e-6;

  @ParameterizedTest
  @CsvSource({
    "3, 8.54990, 141.926, 292.402, 17.6148",
    "6, 16.6139, 66.9310, 150.476, 37.3519",
    "10, 25.9747, 35.1364, 96.2475, 71.1512",
    "20, 40.9091, 10.1010, 61.1111, 247.500"
  })
  void matchedPads(double db, double teeSeries, double teeShunt, double piShunt, double piSeries) {
    double k = Math.pow(10, db / 20);
    double[] tee = {Z0 * (k - 1) / (k + 1), 2 * Z0 * k / (k * k - 1)};
    double[] pi = {Z0 * (k + 1) / (k - 1), Z0 * (k * k - 1) / (2 * k)};
    near(tee[0], teeSeries, SIX_FIGURES);
    near(tee[1], teeShunt, SIX_FIGURES);
    near(pi[0], piShunt, SIX_FIGURES);
    near(pi[1], piSeries, SIX_FIGURES);
    isAPad(k, tee(tee[0], tee[1]));
    isAPad(k, pi(pi[0], pi[1]));
  }

  private static void isAPad(double k, String pad) {
    double a = Math.log(k);
    double coth = 1 / Math.tanh(a);
    Curve open = Curve.of(pad + "port output = out -- ground\n", HZ);
    Complex[] shorted =
        Curve.of(pad + "port output = out -- ground, driven 1 V\n", HZ).z("input", "bare");
    near(open.z("input", "fifty")[0], Z0);
    near(open.z("input", "bare")[0], Z0 * coth);
    near(open.z("output", "bare")[0], Z0 * coth);
    near(shorted[0], Z0 * Math.tanh(a));
    near(shorted[0].multiply(open.z("input", "bare")[0]), Z0 * Z0);
    // A load at the end of a matched pad: its reflection comes back divided by K².
    double reflection = (75 - Z0) / (75 + Z0) / (k * k);
    near(open.z("input", "seventy_five")[0], Z0 * (1 + reflection) / (1 - reflection));
  }

  @Test
  void tenDecibelPadWithSeventyFiveOhm() {
    double k = Math.sqrt(10);
    String pad = tee(Z0 * (k - 1) / (k + 1), 2 * Z0 * k / (k * k - 1));
    near(Curve.of(pad, HZ).z("input", "seventy_five")[0].getReal(), 52.0408, SIX_FIGURES);
    near(Curve.of(pad, HZ).z("input", "bare")[0].getReal(), 61.1111, SIX_FIGURES);
  }

  private static String tee(double series, double shunt) {
    return """
        resistor near_arm = %s
        resistor far_arm = %s
        resistor leg = %s
        wire in -- near_arm -- mid -- far_arm -- out
        wire mid -- leg -- ground
        port input = in -- ground
        load fifty shunt out -- ground = 50 Ω
        load seventy_five shunt out -- ground = 75 Ω
        """
        .formatted(ohm(series), ohm(series), ohm(shunt));
  }

  private static String pi(double shunt, double series) {
    return """
        resistor near_leg = %s
        resistor far_leg = %s
        resistor arm = %s
        wire in -- arm -- out
        wire in -- near_leg -- ground
        wire out -- far_leg -- ground
        port input = in -- ground
        load fifty shunt out -- ground = 50 Ω
        load seventy_five shunt out -- ground = 75 Ω
        """
        .formatted(ohm(shunt), ohm(shunt), ohm(series));
  }

  /** The same source: R1 = √(Z1(Z1−Z2)), R2 = Z2·√(Z1/(Z1−Z2)); 43.3013 Ω and 86.6025 Ω. */
  @Test
  void minimumLossPadMatchesBothItsEnds() {
    double series = Math.sqrt(75 * (75 - 50));
    double shunt = 50 * Math.sqrt(75.0 / (75 - 50));
    near(series, 43.3013, SIX_FIGURES);
    near(shunt, 86.6025, SIX_FIGURES);
    String pad =
        """
        resistor series = %s
        resistor shunt = %s
        wire wide -- series -- narrow -- shunt -- ground
        port wide = wide -- ground, terminated 75 Ω
        port narrow = narrow -- ground, terminated 50 Ω
        """
            .formatted(ohm(series), ohm(shunt));
    Curve curve = Curve.of(pad, HZ);
    near(curve.z("wide", "bare")[0], 75);
    near(curve.z("narrow", "bare")[0], 50);
  }

  /** Common practice and the formula: 9·C1 = C2 makes the ratio the same at every frequency. */
  @ParameterizedTest
  @CsvSource({"10", "1e3", "1e5", "1e7", "1e9"})
  void compensatedDividerProbe(double hz) {
    double c1 = 12e-12;
    double c2 = 9 * c1;
    String probe =
        """
        resistor r1 = 9 MΩ
        capacitor c1 = %s
        resistor r2 = 1 MΩ
        capacitor c2 = %s
        wire tip -- r1 -- mid -- r2 -- ground
        wire tip -- c1 -- mid -- c2 -- ground
        port tip = tip -- ground
        """
            .formatted(farad(c1), farad(c2));
    Complex expected =
        ClosedForm.parallel(ClosedForm.r(10e6), ClosedForm.c(hz, c1 * c2 / (c1 + c2)));
    Complex z = Curve.bare(probe, hz)[0];
    assertThat(ClosedForm.apart(z, expected)).isLessThan(CLOSED_FORM);
  }

  private static void near(Complex actual, double expected) {
    assertThat(ClosedForm.apart(actual, new Complex(expected)))
        .as("%s against %s", actual, expected)
        .isLessThanOrEqualTo(CLOSED_FORM);
  }

  private static void near(double actual, double expected, double relative) {
    assertThat(actual).isCloseTo(expected, within(relative * expected));
  }
}
