package loadmark.judge;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/** The worst point of a run of samples and of what lies between them. */
final class Peak {
  /** The most maxima that are looked into: those which could be the highest. */
  private static final int MOST_MAXIMA = 50;

  /** How much farther than its neighbours differ a maximum may lie. */
  private static final double REACH = 4;

  /** A frequency this share of an interval away tells which way the excess goes there. */
  private static final double ASIDE = 1e-3;

  /** Excesses that differ by less are one; then an end goes before a maximum. */
  static final double TIE = 1e-12;

  private Peak() {}

  /**
   * The worst of samples {@code from} to {@code to}, both in, and of the intervals next to them;
   * empty where nothing is known.
   */
  static Optional<Sample> of(Gauge gauge, List<Sample> samples, int from, int to) {
    Optional<Sample> highest = BandFinder.worstOf(samples.subList(from, to + 1));
    if (highest.isEmpty()) {
      return highest;
    }
    List<Integer> maxima =
        IntStream.rangeClosed(from, to)
            .filter(i -> samples.get(i).isKnown() && isMaximum(samples, i))
            .boxed()
            .sorted(Comparator.comparingDouble((Integer i) -> -promise(samples, i)))
            .limit(MOST_MAXIMA)
            .toList();
    Sample best = highest.get();
    for (int i : maxima) {
      if (promise(samples, i) >= best.excess()) {
        Sample polished = polish(gauge, samples, i);
        best = polished.excess() > best.excess() ? polished : best;
      }
    }
    for (Sample end : List.of(samples.get(from), samples.get(to))) {
      if (end.isKnown() && isTie(end, best)) {
        return Optional.of(end);
      }
    }
    return Optional.of(best);
  }

  /** Whether {@code one} is as bad as {@code best}, rounding aside. */
  static boolean isTie(Sample one, Sample best) {
    return one.excess() == best.excess()
        || one.excess() >= best.excess() - TIE * Math.max(1, Math.abs(best.excess()));
  }

  private static boolean isMaximum(List<Sample> samples, int i) {
    double here = samples.get(i).excess();
    return (i == 0 || here >= samples.get(i - 1).excess())
        && (i == samples.size() - 1 || here >= samples.get(i + 1).excess());
  }

  /** The most that the excess may reach near a sample. */
  private static double promise(List<Sample> samples, int i) {
    double here = samples.get(i).excess();
    if (Double.isInfinite(here)) {
      return here;
    }
    double spread = 0;
    for (int j = Math.max(i - 1, 0); j <= Math.min(i + 1, samples.size() - 1); j++) {
      spread = Math.max(spread, here - samples.get(j).excess());
    }
    return here + REACH * spread;
  }

  private static Sample polish(Gauge gauge, List<Sample> samples, int i) {
    Sample here = samples.get(i);
    int last = samples.size() - 1;
    if (last == 0 || here.excess() == Double.POSITIVE_INFINITY) {
      return here;
    }
    if (i == 0 || i == last) {
      Sample inner = samples.get(i == 0 ? 1 : last - 1);
      Sample aside = gauge.at(here.hz() * Math.pow(inner.hz() / here.hz(), ASIDE));
      if (aside.excess() <= here.excess()) {
        return here;
      }
    }
    return Extremum.highest(
        gauge, samples.get(Math.max(i - 1, 0)).hz(), here, samples.get(Math.min(i + 1, last)).hz());
  }
}
