package loadmark.evidence;

import static loadmark.evidence.ClosedForm.c;
import static loadmark.evidence.ClosedForm.l;
import static loadmark.evidence.ClosedForm.parallel;
import static loadmark.evidence.ClosedForm.r;
import static loadmark.evidence.ClosedForm.series;

import java.util.Set;
import org.apache.commons.math3.complex.Complex;

/** The impedances of the examples, each folded up by hand from series and parallel. */
final class ExampleImpedances {
  /** A load that is not there. */
  private static final Complex OPEN = new Complex(Double.POSITIVE_INFINITY);

  private ExampleImpedances() {}

  static Complex batteryDivider(String port, Set<String> on, double hz) {
    Complex hold = series(r(0.2), c(hz, 10e-9));
    Complex converter = shunt(on, "converter", parallel(r(1.2e6), series(r(200), c(hz, 9e-12))));
    Complex lower = parallel(r(330e3 / 7), hold, converter);
    return port.equals("pack_side") ? series(r(330e3), lower) : parallel(lower, r(330e3 + 0.05));
  }

  static Complex resonatorProbe(String port, Set<String> on, double hz) {
    return parallel(
        series(r(1.1), l(hz, 2.2e-6)),
        c(hz, 470e-12),
        r(27e3),
        shunt(on, "passive", parallel(r(10e6), c(hz, 11e-12))),
        shunt(on, "active", parallel(r(1e6), c(hz, 0.8e-12))));
  }

  static Complex sensorLoop(String port, Set<String> on, double hz) {
    return series(
        r(3.2),
        inSeries(on, "bench", series(r(1.8), l(hz, 4e-6))),
        inSeries(on, "handheld", r(10.5)),
        series(r(380), l(hz, 50e-3)),
        r(3.2));
  }

  static Complex attenuator(String port, Set<String> on, double hz) {
    Complex end =
        parallel(
            r(95.3),
            shunt(on, "fifty", r(50)),
            shunt(on, "seventy_five", r(75)),
            shunt(on, "scope", parallel(r(1e6), c(hz, 20e-12))));
    return parallel(r(95.3), series(r(71.5), end));
  }

  static Complex harmonicFilter(String port, Set<String> on, double hz) {
    Complex capacitor = series(r(0.03), l(hz, 0.8e-9), c(hz, 430e-12));
    double resonance = 2 * Math.PI * 72e6;
    Complex choke =
        parallel(series(r(0.35), l(hz, 2.2e-6)), c(hz, 1 / (resonance * resonance * 2.2e-6)));
    Complex end =
        parallel(
            capacitor,
            shunt(on, "dummy", series(r(50), l(hz, 12e-9))),
            shunt(on, "aerial_wire", parallel(series(r(36), l(hz, 180e-9)), c(hz, 25e-12))));
    return parallel(capacitor, series(choke, end));
  }

  static Complex mainsNetwork(String port, Set<String> on, double hz) {
    Complex mains = parallel(series(r(0.4), l(hz, 800e-6)), series(c(hz, 4e-6), r(10)));
    Complex mid = parallel(series(c(hz, 8e-6), r(5)), series(l(hz, 250e-6), mains));
    Complex socket = parallel(r(1e3), shunt(on, "receiver", r(50)));
    return parallel(series(l(hz, 50e-6), mid), series(c(hz, 0.25e-6), socket));
  }

  /** CISPR 16-1-2: 50 Ω ∥ (50 µH + 5 Ω). */
  static Complex mainsReference(double hz) {
    return parallel(r(50), series(l(hz, 50e-6), r(5)));
  }

  static Complex farPort(String port, Set<String> on, double hz) {
    Complex middle = parallel(c(hz, 4.7e-9), r(33e3));
    Complex probe = shunt(on, "probe", parallel(r(10e6), c(hz, 12e-12)));
    return port.equals("connector")
        ? series(r(1.5e3), parallel(middle, series(r(22e3), probe)))
        : parallel(probe, series(r(22e3), parallel(middle, r(1.5e3 + 10))));
  }

