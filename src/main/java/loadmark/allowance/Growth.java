package loadmark.allowance;

import java.util.Optional;
import loadmark.network.OnePort;
import loadmark.response.Ohms;
import loadmark.response.OnePortImpedance;
import org.apache.commons.math3.complex.Complex;

/** A load that grows with t, from t = 0 to ever heavier ones. */
sealed interface Growth {

  /** The load at t above 0; finite. */
  OnePort at(double t);

  /** What stands there at t = 0; empty where nothing does. */
  Optional<OnePort> start();

  /** Its admittance (shunt) or impedance (series); empty where a number overflows. */
  Optional<Immittance> immittance(double hz);

  /** A t at which the load is like the one in the file, by its order. */
  double usual();

  /** What is told of t. */
  double told(double t);

  /** numerator/denominator, each of which grows evenly with t: S of a shunt, Ω of a series load. */
  record Immittance(Line numerator, Line denominator) {}

  /** The load's own impedance, divided (shunt) or multiplied (series) by t. */
  record Multiple(OnePort value, boolean series) implements Growth {
    @Override
    public OnePort at(double t) {
      return Scaling.of(value, series ? t : 1 / t);
    }

    @Override
    public Optional<OnePort> start() {
      return Optional.empty();
    }

    @Override
    public Optional<Immittance> immittance(double hz) {
      Ohms z = OnePortImpedance.at(value, hz);
      if (z.isUndetermined()) {
        return Optional.empty();
      }
      Complex ohm = z.isOpen() ? Complex.ONE : PlaceResponse.complex(z);
      Complex siemens = z.isOpen() ? Complex.ZERO : Complex.ONE;
      Line grown = new Line(Complex.ZERO, series ? ohm : siemens);
      return Optional.of(new Immittance(grown, Line.of(series ? siemens : ohm)));
    }

    @Override
    public double usual() {
      return 1;
    }

    @Override
    public double told(double t) {
      return t;
    }
  }

  /**
   * A resistance beside a fixed capacitance; t is the conductance (shunt) or the resistance
   * (series).
   */
  record Resistance(double farad, boolean series, double usual) implements Growth {
    @Override
    public OnePort at(double t) {
      return new ParallelRc(series ? 1 / t : t, farad).toOnePort().orElseThrow();
    }

    @Override
    public Optional<OnePort> start() {
      return series ? Optional.empty() : new ParallelRc(0, farad).toOnePort();
    }

    @Override
    public Optional<Immittance> immittance(double hz) {
      Complex susceptance = new Complex(0, 2 * Math.PI * hz * farad);
      return Optional.of(
          series
              ? new Immittance(GROWING, new Line(Complex.ONE, susceptance))
              : new Immittance(new Line(susceptance, Complex.ONE), Line.ONE));
    }

    @Override
    public double told(double t) {
      return series ? t : 1 / t;
    }
  }

  /**
   * A capacitance beside a fixed conductance; t is the capacitance (shunt) or its inverse (series).
   */
  record Capacitance(double siemens, boolean series, double usual) implements Growth {
    @Override
    public OnePort at(double t) {
      return new ParallelRc(siemens, told(t)).toOnePort().orElseThrow();
    }

    @Override
    public Optional<OnePort> start() {
      return series ? Optional.empty() : new ParallelRc(siemens, 0).toOnePort();
    }

    @Override
    public Optional<Immittance> immittance(double hz) {
      Complex conductance = new Complex(siemens);
      Complex jOmega = new Complex(0, 2 * Math.PI * hz);
      return Optional.of(
          series
              ? new Immittance(GROWING, new Line(jOmega, conductance))
              : new Immittance(new Line(conductance, jOmega), Line.ONE));
    }

    @Override
    public double told(double t) {
      return series ? 1 / t : t;
    }
  }

  /** t itself. */
  Line GROWING = new Line(Complex.ZERO, Complex.ONE);

  /**
   * The resistance of a load alone.
   *
   * @param omega where a capacitance may stand for the resistance that there is not, rad/s
   */
  static Growth resistance(ParallelRc own, boolean series, double omega) {
    double siemens = own.siemens() > 0 ? own.siemens() : omega * own.farad();
    return new Resistance(own.farad(), series, series ? 1 / siemens : siemens);
  }

  /** The capacitance of a load alone. */
  static Growth capacitance(ParallelRc own, boolean series, double omega) {
    double farad = own.farad() > 0 ? own.farad() : own.siemens() / omega;
    return new Capacitance(own.siemens(), series, series ? 1 / farad : farad);
  }
}
