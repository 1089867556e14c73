package loadmark.syntax;

import org.antlr.v4.runtime.Token;

/** Pieces of the user's text as they stand in a message. */
final class Quoted {
  private static final int MOST = 32;

  private Quoted() {}

  static String of(Token token) {
    return of(token.getText());
  }

  static String of(String text) {
    return "`" + cut(text) + "`";
  }

  /** The text itself, shortened where it is long. */
  static String cut(String text) {
    return text.codePointCount(0, text.length()) <= MOST
        ? text
        : text.substring(0, text.offsetByCodePoints(0, MOST)) + "…";
  }
}
