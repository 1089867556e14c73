package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;

/** A condition on a system in ζ = (s + s0)/(s − s0) that holds where a criterion has its level. */
sealed interface LevelCondition {

  /** Its roots s/s0, those beyond the axis s = jω too. */
  List<Complex> roots();

  /** A quadratic form of the outputs is 0. */
  record Form(StateSpace system, DMatrixRMaj q) implements LevelCondition {
    @Override
    public List<Complex> roots() {
      return system.states() == 0 ? List.of() : inS(LevelPencil.eigenvalues(system, q));
    }
  }

  /**
   * Real and imaginary part of the output lie on a line. At a pole on the axis the output goes from
   * one side to the other without being on it, so that poles count as roots.
   */
  record Line(StateSpace system, LinePencil pencil) implements LevelCondition {
    @Override
    public List<Complex> roots() {
      if (system.states() == 0) {
        return List.of();
      }
      List<Complex> roots = new ArrayList<>(inS(Eigenvalues.of(system.a())));
      pencil.eigenvalues(system).forEach(omega -> roots.add(omega.multiply(Complex.I)));
      return roots;
    }
  }

  private static List<Complex> inS(List<Complex> zetas) {
    return zetas.stream().map(zeta -> zeta.add(1).divide(zeta.subtract(1))).toList();
  }

  /** The conditions whose roots together are those of the level. */
  static List<LevelCondition> of(Level level, PortSystems systems, double s0) {
    double value = level.value();
    return switch (level.criterion()) {
      case CHANGE -> List.of(magnitude(systems.change(level.inOhm(), s0), value));
      case MAGNITUDE_CHANGE -> relative(systems.change(false, s0), value);
      case PHASE_CHANGE -> List.of(phaseOfOnePlus(systems.change(false, s0), value));
      case MAGNITUDE -> List.of(magnitude(systems.impedance(s0), value));
      case PHASE -> List.of(phase(systems.impedance(s0), value));
      case MAGNITUDE_WITHIN -> {
        StateSpace both = withReference(level, systems, s0);
        Form above = equal(both, 1 + value);
        yield value > 1 ? List.of(above) : List.of(above, equal(both, 1 - value));
      }
      case PHASE_WITHIN -> {
        StateSpace reference = PortSystems.admittance(level.reference().orElseThrow(), s0);
        yield List.of(phase(reference.into(systems.impedance(s0)), value));
      }
      case PARALLEL_CAPACITANCE -> List.of(capacitance(systems.admittance(s0), value * s0));
      case PARALLEL_RESISTANCE -> List.of(realPart(systems.admittanceParts(s0), 1 / value));
      case RETURN_LOSS ->
          List.of(reflection(withReference(level, systems, s0), Math.pow(10, -value / 10)));
    };
  }

  /** Z_with and the reference impedance, both in parts of what the larger is at s0. */
  private static StateSpace withReference(Level level, PortSystems systems, double s0) {
    StateSpace reference = PortSystems.impedance(level.reference().orElseThrow(), s0);
    return normal(systems.impedance(s0).with(reference));
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
  private static List<LevelCondition> relative(StateSpace change, double value) {
    if (value == 0) {
      return List.of(new Form(change.withInput(), form(1, 1, 0)));
    }
    StateSpace h = change.scaled(1 / value).withInput();
    Form above = new Form(h, form(value, 1, -(2 + value)));
    return value > 1 ? List.of(above) : List.of(above, new Form(h, form(value, 1, 2 - value)));
  }

  /** |F1| = factor·|F2|. */
  private static Form equal(StateSpace both, double factor) {
    return new Form(both, form(1, 0, -factor * factor));
  }

  /** |F1 − F2|² = power·|F1 + F2|². */
  private static Form reflection(StateSpace both, double power) {
    return new Form(both, form(1 - power, -1 - power, 1 - power));
  }

  /** The sum of the squares of all outputs is value. */
  private static Form realPart(StateSpace parts, double value) {
    DMatrixRMaj q = CommonOps_DDRM.identity(parts.outputs() + 1);
    q.set(parts.outputs(), parts.outputs(), -1);
    return new Form(parts.scaled(1 / Math.sqrt(value)).withInput(), q);
  }

  /** Im F = value·ω/s0. */
  private static Line capacitance(StateSpace f, double value) {
    return value == 0
        ? new Line(normal(f), new LinePencil(1, 0, 0, 0))
        : new Line(f.scaled(1 / value), new LinePencil(1, 0, 0, 1));
  }

  private static Line phase(StateSpace f, double degrees) {
    return new Line(normal(f), LinePencil.ofPhase(degrees));
  }

  /** The phase of 1 + H, as a condition on H/sin φ, so that small changes keep their digits. */
  private static Line phaseOfOnePlus(StateSpace change, double degrees) {
    LinePencil phase = LinePencil.ofPhase(degrees);
    if (phase.re() == 0 || phase.im() < 0) {
      return new Line(change.plusInput(), phase);
    }
    return new Line(change.scaled(1 / phase.re()), new LinePencil(phase.im(), phase.re(), 1, 0));
  }
}
