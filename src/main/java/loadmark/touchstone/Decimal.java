package loadmark.touchstone;

/** Reads decimal numbers as doubles, correctly rounded. */
final class Decimal {
  /** Exponents of more characters are beyond doubles whatever they are multiplied by. */
  private static final int MOST_EXPONENT_LENGTH = 8;

  private Decimal() {}

  /**
   * The number times a power of ten, rounded once.
   *
   * @return not a number where the text is none; infinite where it is too large for a double, or
   *     too small and not zero
   */
  static double parse(String text, int tenfold) {
    int mantissaEnd = mantissaEnd(text);
    if (mantissaEnd < 0 || !isExponent(text, mantissaEnd)) {
      return Double.NaN;
    }
    double value = Double.parseDouble(shifted(text, mantissaEnd, tenfold));
    return value == 0 && hasDigitPastZero(text, mantissaEnd) ? Double.POSITIVE_INFINITY : value;
  }

  /** Sign, digits and a point; negative where there is no digit. */
  private static int mantissaEnd(String text) {
    int i = signEnd(text, 0);
    boolean point = false;
    boolean digits = false;
    for (; i < text.length(); i++) {
      char c = text.charAt(i);
      if (c == '.' && !point) {
        point = true;
      } else if (isDigit(c)) {
        digits = true;
      } else {
        break;
      }
    }
    return digits ? i : -1;
  }

  private static boolean isExponent(String text, int from) {
    if (from == text.length()) {
      return true;
    }
    int digits = signEnd(text, from + 1);
    return (text.charAt(from) == 'e' || text.charAt(from) == 'E')
        && digits < text.length()
        && text.chars().skip(digits).allMatch(Decimal::isDigit);
  }

  private static int signEnd(String text, int from) {
    boolean sign = from < text.length() && (text.charAt(from) == '+' || text.charAt(from) == '-');
    return sign ? from + 1 : from;
  }

  private static boolean isDigit(int c) {
    return c >= '0' && c <= '9';
  }

  private static String shifted(String text, int mantissaEnd, int tenfold) {
    int exponentLength = text.length() - mantissaEnd - 1;
    if (tenfold == 0 || exponentLength > MOST_EXPONENT_LENGTH) {
      return text;
    }
    int exponent =
        exponentLength < 0 ? 0 : Integer.parseInt(text, mantissaEnd + 1, text.length(), 10);
    return text.substring(0, mantissaEnd) + 'e' + (exponent + tenfold);
  }

  private static boolean hasDigitPastZero(String text, int end) {
    return text.substring(0, end).chars().anyMatch(c -> c >= '1' && c <= '9');
  }
}
