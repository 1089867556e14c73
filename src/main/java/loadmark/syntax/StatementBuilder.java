package loadmark.syntax;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;
import loadmark.syntax.Statement.Closure;
import loadmark.syntax.Statement.DriveKind;
import loadmark.syntax.Statement.NodePair;
import loadmark.syntax.Statement.PartKind;
import loadmark.syntax.Statement.Placement;
import loadmark.syntax.Statement.Property;
import loadmark.syntax.Statement.PropertyKind;
import loadmark.syntax.Statement.Relation;
import loadmark.syntax.Statement.WireItem;
import loadmark.syntax.antlr.NetworkBaseVisitor;
import loadmark.syntax.antlr.NetworkParser.BandContext;
import loadmark.syntax.antlr.NetworkParser.CaseContext;
import loadmark.syntax.antlr.NetworkParser.ClosureContext;
import loadmark.syntax.antlr.NetworkParser.DensityContext;
import loadmark.syntax.antlr.NetworkParser.DrivenContext;
import loadmark.syntax.antlr.NetworkParser.LetContext;
import loadmark.syntax.antlr.NetworkParser.LimitContext;
import loadmark.syntax.antlr.NetworkParser.LoadContext;
import loadmark.syntax.antlr.NetworkParser.PairContext;
import loadmark.syntax.antlr.NetworkParser.PartContext;
import loadmark.syntax.antlr.NetworkParser.PortContext;
import loadmark.syntax.antlr.NetworkParser.PropertyContext;
import loadmark.syntax.antlr.NetworkParser.RangeContext;
import loadmark.syntax.antlr.NetworkParser.SupplyContext;
import loadmark.syntax.antlr.NetworkParser.SweepContext;
import loadmark.syntax.antlr.NetworkParser.TerminatedContext;
import loadmark.syntax.antlr.NetworkParser.TitleContext;
import loadmark.syntax.antlr.NetworkParser.WireContext;
import loadmark.syntax.antlr.NetworkParser.WireItemContext;
import org.antlr.v4.runtime.ParserRuleContext;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.tree.TerminalNode;
import org.jspecify.annotations.Nullable;

/** Parse tree of a statement to its record. */
final class StatementBuilder extends NetworkBaseVisitor<Statement> {
  private final Places places;
  private final List<Token> line;
  private final Span span;
  private final NameReader names;
  private final ExpressionBuilder expressions;
  private final LimitBuilder limits;
  private final Findings findings;

  /**
   * @param line the tokens of the statement that is built
   */
  StatementBuilder(Places places, List<Token> line, Findings findings) {
    this.line = line;
    this.span = places.firstLine(line);
    this.places = places;
    this.names = new NameReader(places);
    this.expressions = new ExpressionBuilder(places, findings);
    this.limits = new LimitBuilder(this, expressions, places, findings);
    this.findings = findings;
  }

  @Override
  public Statement visitTitle(TitleContext c) {
    return new Statement.Title(names.read(c.STRING().getSymbol()), span);
  }

  @Override
  public Statement visitLet(LetContext c) {
    Token token = c.valueName().getStart();
    Name name = names.read(token);
    if (Words.isWord(token) || Words.isLater(name.text())) {
      findings.error(
          "reserved-word",
          name.span(),
          "`" + name.text() + "` is a word of the language and cannot name a value",
          "nodes, parts, ports, loads and cases may be called so, values may not");
    }
    return new Statement.Let(name, expressions.build(c.expression()), span);
  }

  @Override
  public Statement visitPart(PartContext c) {
    PartKind kind =
        switch (c.kind.getText()) {
          case "resistor" -> PartKind.RESISTOR;
          case "capacitor" -> PartKind.CAPACITOR;
          case "inductor" -> PartKind.INDUCTOR;
          default -> PartKind.IMPEDANCE;
        };
    return new Statement.Part(
        kind,
        names.read(c.name()),
        expressions.build(c.expression()),
        c.property().stream().map(this::property).toList(),
        span);
  }

