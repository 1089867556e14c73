package loadmark.syntax;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.syntax.antlr.NetworkParser;
import org.antlr.v4.runtime.Token;

/**
 * Cuts tokens into statements: one a line, going on with the next line while a line ends in a sign
 * that joins, or while a bracket is open. A line that begins a statement ends what was left open
 * before it.
 */
final class LineJoiner {
  private static final Set<Integer> JOINING =
      Set.of(
          NetworkParser.JOINT,
          NetworkParser.PARALLEL,
          NetworkParser.EQUALS,
          NetworkParser.COMMA,
          NetworkParser.PLUS_MINUS,
          NetworkParser.PLUS,
          NetworkParser.MINUS,
          NetworkParser.TIMES,
          NetworkParser.DIVIDED,
          NetworkParser.POWER);

  private static final Set<Integer> BEHIND_WORD =
      Set.of(NetworkParser.NUMBER, NetworkParser.EQUALS);

  /** What follows the name in the first statements' words, where that name is a word itself. */
  private static final Set<String> BEHIND_NAME = Set.of("=", "--", ".", "shunt", "series");

  private final List<Token> tokens;
  private final Places places;
  private final Findings findings;
  private final List<List<Token>> lines = new ArrayList<>();
  private int openBrackets;

  private LineJoiner(List<Token> tokens, Places places, Findings findings) {
    this.tokens = tokens;
    this.places = places;
    this.findings = findings;
  }

  static List<List<Token>> join(List<Token> tokens, Places places, Findings findings) {
    return new LineJoiner(tokens, places, findings).join();
  }

  private List<List<Token>> join() {
    int start = 0;
    for (int i = 0; i < tokens.size(); i++) {
      if (i > start && startsLine(i) && !goesOn(i)) {
        lines.add(tokens.subList(start, i));
        start = i;
        openBrackets = 0;
      }
      countBracket(tokens.get(i));
    }
    if (start < tokens.size()) {
      lines.add(tokens.subList(start, tokens.size()));
    }
    return lines;
  }

  private boolean startsLine(int i) {
    return tokens.get(i).getLine() != tokens.get(i - 1).getLine();
  }

  private void countBracket(Token token) {
    if (token.getType() == NetworkParser.OPEN) {
      openBrackets++;
    } else if (token.getType() == NetworkParser.CLOSE) {
      openBrackets = Math.max(0, openBrackets - 1);
    }
  }

  /** Whether the line that begins with this token goes on with the statement before it. */
  private boolean goesOn(int i) {
    Token first = tokens.get(i);
    if (openBrackets > 0) {
      return !Words.beginsStatement(first);
    }
    if (JOINING.contains(tokens.get(i - 1).getType())) {
      return !isPlainlyStatement(i);
    }
    if (JOINING.contains(first.getType())) {
      findings.error(
          "line-break",
          places.of(first),
          "a line begins with " + Quoted.of(first),
          "the sign that joins two lines stands at the end of the first one");
      return true;
    }
    return false;
  }

  /** A word alone may be the name of a node or load that was due; what follows tells. */
  private boolean isPlainlyStatement(int i) {
    if (!Words.beginsStatement(tokens.get(i)) || i + 1 >= tokens.size()) {
      return false;
    }
    Token next = tokens.get(i + 1);
    if (next.getLine() != tokens.get(i).getLine()) {
      return false;
    }
    if (!Words.isWord(next)) {
      return Words.isName(next) || BEHIND_WORD.contains(next.getType());
    }
    return switch (tokens.get(i).getText()) {
      case "limit" -> LineReader.isCriterion(next);
      case "sweep" -> next.getText().equals("dc");
      default -> i + 2 < tokens.size() && BEHIND_NAME.contains(tokens.get(i + 2).getText());
    };
  }
}
