package loadmark.response;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.DoubleStream;
import loadmark.network.Band;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.OnePort;
import loadmark.network.Port;
import org.apache.commons.math3.complex.Complex;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;

/** Crossings as eigenvalues near the axis, each from the nearest of a few real shifts. */
final class AlgebraicCrossings implements Crossings {
  static final int MOST_REACTIVE = 80;
  private static final int MOST_ELEMENTS = 600;

  /** A double root comes out at this distance from the axis at most, relative to itself. */
  private static final double NEAR_AXIS = 1e-3;

  /** How far a shift looks beyond its own part of the band. */
  private static final double OVERLAP = 1.1;

  private final PortSystems systems;

  AlgebraicCrossings(Network network, Port port, List<Load> loads, List<Load> against) {
    systems = new PortSystems(network, port, loads, against);
  }

  @Override
  public Optional<String> findObstacle() {
    if (systems.reactive() > MOST_REACTIVE) {
      return Optional.of(
          "it has " + systems.reactive() + " reactive elements, more than " + MOST_REACTIVE);
    }
    if (systems.elements() > MOST_ELEMENTS) {
      return Optional.of("it has " + systems.elements() + " elements, more than " + MOST_ELEMENTS);
    }
    return Optional.empty();
  }

  @Override
  public double[] candidates(Level level, Band band) {
    findObstacle()
        .ifPresent(
            why -> {
              throw new IllegalStateException(why);
            });
    if (band.fromHz() <= 0) {
      throw new IllegalArgumentException(band + " is not above 0 Hz");
    }
    int shifts = 1 + (int) Math.floor(Math.log10(band.toHz() / band.fromHz()));
    double step = Math.pow(band.toHz() / band.fromHz(), 1.0 / shifts);
    double[] found = {};
    for (int i = 0; i < shifts; i++) {
      double centre = band.fromHz() * Math.pow(step, i + 0.5);
      double half = Math.sqrt(step) * OVERLAP;
      double[] part =
          near(level, 2 * Math.PI * centre)
              .map(omega -> omega / (2 * Math.PI))
              .filter(hz -> centre / half <= hz && hz <= centre * half)
              .toArray();
      found = DoubleStream.concat(Arrays.stream(found), Arrays.stream(part)).toArray();
    }
    return Arrays.stream(found)
        .map(hz -> Math.min(Math.max(hz, band.fromHz()), band.toHz()))
        .sorted()
        .distinct()
        .toArray();
  }

  /** The candidates that a shift finds, rad/s. */
  private DoubleStream near(Level level, double s0) {
    DoubleStream.Builder found = DoubleStream.builder();
    for (Form form : forms(level, s0)) {
      if (form.system.states() == 0) {
        continue;
      }
      for (Complex zeta : LevelPencil.eigenvalues(form.system, form.q)) {
        Complex s = zeta.add(1).divide(zeta.subtract(1)).multiply(s0);
        if (s.getImaginary() > 0 && Math.abs(s.getReal()) <= NEAR_AXIS * s.abs()) {
          found.add(s.getImaginary());
        }
      }
    }
    return found.build();
  }

  /** Outputs and a form of them that is 0 at the level. */
  private record Form(StateSpace system, DMatrixRMaj q) {}

  private List<Form> forms(Level level, double s0) {
    double value = level.value();
    return switch (level.criterion()) {
      case CHANGE -> List.of(magnitude(systems.change(level.inOhm(), s0), value));
      case MAGNITUDE_CHANGE -> relative(systems.change(false, s0), value);
      case PHASE_CHANGE -> List.of(phaseOfOnePlus(systems.change(false, s0), value));
      case MAGNITUDE -> List.of(magnitude(systems.impedance(s0), value));
      case PHASE -> List.of(phaseByParts(systems.impedanceParts(s0), value));
      case MAGNITUDE_WITHIN -> {
        StateSpace both = withReference(level, s0);
        Form above = equal(both, 1 + value);
        yield value > 1 ? List.of(above) : List.of(above, equal(both, 1 - value));
      }
      case PHASE_WITHIN -> List.of(phase(withReference(level, s0), value));
      case PARALLEL_CAPACITANCE -> List.of(capacitance(systems.admittance(s0), value, s0));
      case PARALLEL_RESISTANCE -> List.of(realPart(systems.admittanceParts(s0), 1 / value));
      case RETURN_LOSS -> List.of(reflection(withReference(level, s0), Math.pow(10, -value / 10)));
    };
  }

  /** Z_with and the reference impedance, both in parts of what the larger is at s0. */
  private StateSpace withReference(Level level, double s0) {
    OnePort one = level.reference().orElseThrow();
    return normal(systems.impedance(s0).with(PortSystems.impedance(one, s0)));
  }

  private static StateSpace normal(StateSpace system) {
    double largest = CommonOps_DDRM.elementMaxAbs(system.d());
    return largest == 0 ? system : system.scaled(1 / largest);
  }

  private static DMatrixRMaj form(double q11, double q12, double q22) {
    return new DMatrixRMaj(2, 2, true, q11, q12, q12, q22);
  }

