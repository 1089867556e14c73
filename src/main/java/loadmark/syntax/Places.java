package loadmark.syntax;

import java.util.List;
import loadmark.diagnostic.SourceText;
import loadmark.diagnostic.Span;
import org.antlr.v4.runtime.ParserRuleContext;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.misc.Interval;

/** Where tokens stand in a source. Their lines and columns were set by {@link TokenReader}. */
record Places(SourceText source) {

  Span of(Token token) {
    return new Span(source, token.getLine(), column(token), length(token));
  }

  Span of(Token first, Token last) {
    return of(first).to(of(last));
  }

  Span of(ParserRuleContext context) {
    return of(context.getStart(), context.getStop());
  }

  /** A statement's tokens as far as they stand on its first line. */
  Span firstLine(List<Token> tokens) {
    Token first = tokens.get(0);
    Token last = first;
    for (Token token : tokens) {
      if (token.getLine() != first.getLine()) {
        break;
      }
      last = token;
    }
    return of(first, last);
  }

  /** The empty place behind a token. */
  Span after(Token token) {
    return new Span(source, token.getLine(), column(token) + length(token), 0);
  }

  /**
   * The text of some tokens as it stands, with line ends and comments between them made a blank.
   */
  static String text(List<Token> tokens) {
    StringBuilder text = new StringBuilder();
    Token before = tokens.get(0);
    for (Token token : tokens) {
      if (token != before) {
        int from = before.getStopIndex() + 1;
        int to = token.getStartIndex() - 1;
        boolean sameLine = token.getLine() == before.getLine();
        boolean apart = from <= to;
        text.append(
            !apart ? "" : sameLine ? token.getInputStream().getText(Interval.of(from, to)) : " ");
      }
      text.append(token.getText());
      before = token;
    }
    return text.toString();
  }

  /** Whether nothing stands between the two. */
  static boolean adjoin(Token first, Token second) {
    return first.getStopIndex() + 1 == second.getStartIndex();
  }

  private static int column(Token token) {
    return token.getCharPositionInLine() + 1;
  }

  private static int length(Token token) {
    return token.getStopIndex() - token.getStartIndex() + 1;
  }
}
