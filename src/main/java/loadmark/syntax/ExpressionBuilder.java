package loadmark.syntax;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;
import loadmark.syntax.Expression.Operator;
import loadmark.syntax.antlr.NetworkBaseVisitor;
import loadmark.syntax.antlr.NetworkParser;
import loadmark.syntax.antlr.NetworkParser.ArgumentContext;
import loadmark.syntax.antlr.NetworkParser.DataContext;
import loadmark.syntax.antlr.NetworkParser.ExpressionContext;
import loadmark.syntax.antlr.NetworkParser.GroupedContext;
import loadmark.syntax.antlr.NetworkParser.JoinedContext;
import loadmark.syntax.antlr.NetworkParser.LiteralContext;
import loadmark.syntax.antlr.NetworkParser.PowerContext;
import loadmark.syntax.antlr.NetworkParser.ProductContext;
import loadmark.syntax.antlr.NetworkParser.ReferenceContext;
import loadmark.syntax.antlr.NetworkParser.SignedContext;
import loadmark.syntax.antlr.NetworkParser.SumContext;
import loadmark.syntax.antlr.NetworkParser.TolerancedContext;
import org.antlr.v4.runtime.Token;
import org.jspecify.annotations.Nullable;

/** Parse tree of an expression to its records. */
final class ExpressionBuilder extends NetworkBaseVisitor<Expression> {
  private final Places places;
  private final NameReader names;
  private final Findings findings;

  ExpressionBuilder(Places places, Findings findings) {
    this.places = places;
    this.names = new NameReader(places);
    this.findings = findings;
  }

  Expression build(ExpressionContext context) {
    return visit(context);
  }

  Optional<Expression> buildIfAny(@Nullable ExpressionContext context) {
    return context == null ? Optional.empty() : Optional.of(build(context));
  }

  @Override
  public Expression visitLiteral(LiteralContext c) {
    Token number = c.NUMBER().getSymbol();
    String digits = number.getText().replace('−', '-');
    Span span = places.of(c);
    if (c.unit() == null) {
      return new Expression.Literal(
          digits, Double.parseDouble(digits), Optional.empty(), false, span);
    }
    Token word = c.unit().getStart();
    Expression.Unit unit = new Expression.Unit(word.getText(), places.of(word));
    return new Expression.Literal(
        digits, Double.parseDouble(digits), Optional.of(unit), Places.adjoin(number, word), span);
  }

  @Override
  public Expression visitReference(ReferenceContext c) {
    Name name = names.read(c.NAME().getSymbol());
    if (c.OPEN() == null) {
      return new Expression.Reference(name, places.of(c));
    }
    List<Expression.Argument> arguments = c.argument().stream().map(this::argument).toList();
    boolean block = arguments.stream().anyMatch(a -> a.name().isPresent());
    if (block) {
      findings.error(
          "not-known-yet",
          name.span(),
          "blocks are not known to this version yet",
          "write out what the block holds");
    }
    return new Expression.Invocation(name, arguments, places.of(c));
  }

  private Expression.Argument argument(ArgumentContext c) {
    Expression first = build(c.expression(0));
    if (c.EQUALS() == null) {
      return new Expression.Argument(Optional.empty(), first);
    }
    Expression value = build(c.expression(1));
    if (first instanceof Expression.Reference reference) {
      return new Expression.Argument(Optional.of(reference.name()), value);
    }
    findings.error("syntax", first.span(), "before `=` stands the name of a parameter");
    return new Expression.Argument(Optional.empty(), value);
  }

  @Override
  public Expression visitData(DataContext c) {
    Name file = names.read(c.getStart());
    findings.error(
        "not-known-yet",
        file.span(),
        "data files are not known to this version yet",
        "a quoted text in a value is the name of a data file; names of values are not quoted");
    return new Expression.Data(file, file.span());
  }

  @Override
  public Expression visitGrouped(GroupedContext c) {
    return new Expression.Grouped(build(c.expression()), places.of(c));
  }

  @Override
  public Expression visitSigned(SignedContext c) {
    boolean negative = c.sign.getType() == NetworkParser.MINUS;
    return new Expression.Signed(negative, build(c.expression()), places.of(c));
  }

  @Override
  public Expression visitToleranced(TolerancedContext c) {
    return new Expression.Toleranced(build(c.expression(0)), build(c.expression(1)), places.of(c));
  }

  @Override
  public Expression visitPower(PowerContext c) {
    return operation(c, c.POWER().getSymbol(), Operator.POWER, c.expression());
  }

  @Override
  public Expression visitProduct(ProductContext c) {
    boolean times = c.operator.getType() == NetworkParser.TIMES;
    return operation(c, c.operator, times ? Operator.TIMES : Operator.DIVIDED, c.expression());
  }

  @Override
  public Expression visitJoined(JoinedContext c) {
    return operation(c, c.operator, Operator.PARALLEL, c.expression());
  }

  @Override
  public Expression visitSum(SumContext c) {
    boolean plus = c.operator.getType() == NetworkParser.PLUS;
    return operation(c, c.operator, plus ? Operator.PLUS : Operator.MINUS, c.expression());
  }

  private Expression operation(
      ExpressionContext c, Token sign, Operator operator, List<ExpressionContext> operands) {
    return new Expression.Operation(
        operator, build(operands.get(0)), build(operands.get(1)), places.of(sign), places.of(c));
  }
}