  private Property property(PropertyContext c) {
    boolean inductance = has(c, "inductance");
    PropertyKind kind =
        switch (c.getStart().getText()) {
          case "series" ->
              inductance ? PropertyKind.SERIES_INDUCTANCE : PropertyKind.SERIES_RESISTANCE;
          case "parallel" -> PropertyKind.PARALLEL_CAPACITANCE;
          case "leakage" -> PropertyKind.LEAKAGE;
          case "self-resonance" -> PropertyKind.SELF_RESONANCE;
          case "rated" -> PropertyKind.RATED;
          default -> PropertyKind.TOLERANCE;
        };
    return new Property(
        kind,
        expressions.build(c.expression(0)),
        expressions.buildIfAny(c.expression(1)),
        places.of(c));
  }

  @Override
  public Statement visitWire(WireContext c) {
    return new Statement.Wire(c.wireItem().stream().map(this::item).toList(), span);
  }

  private WireItem item(WireItemContext c) {
    Optional<Name> port = Optional.ofNullable(c.name(1)).map(names::read);
    return new WireItem(names.read(c.name(0)), port, places.of(c));
  }

  private NodePair pair(PairContext c) {
    return new NodePair(names.read(c.plus), names.read(c.minus), places.of(c));
  }

  @Override
  public Statement visitPort(PortContext c) {
    return new Statement.Port(names.read(c.name()), pair(c.pair()), closure(c.closure()), span);
  }

  private Optional<Closure> closure(@Nullable ClosureContext closure) {
    if (closure instanceof TerminatedContext c) {
      return Optional.of(new Closure.Terminated(expressions.build(c.expression())));
    }
    if (closure instanceof DrivenContext c) {
      DriveKind kind =
          has(c, "peak") ? DriveKind.PEAK : has(c, "dc") ? DriveKind.DC : DriveKind.RMS;
      if (kind == DriveKind.DC && has(c, "mains")) {
        findings.error(
            "dc-mains",
            places.of(c.getStop()),
            "the mains is no direct voltage",
            "take out `dc` or `mains`");
      }
      return Optional.of(
          new Closure.Driven(
              expressions.build(c.volts), kind, expressions.buildIfAny(c.behind), has(c, "mains")));
    }
    return Optional.empty();
  }

  @Override
  public Statement visitSupply(SupplyContext c) {
    return new Statement.Supply(
        names.read(c.name()), expressions.build(c.volts), expressions.buildIfAny(c.behind), span);
  }

  @Override
  public Statement visitLoad(LoadContext c) {
    boolean shunt = c.placement.getText().equals("shunt");
    return new Statement.Load(
        names.read(c.name()),
        shunt ? Placement.SHUNT : Placement.SERIES,
        pair(c.pair()),
        expressions.build(c.expression()),
        span);
  }

  @Override
  public Statement visitCase(CaseContext c) {
    Name name = names.read(c.name());
    Relation relation =
        c.others == null
            ? Relation.AGAINST_BARE
            : has(c, "added") ? Relation.ADDED_TO : Relation.INSTEAD_OF;
    return new Statement.Case(
        name,
        !name.quoted() && name.text().equals("each"),
        names.read(c.loads),
        relation,
        c.others == null ? List.of() : names.read(c.others),
        span);
  }

  @Override
  public Statement visitBand(BandContext c) {
    return sweep(c.sweep());
  }

  Statement.Sweep sweep(SweepContext c) {
    return new Statement.Sweep(
        has(c, "dc"),
        Optional.ofNullable(c.range()).map(this::range),
        Optional.ofNullable(c.density()).map(this::density),
        span);
  }

  Statement.Range range(RangeContext c) {
    return new Statement.Range(expressions.build(c.from), expressions.build(c.to), places.of(c));
  }

  private Statement.Density density(DensityContext c) {
    return new Statement.Density(expressions.build(c.expression()), has(c, "per"), places.of(c));
  }

  @Override
  public Statement visitLimit(LimitContext c) {
    return new Statement.Limit(
        limits.criterion(c.criterion()),
        c.scope().stream().map(limits::scope).toList(),
        Places.text(line),
        span);
  }

  /** Whether a word of the language stands in a rule itself, not deeper. */
  static boolean has(ParserRuleContext c, String word) {
    return c.children.stream()
        .anyMatch(child -> child instanceof TerminalNode && child.getText().equals(word));
  }
}
