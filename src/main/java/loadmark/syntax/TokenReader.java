package loadmark.syntax;

import java.text.Normalizer;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import loadmark.syntax.antlr.NetworkLexer;
import loadmark.syntax.antlr.NetworkParser;
import org.antlr.v4.runtime.CharStreams;
import org.antlr.v4.runtime.CommonToken;
import org.antlr.v4.runtime.Token;

/**
 * Text to tokens, each with its line and column in code points. Two things the lexer does not see
 * are settled here: a comma in place of a decimal point, and units per metre behind a number.
 */
final class TokenReader {
  private static final Pattern UNIT_PER_METRE = Pattern.compile("[fpnuµμmkMGT]?(Ω|ohm|H|S|F|s)");
  private static final int REPLACEMENT = 0xFFFD;

  private final SourceText source;
  private final Places places;
  private final Findings findings;
  private final List<Token> tokens = new ArrayList<>();

  private TokenReader(SourceText source, Findings findings) {
    this.source = source;
    this.places = new Places(source);
    this.findings = findings;
  }

  static List<Token> read(SourceText source, Findings findings) {
    return new TokenReader(source, findings).read();
  }

  private List<Token> read() {
    int[] codePoints = source.text().codePoints().map(TokenReader::withoutHalves).toArray();
    NetworkLexer lexer =
        new NetworkLexer(CharStreams.fromString(new String(codePoints, 0, codePoints.length)));
    int line = 1;
    int lineStart = 0;
    int at = 0;
    for (Token next = lexer.nextToken(); next.getType() != Token.EOF; next = lexer.nextToken()) {
      CommonToken token = (CommonToken) next;
      for (; at < token.getStartIndex(); at++) {
        if (endsLine(codePoints, at)) {
          line++;
          lineStart = at + 1;
        }
      }
      token.setLine(line);
      token.setCharPositionInLine(token.getStartIndex() - lineStart);
      add(token);
    }
    return tokens;
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
    if (token.getType() == NetworkLexer.COMMA_NUMBER) {
      String text = token.getText();
      int comma = text.indexOf(',');
      String read =
          text.substring(0, comma) + "." + text.substring(comma + 1).replaceAll("[.,].*", "");
      findings.error(
          "decimal-comma",
          places.of(token),
          "a comma in a number",
          "the decimal sign is a point: write " + Quoted.cut(read));
      token.setType(NetworkLexer.NUMBER);
      token.setText(text.substring(0, comma).contains(".") ? text.substring(0, comma) : read);
    }
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
        number.getType() == NetworkLexer.NUMBER
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
