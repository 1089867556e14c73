package loadmark.judge;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import loadmark.network.Band;

/** Finds where a limit is broken within one band of its scope, and its worst point there. */
final class BandFinder {
  private final Gauge gauge;
  private final Probes probes;

  BandFinder(Gauge gauge, Probes probes) {
    this.gauge = gauge;
    this.probes = probes;
  }

  /**
   * What was found in one band of a scope.
   *
   * @param worst empty where nothing is known
   * @param unknown the first sample where nothing could be said
   */
  record Found(List<BrokenBand> bands, Optional<Sample> worst, Optional<Sample> unknown) {}

  /** Over a single frequency. */
  Found atPoint(Sample sample) {
    if (!sample.isKnown()) {
      return new Found(List.of(), Optional.empty(), Optional.of(sample));
    }
    List<BrokenBand> bands =
        sample.isBroken()
            ? List.of(new BrokenBand(Band.at(sample.hz()), sample.toWorst()))
            : List.of();
    return new Found(bands, Optional.of(sample), Optional.empty());
  }

  /** Over a band, from samples of it that include both ends. */
  Found over(List<Sample> grid) {
    List<Sample> samples = withProbes(grid);
    List<BrokenBand> bands = new ArrayList<>();
    List<Sample> peaks = new ArrayList<>();
    int n = samples.size();
    int from = 0;
    while (from < n) {
      if (!samples.get(from).isPast()) {
        from++;
        continue;
      }
      int to = endOfRun(samples, from);
      Sample peak = Peak.of(gauge, samples, from, to).orElseThrow();
      if (peak.isBroken()) {
        peaks.add(peak);
        double low =
            from == 0
                ? samples.get(0).hz()
                : Edge.between(gauge, samples.get(from - 1), samples.get(from));
        double high =
            to == n - 1
                ? samples.get(to).hz()
                : Edge.between(gauge, samples.get(to), samples.get(to + 1));
        bands.add(new BrokenBand(new Band(low, high), peak.toWorst()));
      }
      from = to + 1;
    }
    Optional<Sample> worst = peaks.isEmpty() ? Peak.of(gauge, samples, 0, n - 1) : worstOf(peaks);
    Optional<Sample> unknown = samples.stream().filter(s -> !s.isKnown()).findFirst();
    return new Found(bands, worst, unknown);
  }

  /** The first of the worst among those that are known. */
  static Optional<Sample> worstOf(List<Sample> samples) {
    List<Sample> known = samples.stream().filter(Sample::isKnown).toList();
    return known.stream()
        .max(Comparator.comparingDouble(Sample::excess))
        .flatMap(best -> known.stream().filter(one -> Peak.isTie(one, best)).findFirst());
  }

  private List<Sample> withProbes(List<Sample> grid) {
    TreeMap<Double, Sample> all = new TreeMap<>();
    probes.find(gauge, grid).forEach(s -> all.put(s.hz(), s));
    grid.forEach(s -> all.put(s.hz(), s));
    return List.copyOf(all.values());
  }

  /** The last sample of a run past the bound; what is unknown inside a run belongs to it. */
  private static int endOfRun(List<Sample> samples, int from) {
    int to = from;
    for (int i = from + 1; i < samples.size(); i++) {
      if (samples.get(i).isPast()) {
        to = i;
      } else if (samples.get(i).isKnown()) {
        break;
      }
    }
    return to;
  }
}
