package loadmark.response;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import loadmark.equation.Circuit;
import loadmark.equation.CircuitBuilder;
import loadmark.equation.Rates;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Port;
import org.apache.commons.math3.complex.Complex;

/**
 * Poles and zeros of a driving-point impedance.
 *
 * @param poles rad/s, finite, those that the port sees, ascending in |s|; conjugate pairs both
 * @param zeros the same
 */
public record PortRoots(List<Complex> poles, List<Complex> zeros) {
  /** How far apart two frequencies far below all others are. */
  private static final double DECADE = 10;

  /** A pole and a zero nearer than this, relative, are looked at more closely. */
  private static final double CLOSE = 1e-3;

  /** A residue below this part of |Z|·|p| is rounding. */
  private static final double LEAST_RESIDUE = 1e-10;

  private static final int CIRCLE_POINTS = 16;

  public PortRoots {
    poles = List.copyOf(poles);
    zeros = List.copyOf(zeros);
  }

  /** The poles and zeros of the port's impedance with some loads on. */
  public static PortRoots of(Network network, Port port, List<Load> loads) {
    return of(CircuitBuilder.build(network, port, loads, List.of()));
  }

  static PortRoots of(Circuit circuit) {
    double margin = 10.0 * (1 + circuit.elements().size());
    Rates range = Rates.of(circuit).widened(margin);
    List<Complex> poles = NaturalFrequencies.of(circuit, range);
    List<Complex> zeros = NaturalFrequencies.of(circuit.withPortShort(), range);
    List<Complex> seenPoles = new ArrayList<>();
    List<Complex> seenZeros = new ArrayList<>();
    for (Complex pole : poles) {
      if (isSeen(circuit, pole, zeros, poles)) {
        seenPoles.add(pole);
      }
    }
    for (Complex zero : zeros) {
      if (isSeen(circuit.withPortShort(), zero, poles, zeros)) {
        seenZeros.add(zero);
      }
    }
    addRootAtZero(circuit, range.slowest(), seenPoles, seenZeros);
    return new PortRoots(sorted(seenPoles), sorted(seenZeros));
  }

  private static List<Complex> sorted(List<Complex> roots) {
    roots.sort(Comparator.comparingDouble(Complex::abs).thenComparing(Complex::getImaginary));
    return roots;
  }

  /** Whether what the port shows has a pole there, by its residue on a small circle. */
  private static boolean isSeen(
      Circuit circuit, Complex pole, List<Complex> opposite, List<Complex> same) {
    double nearest = nearest(pole, opposite, 0);
    if (nearest > CLOSE) {
      return true;
    }
    double others = nearest(pole, same, 10 * LEAST_RESIDUE);
    double radius = Math.min(0.3 * others, CLOSE) * pole.abs();
    double s0 = pole.abs();
    WaveResponse response = new WaveResponse(WaveRealisation.of(circuit, s0).part(0, 0, 1), s0);
    Complex residue = Complex.ZERO;
    double size = 0;
    for (int k = 0; k < CIRCLE_POINTS; k++) {
      double angle = 2 * Math.PI * (k + 0.5) / CIRCLE_POINTS;
      Complex offset = new Complex(radius * Math.cos(angle), radius * Math.sin(angle));
      Complex value = response.at(pole.add(offset));
      residue = residue.add(value.multiply(offset));
      size = Math.max(size, value.abs());
    }
    return residue.abs() / CIRCLE_POINTS > LEAST_RESIDUE * size * pole.abs();
  }

  private static double nearest(Complex root, List<Complex> others, double beyond) {
    return others.stream()
        .mapToDouble(other -> NaturalFrequencies.distance(other, root))
        .filter(d -> d >= beyond)
        .min()
        .orElse(Double.POSITIVE_INFINITY);
  }

  /** A root at 0 shows in how Z goes at small real frequencies, where it is known best. */
  private static void addRootAtZero(
      Circuit circuit, double low, List<Complex> poles, List<Complex> zeros) {
    double near = real(circuit, low / DECADE);
    double far = real(circuit, low);
    if (near > far * DECADE / 2) {
      poles.add(Complex.ZERO);
    } else if (near < far / DECADE * 2) {
      zeros.add(Complex.ZERO);
    }
  }

  private static double real(Circuit circuit, double s) {
    return -WaveRealisation.of(circuit, s).d().get(0, 0);
  }
}
