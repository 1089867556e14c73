package loadmark.allowance;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.network.Bound;
import loadmark.network.Limit;
import loadmark.response.Ohms;
import loadmark.response.OnePortImpedance;
import org.apache.commons.math3.complex.Complex;

/**
 * When a growing load breaks a limit at one frequency. Every limit on the impedance of a port is
 * one or two quadratics in t, since Z_with is a quotient of two numbers that grow evenly with t.
 */
final class Breaches {
  /** The judgement's own tolerance: a value past its bound by this share of it is kept. */
  static final double SLACK = 1e-9;

  private final Limit limit;
  private final double slack;
  private final double hz;

  /** Z_with is {@code loaded}/{@code scale}, Ω. */
  private final Line loaded;

  private final Line scale;

  /** The difference to the reference is {@code difference}/{@code scale}, Ω. */
  private final Line difference;

  /** The reference's impedance, Ω. */
  private final Complex reference;

  private Breaches(Limit limit, PlaceResponse place, Growth.Immittance load, double slack) {
    this.limit = limit;
    this.slack = slack;
    hz = place.hz();
    scale = load.denominator().times(place.base()).plus(load.numerator().times(place.slope()));
    Line effect = load.numerator().times(place.effect());
    loaded = scale.times(place.impedance()).plus(effect);
    boolean told = place.without().without().isFinite();
    reference = told ? place.reference() : Complex.ZERO;
    difference = told ? scale.times(place.offset()).plus(effect) : loaded;
  }

  /** The least t that breaks the limit, infinite where none does; empty where that is not known. */
  static OptionalDouble first(Limit limit, PlaceResponse place, Growth growth) {
    if (!limit.criterion().isAbsolute() && !place.without().without().isFinite()) {
      return OptionalDouble.empty();
    }
    Optional<Growth.Immittance> load = growth.immittance(place.hz());
    Optional<Breach> exact = load.flatMap(l -> new Breaches(limit, place, l, 0).find());
    Optional<Breach> tolerant = load.flatMap(l -> new Breaches(limit, place, l, SLACK).find());
    return exact.isPresent() && tolerant.isPresent()
        ? OptionalDouble.of(exact.get().first(tolerant.get()))
        : OptionalDouble.empty();
  }

  /** Whether limits of this kind can be told at all. */
  static boolean knows(Limit limit) {
    return switch (limit.criterion()) {
      case CHANGE,
          MAGNITUDE_CHANGE,
          PHASE_CHANGE,
          MAGNITUDE,
          PHASE,
          MAGNITUDE_WITHIN,
          PHASE_WITHIN,
          PARALLEL_CAPACITANCE,
          PARALLEL_RESISTANCE,
          RETURN_LOSS ->
          true;
    };
  }

  private Optional<Breach> find() {
    Bound bound = limit.bound();
    return switch (limit.criterion()) {
      case CHANGE -> Optional.of(change(mostOhm(bound, reference.abs())));
      case MAGNITUDE_CHANGE -> Optional.of(magnitudeChange(most()));
      case PHASE_CHANGE -> Optional.of(beyond(reference, most()));
      case MAGNITUDE -> Optional.of(magnitude(least(bound.atLeast()), most(bound.atMost())));
      case PHASE -> Optional.of(phase(bound.atLeast().orElse(-180), bound.atMost().orElse(180)));
      case MAGNITUDE_WITHIN -> limitReference().map(this::magnitudeWithin);
      case PHASE_WITHIN -> limitReference().map(z -> beyond(z, most()));
      case PARALLEL_CAPACITANCE -> Optional.of(parallelCapacitance(bound));
      case PARALLEL_RESISTANCE -> Optional.of(parallelResistance(bound));
      case RETURN_LOSS -> limitReference().map(this::returnLoss);
    };
  }

  private double most() {
    return limit.bound().atMost().orElseThrow() * (1 + slack);
  }

  private OptionalDouble most(OptionalDouble bound) {
    return bound.isEmpty() ? bound : OptionalDouble.of(bound.getAsDouble() * (1 + slack));
  }

  private OptionalDouble least(OptionalDouble bound) {
    return bound.isEmpty() ? bound : OptionalDouble.of(bound.getAsDouble() * (1 - slack));
  }

  private Optional<Complex> limitReference() {
    Ohms z = OnePortImpedance.at(limit.reference().orElseThrow(), hz);
    return z.isFinite() && !z.isZero() ? Optional.of(PlaceResponse.complex(z)) : Optional.empty();
  }

