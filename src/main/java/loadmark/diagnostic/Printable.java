package loadmark.diagnostic;

/**
 * Text of the user's, made safe to show: nothing in it can steer a terminal or turn lines round.
 */
public final class Printable {
  private static final int CONTROL_PICTURES = 0x2400;
  private static final int PICTURE_OF_DELETE = 0x2421;
  private static final int REPLACEMENT = 0xFFFD;

  private Printable() {}

  /**
   * The text with a visible sign in place of each control and format character; code points keep
   * their count. A tab stays.
   */
  public static String of(String text) {
    StringBuilder safe = new StringBuilder(text.length());
    text.codePoints().map(Printable::shown).forEach(safe::appendCodePoint);
    return safe.toString();
  }

  private static int shown(int c) {
    if (c == '\t') {
      return c;
    }
    if (c < ' ') {
      return CONTROL_PICTURES + c;
    }
    if (c == 0x7F) {
      return PICTURE_OF_DELETE;
    }
    return switch (Character.getType(c)) {
      case Character.CONTROL,
          Character.FORMAT,
          Character.SURROGATE,
          Character.LINE_SEPARATOR,
          Character.PARAGRAPH_SEPARATOR ->
          REPLACEMENT;
      default -> c;
    };
  }
}
