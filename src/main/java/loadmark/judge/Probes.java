package loadmark.judge;

import java.util.List;
import java.util.Optional;
import loadmark.network.Band;

/**
 * Where to look beside the grid, such that between two neighbours of all samples the excess changes
 * its sign at most once. The bands are then found by comparing neighbours, however the probes were
 * found: from turning points of the sampled excess, or from crossings that are known algebraically.
 */
interface Probes {

  /**
   * Looks over one band.
   *
   * @param grid samples over one band, ascending, both ends in
   */
  Found find(Gauge gauge, List<Sample> grid);

  /**
   * Looks for a worse point than the worst one known.
   *
   * @return empty where the worst one is not certain
   */
  Optional<Sample> raise(Gauge gauge, Band band, Sample worst);

  /**
   * All samples of a band.
   *
   * @param samples ascending, the grid among them
   * @param doubt why a change of sign could still be missing, in words that follow "because"; empty
   *     where none is
   */
  record Found(List<Sample> samples, Optional<String> doubt) {
    public Found {
      samples = List.copyOf(samples);
    }
  }
}
