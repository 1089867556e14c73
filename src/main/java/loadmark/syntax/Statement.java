package loadmark.syntax;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Span;

/** One statement of a network file. The span is that of its first line. */
public sealed interface Statement {

  Span span();

  /** {@code network "Title"}. */
  record Title(Name title, Span span) implements Statement {}

  /** {@code let NAME = EXPRESSION}. */
  record Let(Name name, Expression value, Span span) implements Statement {}

  /** {@code resistor r = 10 kΩ ± 1 %, rated 0.1 W}. */
  record Part(PartKind kind, Name name, Expression value, List<Property> properties, Span span)
      implements Statement {}

  /** The parts with two terminals. */
  enum PartKind {
    RESISTOR("resistor"),
    CAPACITOR("capacitor"),
    INDUCTOR("inductor"),
    IMPEDANCE("impedance");

    private final String word;

    PartKind(String word) {
      this.word = word;
    }

    public String word() {
      return word;
    }
  }

  /**
   * A property behind a part's value.
   *
   * @param second the upper end of a {@code tolerance}, the frequency of a {@code quality}
   */
  record Property(PropertyKind kind, Expression value, Optional<Expression> second, Span span) {}

  /** Every property of the two-terminal parts. */
  enum PropertyKind {
    SERIES_RESISTANCE("series resistance"),
    SERIES_INDUCTANCE("series inductance"),
    PARALLEL_CAPACITANCE("parallel capacitance"),
    LEAKAGE("leakage"),
    LOSS_TANGENT("loss tangent"),
    SELF_RESONANCE("self-resonance"),
    QUALITY("quality"),
    RATED("rated"),
    TOLERANCE("tolerance");

    private final String words;

    PropertyKind(String words) {
      this.words = words;
    }

    public String words() {
      return words;
    }
  }

  /** {@code wire a -- r1 -- b}: a chain, at least one item. */
  record Wire(List<WireItem> items, Span span) implements Statement {}

  /** A node, a part, or one port of a larger part ({@code t.primary}). */
  record WireItem(Name name, Optional<Name> port, Span span) {}

  /** Two nodes, {@code a -- b}. */
  record NodePair(Name plus, Name minus, Span span) {}

  /** {@code port input = a -- b, terminated 50 Ω}. */
  record Port(Name name, NodePair nodes, Optional<Closure> closure, Span span)
      implements Statement {}

  /** What closes a port while another one is judged. */
  sealed interface Closure {
    record Terminated(Expression value) implements Closure {}

    record Driven(Expression volts, DriveKind kind, Optional<Expression> behind, boolean mains)
        implements Closure {}
  }

  /** How a drive's voltage is meant. */
  enum DriveKind {
    RMS,
    PEAK,
    DC
  }

  /** {@code supply rail = 3.3 V behind 0.1 Ω}. */
  record Supply(Name node, Expression volts, Optional<Expression> behind, Span span)
      implements Statement {}

  /** {@code load probe shunt a -- b = 10 MΩ || 13 pF}. */
  record Load(Name name, Placement placement, NodePair nodes, Expression value, Span span)
      implements Statement {}

  /** Across two nodes, or between them. */
  enum Placement {
    SHUNT,
    SERIES
  }

  /**
   * {@code case NAME = probe added to converter}. {@code each} is the unquoted word in the name's
   * place.
   */
  record Case(
      Name name, boolean each, List<Name> loads, Relation relation, List<Name> others, Span span)
      implements Statement {}

  /** What a case is held against. */
  enum Relation {
    AGAINST_BARE,
    ADDED_TO,
    INSTEAD_OF
  }

  /** {@code sweep dc and 10 Hz to 1 MHz, 50 per decade}. */
  record Sweep(boolean dc, Optional<Range> band, Optional<Density> density, Span span)
      implements Statement {}

  /** {@code from to to}. */
  record Range(Expression from, Expression to, Span span) {}

  /** {@code 50 per decade} or {@code 400 points}. */
  record Density(Expression count, boolean perDecade, Span span) {}

  /**
   * {@code limit CRITERION SCOPE…}.
   *
   * @param text the statement as written, on one line
   */
  record Limit(Criterion criterion, List<ScopeItem> scope, String text, Span span)
      implements Statement {}

  /** What a limit bounds. */
  sealed interface Criterion {
    /** {@code change 2 % or 5 Ω}. */
    record Change(Expression bound, Optional<Expression> or) implements Criterion {}

    record MagnitudeChange(Expression bound) implements Criterion {}

    record PhaseChange(Expression bound) implements Criterion {}

    record Magnitude(Window window) implements Criterion {}

    record Phase(Window window) implements Criterion {}

    /** {@code within 20 %, 11.5 deg of EXPRESSION}. */
    record Within(Expression first, Optional<Expression> second, Expression reference)
        implements Criterion {}

    record ParallelCapacitance(Window window) implements Criterion {}

    record ParallelResistance(Window window) implements Criterion {}

    record ReturnLoss(Expression bound, Expression reference) implements Criterion {}
  }

  /** Where a value must lie. */
  sealed interface Window {
    record Between(Expression from, Expression to) implements Window {}

    record Above(Expression bound) implements Window {}

    record Below(Expression bound) implements Window {}

    /** {@code 50 Ω ± 20 %}. */
    record Around(Expression.Toleranced value) implements Window {}
  }

  /** A narrower scope. */
  sealed interface ScopeItem {
    Span span();

    record FromTo(Range range, Span span) implements ScopeItem {}

    /** {@code at 1 kHz, 5 kHz, dc}. */
    record At(boolean dc, List<Expression> points, Span span) implements ScopeItem {}

    record ForCases(List<Name> cases, Span span) implements ScopeItem {}

    record AtPort(Name port, Span span) implements ScopeItem {}
  }

  /**
   * A statement that could not be read, and on which there is a finding already. It keeps what can
   * be told, so that later checks do not report the same slip again.
   *
   * @param word the statement's word, or empty where even that is wrong
   * @param declared the name it would have declared
   * @param mentioned every name in it
   */
  record Broken(String word, Optional<Name> declared, List<Name> mentioned, Span span)
      implements Statement {}
}
