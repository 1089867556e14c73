package loadmark.report;

import loadmark.diagnostic.Printable;

/** Text that others wrote, made safe to show, and measured in columns. */
final class Visible {
  private static final String CUT = "…";
  private static final char PICTURE_OF_TAB = '\u2409';

  private Visible() {}

  /** With a sign in place of everything that could steer a terminal. */
  static String of(String text) {
    return Printable.of(text).replace('\t', PICTURE_OF_TAB);
  }

  /** Columns that a terminal gives it: two for wide East Asian characters, none for marks. */
  static int width(String text) {
    return text.codePoints().map(Visible::width).sum();
  }

  private static int width(int c) {
    if (c < 0x300) {
      return 1;
    }
    int type = Character.getType(c);
    if (type == Character.NON_SPACING_MARK || type == Character.ENCLOSING_MARK) {
      return 0;
    }
    boolean wide =
        (0x1100 <= c && c <= 0x115F)
            || (0x2E80 <= c && c <= 0xA4CF)
            || (0xAC00 <= c && c <= 0xD7A3)
            || (0xF900 <= c && c <= 0xFAFF)
            || (0xFE30 <= c && c <= 0xFE6F)
            || (0xFF00 <= c && c <= 0xFF60)
            || (0xFFE0 <= c && c <= 0xFFE6)
            || (0x1F300 <= c && c <= 0x1F64F)
            || (0x1F900 <= c && c <= 0x1F9FF)
            || (0x20000 <= c && c <= 0x3FFFD);
    return wide ? 2 : 1;
  }

  /** At most {@code columns} wide; what is too long loses its middle. */
  static String cut(String text, int columns) {
    if (width(text) <= columns) {
      return text;
    }
    int[] points = text.codePoints().toArray();
    int tail = (columns - 1) / 3;
    int end = points.length;
    for (int used = 0; end > 0 && used + width(points[end - 1]) <= tail; end--) {
      used += width(points[end - 1]);
    }
    int begin = prefix(points, columns - 1 - tail);
    return new String(points, 0, begin) + CUT + new String(points, end, points.length - end);
  }

  /** How many of the first characters fit. */
  private static int prefix(int[] points, int columns) {
    int used = 0;
    int count = 0;
    while (count < points.length && used + width(points[count]) <= columns) {
      used += width(points[count++]);
    }
    return count;
  }

  /** The first {@code columns} columns at most, as a count of chars. */
  static int fitting(String text, int columns) {
    int[] points = text.codePoints().toArray();
    return text.offsetByCodePoints(0, prefix(points, columns));
  }

  static String pad(String text, int columns) {
    return text + " ".repeat(Math.max(0, columns - width(text)));
  }

  static String padLeft(String text, int columns) {
    return " ".repeat(Math.max(0, columns - width(text))) + text;
  }
}