  /** The easier of a relative bound and one in Ω, in Ω. */
  static double mostOhm(Bound bound, double referenceOhm) {
    double relative = bound.atMost().orElse(0) * referenceOhm;
    return Math.max(relative, bound.atMostOhm().orElse(0));
  }

  private Breach change(double ohm) {
    double most = ohm * (1 + slack);
    return Breach.any(difference.square().minus(scale.square().times(most * most)));
  }

  /**
   * | |Z| − |Z_ref| | > m·|Z_ref|, from the difference alone: |Z|² − |Z_ref|² without cancelling.
   */
  private Breach magnitudeChange(double most) {
    Quadratic more =
        difference.real(scale, reference.conjugate()).times(2).plus(difference.square());
    Quadratic square = scale.times(reference).square();
    Quadratic above = more.minus(square.times(most * (2 + most)));
    Quadratic below = square.times(-most * (2 - most)).minus(more);
    return most < 1 ? Breach.any(above, below) : Breach.any(above);
  }

  private Breach magnitudeWithin(Complex z) {
    double most = most();
    OptionalDouble from =
        most < 1 ? OptionalDouble.of(z.abs() * (1 - most)) : OptionalDouble.empty();
    return magnitude(from, OptionalDouble.of(z.abs() * (1 + most)));
  }

  private Breach magnitude(OptionalDouble from, OptionalDouble to) {
    return window(loaded.square(), scale.square(), square(from), square(to));
  }

  private static OptionalDouble square(OptionalDouble value) {
    return value.isEmpty() ? value : OptionalDouble.of(value.getAsDouble() * value.getAsDouble());
  }

  /** value/unit outside from … to; unit is never below 0. */
  private static Breach window(
      Quadratic value, Quadratic unit, OptionalDouble from, OptionalDouble to) {
    List<Quadratic> parts = new ArrayList<>();
    from.ifPresent(least -> parts.add(unit.times(least).minus(value)));
    to.ifPresent(most -> parts.add(value.minus(unit.times(most))));
    return new Breach(parts, false);
  }

  private Breach phase(double from, double to) {
    double middle = Math.toRadians(from + (to - from) / 2);
    double edge = Math.max(Math.abs(from), Math.abs(to));
    double width = (to - from) / 2 + slack * edge;
    return beyond(new Complex(Math.cos(middle), Math.sin(middle)), width);
  }

  /**
   * The angle between Z and {@code direction} beyond ± {@code degrees}: outside of either half
   * plane up to a right angle, outside of both past it.
   */
  private Breach beyond(Complex direction, double degrees) {
    if (direction.abs() == 0) {
      return Breach.NEVER;
    }
    Complex unit = direction.divide(direction.abs());
    double angle = Math.toRadians(degrees);
    double cos = Math.cos(angle);
    double sin = Math.sin(angle);
    // The real part of Z/direction, and its imaginary part from the difference where that is small.
    Quadratic along = loaded.real(scale, unit.conjugate());
    boolean toReference = direction.equals(reference);
    Quadratic across =
        (toReference ? difference : loaded)
            .real(scale, unit.conjugate().multiply(new Complex(0, -1)));
    Quadratic ahead = across.times(cos).minus(along.times(sin));
    Quadratic behind = across.times(-cos).minus(along.times(sin));
    return degrees <= 90 ? Breach.any(ahead, behind) : Breach.all(ahead, behind);
  }

  /** Im(1/Z) = Im(scale·loaded*)/|loaded|², against ωC. */
  private Breach parallelCapacitance(Bound bound) {
    double omega = 2 * Math.PI * hz;
    Quadratic susceptance = scale.real(loaded, new Complex(0, -1));
    return window(
        susceptance, loaded.square().times(omega), least(bound.atLeast()), most(bound.atMost()));
  }

  /** As a conductance, of which one below 0 is beyond any resistance. */
  private Breach parallelResistance(Bound bound) {
    return window(
        scale.real(loaded, Complex.ONE),
        loaded.square(),
        inverse(most(bound.atMost())),
        inverse(least(bound.atLeast())));
  }

  private static OptionalDouble inverse(OptionalDouble value) {
    return value.isEmpty() ? value : OptionalDouble.of(1 / value.getAsDouble());
  }

  /** |Z + z| < g·|Z − z|. */
  private Breach returnLoss(Complex z) {
    double least = limit.bound().atLeast().orElseThrow() * (1 - slack);
    double ratio = Math.pow(10, least / 20);
    Quadratic sum = loaded.plus(scale.times(z)).square();
    Quadratic apart = loaded.plus(scale.times(z.negate())).square();
    return Breach.any(apart.times(ratio * ratio).minus(sum));
  }
}