  static Complex probeAdded(String port, Set<String> on, double hz) {
    return parallel(
        r(68e3),
        r(22e3),
        c(hz, 220e-12),
        shunt(on, "converter", parallel(r(500e3), series(r(150), c(hz, 14e-12)))),
        shunt(on, "passive", parallel(r(10e6), c(hz, 9.5e-12))),
        shunt(on, "active", parallel(r(1e6), c(hz, 1e-12))));
  }

  static Complex currentLoop(String port, Set<String> on, double hz) {
    return series(
        r(8.2),
        r(8.2),
        series(r(4), l(hz, 10e-3)),
        inSeries(on, "barrier", r(280)),
        inSeries(on, "indicator", r(52)),
        parallel(r(250), c(hz, 10e-9)));
  }

  static Complex oneSidedPad(String port, Set<String> on, double hz) {
    Complex step = parallel(r(24.9), c(hz, 0.1e-12));
    return series(step, r(port.equals("side_75") ? 50 : 75));
  }

  static Complex pickupCable(String port, Set<String> on, double hz) {
    double resonance = 2 * Math.PI * 9e3;
    return parallel(
        series(r(7.8e3), l(hz, 3.2)),
        c(hz, 1 / (resonance * resonance * 3.2)),
        r(470e3),
        series(c(hz, 22e-9), r(250e3)),
        shunt(on, "guitar_lead", c(hz, 330e-12)),
        shunt(on, "patch_lead", c(hz, 470e-12)));
  }

  static Complex supplyRail(String port, Set<String> on, double hz) {
    Complex inlet =
        parallel(
            series(r(4e-3), l(hz, 25e-9)),
            series(r(6e-3), l(hz, 1.6e-9), c(hz, 47e-6)),
            shunt(on, "module", series(c(hz, 22e-6), r(4e-3), l(hz, 2.5e-9))));
    Complex small = series(r(3e-3), l(hz, 0.12e-9), parallel(c(hz, 1e-6), r(50e6)));
    return parallel(small, series(inlet, r(1e-3), l(hz, 0.2e-9)));
  }

  static Complex poweredDevice(String port, Set<String> on, double hz) {
    return parallel(
        series(r(10), parallel(r(24.9e3), c(hz, 100e-9))),
        shunt(on, "clamp", parallel(r(1e6), c(hz, 1.5e-9))),
        shunt(on, "lamp", parallel(r(680e3), c(hz, 10e-9))));
  }

  static Complex strainBridge(String port, Set<String> on, double hz) {
    return parallel(
        series(parallel(r(350), r(350)), parallel(r(350), r(350.7))),
        shunt(on, "amplifier", parallel(r(100e3), c(hz, 470e-12))));
  }

  static Complex thermistorTap(String port, Set<String> on, double hz) {
    return parallel(
        r(22e3),
        r(10e3),
        series(r(0.5), c(hz, 10e-9)),
        shunt(on, "logger", parallel(r(1e6), series(r(1e3), c(hz, 15e-12)))),
        shunt(on, "meter", parallel(r(10e6), c(hz, 60e-12))));
  }

  static Complex touchCurrent(String port, Set<String> on, double hz) {
    Complex skin = parallel(r(1500), c(hz, 220e-9));
    Complex end = parallel(c(hz, 22e-9), shunt(on, "meter", parallel(r(1e6), c(hz, 200e-12))));
    return port.equals("hand")
        ? series(skin, parallel(r(500), series(r(10e3), end)))
        : parallel(end, series(r(10e3), parallel(r(500), series(skin, r(1e6)))));
  }

  private static Complex shunt(Set<String> on, String load, Complex z) {
    return on.contains(load) ? z : OPEN;
  }

  private static Complex inSeries(Set<String> on, String load, Complex z) {
    return on.contains(load) ? z : Complex.ZERO;
  }
}
