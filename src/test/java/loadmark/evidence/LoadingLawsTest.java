package loadmark.evidence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Laws that hold for every passive network, on networks at random; each seed is a test's name. */
class LoadingLawsTest {
  private static final int NETWORKS = 500;
  private static final double CLOSED_FORM = 1e-9;

  /** Roundings that a network's own conditioning may spread into its impedance. */
  private static final double ROUNDINGS = 1000 * 0x1p-53;

  static IntStream seeds() {
    return IntStream.rangeClosed(1, NETWORKS);
  }

  /**
   * Z_with = Z_oc (Z_L + z_sc)/(Z_L + z_oc), z_oc and z_sc seen from the load's place with the port
   * open and shorted: Middlebrook, Null Double Injection and the Extra Element Theorem, IEEE Trans.
   * Education 32(3), 1989; Blackman, Bell System Technical Journal 22, 1943.
   */
  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void aShuntLoadObeysTheExtraElementTheorem(int seed) {
    Random random = new Random(seed);
    RandomNetwork network = RandomNetwork.of(random);
    double hz = RandomNetwork.hz(random);
    Curve open = Curve.of(network.text(network.input(), network.place()), hz);
    Curve shorted = Curve.of(network.text(network.input() + ", driven 1 V", network.place()), hz);

    Complex zOpen = open.z("place", "bare")[0];
    Complex zShort = shorted.z("place", "bare")[0];
    Complex zLoad = network.loadSiemens(hz).reciprocal();
    Complex bare = open.z("input", "bare")[0];
    Complex with = open.z("input", "probe")[0];
    Complex law = bare.multiply(zLoad.add(zShort)).divide(zLoad.add(zOpen));

    NodalSolution bareSolution = new NodalSolution(network.nodes(), network.branches(hz), 1, 0);
    NodalSolution loadedSolution =
        new NodalSolution(network.nodes(), network.loadedBranches(hz), 1, 0);
    close(bare, bareSolution.impedance(), bareSolution.condition());
    close(with, loadedSolution.impedance(), loadedSolution.condition());
    NodalSolution place =
        new NodalSolution(network.nodes(), network.branches(hz), network.tap(), network.foot());
    close(zOpen, place.impedance(), place.condition());
    close(with, law, loadedSolution.condition() + bareSolution.condition() + place.condition());
    assertThat(with.getReal() >= 0).as("passive: %s", with).isTrue();
    assertThat(bare.getReal() >= 0).as("passive: %s", bare).isTrue();
  }

