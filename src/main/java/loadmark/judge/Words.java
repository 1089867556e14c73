package loadmark.judge;

import java.math.BigDecimal;
import java.math.MathContext;

/** For people, in a few words. */
final class Words {
  private static final MathContext SHORT = new MathContext(6);

  private Words() {}

  static String frequency(double hz) {
    return new BigDecimal(hz).round(SHORT).stripTrailingZeros().toPlainString() + " Hz";
  }

  /** Why nothing is known of a sample, or not enough, and where. */
  static String doubt(Sample sample) {
    return why(sample.reading()) + (sample.hz() == 0 ? " at DC" : " at " + frequency(sample.hz()));
  }

  private static String why(Reading reading) {
    if (reading instanceof Reading.Unknown unknown) {
      return unknown.why();
    }
    Spread spread = ((Reading.Known) reading).spread();
    int digits = (int) Math.floor(-Math.log10(Math.max(spread.up(), Double.MIN_NORMAL)));
    String known =
        digits < 1 ? "to no digit" : digits == 1 ? "to 1 digit" : "to " + digits + " digits";
    return "too near its bound to tell: known only " + known;
  }
}
