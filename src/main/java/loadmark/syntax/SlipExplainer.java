package loadmark.syntax;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Nearest;
import loadmark.diagnostic.Severity;
import loadmark.diagnostic.Span;
import loadmark.syntax.Statement.PropertyKind;
import loadmark.syntax.antlr.NetworkParser;
import org.antlr.v4.runtime.Token;

/** Says in a user's words why a line could not be read. */
final class SlipExplainer {
  private static final Set<String> PROPERTIES =
      Arrays.stream(PropertyKind.values())
          .map(PropertyKind::words)
          .filter(words -> !Words.isLaterProperty(words))
          .collect(Collectors.toCollection(TreeSet::new));
  private static final Set<String> CRITERIA =
      Set.of(
          "change",
          "magnitude",
          "magnitude change",
          "phase",
          "phase change",
          "within",
          "parallel capacitance",
          "parallel resistance",
          "return loss");
  private static final int FEW = 3;

  private final Places places;
  private final LimitSlips limits;

  SlipExplainer(Places places) {
    this.places = places;
    this.limits = new LimitSlips(places);
  }

  Finding explain(Slip slip) {
    return limits.find(slip).orElseGet(() -> explainByRule(slip));
  }

  private Finding explainByRule(Slip slip) {
    if (slip.index() == 1 && begins(slip, "network")) {
      return title(slip);
    }
    if (slip.rule(0) == NetworkParser.RULE_name || slip.rule(0) == NetworkParser.RULE_valueName) {
      return name(slip);
    }
    if (slip.rule(0) == NetworkParser.RULE_property) {
      return property(slip);
    }
    if (slip.rule(0) == NetworkParser.RULE_criterion && !slip.expects(NetworkParser.NUMBER)) {
      return criterion(slip);
    }
    if (slip.expects(NetworkParser.NUMBER)) {
      return value(slip);
    }
    if (slip.expects(NetworkParser.JOINT) && !isStatementOver(slip)) {
      return joint(slip);
    }
    if (slip.expects(NetworkParser.EQUALS) && !slip.expects(NetworkParser.CLOSE)) {
      return finding(
          slip,
          "missing-equals",
          "`=` is missing" + beforeOf(slip),
          "write `" + slip.tokens().get(0).getText() + " NAME = …`");
    }
    if (slip.expects(Token.EOF)) {
      return leftOver(slip);
    }
    return words(slip);
  }

  private Finding title(Slip slip) {
    return finding(
        slip,
        "title-needs-quotes",
        slip.atEnd() ? "the network's title is missing" : "the network's title stands in quotes",
        "write `network \"…\"`");
  }

  private Finding name(Slip slip) {
    String due = due(slip);
    if (slip.atEnd()) {
      return finding(slip, "missing-name", due + " is missing", "");
    }
    Token token = slip.token();
    Token last = lastAdjoined(slip);
    boolean sign = token.getType() == NetworkParser.PLUS || token.getType() == NetworkParser.MINUS;
    if (token.getType() == NetworkParser.NUMBER || (sign && last != token)) {
      String text = text(slip, last);
      return finding(
          places.of(token, last),
          "name-needs-quotes",
          "a name that begins with " + (sign ? "a sign" : "a digit") + " stands in quotes",
          "write `\"" + Quoted.cut(text) + "\"`");
    }
    return finding(slip, "missing-name", due + " is missing" + beforeOf(slip), "");
  }

  private static String due(Slip slip) {
    return switch (slip.rule(1)) {
      case NetworkParser.RULE_wireItem -> "a node or a part";
      case NetworkParser.RULE_pair -> "a node";
      case NetworkParser.RULE_names -> slip.isIn(NetworkParser.RULE_scope) ? "a case" : "a load";
      case NetworkParser.RULE_scope -> "the port";
      default ->
          switch (slip.tokens().get(0).getText()) {
            case "supply" -> "the node of the supply";
            case "let" -> "the name of the value";
            default -> "the name of the " + slip.tokens().get(0).getText();
          };
    };
  }

