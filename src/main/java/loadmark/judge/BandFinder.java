package loadmark.judge;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import loadmark.network.Band;

/** Finds where a limit is broken within one band of its scope, and its worst point there. */
final class BandFinder {
  private static final String NOT_CERTAIN = "its worst value could not be made certain";
  private static final String MISSED = "the algebra missed a crossing";

  private final Gauge gauge;
  private final Probes probes;
  private final boolean raising;

  /**
   * @param raising whether worst points are made sure of; else the verdict alone counts
   */
  BandFinder(Gauge gauge, Probes probes, boolean raising) {
    this.gauge = gauge;
    this.probes = probes;
    this.raising = raising;
  }

  /**
   * What was found in one band of a scope.
   *
   * @param worst empty where nothing is known
   * @param unknown the first sample of which nothing can be said, or not enough for a verdict
   * @param doubt why something could have been missed, in words that follow "because"
   */
  record Found(
      List<BrokenBand> bands,
      Optional<Sample> worst,
      Optional<Sample> unknown,
      Optional<String> doubt) {

    private Found orDoubt(String why) {
      return new Found(bands, worst, unknown, doubt.or(() -> Optional.of(why)));
    }
  }

  /** Over a single frequency. */
  Found atPoint(Sample sample) {
    List<BrokenBand> bands =
        sample.isSurelyBroken()
            ? List.of(new BrokenBand(Band.at(sample.hz()), sample.toWorst()))
            : List.of();
    return new Found(
        bands,
        Optional.of(sample).filter(Sample::isKnown),
        Optional.of(sample).filter(s -> !s.isSure()),
        Optional.empty());
  }

  /** Over a band, from samples of it that include both ends. */
  Found over(List<Sample> grid) {
    Found found = once(grid);
    Optional<Sample> worst = found.worst;
    if (!found.bands.isEmpty() || worst.isEmpty() || !worst.get().isSurelyBroken()) {
      return found;
    }
    // Raising the level came upon a band where no crossing was seen.
    TreeMap<Double, Sample> more = new TreeMap<>();
    Stream.concat(grid.stream(), worst.stream()).forEach(s -> more.put(s.hz(), s));
    return once(List.copyOf(more.values())).orDoubt(MISSED);
  }

  private Found once(List<Sample> grid) {
    Probes.Found probed = probes.find(gauge, grid);
    Run whole = Run.of(gauge, probed.samples());
    Optional<String> doubt = probed.doubt();
    List<BrokenBand> bands = new ArrayList<>();
    List<Sample> peaks = new ArrayList<>();
    List<Run> broken = whole.past().stream().filter(Run::isSurelyBroken).toList();
    for (Run run : broken) {
      Band band = run.band();
      Sample peak = run.peak().orElseThrow();
      Optional<Sample> worst = raised(band, peak, doubt);
      doubt = worst.isEmpty() ? Optional.of(NOT_CERTAIN) : doubt;
      peaks.add(worst.orElse(peak));
      bands.add(new BrokenBand(band, worst.orElse(peak).toWorst()));
    }
    if (broken.isEmpty() && whole.peak().isPresent()) {
      Sample peak = whole.peak().get();
      Optional<Sample> worst = raised(whole.band(), peak, doubt);
      doubt = worst.isEmpty() ? Optional.of(NOT_CERTAIN) : doubt;
      peaks.add(worst.orElse(peak));
    }
    Optional<Sample> unknown =
        Stream.concat(probed.samples().stream(), peaks.stream())
            .filter(s -> !s.isSure())
            .findFirst();
    return new Found(bands, worstOf(peaks), unknown, doubt);
  }

  /** The worst point of a band; empty where it should be certain and is not. */
  private Optional<Sample> raised(Band band, Sample peak, Optional<String> doubt) {
    return raising && doubt.isEmpty() && !band.isPoint()
        ? probes.raise(gauge, band, peak)
        : Optional.of(peak);
  }

  /** The first of the worst among those that are known. */
  static Optional<Sample> worstOf(List<Sample> samples) {
    List<Sample> known = samples.stream().filter(Sample::isKnown).toList();
    return known.stream()
        .max(Comparator.comparingDouble(Sample::excess))
        .flatMap(best -> known.stream().filter(one -> Peak.isTie(one, best)).findFirst());
  }
}