  /** |F| = value. */
  private static Form magnitude(StateSpace f, double value) {
    return value == 0
        ? new Form(normal(f).withInput(), form(1, 0, 0))
        : new Form(f.scaled(1 / value).withInput(), form(1, 0, -1));
  }

  /** |1 + H| = 1 ± value, as forms of H/value, so that small changes keep their digits. */
  private static List<Form> relative(StateSpace change, double value) {
    StateSpace h = change.scaled(value == 0 ? 1 : 1 / value).withInput();
    double most = value == 0 ? 1 : value;
    Form above = new Form(h, form(most, 1, value == 0 ? 0 : -(2 + value)));
    return value == 0 || value > 1
        ? List.of(above)
        : List.of(above, new Form(h, form(value, 1, 2 - value)));
  }

  /** |F1| = factor·|F2|. */
  private static Form equal(StateSpace both, double factor) {
    return new Form(both, form(1, 0, -factor * factor));
  }

  /** Re F = value, F being the last output and its real part the squares of all others. */
  private static Form realPart(StateSpace parts, double value) {
    int last = parts.outputs() - 1;
    StateSpace roots = parts.part(0, last, 0, 1, 1 / Math.sqrt(value)).withInput();
    DMatrixRMaj q = CommonOps_DDRM.identity(last + 1);
    q.set(last, last, -1);
    return new Form(roots, q);
  }

  /** |F1 − F2|² = power·|F1 + F2|². */
  private static Form reflection(StateSpace both, double power) {
    return new Form(both, form(1 - power, -1 - power, 1 - power));
  }

  /** Im F = value·ω, as Re(F·s*) = value·|s|², all of it divided by s + s0, a delay in ζ. */
  private static Form capacitance(StateSpace f, double value, double s0) {
    DMatrixRMaj one = new DMatrixRMaj(1, 1, true, 1);
    StateSpace delay =
        new StateSpace(
            new DMatrixRMaj(1, 1),
            one,
            new DMatrixRMaj(2, 1, true, -0.5, 0.5),
            new DMatrixRMaj(2, 1, true, 0.5, 0.5));
    double unit = value == 0 ? 1 : value * s0;
    StateSpace both = delay.into(f.scaled(1 / unit).besideWire());
    return new Form(value == 0 ? normal(both) : both, form(0, 1, value == 0 ? 0 : -2));
  }

  /** The phase of 1 + H is ±degrees. */
  private static Form phaseOfOnePlus(StateSpace change, double degrees) {
    double sine = Math.sin(Math.toRadians(degrees));
    double cosine = Math.cos(Math.toRadians(degrees));
    if (sine == 0 || cosine < 0) {
      return phase(change.plusInput().withInput(), degrees);
    }
    // Im((1 + H)·exp(−jφ)) / sin φ = Im(H / sin φ)·cos φ − Re(H / sin φ)·sin φ − 1.
    return hermitian(change.scaled(1 / sine).withInput(), -sine, -2, cosine);
  }

  /** The phase of F1/F2 is ±degrees. */
  private static Form phase(StateSpace both, double degrees) {
    double sine = Math.sin(Math.toRadians(degrees));
    double cosine = Math.cos(Math.toRadians(degrees));
    return hermitian(both, -sine, 0, cosine);
  }

  /** The phase of F is ±degrees, F being the last output, its real part the others' squares. */
  private static Form phaseByParts(StateSpace parts, double degrees) {
    double sine = Math.sin(Math.toRadians(degrees));
    double cosine = Math.cos(Math.toRadians(degrees));
    int last = parts.outputs() - 1;
    double unit = Math.max(Math.abs(parts.d().get(last, 0)), Double.MIN_NORMAL);
    StateSpace both =
        parts
            .part(0, last, 0, 1, Math.sqrt(2 * Math.abs(sine) / unit))
            .beside(parts.part(last, last + 1, 0, 1, 1 / unit))
            .withInput();
    DMatrixRMaj q = CommonOps_DDRM.identity(last + 2);
    CommonOps_DDRM.scale(-Math.signum(sine), q);
    q.set(last, last, 0);
    q.set(last + 1, last + 1, 0);
    return hermitian(both, q, cosine);
  }

  private static Form hermitian(StateSpace one, double real, double last, double imaginary) {
    return hermitian(one, form(0, real, last), imaginary);
  }

  /**
   * The form whose matrix is {@code q}, plus and minus j·imaginary between the last two outputs: a
   * real form of the system doubled.
   */
  private static Form hermitian(StateSpace one, DMatrixRMaj q, double imaginary) {
    int n = q.numRows;
    DMatrixRMaj doubled = new DMatrixRMaj(2 * n, 2 * n);
    CommonOps_DDRM.insert(q, doubled, 0, 0);
    CommonOps_DDRM.insert(q, doubled, n, n);
    doubled.set(n - 2, 2 * n - 1, -imaginary);
    doubled.set(2 * n - 1, n - 2, -imaginary);
    doubled.set(n - 1, 2 * n - 2, imaginary);
    doubled.set(2 * n - 2, n - 1, imaginary);
    return new Form(one.twice(), doubled);
  }
}
