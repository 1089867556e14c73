package loadmark.syntax;

import java.util.List;
import loadmark.diagnostic.SourceText;
import loadmark.diagnostic.Span;
import org.antlr.v4.runtime.ParserRuleContext;
import org.antlr.v4.runtime.Token;

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
