package loadmark.solve;

import loadmark.equation.Law;
import org.jspecify.annotations.Nullable;

/** The laws of two-terminals at one frequency, to about 32 digits. */
final class WideLaw {
  /** Less than this part of its terms is what rounding leaves of zero. */
  static final double NOTHING = 0x1p-95;

  private static final double SMALLEST = 0x1p-200;
  private static final double LARGEST = 0x1p200;

  private final double[] values;
  private final WideComplex s;
  private final WideComplex inverse;
  private boolean inRange = true;

  WideLaw(double[] values, Frequencies s, int i) {
    this.values = values;
    this.s = new WideComplex(DoubleDouble.of(s.re()[i]), DoubleDouble.sum(s.im()[i], s.low(i)));
    inverse = this.s.inverse();
  }

  /** Whether every term so far was of a size that can be worked with. */
  boolean isInRange() {
    return inRange;
  }

  /** The admittance, S; {@code null} where it is infinite. */
  @Nullable WideComplex admittance(Law law) {
    if (law instanceof Law.Sum sum) {
      return sum.isImpedance() ? inverse(sum(sum)) : sum(sum);
    }
    return law == Law.Fixed.OPEN ? WideComplex.ZERO : null;
  }

  /** The impedance, Ω; {@code null} where it is infinite. */
  @Nullable WideComplex impedance(Law law) {
    if (law instanceof Law.Sum sum) {
      return sum.isImpedance() ? sum(sum) : inverse(sum(sum));
    }
    return law == Law.Fixed.JOINED ? WideComplex.ZERO : null;
  }

  private static @Nullable WideComplex inverse(@Nullable WideComplex of) {
    if (of == null) {
      return WideComplex.ZERO;
    }
    return of.isZero() ? null : of.inverse();
  }

  private @Nullable WideComplex sum(Law.Sum law) {
    WideComplex sum = WideComplex.ZERO;
    double terms = 0;
    for (int i = 0; i < law.elements(); i++) {
      WideComplex term = term(law, i);
      sum = sum.plus(term);
      terms += term.size();
    }
    for (int i = 0; i < law.inners(); i++) {
      WideComplex term = inverse(sum(law.inner(i)));
      if (term == null) {
        return null;
      }
      sum = sum.plus(term);
      terms += term.size();
    }
    return sum.size() <= NOTHING * terms ? WideComplex.ZERO : sum;
  }

  private WideComplex term(Law.Sum law, int i) {
    DoubleDouble value = DoubleDouble.of(values[law.element(i)]);
    DoubleDouble coefficient = law.isInverse(i) ? DoubleDouble.of(1).over(value) : value;
    WideComplex term =
        switch (law.power(i)) {
          case 0 -> new WideComplex(coefficient, DoubleDouble.ZERO);
          case 1 -> s.times(coefficient);
          default -> inverse.times(coefficient);
        };
    inRange &= term.size() >= SMALLEST && term.size() <= LARGEST;
    return term;
  }
}
