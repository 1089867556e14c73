package loadmark.report;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loadmark.judge.Worst;
import loadmark.network.Bound;
import loadmark.network.Limit;
import loadmark.quantity.Engineering;

/** A limit's bound and values, for people. */
final class Values {
  /** Doubles have no more digits than these. */
  private static final int MOST_DIGITS = 17;

  /** How far past its bound a value still keeps it, relative: the tolerance of every limit. */
  private static final double TOUCHING = 1e-9;

  static final String UNBOUNDED = "without bound";

  private Values() {}

  /** The worst value as a limit counts it; for a limit in percent or ohm both, apart by a comma. */
  static String worst(Limit limit, Worst worst) {
    Bound bound = limit.bound();
    if (Unit.inOhmAlone(limit)) {
      return value(Unit.OHM, worst.valueOhm(), OptionalDouble.empty(), bound.atMostOhm());
    }
    String value = value(Unit.of(limit), worst.value(), bound.atLeast(), bound.atMost());
    return bound.atMostOhm().isPresent()
        ? value
            + " and "
            + value(Unit.OHM, worst.valueOhm(), OptionalDouble.empty(), bound.atMostOhm())
        : value;
  }

  /** The worst value; for a limit in percent or ohm the one that is nearer to being kept. */
  static String easierWorst(Limit limit, Worst worst) {
    Bound bound = limit.bound();
    if (bound.atMost().isEmpty() || bound.atMostOhm().isEmpty()) {
      return worst(limit, worst);
    }
    double relative = part(worst.value(), bound.atMost().getAsDouble());
    double ohm = part(worst.valueOhm(), bound.atMostOhm().getAsDouble());
    return ohm < relative
        ? value(Unit.OHM, worst.valueOhm(), OptionalDouble.empty(), bound.atMostOhm())
        : value(Unit.of(limit), worst.value(), bound.atLeast(), bound.atMost());
  }

  /** The share of the bound; a value without bound is past any. */
  private static double part(OptionalDouble value, double bound) {
    return value.isEmpty() ? Double.POSITIVE_INFINITY : value.getAsDouble() / bound;
  }

  private static String value(
      Unit unit, OptionalDouble value, OptionalDouble atLeast, OptionalDouble atMost) {
    return value.isEmpty()
        ? UNBOUNDED
        : unit.write(value.getAsDouble(), digits(value.getAsDouble(), atLeast, atMost));
  }

  /** The fewest digits, four or more, with which a value stands on its own side of its bounds. */
  static int digits(double value, OptionalDouble atLeast, OptionalDouble atMost) {
    BigDecimal exact = Unit.decimal(value);
    for (int digits = Engineering.DEFAULT_DIGITS; digits < MOST_DIGITS; digits++) {
      BigDecimal shown = Unit.rounded(exact, digits);
      if (agree(value, shown, atMost, 1) && agree(value, shown, atLeast, -1)) {
        return digits;
      }
    }
    return Math.max(Engineering.DEFAULT_DIGITS, exact.stripTrailingZeros().precision());
  }

  private static boolean agree(
      double value, BigDecimal shown, OptionalDouble bound, int direction) {
    if (bound.isEmpty()) {
      return true;
    }
    double limit = bound.getAsDouble();
    boolean past = direction * (value - limit) > TOUCHING * Math.abs(limit);
    boolean shownPast = direction * shown.compareTo(Unit.decimal(limit)) > 0;
    return past == shownPast;
  }

  /** {@code at most 2 % or 5 Ω}. */
  static String bound(Limit limit) {
    return bound(limit, "at most ", "at least ");
  }

  /** {@code ≤ 2 % or 5 Ω}. */
  static String shortBound(Limit limit) {
    return bound(limit, "≤ ", "≥ ");
  }

  private static String bound(Limit limit, String atMost, String atLeast) {
    Bound bound = limit.bound();
    Unit unit = Unit.of(limit);
    if (bound.atLeast().isPresent() && bound.atMost().isPresent()) {
      return unit.writeShort(bound.atLeast().getAsDouble(), Unit.MOST_BOUND_DIGITS)
          + " to "
          + unit.writeShort(bound.atMost().getAsDouble(), Unit.MOST_BOUND_DIGITS);
    }
    if (bound.atLeast().isPresent()) {
      return atLeast + unit.writeShort(bound.atLeast().getAsDouble(), Unit.MOST_BOUND_DIGITS);
    }
    List<String> either = new ArrayList<>();
    bound.atMost().ifPresent(most -> either.add(unit.writeShort(most, Unit.MOST_BOUND_DIGITS)));
    bound
        .atMostOhm()
        .ifPresent(most -> either.add(Unit.OHM.writeShort(most, Unit.MOST_BOUND_DIGITS)));
    return atMost + String.join(" or ", either);
  }
}
