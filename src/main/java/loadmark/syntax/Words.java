package loadmark.syntax;

import java.util.Set;
import java.util.TreeSet;
import loadmark.syntax.antlr.NetworkParser;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.atn.ATN;
import org.antlr.v4.runtime.misc.IntervalSet;

/** The words of the language. */
final class Words {
  /** Ends a block; begins no statement. */
  static final String END = "end";

  static final String BLOCK = "block";

  /** Statements that a later version reads. */
  static final Set<String> LATER_STATEMENTS =
      Set.of(
          "coupling",
          "transformer",
          "amplifier",
          "transconductance",
          "line",
          "measured",
          BLOCK,
          "place",
          "use",
          "extent",
          "vary",
          "tolerance",
          "spread",
          "choose",
          "keep",
          "sampler",
          "derate");

  /** Words inside those statements; as names of values they would be ambiguous then. */
  private static final Set<String> LATER_WORDS =
      Set.of(
          "with",
          "turns",
          "gain",
          "bandwidth",
          "input",
          "output",
          "length",
          "conductance",
          "delay",
          "copper",
          "distributed",
          "sections",
          "tangent",
          "quality",
          "velocity",
          "permittivity",
          "steps",
          "trials",
          "normal",
          "sigma",
          "every",
          "acquire",
          "bits",
          "pin",
          "through",
          "shift",
          "resonance",
          "level",
          "settling");

  /** Limits that a later version reads. */
  static final Set<String> LATER_LIMITS = Set.of("resonance", "level", "settling");

  /** Statements that are read. */
  static final Set<String> STATEMENTS = statements();

  /** Statements that declare nothing, though a name may stand behind their word. */
  private static final Set<String> DECLARE_NOTHING =
      Set.of("network", "wire", "sweep", "limit", "coupling", "use", "extent", "spread", "choose");

  private Words() {}

  private static Set<String> statements() {
    ATN atn = NetworkParser._ATN;
    IntervalSet first = atn.nextTokens(atn.ruleToStartState[NetworkParser.RULE_statement]);
    Set<String> words = new TreeSet<>();
    first.toList().forEach(type -> words.add(text(type)));
    return words;
  }

  /** Whether a later version has this word. */
  static boolean isLater(String word) {
    return LATER_STATEMENTS.contains(word) || LATER_WORDS.contains(word);
  }

  /** Whether a token is a word of the language, and so no name of a value. */
  static boolean isWord(Token token) {
    return isWord(token.getType());
  }

  static boolean isWord(int type) {
    String literal = NetworkParser.VOCABULARY.getLiteralName(type);
    return literal != null && Character.isLetter(literal.charAt(1));
  }

  /** How a word or sign is written. */
  static String text(int type) {
    String literal = NetworkParser.VOCABULARY.getLiteralName(type);
    return literal == null ? "" : literal.substring(1, literal.length() - 1);
  }

  /** Whether a token may stand as a name. */
  static boolean isName(Token token) {
    int type = token.getType();
    return type == NetworkParser.NAME || type == NetworkParser.STRING || isWord(type);
  }

  /** Whether a line that begins with this token begins a statement, now or in a later version. */
  static boolean beginsStatement(Token token) {
    String text = token.getText();
    boolean unquoted = token.getType() == NetworkParser.NAME || isWord(token);
    return unquoted
        && (STATEMENTS.contains(text) || LATER_STATEMENTS.contains(text) || text.equals(END));
  }

  /** Whether a property begins with a word that a later version reads. */
  static boolean isLaterProperty(String words) {
    return words.startsWith("loss") || words.startsWith("quality");
  }

  static boolean declares(String statement) {
    return !DECLARE_NOTHING.contains(statement);
  }
}
