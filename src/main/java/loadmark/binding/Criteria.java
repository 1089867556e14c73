package loadmark.binding;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;
import loadmark.network.Bound;
import loadmark.network.Criterion;
import loadmark.network.OnePort;
import loadmark.quantity.Dimension;
import loadmark.quantity.Quantity;
import loadmark.syntax.Expression;
import loadmark.syntax.Statement;

/** Reads what a limit bounds and how far. */
final class Criteria {
  /** Less than a full turn, or the window would bound nothing. */
  private static final double FULL_TURN_DEGREES = 360;

  /** One thing that is bounded; a line with two ({@code within 20 %, 11.5 deg}) makes two. */
  record Bounded(Criterion criterion, Bound bound, Optional<Reference> reference) {
    static Bounded of(Criterion criterion, Bound bound) {
      return new Bounded(criterion, bound, Optional.empty());
    }
  }

  /** An impedance to hold against, and how it is written. */
  record Reference(OnePort value, Expression written) {}

  private final Values values;
  private final Impedances impedances;
  private final Windows windows;
  private final Findings findings;

  Criteria(Values values, Impedances impedances, Findings findings) {
    this.values = values;
    this.impedances = impedances;
    this.windows = new Windows(values, findings);
    this.findings = findings;
  }

  /** Empty where there is a finding. */
  List<Bounded> read(Statement.Criterion criterion) {
    if (criterion instanceof Statement.Criterion.Change change) {
      return list(readChange(change).map(bound -> Bounded.of(Criterion.CHANGE, bound)));
    }
    if (criterion instanceof Statement.Criterion.MagnitudeChange change) {
      return atMost(Criterion.MAGNITUDE_CHANGE, change.bound(), Expected.RATIO);
    }
    if (criterion instanceof Statement.Criterion.PhaseChange change) {
      return atMost(Criterion.PHASE_CHANGE, change.bound(), Expected.ANGLE);
    }
    if (criterion instanceof Statement.Criterion.Magnitude magnitude) {
      return window(Criterion.MAGNITUDE, magnitude.window(), Expected.RESISTANCE);
    }
    if (criterion instanceof Statement.Criterion.Phase phase) {
      return readPhase(phase.window());
    }
    if (criterion instanceof Statement.Criterion.ParallelCapacitance capacitance) {
      Expected any = Expected.CAPACITANCE.in(Expected.Range.ANY);
      return window(Criterion.PARALLEL_CAPACITANCE, capacitance.window(), any);
    }
    if (criterion instanceof Statement.Criterion.ParallelResistance resistance) {
      return window(Criterion.PARALLEL_RESISTANCE, resistance.window(), Expected.RESISTANCE);
    }
    if (criterion instanceof Statement.Criterion.ReturnLoss loss) {
      OptionalDouble bound = values.read(loss.bound(), Expected.DECIBELS);
      Optional<OnePort> reference = impedances.read(loss.reference());
      return bound.isEmpty() || reference.isEmpty()
          ? List.of()
          : List.of(
              new Bounded(
                  Criterion.RETURN_LOSS,
                  Bound.atLeast(bound.getAsDouble()),
                  Optional.of(new Reference(reference.get(), loss.reference()))));
    }
    return readWithin((Statement.Criterion.Within) criterion);
  }

  private Optional<Bound> readChange(Statement.Criterion.Change change) {
    List<Expected> either = List.of(Expected.RATIO, Expected.RESISTANCE);
    Optional<Quantity> first = values.readOneOf(change.bound(), either);
    if (change.or().isEmpty()) {
      return first.map(q -> isRatio(q) ? Bound.atMost(q.value()) : Bound.atMostOhm(q.value()));
    }
    Expression other = change.or().get();
    Optional<Quantity> second = values.readOneOf(other, either);
    if (first.isEmpty() || second.isEmpty()) {
      return Optional.empty();
    }
    if (isRatio(first.get()) == isRatio(second.get())) {
      findings.error(
          "wrong-dimension",
          other.span(),
          "behind `or` stands the other kind of bound",
          "one is a ratio and one is in Ω: limit change 2 % or 5 Ω");
      return Optional.empty();
    }
    Quantity ratio = isRatio(first.get()) ? first.get() : second.get();
    Quantity ohm = isRatio(first.get()) ? second.get() : first.get();
    return Optional.of(Bound.atMost(ratio.value()).orAtMostOhm(ohm.value()));
  }

  private static boolean isRatio(Quantity quantity) {
    return quantity.dimension().equals(Dimension.NUMBER);
  }

  private List<Bounded> readPhase(Statement.Window window) {
    Optional<Bound> bound = windows.read(window, Expected.ANGLE.in(Expected.Range.ANY));
    if (bound.isEmpty()) {
      return List.of();
    }
    OptionalDouble from = bound.get().atLeast();
    OptionalDouble to = bound.get().atMost();
    if (from.isPresent()
        && to.isPresent()
        && to.getAsDouble() - from.getAsDouble() >= FULL_TURN_DEGREES) {
      findings.error("out-of-range", place(window), "a phase window is less than 360 deg wide");
      return List.of();
    }
    return List.of(Bounded.of(Criterion.PHASE, bound.get()));
  }

  private static Span place(Statement.Window window) {
    if (window instanceof Statement.Window.Between between) {
      return between.from().span().to(between.to().span());
    }
    return ((Statement.Window.Around) window).value().span();
  }

  private List<Bounded> readWithin(Statement.Criterion.Within within) {
    List<Expected> either = List.of(Expected.RATIO, Expected.ANGLE);
    Optional<Quantity> first = values.readOneOf(within.first(), either);
    Optional<Quantity> second = within.second().flatMap(e -> values.readOneOf(e, either));
    Optional<OnePort> reference = impedances.read(within.reference());
    if (first.isEmpty()
        || (within.second().isPresent() && second.isEmpty())
        || reference.isEmpty()) {
      return List.of();
    }
    if (second.isPresent() && isRatio(first.get()) == isRatio(second.get())) {
      findings.error(
          "wrong-dimension",
          within.second().orElseThrow().span(),
          "one distance is a ratio, the other one an angle",
          "write, for example, within 20 %, 11.5 deg of …");
      return List.of();
    }
    Reference of = new Reference(reference.get(), within.reference());
    List<Bounded> bounded = new ArrayList<>();
    bounded.add(within(first.get(), of));
    second.ifPresent(q -> bounded.add(within(q, of)));
    return bounded;
  }

  private static Bounded within(Quantity distance, Reference of) {
    Criterion criterion = isRatio(distance) ? Criterion.MAGNITUDE_WITHIN : Criterion.PHASE_WITHIN;
    return new Bounded(criterion, Bound.atMost(distance.value()), Optional.of(of));
  }

  private List<Bounded> atMost(Criterion criterion, Expression bound, Expected expected) {
    OptionalDouble most = values.read(bound, expected);
    return most.isEmpty()
        ? List.of()
        : List.of(Bounded.of(criterion, Bound.atMost(most.getAsDouble())));
  }

  private List<Bounded> window(Criterion criterion, Statement.Window window, Expected expected) {
    return list(windows.read(window, expected).map(bound -> Bounded.of(criterion, bound)));
  }

  private static List<Bounded> list(Optional<Bounded> one) {
    return one.map(List::of).orElse(List.of());
  }
}
