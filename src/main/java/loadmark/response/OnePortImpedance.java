package loadmark.response;

import loadmark.network.OnePort;

/** The impedance of a two-terminal alone. */
public final class OnePortImpedance {
  private OnePortImpedance() {}

  /**
   * Its impedance at a frequency.
   *
   * @param hz 0 for DC, where capacitors are open and inductors are joined
   * @return finite (0 where it is a join), open, or undetermined where the numbers overflow
   */
  public static Ohms at(OnePort onePort, double hz) {
    if (onePort instanceof OnePort.Element element) {
      return element(element.kind(), element.value().nominal(), 2 * Math.PI * hz);
    }
    if (onePort instanceof OnePort.Series series) {
      Ohms sum = Ohms.of(0, 0);
      for (OnePort member : series.members()) {
        sum = inSeries(sum, at(member, hz));
      }
      return sum;
    }
    Ohms sum = Ohms.of(0, 0);
    for (OnePort member : ((OnePort.Parallel) onePort).members()) {
      sum = inSeries(sum, inverse(at(member, hz)));
    }
    return inverse(sum);
  }

  private static Ohms element(OnePort.ElementKind kind, double value, double omega) {
    return switch (kind) {
      case RESISTANCE -> finite(value, 0);
      case CONDUCTANCE -> inverse(finite(value, 0));
      case CAPACITANCE -> inverse(finite(0, omega * value));
      case INDUCTANCE -> finite(0, omega * value);
    };
  }

  private static Ohms inSeries(Ohms a, Ohms b) {
    if (a.isUndetermined() || b.isUndetermined()) {
      return Ohms.UNDETERMINED;
    }
    return a.isOpen() || b.isOpen() ? Ohms.OPEN : finite(a.re() + b.re(), a.im() + b.im());
  }

  /** 1/z, where 1/0 is open and 1/open is 0. */
  private static Ohms inverse(Ohms z) {
    if (z.isOpen()) {
      return Ohms.of(0, 0);
    }
    if (z.isZero()) {
      return Ohms.OPEN;
    }
    if (z.isUndetermined()) {
      return z;
    }
    double scale = Math.max(Math.abs(z.re()), Math.abs(z.im()));
    double re = z.re() / scale;
    double im = z.im() / scale;
    double square = re * re + im * im;
    return finite(re / square / scale, -im / square / scale);
  }

  private static Ohms finite(double re, double im) {
    return Double.isFinite(re) && Double.isFinite(im) ? Ohms.of(re, im) : Ohms.UNDETERMINED;
  }
}
