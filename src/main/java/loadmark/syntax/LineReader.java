package loadmark.syntax;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;
import loadmark.syntax.antlr.NetworkParser;
import org.antlr.v4.runtime.Token;

/** One line's tokens to a statement. */
final class LineReader {
  private static final Set<String> CRITERIA =
      Set.of("change", "magnitude", "phase", "within", "parallel", "return");

  private final Places places;
  private final Findings findings;
  private final LineCheck check;
  private final LineParser parser = new LineParser();
  private final SlipExplainer explainer;

  LineReader(Places places, Findings findings) {
    this.places = places;
    this.findings = findings;
    this.check = new LineCheck(places, findings);
    this.explainer = new SlipExplainer(places);
  }

  /** Whether a token may follow the word {@code limit}. */
  static boolean isCriterion(Token token) {
    return CRITERIA.contains(token.getText()) || Words.LATER_LIMITS.contains(token.getText());
  }

  Statement read(List<Token> line) {
    Span span = places.firstLine(line);
    if (!check.beginsKnownStatement(line) || !check.passes(line)) {
      return broken(line);
    }
    LineParser.Outcome<NetworkParser.LineContext> outcome = parser.parse(line, NetworkParser::line);
    outcome.slip().map(explainer::explain).ifPresent(findings::add);
    int before = findings.errorCount();
    Optional<Statement> built =
        outcome
            .read()
            .map(tree -> new StatementBuilder(places, span, findings).visit(tree.statement()));
    return findings.errorCount() > before ? broken(line) : built.orElseGet(() -> broken(line));
  }

  /** A block and all that is in it. */
  Statement refuse(List<Token> block) {
    check.notKnownYet(block.get(0));
    return broken(block);
  }

  Optional<Statement.Sweep> readSweep(List<Token> tokens) {
    int before = findings.errorCount();
    return read(tokens, NetworkParser::sweepOption)
        .map(
            tree ->
                new StatementBuilder(places, places.firstLine(tokens), findings)
                    .sweep(tree.sweep()))
        .filter(sweep -> findings.errorCount() == before);
  }

  Optional<List<Expression>> readValues(List<Token> tokens) {
    int before = findings.errorCount();
    ExpressionBuilder builder = new ExpressionBuilder(places, findings);
    return read(tokens, NetworkParser::valueList)
        .map(tree -> tree.expression().stream().map(builder::build).toList())
        .filter(values -> findings.errorCount() == before);
  }

  private <T> Optional<T> read(
      List<Token> tokens, java.util.function.Function<NetworkParser, T> rule) {
    if (!check.passes(tokens)) {
      return Optional.empty();
    }
    LineParser.Outcome<T> outcome = parser.parse(tokens, rule);
    outcome.slip().map(explainer::explain).ifPresent(findings::add);
    return outcome.read();
  }

  /** What can be told about a line that is not read. */
  Statement.Broken broken(List<Token> line) {
    NameReader names = new NameReader(places);
    List<Name> mentioned = new ArrayList<>();
    for (int i = 1; i < line.size(); i++) {
      Token token = line.get(i);
      Token before = line.get(i - 1);
      boolean unit = before.getType() == NetworkParser.NUMBER;
      if (Words.isName(token) && !unit) {
        mentioned.add(names.read(token));
      } else if (unit && Places.adjoin(before, token)) {
        // `3V3`: perhaps a name that wants quotes.
        mentioned.add(
            new Name(before.getText() + token.getText(), false, places.of(before, token)));
      }
    }
    String word = line.get(0).getText();
    boolean known = Words.beginsStatement(line.get(0));
    Optional<Name> declared =
        Words.declares(word) && line.size() > 1 && Words.isName(line.get(1))
            ? Optional.of(names.read(line.get(1)))
            : Optional.empty();
    return new Statement.Broken(known ? word : "", declared, mentioned, places.firstLine(line));
  }
}
