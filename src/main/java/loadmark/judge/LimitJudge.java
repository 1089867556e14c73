package loadmark.judge;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.function.Predicate;
import loadmark.judge.LimitJudgement.Method;
import loadmark.network.Band;
import loadmark.network.Limit;
import loadmark.response.Comparison;
import loadmark.response.Crossings;
import loadmark.response.Loading;

/** Judges several limits of one port with one set of loads; they share their samples. */
final class LimitJudge {
  private final Comparison comparison;
  private final Probes probes;
  private final List<Limit> limits;
  private final List<List<Loading>> grids;

  LimitJudge(Comparison comparison, Crossings crossings, List<Limit> limits) {
    this.comparison = comparison;
    this.probes =
        crossings
            .findObstacle()
            .<Probes>map(TurningPoints::new)
            .orElseGet(() -> new CrossingProbes(new Algebra(crossings)));
    this.limits = List.copyOf(limits);
    Curves curves =
        new Curves(limits.stream().map(l -> new Curves.Scoped(Measure.of(l), l.scope())).toList());
    this.grids =
        stretches(limits).stream().map(marks -> Grid.sample(comparison, marks, curves)).toList();
  }

  /**
   * One judgement a limit, in order.
   *
   * @param raising those whose worst values are made sure of; of the others the verdict counts
   */
  List<LimitJudgement> judge(
      Function<Limit, Optional<Verdict>> bareVerdict, Predicate<Limit> raising) {
    return limits.stream().map(l -> judge(l, bareVerdict.apply(l), raising.test(l))).toList();
  }

  private LimitJudgement judge(Limit limit, Optional<Verdict> bareVerdict, boolean raising) {
    Gauge gauge = new Gauge(comparison, Measure.of(limit));
    BandFinder finder = new BandFinder(gauge, probes, raising);
    Optional<String> doubt = Optional.empty();
    List<BrokenBand> bands = new ArrayList<>();
    List<Sample> worst = new ArrayList<>();
    List<Sample> unknown = new ArrayList<>();
    for (Band band : limit.scope()) {
      BandFinder.Found found =
          band.isPoint()
              ? finder.atPoint(gauge.at(band.fromHz()))
              : finder.over(samples(gauge, band));
      bands.addAll(found.bands());
      found.worst().ifPresent(worst::add);
      found.unknown().ifPresent(unknown::add);
      doubt = doubt.or(found::doubt);
    }
    Verdict kept = unknown.isEmpty() ? Verdict.KEPT : Verdict.UNDETERMINED;
    return new LimitJudgement(
        limit,
        bands.isEmpty() ? kept : Verdict.BROKEN,
        bareVerdict,
        doubt.isEmpty() ? Method.COMPLETE : Method.SAMPLED,
        doubt.orElse(""),
        BandFinder.worstOf(worst).map(Sample::toWorst),
        bands,
        unknown.isEmpty() ? "" : Words.doubt(unknown.get(0)));
  }

  private List<Sample> samples(Gauge gauge, Band band) {
    return grids.stream()
        .filter(g -> g.get(0).hz() <= band.fromHz() && band.toHz() <= g.get(g.size() - 1).hz())
        .findFirst()
        .map(g -> Grid.inside(g, band).stream().map(gauge::of).toList())
        .orElseThrow();
  }

  /** The ends of all scopes, those that overlap together. */
  private static List<SortedSet<Double>> stretches(List<Limit> limits) {
    List<SortedSet<Double>> stretches = new ArrayList<>();
    limits.stream()
        .flatMap(l -> l.scope().stream())
        .filter(b -> !b.isPoint())
        .sorted()
        .forEach(
            band -> {
              int last = stretches.size() - 1;
              if (last < 0 || stretches.get(last).last() < band.fromHz()) {
                stretches.add(new TreeSet<>());
                last++;
              }
              stretches.get(last).add(band.fromHz());
              stretches.get(last).add(band.toHz());
            });
    return stretches;
  }
}
