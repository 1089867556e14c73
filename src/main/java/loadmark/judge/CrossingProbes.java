package loadmark.judge;

import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import loadmark.network.Band;

/**
 * Probes at, beside and between the crossings that algebra finds. What the crossings say is
 * checked: between two neighbours the excess has one sign wherever it was sampled.
 */
final class CrossingProbes implements Probes {
  /** Into how many parts a band is cut: first, and where signs and crossings disagreed. */
  private static final int[] PARTS = {1, 8};

  /** A crossing may be off by this, relative: where changes of 1e-12 are told apart it is. */
  private static final double CANDIDATE_ERROR = 1e-3;

  /** An excess nearer to 0 has no sign that counts. */
  private static final double INDECISIVE = 1e-9;

  /** A probe without an answer, this near to others with one, is left out: a pole or a zero. */
  private static final double GAP = 1e-3;

  private final Algebra algebra;

  CrossingProbes(Algebra algebra) {
    this.algebra = algebra;
  }

  @Override
  public Found find(Gauge gauge, List<Sample> grid) {
    Band band = new Band(grid.get(0).hz(), grid.get(grid.size() - 1).hz());
    Optional<String> doubt = Optional.empty();
    for (int parts : PARTS) {
      Optional<double[]> crossings = algebra.candidates(gauge.measure(), 0, band, parts);
      if (crossings.isEmpty()) {
        doubt = Optional.of("the algebra found no answer");
        continue;
      }
      List<Sample> probed = merge(grid, gauge.at(Surroundings.of(crossings.get(), band)));
      List<Sample> samples = TurningPoints.added(gauge, probed);
      Optional<Sample> odd = findContradiction(samples, crossings.get());
      if (odd.isEmpty()) {
        return new Found(samples, Optional.empty());
      }
      doubt =
          Optional.of(
              "the crossings that algebra finds do not fit the values at "
                  + Words.frequency(odd.get().hz()));
    }
    return new Found(TurningPoints.added(gauge, grid), doubt);
  }

  @Override
  public Optional<Sample> raise(Gauge gauge, Band band, Sample worst) {
    return WorstRaising.raise(gauge, algebra, band, worst);
  }

  /** The grid, and of the probes those with an answer, or far from any. */
  private static List<Sample> merge(List<Sample> grid, List<Sample> probes) {
    TreeMap<Double, Sample> all = new TreeMap<>();
    TreeMap<Double, Sample> open = new TreeMap<>();
    grid.forEach(s -> all.put(s.hz(), s));
    probes.forEach(s -> (s.isKnown() ? all : open).putIfAbsent(s.hz(), s));
    open.values().stream()
        .filter(s -> all.subMap(s.hz() / (1 + GAP), s.hz() * (1 + GAP)).isEmpty())
        .toList()
        .forEach(s -> all.put(s.hz(), s));
    return List.copyOf(all.values());
  }

  /** A sample that has another sign than the one before, without a crossing between them. */
  private static Optional<Sample> findContradiction(List<Sample> samples, double[] crossings) {
    Optional<Sample> last = Optional.empty();
    int next = 0;
    for (Sample sample : samples) {
      if (!isDecisive(sample)) {
        continue;
      }
      if (last.isPresent() && last.get().isPast() != sample.isPast()) {
        double from = last.get().hz() / (1 + CANDIDATE_ERROR);
        while (next < crossings.length && crossings[next] < from) {
          next++;
        }
        if (next == crossings.length || crossings[next] > sample.hz() * (1 + CANDIDATE_ERROR)) {
          return Optional.of(sample);
        }
      }
      last = Optional.of(sample);
    }
    return Optional.empty();
  }

  private static boolean isDecisive(Sample sample) {
    return sample.isSure() && Math.abs(sample.excess()) > INDECISIVE;
  }
}