  private Finding property(Slip slip) {
    String before = slip.tokens().get(slip.index() - 1).getText();
    if (slip.atEnd()) {
      return finding(
          slip, "missing-property", "a property is missing behind " + Quoted.of(before), known());
    }
    String text = slip.token().getText();
    if (Words.isLaterProperty(text)) {
      return finding(
          slip,
          "not-known-yet",
          Quoted.of(text) + " is not known to this version yet",
          "take it out, or use a later version");
    }
    if (slip.expects(NetworkParser.NUMBER)) {
      return value(slip);
    }
    boolean second = !before.equals(",");
    String written = second ? before + " " + text : twoWords(slip);
    Optional<String> meant =
        Nearest.find(written, PROPERTIES).or(() -> Nearest.find(text, PROPERTIES));
    return finding(
        slip,
        "unknown-property",
        "no property is called " + Quoted.of(second ? written : text),
        meant.map(word -> "did you mean `" + word + "`?").orElse(known()));
  }

  private static String known() {
    return "properties are " + String.join(", ", PROPERTIES);
  }

  private Finding criterion(Slip slip) {
    if (slip.atEnd()) {
      return finding(
          slip,
          "missing-criterion",
          "what the limit bounds is missing",
          "limits are " + String.join(", ", CRITERIA.stream().sorted().toList()));
    }
    boolean second = slip.index() > 1;
    String text = slip.token().getText();
    String written = second ? slip.tokens().get(1).getText() + " " + text : twoWords(slip);
    Optional<String> meant = Nearest.find(written, CRITERIA).or(() -> Nearest.find(text, CRITERIA));
    return finding(
        slip,
        "unknown-criterion",
        "no limit is called " + Quoted.of(second ? written : text),
        meant
            .map(word -> "did you mean `limit " + word + "`?")
            .orElse("limits are " + String.join(", ", CRITERIA.stream().sorted().toList())));
  }

  private Finding value(Slip slip) {
    if (slip.atEnd()) {
      return finding(slip, "missing-value", "a value is missing at the end", "");
    }
    Token token = slip.token();
    if (token.getType() == NetworkParser.JOINT) {
      return finding(
          slip, "missing-value", "`--` joins nodes and parts, not values", "minus is `-`");
    }
    if (Words.isWord(token)) {
      return finding(
          slip,
          "missing-value",
          "a value is missing before " + Quoted.of(token),
          Quoted.of(token) + " is a word of the language and names no value");
    }
    return finding(slip, "missing-value", "a value is missing" + beforeOf(slip), "");
  }

  private Finding joint(Slip slip) {
    if (slip.atEnd()) {
      return finding(
          slip, "missing-joint", "the second node is missing", "write two nodes: `a -- b`");
    }
    if (slip.token().getType() == NetworkParser.MINUS) {
      return finding(
          slip,
          "missing-joint",
          "nodes and parts are joined by `--`, not by `-`",
          "a name with a hyphen stands in quotes");
    }
    return finding(
        slip,
        "missing-joint",
        "`--` is missing" + beforeOf(slip),
        "nodes and parts are joined by `--`");
  }

  /** A wire may end where it may also go on; then only a name says that a joint was forgotten. */
  private static boolean isStatementOver(Slip slip) {
    if (!slip.expects(Token.EOF)) {
      return false;
    }
    Token token = slip.token();
    boolean joinable =
        Words.isName(token)
            || token.getType() == NetworkParser.MINUS
            || token.getType() == NetworkParser.NUMBER;
    return !joinable;
  }

  private Finding leftOver(Slip slip) {
    Token token = slip.token();
    if (slip.expects(NetworkParser.COMMA) && isAfterComma(slip)) {
      return finding(slip, "missing-comma", "a comma is missing" + beforeOf(slip), "");
    }
    Optional<Finding> misspelt = misspeltUnit(slip);
    if (misspelt.isPresent()) {
      return misspelt.get();
    }
    Token before = slip.tokens().get(slip.index() - 1);
    boolean loosePrefix = isUnit(slip) && before.getText().length() == 1 && Words.isName(token);
    if (loosePrefix && Nearest.find(token.getText(), expectedWords(slip)).isEmpty()) {
      String joined = before.getText() + token.getText();
      return finding(
          slip,
          "left-over",
          "prefix and unit stand together",
          "write `" + Quoted.cut(joined) + "`");
    }
    return finding(
        slip,
        "left-over",
        "the statement could end before " + Quoted.of(token) + ", which does not fit",
        didYouMean(token, expectedWords(slip)));
  }