  /** V_with/V_without = Z_with/Z_without seen at the tap, the source set to zero. */
  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void theVoltageAtATapFallsAsItsImpedanceDoes(int seed) {
    Random random = new Random(-seed);
    RandomNetwork network = RandomNetwork.of(random);
    double hz = RandomNetwork.hz(random);
    double source = 50;
    Curve curve =
        Curve.of(
            network.text(
                network.input() + ", driven 1 V behind " + Text.ohm(source), network.place()),
            hz);
    Complex[] z = {curve.z("place", "probe")[0], curve.z("place", "bare")[0]};

    // 1 V behind 50 Ω at the input is 20 mA with 50 Ω across it; the ratio leaves the 20 mA out.
    List<NodalSolution.Branch> bare = network.branches(hz);
    bare.add(new NodalSolution.Branch(1, 0, new Complex(1 / source)));
    List<NodalSolution.Branch> loaded = network.loadedBranches(hz);
    loaded.add(new NodalSolution.Branch(1, 0, new Complex(1 / source)));
    NodalSolution without = new NodalSolution(network.nodes(), bare, 1, 0);
    NodalSolution with = new NodalSolution(network.nodes(), loaded, 1, 0);
    NodalSolution at = new NodalSolution(network.nodes(), bare, network.tap(), network.foot());
    Complex ratio =
        with.volts(network.tap(), network.foot())
            .divide(without.volts(network.tap(), network.foot()));
    close(z[0].divide(z[1]), ratio, at.condition() + with.condition() + without.condition());
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void scalingRenamingAndReorderingChangeNothing(int seed) {
    Random random = new Random(1_000_000L + seed);
    RandomNetwork network = RandomNetwork.of(random);
    double hz = RandomNetwork.hz(random);
    NodalSolution loaded = new NodalSolution(network.nodes(), network.loadedBranches(hz), 1, 0);
    Complex z = loadedInput(network.text(network.input()), hz);
    double condition = loaded.condition();

    double ohms = Math.pow(10, 6 * random.nextDouble() - 3);
    double hertz = Math.pow(10, 6 * random.nextDouble() - 3);
    RandomNetwork scaled = network.scaled(ohms, hertz);
    close(loadedInput(scaled.text(scaled.input()), hz * hertz), z.multiply(ohms), condition);

    List<String> lines = new ArrayList<>(network.lines());
    lines.add(network.input());
    Collections.shuffle(lines, random);
    close(loadedInput(String.join("\n", lines), hz), z, condition);

    List<String> renamed =
        new ArrayList<>(
            network.lines(
                k -> k == 0 ? "ground" : "\"+" + (97 - k) + " V\"", k -> "Überträger_" + (7 * k)));
    renamed.add("port input = \"+96 V\" -- ground");
    close(loadedInput(String.join("\n", renamed), hz), z, condition);
  }

  /**
   * 1 kΩ, 10 nF across, 10 kΩ to a tap with 10 MΩ ∥ 12 pF, at 100 kHz; formula, figures printed.
   */
  @Test
  void aFarPortHidesWhatANearPortShows() {
    String text =
        """
        resistor near = 1 kΩ
        capacitor shunt = 10 nF
        resistor far = 10 kΩ
        wire in -- near -- mid -- far -- tap
        wire mid -- shunt -- ground
        port input = in -- ground, driven 1 V
        port tap = tap -- ground
        load probe shunt tap -- ground = 10 MΩ || 12 pF
        sweep 10 kHz to 1 MHz
        limit change 10 % at 100 kHz
        limit magnitude change 10 % at 100 kHz
        limit phase change 10 deg at 100 kHz
        """;
    double hz = 100e3;
    Complex c = ClosedForm.c(hz, 10e-9);
    Complex probe = ClosedForm.parallel(ClosedForm.r(10e6), ClosedForm.c(hz, 12e-12));
    Complex far = ClosedForm.r(10e3);
    Complex near = ClosedForm.r(1e3);
    Complex inWithout = near.add(c);
    Complex inWith = near.add(ClosedForm.parallel(c, far.add(probe)));
    Complex tapWithout = far.add(ClosedForm.parallel(near, c));
    Complex tapWith = ClosedForm.parallel(tapWithout, probe);

    Judged judged = Judged.text(text);
    assertThat(judged.status()).isEqualTo(Run.KEPT);
    is(judged.worst("probe", "input", "change"), ClosedForm.change(inWith, inWithout), 0.00019);
    is(judged.worst("probe", "tap", "change"), ClosedForm.change(tapWith, tapWithout), 0.075);
    is(
        judged.worst("probe", "tap", "magnitude change"),
        Math.abs(tapWith.abs() / tapWithout.abs() - 1),
        0.0050);
    is(
        judged.worst("probe", "tap", "phase change"),
        Math.abs(ClosedForm.degrees(tapWith.divide(tapWithout))),
        4.31);
  }

  /** Common practice: a probe of ten times the source resistance still takes a eleventh. */
  @Test
  void aProbeOfTenTimesTheSourceTakesNinePercent() {
    String text =
        """
        resistor source = 1 kΩ
        wire in -- source -- ground
        port input = in -- ground
        load probe shunt in -- ground = 10 kΩ
        sweep dc and 10 Hz to 1 kHz
        limit change 10 %
        """;
    is(Judged.text(text).worst("probe", "input", "change"), 1.0 / 11, 0.0909);
  }

  /**
   * To the tool's promise against the formula, and to the last digit against the printed figure.
   */
  private static void is(double actual, double formula, double printed) {
    assertThat(actual).isCloseTo(formula, within(CLOSED_FORM * formula));
    double digit = Math.pow(10, Math.floor(Math.log10(printed)) - 1);
    assertThat(actual).isCloseTo(printed, within(digit));
  }

  private static Complex loadedInput(String text, double hz) {
    return Curve.of(text, hz).z("input", "probe")[0];
  }

  private static void close(Complex actual, Complex expected, double condition) {
    assertThat(ClosedForm.apart(actual, expected))
        .as("%s against %s, condition %s", actual, expected, condition)
        .isLessThanOrEqualTo(Math.max(CLOSED_FORM, ROUNDINGS * condition));
  }
}
