package loadmark.syntax;

import java.text.Normalizer;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import loadmark.diagnostic.SourceText;
import loadmark.syntax.antlr.NetworkLexer;
import loadmark.syntax.antlr.NetworkParser;
import org.antlr.v4.runtime.CharStreams;
import org.antlr.v4.runtime.CommonToken;
import org.antlr.v4.runtime.Token;

/**
 * Text to tokens, each with its line and column in code points. Units per metre behind a number,
 * which the lexer does not see, are settled here.
 */
final class TokenReader {
  private static final Pattern UNIT_PER_METRE = Pattern.compile("[fpnuµμmkMGT]?(Ω|ohm|H|S|F|s)");
  private static final int REPLACEMENT = 0xFFFD;

  private final SourceText source;
  private final List<Token> tokens = new ArrayList<>();

  private TokenReader(SourceText source) {
    this.source = source;
  }

  static List<Token> read(SourceText source) {
    return new TokenReader(source).read();
  }

  private List<Token> read() {
    int[] codePoints = source.text().codePoints().map(TokenReader::withoutHalves).toArray();
    NetworkLexer lexer =
        new NetworkLexer(CharStreams.fromString(new String(codePoints, 0, codePoints.length)));
    int line = 1;
    int lineStart = 0;
    int at = 0;
    int onLine = 0;
    for (Token next = lexer.nextToken(); next.getType() != Token.EOF; next = lexer.nextToken()) {
      CommonToken token = (CommonToken) next;
      for (; at < token.getStartIndex(); at++) {
        if (endsLine(codePoints, at)) {
          line++;
          lineStart = at + 1;
          onLine = 0;
        }
      }
      token.setLine(line);
      token.setCharPositionInLine(token.getStartIndex() - lineStart);
      add(token);
      if (++onLine > LineCheck.MOST_TOKENS) {
        skipLine(lexer, codePoints);
      }
    }
    return tokens;
  }

  /** What stands behind so many tokens is refused whatever it is. */
  private static void skipLine(NetworkLexer lexer, int[] text) {
    int end = lexer.getInputStream().index();
    while (end < text.length && !endsLine(text, end)) {
      end++;
    }
    lexer.getInputStream().seek(end);
  }

  private static boolean endsLine(int[] text, int at) {
    return text[at] == '\n'
        || (text[at] == '\r' && !(at + 1 < text.length && text[at + 1] == '\n'));
  }

  /** Half of a surrogate pair is no character. */
  private static int withoutHalves(int c) {
    return Character.getType(c) == Character.SURROGATE ? REPLACEMENT : c;
  }

  private void add(CommonToken token) {
    tokens.add(token);
    joinPerMetre();
  }

  /** NUMBER NAME "/" "m" without a blank behind the name: the last three are one unit. */
  private void joinPerMetre() {
    int n = tokens.size();
    if (n < 4 || !tokens.get(n - 1).getText().equals("m")) {
      return;
    }
    Token number = tokens.get(n - 4);
    CommonToken unit = (CommonToken) tokens.get(n - 3);
    Token slash = tokens.get(n - 2);
    Token metre = tokens.get(n - 1);
    boolean joined =
        (number.getType() == NetworkLexer.NUMBER || number.getType() == NetworkLexer.COMMA_NUMBER)
            && slash.getType() == NetworkLexer.DIVIDED
            && Places.adjoin(unit, slash)
            && Places.adjoin(slash, metre)
            && UNIT_PER_METRE
                .matcher(Normalizer.normalize(unit.getText(), Normalizer.Form.NFC))
                .matches();
    if (joined) {
      unit.setType(NetworkParser.PER_METRE);
      unit.setStopIndex(metre.getStopIndex());
      tokens.subList(n - 2, n).clear();
    }
  }
}