  /** A word misspelt behind a number was taken for its unit: {@code 50 par decade}. */
  private Optional<Finding> misspeltUnit(Slip slip) {
    if (slip.index() < 2 || !isUnit(slip)) {
      return Optional.empty();
    }
    Token unit = slip.tokens().get(slip.index() - 1);
    return Nearest.find(unit.getText(), expectedWords(slip))
        .map(
            word ->
                finding(
                    places.of(unit),
                    "syntax",
                    Quoted.of(unit) + " has no meaning here",
                    "did you mean `" + word + "`?"));
  }

  private static String didYouMean(Token token, List<String> words) {
    return Nearest.find(token.getText(), words)
        .map(word -> "did you mean `" + word + "`?")
        .orElse("");
  }

  /** Whether the token before the slip was read as a number's unit. */
  private static boolean isUnit(Slip slip) {
    return slip.index() > 1
        && slip.tokens().get(slip.index() - 2).getType() == NetworkParser.NUMBER
        && slip.tokens().get(slip.index() - 1).getType() == NetworkParser.NAME;
  }

  /** Whether the word would fit if a comma stood before it. */
  private static boolean isAfterComma(Slip slip) {
    String text = slip.token().getText();
    return switch (slip.tokens().get(0).getText()) {
      case "resistor", "capacitor", "inductor", "impedance" ->
          PROPERTIES.stream().anyMatch(p -> p.equals(text) || p.startsWith(text + " "));
      case "port" -> Set.of("terminated", "driven", "mains").contains(text);
      case "case" -> Words.isName(slip.token());
      default -> false;
    };
  }

  private Finding words(Slip slip) {
    List<String> words = expectedWords(slip);
    List<String> quoted = words.stream().map(Quoted::of).toList();
    String due = words.size() <= FEW ? String.join(" or ", quoted) : "something";
    if (slip.atEnd()) {
      return finding(slip, "syntax", due + " is missing at the end", "");
    }
    return misspeltUnit(slip)
        .orElseGet(
            () ->
                finding(
                    slip,
                    "syntax",
                    due + " is missing" + beforeOf(slip),
                    didYouMean(slip.token(), words)));
  }

  /** The words that could have stood, and where there are none the signs. */
  private static List<String> expectedWords(Slip slip) {
    List<String> words = new ArrayList<>();
    List<String> signs = new ArrayList<>();
    for (int type : slip.expected().toList()) {
      if (Words.isWord(type)) {
        words.add(Words.text(type));
      } else if (type == NetworkParser.COMMA || type == NetworkParser.CLOSE) {
        signs.add(Words.text(type));
      }
    }
    return words.isEmpty() ? signs : words;
  }

  private static String twoWords(Slip slip) {
    String text = slip.token().getText();
    int next = slip.index() + 1;
    return next < slip.tokens().size() && Words.isName(slip.tokens().get(next))
        ? text + " " + slip.tokens().get(next).getText()
        : text;
  }

  /** The last of the tokens that follow without a blank. */
  private static Token lastAdjoined(Slip slip) {
    Token last = slip.token();
    for (int i = slip.index() + 1; i < slip.tokens().size(); i++) {
      Token next = slip.tokens().get(i);
      boolean part = Words.isName(next) || next.getType() == NetworkParser.NUMBER;
      if (!part || !Places.adjoin(last, next)) {
        break;
      }
      last = next;
    }
    return last;
  }

  private static String text(Slip slip, Token last) {
    StringBuilder text = new StringBuilder();
    for (int i = slip.index(); i < slip.tokens().size(); i++) {
      text.append(slip.tokens().get(i).getText());
      if (slip.tokens().get(i) == last) {
        break;
      }
    }
    return text.toString();
  }

  private static boolean begins(Slip slip, String word) {
    return slip.tokens().get(0).getText().equals(word);
  }

  private static String beforeOf(Slip slip) {
    return slip.atEnd() ? "" : " before " + Quoted.of(slip.token());
  }

  private Finding finding(Slip slip, String code, String message, String hint) {
    Span place = slip.atEnd() ? places.after(slip.token()) : places.of(slip.token());
    return finding(place, code, message, hint);
  }

  private static Finding finding(Span place, String code, String message, String hint) {
    Optional<String> any = hint.isEmpty() ? Optional.empty() : Optional.of(hint);
    return new Finding(Severity.ERROR, code, place, message, any);
  }
}
