package loadmark.judge;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.function.Function;
import loadmark.network.Band;
import loadmark.network.Limit;
import loadmark.response.Comparison;
import loadmark.response.Loading;

/** Judges several limits of one port with one set of loads; they share their samples. */
final class LimitJudge {
  private static final MathContext SHORT = new MathContext(6);

  private final Comparison comparison;
  private final List<Limit> limits;
  private final List<List<Loading>> grids;

  LimitJudge(Comparison comparison, List<Limit> limits) {
    this.comparison = comparison;
    this.limits = List.copyOf(limits);
    Curves curves =
        new Curves(limits.stream().map(l -> new Curves.Scoped(Measure.of(l), l.scope())).toList());
    this.grids =
        stretches(limits).stream().map(marks -> Grid.sample(comparison, marks, curves)).toList();
  }

  /** One judgement a limit, in order. */
  List<LimitJudgement> judge(Function<Limit, Optional<Verdict>> bareVerdict) {
    return limits.stream().map(l -> judge(l, bareVerdict.apply(l))).toList();
  }

  private LimitJudgement judge(Limit limit, Optional<Verdict> bareVerdict) {
    Probes probes = new TurningPoints();
    Gauge gauge = new Gauge(comparison, Measure.of(limit));
    BandFinder finder = new BandFinder(gauge, probes);
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
    }
    Verdict kept = unknown.isEmpty() ? Verdict.KEPT : Verdict.UNDETERMINED;
    return new LimitJudgement(
        limit,
        bands.isEmpty() ? kept : Verdict.BROKEN,
        bareVerdict,
        probes.method(),
        BandFinder.worstOf(worst).map(Sample::toWorst),
        bands,
        unknown.isEmpty() ? "" : words(unknown.get(0)));
  }

  private List<Sample> samples(Gauge gauge, Band band) {
    return grids.stream()
        .filter(g -> g.get(0).hz() <= band.fromHz() && band.toHz() <= g.get(g.size() - 1).hz())
        .findFirst()
        .map(g -> Grid.inside(g, band).stream().map(gauge::of).toList())
        .orElseThrow();
  }

  private static String words(Sample sample) {
    String why = sample.reading() instanceof Reading.Unknown unknown ? unknown.why() : "";
    String hz = new BigDecimal(sample.hz()).round(SHORT).stripTrailingZeros().toPlainString();
    return why + (sample.hz() == 0 ? " at DC" : " at " + hz + " Hz");
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
