package loadmark.syntax;

import java.util.List;
import loadmark.diagnostic.Findings;
import loadmark.syntax.Statement.Criterion;
import loadmark.syntax.Statement.ScopeItem;
import loadmark.syntax.Statement.Window;
import loadmark.syntax.antlr.NetworkParser.AtContext;
import loadmark.syntax.antlr.NetworkParser.ChangeContext;
import loadmark.syntax.antlr.NetworkParser.CriterionContext;
import loadmark.syntax.antlr.NetworkParser.ForCasesContext;
import loadmark.syntax.antlr.NetworkParser.FromToContext;
import loadmark.syntax.antlr.NetworkParser.MagnitudeContext;
import loadmark.syntax.antlr.NetworkParser.ParallelContext;
import loadmark.syntax.antlr.NetworkParser.PhaseContext;
import loadmark.syntax.antlr.NetworkParser.PointContext;
import loadmark.syntax.antlr.NetworkParser.ReturnLossContext;
import loadmark.syntax.antlr.NetworkParser.ScopeContext;
import loadmark.syntax.antlr.NetworkParser.WindowContext;
import loadmark.syntax.antlr.NetworkParser.WithinContext;

/** Parse tree of a limit to its records. */
final class LimitBuilder {
  private final StatementBuilder statements;
  private final ExpressionBuilder expressions;
  private final NameReader names;
  private final Places places;
  private final Findings findings;

  LimitBuilder(
      StatementBuilder statements,
      ExpressionBuilder expressions,
      Places places,
      Findings findings) {
    this.statements = statements;
    this.expressions = expressions;
    this.names = new NameReader(places);
    this.places = places;
    this.findings = findings;
  }

  Criterion criterion(CriterionContext criterion) {
    if (criterion instanceof ChangeContext c) {
      return new Criterion.Change(expressions.build(c.bound), expressions.buildIfAny(c.other));
    }
    if (criterion instanceof MagnitudeContext c) {
      return c.window() == null
          ? new Criterion.MagnitudeChange(expressions.build(c.expression()))
          : new Criterion.Magnitude(window(c.window()));
    }
    if (criterion instanceof PhaseContext c) {
      return c.window() == null
          ? new Criterion.PhaseChange(expressions.build(c.expression()))
          : new Criterion.Phase(window(c.window()));
    }
    if (criterion instanceof WithinContext c) {
      return new Criterion.Within(
          expressions.build(c.first),
          expressions.buildIfAny(c.second),
          expressions.build(c.reference));
    }
    if (criterion instanceof ParallelContext c) {
      Window window = window(c.window());
      return StatementBuilder.has(c, "capacitance")
          ? new Criterion.ParallelCapacitance(window)
          : new Criterion.ParallelResistance(window);
    }
    ReturnLossContext c = (ReturnLossContext) criterion;
    return new Criterion.ReturnLoss(expressions.build(c.bound), expressions.build(c.reference));
  }

  private Window window(WindowContext c) {
    if (c.side != null) {
      Expression bound = expressions.build(c.expression(0));
      return c.side.getText().equals("above") ? new Window.Above(bound) : new Window.Below(bound);
    }
    Expression from = expressions.build(c.from);
    if (c.to != null) {
      return new Window.Between(from, expressions.build(c.to));
    }
    if (from instanceof Expression.Toleranced around) {
      return new Window.Around(around);
    }
    if (from instanceof Expression.Operation difference
        && difference.operator() == Expression.Operator.MINUS) {
      String window =
          ExpressionText.of(difference.left()) + " to " + ExpressionText.of(difference.right());
      findings.error(
          "missing-bound",
          difference.operatorSpan(),
          "the ends of a window are joined by `to`",
          "write " + Quoted.of(window));
      return new Window.Between(difference.left(), difference.right());
    }
    findings.error(
        "missing-bound",
        places.after(c.getStop()),
        "one value bounds nothing: the other end is missing",
        "write `45 Ω to 55 Ω`, `50 Ω ± 10 %`, `above 45 Ω` or `below 55 Ω`");
    return new Window.Between(from, from);
  }

  ScopeItem scope(ScopeContext scope) {
    if (scope instanceof FromToContext c) {
      return new ScopeItem.FromTo(statements.range(c.range()), places.of(c));
    }
    if (scope instanceof ForCasesContext c) {
      return new ScopeItem.ForCases(names.read(c.names()), places.of(c));
    }
    AtContext c = (AtContext) scope;
    if (c.name() != null) {
      return new ScopeItem.AtPort(names.read(c.name()), places.of(c));
    }
    List<Expression> points =
        c.point().stream()
            .filter(p -> p.expression() != null)
            .map(p -> expressions.build(p.expression()))
            .toList();
    boolean dc = c.point().stream().map(PointContext::expression).anyMatch(e -> e == null);
    return new ScopeItem.At(dc, points, places.of(c));
  }
}
