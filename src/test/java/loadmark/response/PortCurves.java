package loadmark.response;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loadmark.network.Criterion;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.OnePort;
import loadmark.network.Port;
import org.apache.commons.math3.complex.Complex;

/** What the criteria are of, quick enough for scans: a realisation for every decade. */
final class PortCurves {
  /** Of this size the change of a scanned point is still right to about 1e-6. */
  private static final double LEAST_CHANGE = 1e-4;

  private final PortSystems systems;
  private final OnePort reference;
  private final Map<Integer, FrequencyScan[]> decades = new HashMap<>();

  PortCurves(Network network, Port port, List<Load> loads, List<Load> against, OnePort reference) {
    systems = new PortSystems(network, port, loads, against);
    this.reference = reference;
  }

  /** Z_with, the change, the difference in Ω, and the reference impedance. */
  record Point(Complex with, Complex change, Complex difference, Complex reference) {}

  Point at(double hz) {
    FrequencyScan[] scans =
        decades.computeIfAbsent((int) Math.floor(Math.log10(hz)), this::realise);
    return new Point(scans[0].at(hz), scans[1].at(hz), scans[2].at(hz), scans[3].at(hz));
  }

  private FrequencyScan[] realise(int decade) {
    double s0 = 2 * Math.PI * Math.pow(10, decade + 0.5);
    return new FrequencyScan[] {
      new FrequencyScan(systems.impedance(s0), s0),
      new FrequencyScan(systems.change(false, s0), s0),
      new FrequencyScan(systems.change(true, s0), s0),
      new FrequencyScan(PortSystems.impedance(reference, s0), s0)
    };
  }

  /** The level that a criterion has at a point, as the crossings are asked for it. */
  Level level(Criterion criterion, boolean inOhm, double factor, double hz) {
    boolean needed =
        criterion == Criterion.MAGNITUDE_WITHIN
            || criterion == Criterion.PHASE_WITHIN
            || criterion == Criterion.RETURN_LOSS;
    double value = value(criterion, inOhm, at(hz), hz) * factor;
    return new Level(criterion, inOhm, needed ? Optional.of(reference) : Optional.empty(), value);
  }

  /** The criterion less the level; at a lossless pole what it is beside it. */
  double excess(Level level, double hz) {
    return excess(level, at(hz), hz);
  }

  /** The same at a point that is known already. */
  double excess(Level level, Point point, double hz) {
    double value = value(level.criterion(), level.inOhm(), point, hz);
    return Double.isNaN(value) ? excess(level, Math.nextUp(hz)) : value - level.value();
  }

  /** How many times rounding is larger in the criterion than in what it is computed from. */
  double condition(Level level, double hz) {
    Point p = at(hz);
    Complex admittance = p.with.reciprocal();
    return switch (level.criterion()) {
      case CHANGE -> LEAST_CHANGE / p.change.abs();
      case MAGNITUDE_CHANGE -> Math.max(p.change.abs(), LEAST_CHANGE) / magnitudeChange(p.change);
      case PHASE_CHANGE ->
          Math.max(p.change.abs(), LEAST_CHANGE) / Math.abs(p.change.getImaginary());
      case PARALLEL_RESISTANCE -> admittance.abs() / Math.abs(admittance.getReal());
      case PARALLEL_CAPACITANCE -> admittance.abs() / Math.abs(admittance.getImaginary());
      case MAGNITUDE_WITHIN, PHASE_WITHIN -> 1 / Math.abs(level.value());
      default -> 1;
    };
  }

  private static double magnitudeChange(Complex change) {
    double square = 2 * change.getReal() + change.abs() * change.abs();
    return Math.abs(square / (Math.sqrt(1 + square) + 1));
  }

  private static double value(Criterion criterion, boolean inOhm, Point p, double hz) {
    return switch (criterion) {
      case CHANGE -> (inOhm ? p.difference : p.change).abs();
      case MAGNITUDE_CHANGE -> magnitudeChange(p.change);
      case PHASE_CHANGE -> degrees(p.change.add(1));
      case MAGNITUDE -> p.with.abs();
      case PHASE -> Math.toDegrees(p.with.getArgument());
      case MAGNITUDE_WITHIN -> Math.abs(p.with.abs() / p.reference.abs() - 1);
      case PHASE_WITHIN -> degrees(p.with.divide(p.reference));
      case PARALLEL_CAPACITANCE -> p.with.reciprocal().getImaginary() / (2 * Math.PI * hz);
      case PARALLEL_RESISTANCE -> 1 / p.with.reciprocal().getReal();
      case RETURN_LOSS ->
          20 * Math.log10(p.with.add(p.reference).divide(p.with.subtract(p.reference)).abs());
    };
  }

  private static double degrees(Complex ratio) {
    return Math.toDegrees(Math.abs(ratio.getArgument()));
  }
}
