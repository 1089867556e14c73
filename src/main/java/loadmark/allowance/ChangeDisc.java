package loadmark.allowance;

import java.util.List;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.response.Loading;
import org.apache.commons.math3.complex.Complex;

/**
 * The loads that a limit on the change forbids at one frequency. With v the admittance of a shunt
 * or the impedance of a series load, |J·(c + v·e) + v·κ| ≤ b·|c + v·e| in the terms of {@link
 * PlaceResponse}, where J is the difference that is there without the load and b the bound in Ω: a
 * disc, or what is outside of one, or a half plane. Along v = ρ·u, |u| = 1, the limit is broken
 * where −a + 2ρ·Re(βu) + dρ² is above 0.
 */
record ChangeDisc(double a, Complex beta, double d) {

  /**
   * What all limits on the change together leave room for at one frequency.
   *
   * @param limits those in whose scope the frequency lies
   */
  static PointAllowance at(LoadPlace.Point point, List<Limit> limits, boolean series) {
    double hz = point.without().hz();
    PointAllowance tightest = new PointAllowance(hz, Amount.ANY, Amount.ANY, Amount.ANY);
    for (Limit limit : limits) {
      if (limit.criterion() == Criterion.CHANGE) {
        tightest = tighter(tightest, of(point, limit, series), series);
      }
    }
    return tightest;
  }

  private static PointAllowance of(LoadPlace.Point point, Limit limit, boolean series) {
    double hz = point.without().hz();
    Loading bare = point.without();
    boolean relativeAlone = limit.bound().atMostOhm().isEmpty();
    if (relativeAlone && bare.change().isUndetermined()) {
      return all(hz, Amount.UNDETERMINED);
    }
    if (!bare.with().isFinite() || !bare.without().isFinite()) {
      return all(hz, withOpen(bare, limit));
    }
    if (point.response().isEmpty()) {
      return all(hz, Amount.UNDETERMINED);
    }
    PlaceResponse place = point.response().get();
    double bound = Breaches.mostOhm(limit.bound(), place.reference().abs());
    double offset = place.offset().abs();
    if (offset > bound * (1 + Breaches.SLACK)) {
      return all(hz, Amount.NONE);
    }
    // A start between the bound and its tolerance is kept; then the tolerance decides.
    ChangeDisc disc = of(place, offset >= bound ? bound * (1 + Breaches.SLACK) : bound);
    double omega = 2 * Math.PI * hz;
    Amount resistance = told(disc.along(disc.beta.getReal()), !series);
    Amount reactive =
        omega == 0 ? Amount.ANY : told(disc.along(-disc.beta.getImaginary()) / omega, false);
    return new PointAllowance(
        hz, told(disc.along(disc.worstPhase()), !series), resistance, reactive);
  }

  /** An open port changes by 1 or without bound, whatever the load. */
  private static Amount withOpen(Loading bare, Limit limit) {
    if (bare.change().isUndetermined()) {
      return Amount.UNDETERMINED;
    }
    double change = bare.change().magnitude();
    boolean kept = change <= limit.bound().atMost().orElse(0) * (1 + Breaches.SLACK);
    return kept ? Amount.ANY : Amount.NONE;
  }

  private static ChangeDisc of(PlaceResponse place, double bound) {
    Complex start = place.offset().multiply(place.base());
    Complex slope = place.offset().multiply(place.slope()).add(place.effect());
    double square = bound * bound;
    Complex beta =
        start
            .conjugate()
            .multiply(slope)
            .subtract(place.base().conjugate().multiply(place.slope()).multiply(square));
    return new ChangeDisc(
        difference(bound * place.base().abs(), start.abs()),
        beta,
        difference(slope.abs(), bound * place.slope().abs()));
  }

  /** x² − y². */
  private static double difference(double x, double y) {
    return (x - y) * (x + y);
  }

  /** The largest Re(βu) of all passive loads: at the phase that meets the disc first. */
  private double worstPhase() {
    return beta.getReal() >= 0 ? beta.abs() : Math.abs(beta.getImaginary());
  }

  /** The first ρ at which the limit is broken; infinite where it never is. */
  private double along(double b) {
    double root = Math.sqrt(b * b + a * d);
    if (Double.isNaN(root)) {
      return Double.POSITIVE_INFINITY;
    }
    if (b > 0) {
      return a / (b + root);
    }
    return d > 0 ? (root - b) / d : Double.POSITIVE_INFINITY;
  }

  private static Amount told(double rho, boolean inverse) {
    if (rho == 0) {
      return Amount.NONE;
    }
    double told = inverse ? 1 / rho : rho;
    return rho < Double.POSITIVE_INFINITY && told < Double.POSITIVE_INFINITY
        ? Amount.of(told)
        : Amount.ANY;
  }

  private static PointAllowance all(double hz, Amount amount) {
    return new PointAllowance(hz, amount, amount, amount);
  }

  private static PointAllowance tighter(PointAllowance a, PointAllowance b, boolean series) {
    return new PointAllowance(
        a.hz(),
        tighter(a.magnitude(), b.magnitude(), !series),
        tighter(a.resistance(), b.resistance(), !series),
        tighter(a.reactive(), b.reactive(), false));
  }

  /** None before undetermined, that before numbers, and any last. */
  private static Amount tighter(Amount a, Amount b, boolean leastCounts) {
    if (a.isNumber() && b.isNumber()) {
      return (a.value() > b.value()) == leastCounts ? a : b;
    }
    return rank(a) <= rank(b) ? a : b;
  }

  private static int rank(Amount amount) {
    return switch (amount.state()) {
      case NONE -> 0;
      case UNDETERMINED -> 1;
      case NUMBER -> 2;
      case ANY -> 3;
    };
  }
}
