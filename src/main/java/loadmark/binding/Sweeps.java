package loadmark.binding;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.diagnostic.Findings;
import loadmark.network.Band;
import loadmark.network.Sweep;
import loadmark.syntax.Statement;

/** Reads the sweep. */
final class Sweeps {
  private static final int MOST_POINTS = 1_000_000;

  /** Room for the rounding of log10: five decades at 20 are 100 steps, not 101. */
  private static final double STEP_ROUNDING = 1e-9;

  private final Values values;
  private final Findings findings;

  Sweeps(Values values, Findings findings) {
    this.values = values;
    this.findings = findings;
  }

  /** The sweep that the file states; a second one is reported. */
  Optional<Statement.Sweep> find(List<Statement> statements) {
    Optional<Statement.Sweep> first = Optional.empty();
    for (Statement statement : statements) {
      if (statement instanceof Statement.Sweep sweep) {
        if (first.isPresent()) {
          findings.error(
              "duplicate-statement",
              sweep.span(),
              "there is a sweep already, on line " + first.get().span().line(),
              "a file has one sweep: sweep dc and 10 Hz to 1 MHz holds both");
        } else {
          first = Optional.of(sweep);
        }
      }
    }
    return first;
  }

  Optional<Sweep> read(Statement.Sweep sweep) {
    int line = sweep.span().line();
    if (sweep.band().isEmpty()) {
      return Optional.of(new Sweep(true, Optional.empty(), Sweep.LEAST_POINTS, line));
    }
    Optional<Band> band = readRange(sweep.band().get(), "sweep-order");
    if (band.isEmpty()) {
      return Optional.empty();
    }
    double decades = Math.log10(band.get().toHz() / band.get().fromHz());
    if (sweep.density().isEmpty()) {
      int points = pointsFor(Sweep.DEFAULT_PER_DECADE, decades);
      return Optional.of(new Sweep(sweep.dc(), band, points, line));
    }
    Statement.Density density = sweep.density().get();
    OptionalDouble count = values.read(density.count(), Expected.COUNT);
    if (count.isEmpty()) {
      return Optional.empty();
    }
    double wanted = density.perDecade() ? count.getAsDouble() * decades : count.getAsDouble();
    if (wanted > MOST_POINTS || (!density.perDecade() && Math.rint(wanted) != wanted)) {
      findings.error(
          "out-of-range",
          density.span(),
          wanted > MOST_POINTS
              ? "a sweep has at most " + MOST_POINTS + " points"
              : "a number of points is a whole number");
      return Optional.empty();
    }
    if (!density.perDecade() && wanted < Sweep.LEAST_POINTS) {
      findings.warning(
          "few-points",
          density.span(),
          "a sweep has at least " + Sweep.LEAST_POINTS + " points; it is drawn with that many");
    }
    int points =
        density.perDecade()
            ? pointsFor(count.getAsDouble(), decades)
            : Math.max(Sweep.LEAST_POINTS, (int) wanted);
    return Optional.of(new Sweep(sweep.dc(), band, points, line));
  }

  private static int pointsFor(double perDecade, double decades) {
    int steps = (int) Math.ceil(perDecade * decades - STEP_ROUNDING);
    return Math.max(Sweep.LEAST_POINTS, steps + 1);
  }

  /** A range of frequencies, lower end first. */
  Optional<Band> readRange(Statement.Range range, String code) {
    OptionalDouble from = values.read(range.from(), Expected.FREQUENCY);
    OptionalDouble to = values.read(range.to(), Expected.FREQUENCY);
    if (from.isEmpty() || to.isEmpty()) {
      return Optional.empty();
    }
    if (from.getAsDouble() >= to.getAsDouble()) {
      findings.error(
          code,
          range.span(),
          "the range does not go from a lower to a higher frequency",
          from.getAsDouble() == to.getAsDouble()
              ? "a single frequency is written with at"
              : "put the lower one first");
      return Optional.empty();
    }
    return Optional.of(new Band(from.getAsDouble(), to.getAsDouble()));
  }
}
