package loadmark.syntax;

import java.util.ArrayDeque;
import java.util.Collection;
import java.util.Deque;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.syntax.antlr.NetworkParser;
import org.antlr.v4.runtime.CommonToken;
import org.antlr.v4.runtime.Token;

/** What is found in the tokens of a line before the grammar is asked. */
final class LineCheck {
  /** Brackets in brackets. */
  static final int MOST_DEPTH = 200;

  /** Operators in one statement; what follows may go as deep as their chain is long. */
  static final int MOST_OPERATORS = 200;

  /** Tokens in one statement. */
  static final int MOST_TOKENS = 100_000;

  /** Characters in a name, number or quoted text. */
  static final int MOST_CHARACTERS = 1000;

  private static final Set<Integer> OPERATORS =
      Set.of(
          NetworkParser.PARALLEL,
          NetworkParser.PLUS,
          NetworkParser.MINUS,
          NetworkParser.TIMES,
          NetworkParser.DIVIDED,
          NetworkParser.POWER,
          NetworkParser.PLUS_MINUS);

  private static final Set<String> ALL_STATEMENTS =
      Stream.of(Words.STATEMENTS, Words.LATER_STATEMENTS)
          .flatMap(Set::stream)
          .collect(Collectors.toCollection(TreeSet::new));

  private final Places places;
  private final Findings findings;

  LineCheck(Places places, Findings findings) {
    this.places = places;
    this.findings = findings;
  }

  /** Whether the line may go to the grammar; if not there is one finding on it. */
  boolean passes(List<Token> line) {
    if (line.size() > MOST_TOKENS) {
      findings.error(
          "too-long", places.of(line.get(MOST_TOKENS)), "the statement is too long from here on");
      return false;
    }
    readCommas(line);
    return tokensAreWhole(line) && bracketsClose(line);
  }

  /** A comma in place of a decimal point is reported, then read as one. */
  private void readCommas(List<Token> line) {
    for (Token token : line) {
      if (token.getType() == NetworkParser.COMMA_NUMBER) {
        String text = token.getText();
        String whole = text.substring(0, text.indexOf(','));
        String read = whole + "." + text.substring(whole.length() + 1).replaceAll("[.,].*", "");
        findings.error(
            "decimal-comma",
            places.of(token),
            "a comma in a number",
            "the decimal sign is a point: write " + Quoted.cut(read));
        CommonToken number = (CommonToken) token;
        number.setType(NetworkParser.NUMBER);
        number.setText(whole.contains(".") ? whole : read);
      }
    }
  }

  private boolean tokensAreWhole(List<Token> line) {
    int operators = 0;
    for (Token token : line) {
      if (token.getType() == NetworkParser.UNCLOSED) {
        findings.error(
            "unclosed-quote",
            places.of(token),
            "the closing quote is missing",
            "a quoted text ends with `\"` on the line where it begins");
        return false;
      }
      if (token.getType() == NetworkParser.UNKNOWN) {
        unknown(token);
        return false;
      }
      if (token.getStopIndex() - token.getStartIndex() >= MOST_CHARACTERS) {
        findings.error(
            "too-long",
            places.of(token),
            "a name, number or text of more than " + MOST_CHARACTERS + " characters");
        return false;
      }
      if (OPERATORS.contains(token.getType()) && ++operators > MOST_OPERATORS) {
        findings.error(
            "too-long",
            places.of(token),
            "more than " + MOST_OPERATORS + " operators in one statement",
            "name parts of it with `let`");
        return false;
      }
    }
    return true;
  }

  private void unknown(Token token) {
    String hint =
        switch (token.getText()) {
          case "–", "—" -> "nodes and parts are joined by two hyphens, `--`; a minus is `-`";
          case "“", "”", "„", "«", "»", "'", "‘", "’" -> "quotes are straight and double: `\"`";
          case "|" -> "in parallel is written `||`";
          case ";" -> "each statement stands on its own line; items are parted by commas";
          case "×", "·" -> "times is written `*`";
          case "$", "@", "!", "&", "~", ":" -> "a name with other signs stands in quotes: `\"…\"`";
          default -> "";
        };
    String message = Quoted.of(token) + " has no meaning here";
    if (hint.isEmpty()) {
      findings.error("unknown-character", places.of(token), message);
    } else {
      findings.error("unknown-character", places.of(token), message, hint);
    }
  }

  private boolean bracketsClose(List<Token> line) {
    Deque<Token> open = new ArrayDeque<>();
    for (Token token : line) {
      if (token.getType() == NetworkParser.OPEN) {
        open.push(token);
        if (open.size() > MOST_DEPTH) {
          findings.error(
              "too-deep",
              places.of(token),
              "more than " + MOST_DEPTH + " brackets within each other");
          return false;
        }
      } else if (token.getType() == NetworkParser.CLOSE && open.poll() == null) {
        findings.error("unopened-bracket", places.of(token), "this bracket was never opened");
        return false;
      }
    }
    if (!open.isEmpty()) {
      findings.error(
          "unclosed-bracket", places.of(open.pop()), "this bracket is never closed", "add `)`");
      return false;
    }
    return true;
  }

  /** Whether the first word begins a statement that is read; if not there is one finding. */
  boolean beginsKnownStatement(List<Token> line) {
    Token first = line.get(0);
    String text = first.getText();
    boolean unquoted = first.getType() != NetworkParser.STRING;
    if (unquoted && Words.STATEMENTS.contains(text) && !isLaterLimit(line)) {
      return true;
    }
    if (unquoted && (Words.LATER_STATEMENTS.contains(text) || isLaterLimit(line))) {
      Token word = isLaterLimit(line) ? line.get(1) : first;
      notKnownYet(word);
    } else if (unquoted && text.equals(Words.END)) {
      findings.error("unopened-block", places.of(first), "no block is open here");
    } else {
      unknownStatement(first);
    }
    return false;
  }

  private static boolean isLaterLimit(List<Token> line) {
    return line.size() > 1
        && line.get(0).getText().equals("limit")
        && Words.LATER_LIMITS.contains(line.get(1).getText());
  }

  void notKnownYet(Token word) {
    findings.error(
        "not-known-yet",
        places.of(word),
        Quoted.of(word) + " is not known to this version yet",
        "take it out, or use a later version");
  }

  private void unknownStatement(Token first) {
    if (!Words.isName(first) || first.getType() == NetworkParser.STRING) {
      findings.error(
          "unknown-statement",
          places.of(first),
          "a statement begins with its word, not with " + Quoted.of(first),
          "such as `resistor`, `wire` or `load`");
      return;
    }
    findings.error(
        "unknown-statement",
        places.of(first),
        "no statement is called " + Quoted.of(first),
        suggestion(first.getText(), ALL_STATEMENTS));
  }

  private static String suggestion(String text, Collection<String> words) {
    return Nearest.find(text, words)
        .map(word -> "did you mean `" + word + "`?")
        .orElse("known are " + String.join(", ", new TreeSet<>(words)));
  }
}
