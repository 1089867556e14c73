package loadmark.response;

import java.util.List;
import loadmark.network.OnePort;

/** The impedance of a two-terminal of constant elements. */
public final class OnePortImpedance {
  private OnePortImpedance() {}

  /** At a frequency, Hz; at DC inductors are links and capacitors open. */
  public static Ohms at(OnePort one, double hz) {
    if (one instanceof OnePort.Element element) {
      return element(element, 2 * Math.PI * hz);
    }
    return one instanceof OnePort.Series series
        ? series(series.members(), hz)
        : parallel(((OnePort.Parallel) one).members(), hz);
  }

  private static Ohms element(OnePort.Element element, double omega) {
    double value = element.value().nominal();
    return switch (element.kind()) {
      case RESISTANCE -> Ohms.of(value, 0);
      case CONDUCTANCE -> value == 0 ? Ohms.OPEN : Ohms.of(1 / value, 0);
      case INDUCTANCE -> Ohms.of(0, omega * value);
      case CAPACITANCE -> omega == 0 ? Ohms.OPEN : Ohms.of(0, -1 / (omega * value));
    };
  }

  private static Ohms series(List<OnePort> members, double hz) {
    double re = 0;
    double im = 0;
    for (OnePort member : members) {
      Ohms z = at(member, hz);
      if (!z.isFinite()) {
        return z;
      }
      re += z.re();
      im += z.im();
    }
    return Ohms.of(re, im);
  }

  private static Ohms parallel(List<OnePort> members, double hz) {
    double re = 0;
    double im = 0;
    for (OnePort member : members) {
      Ohms z = at(member, hz);
      if (z.isZero()) {
        return z;
      }
      if (z.isFinite()) {
        double square = z.re() * z.re() + z.im() * z.im();
        re += z.re() / square;
        im -= z.im() / square;
      }
    }
    double square = re * re + im * im;
    return square == 0 ? Ohms.OPEN : Ohms.of(re / square, -im / square);
  }
}
