package loadmark.binding;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Span;
import loadmark.network.Band;
import loadmark.network.Sweep;
import loadmark.syntax.Expression;
import loadmark.syntax.Statement;
import loadmark.syntax.Statement.ScopeItem;

/** Reads the frequencies of a limit and cuts them to the sweep. */
final class Scopes {
  private final Values values;
  private final Sweeps sweeps;
  private final Optional<Sweep> sweep;
  private final boolean sweepUnread;
  private final boolean overriding;
  private final Findings findings;

  /**
   * @param sweep empty where the file has none; a limit then names its own frequencies
   * @param sweepUnread whether there is one that could not be read: nothing is then held against it
   * @param overriding whether the sweep is the command line's: limits outside are then skipped
   */
  Scopes(
      Values values,
      Sweeps sweeps,
      Optional<Sweep> sweep,
      boolean sweepUnread,
      boolean overriding,
      Findings findings) {
    this.values = values;
    this.sweeps = sweeps;
    this.sweep = sweep;
    this.sweepUnread = sweepUnread;
    this.overriding = overriding;
    this.findings = findings;
  }

  /** Sorted, apart, at least one; empty where there is a finding. */
  Optional<List<Band>> read(Statement.Limit limit) {
    List<Band> asked = new ArrayList<>();
    Optional<Span> place = Optional.empty();
    int before = findings.errorCount();
    for (ScopeItem item : limit.scope()) {
      if (item instanceof ScopeItem.FromTo range) {
        sweeps.readRange(range.range(), "scope-order").ifPresent(asked::add);
        place = place.or(() -> Optional.of(range.span()));
      } else if (item instanceof ScopeItem.At at) {
        readPoints(at, asked);
        place = place.or(() -> Optional.of(at.span()));
      }
    }
    if (findings.errorCount() > before) {
      return Optional.empty();
    }
    if (place.isEmpty()) {
      return wholeSweep(limit);
    }
    List<Band> apart = merge(asked);
    return sweep.isEmpty() ? Optional.of(apart) : cut(apart, place.get(), limit);
  }

  private void readPoints(ScopeItem.At at, List<Band> asked) {
    if (at.dc()) {
      asked.add(Band.DC);
    }
    for (Expression point : at.points()) {
      OptionalDouble hz = values.read(point, Expected.FREQUENCY);
      if (hz.isPresent()) {
        asked.add(Band.at(hz.getAsDouble()));
      }
    }
  }

  private Optional<List<Band>> wholeSweep(Statement.Limit limit) {
    if (sweepUnread) {
      return Optional.empty();
    }
    if (sweep.isEmpty()) {
      findings.error(
          "no-sweep",
          limit.span(),
          "this limit names no frequencies, and the file has no sweep",
          "add a line such as: sweep 10 Hz to 1 MHz");
      return Optional.empty();
    }
    List<Band> all = new ArrayList<>();
    if (sweep.get().dc()) {
      all.add(Band.DC);
    }
    sweep.get().band().ifPresent(all::add);
    return Optional.of(all);
  }

  private Optional<List<Band>> cut(List<Band> asked, Span place, Statement.Limit limit) {
    List<Band> inside = new ArrayList<>();
    for (Band band : asked) {
      cut(band).ifPresent(inside::add);
    }
    if (inside.isEmpty()) {
      if (overriding) {
        findings.warning(
            "limit-skipped", limit.span(), "this limit lies outside the sweep asked for: skipped");
      } else {
        findings.error(
            "scope-outside-sweep",
            place,
            "these frequencies lie outside the sweep of line " + sweep.orElseThrow().line(),
            asked.equals(List.of(Band.DC))
                ? "DC is swept by: sweep dc and …"
                : "widen the sweep, or correct the limit");
      }
      return Optional.empty();
    }
    if (!overriding && !inside.equals(asked)) {
      findings.warning(
          "scope-cut",
          place,
          "these frequencies lie partly outside the sweep of line "
              + sweep.orElseThrow().line()
              + ": judged only inside");
    }
    return Optional.of(inside);
  }

  private Optional<Band> cut(Band band) {
    if (band.equals(Band.DC)) {
      return sweep.orElseThrow().dc() ? Optional.of(band) : Optional.empty();
    }
    Optional<Band> swept = sweep.orElseThrow().band();
    if (swept.isEmpty()) {
      return Optional.empty();
    }
    double from = Math.max(band.fromHz(), swept.get().fromHz());
    double to = Math.min(band.toHz(), swept.get().toHz());
    return from < to || (from == to && band.isPoint())
        ? Optional.of(new Band(from, to))
        : Optional.empty();
  }

  /** Sorted, with overlapping ones made one. */
  private static List<Band> merge(List<Band> bands) {
    List<Band> sorted = new ArrayList<>(bands);
    Collections.sort(sorted);
    List<Band> apart = new ArrayList<>();
    for (Band band : sorted) {
      int last = apart.size() - 1;
      if (last >= 0 && band.fromHz() <= apart.get(last).toHz()) {
        Band before = apart.get(last);
        apart.set(last, new Band(before.fromHz(), Math.max(before.toHz(), band.toHz())));
      } else {
        apart.add(band);
      }
    }
    return apart;
  }
}
