package loadmark.judge;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loadmark.network.Band;

/**
 * Neighbours among the samples of a band.
 *
 * @param from the first one's index
 * @param to the last one's
 */
record Run(Gauge gauge, List<Sample> samples, int from, int to) {

  /** All samples of a band. */
  static Run of(Gauge gauge, List<Sample> samples) {
    return new Run(gauge, samples, 0, samples.size() - 1);
  }

  /** Those past the bound; what is unknown inside such a run belongs to it. */
  List<Run> past() {
    List<Run> runs = new ArrayList<>();
    int start = from;
    while (start <= to) {
      if (samples.get(start).isPast()) {
        Run run = new Run(gauge, samples, start, lastPast(start));
        runs.add(run);
        start = run.to;
      }
      start++;
    }
    return runs;
  }

  private int lastPast(int start) {
    int last = start;
    for (int i = start + 1; i <= to; i++) {
      if (samples.get(i).isPast()) {
        last = i;
      } else if (samples.get(i).isKnown()) {
        break;
      }
    }
    return last;
  }

  boolean isSurelyBroken() {
    return samples.subList(from, to + 1).stream().anyMatch(Sample::isSurelyBroken)
        || peak().filter(Sample::isSurelyBroken).isPresent();
  }

  /** The worst point; empty where nothing is known. */
  Optional<Sample> peak() {
    return Peak.of(gauge, samples, from, to);
  }

  /** From edge to edge of a run past the bound; of all samples, from end to end. */
  Band band() {
    double low =
        from == 0
            ? samples.get(0).hz()
            : Edge.between(gauge, samples.get(from - 1), samples.get(from));
    double high =
        to == samples.size() - 1
            ? samples.get(to).hz()
            : Edge.between(gauge, samples.get(to), samples.get(to + 1));
    return new Band(low, high);
  }
}
