package loadmark.syntax;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Findings;
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
    if (!check.beginsKnownStatement(line) || !check.passes(line)) {
      return broken(line);
    }
    LineParser.Outcome<NetworkParser.LineContext> outcome = parser.parse(line, NetworkParser::line);
    outcome.slip().map(explainer::explain).ifPresent(findings::add);
    int before = findings.errorCount();
    Optional<Statement> built =
        outcome
            .read()
            .map(tree -> new StatementBuilder(places, line, findings).visit(tree.statement()));
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
        .map(tree -> new StatementBuilder(places, tokens, findings).sweep(tree.sweep()))
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

  /** Tokens that stand together: `3V3`, `+5V`, perhaps a name that wants quotes. */
  private Optional<Name> findRun(List<Token> line, int from) {
    int last = from;
    StringBuilder text = new StringBuilder(line.get(from).getText());
    while (last + 1 < line.size() && Places.adjoin(line.get(last), line.get(last + 1))) {
      last++;
      text.append(line.get(last).getText());
    }
    return last == from
        ? Optional.empty()
        : Optional.of(new Name(text.toString(), false, places.of(line.get(from), line.get(last))));
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
      } else if (!Places.adjoin(before, token)) {
        findRun(line, i).ifPresent(mentioned::add);
      }
    }
    String word = line.get(0).getText();
    boolean known = Words.beginsStatement(line.get(0));
    Optional<Name> declared =
        Words.declares(word) && line.size() > 1 && Words.isName(line.get(1))
            ? Optional.of(names.read(line.get(1)))
            : Optional.empty();
    if (!known && Words.isName(line.get(0))) {
      mentioned.add(names.read(line.get(0)));
    }
    boolean nameless = Words.declares(word) && declared.isEmpty();
    boolean told = known && (nameless || !mayHideStatements(line));
    return new Statement.Broken(told ? word : "", declared, mentioned, places.firstLine(line));
  }

  /** Whether anything may stand in the line: in a quote that is not closed, or behind a `;`. */
  private static boolean mayHideStatements(List<Token> line) {
    return line.stream()
        .anyMatch(t -> t.getType() == NetworkParser.UNCLOSED || t.getText().equals(";"));
  }
}
