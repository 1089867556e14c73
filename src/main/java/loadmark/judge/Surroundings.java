package loadmark.judge;

import java.util.stream.DoubleStream;
import loadmark.network.Band;

/** Where to look to tell what happens at candidates and between them. */
final class Surroundings {
  /** Relative distances from a candidate: from what the best ones to what the worst are off. */
  private static final double[] AWAY = {1e-11, 1e-10, 1e-9, 1e-8, 1e-7, 1e-6, 1e-5, 1e-4, 1e-3};

  /** Between neighbours, as parts of the logarithm of their ratio. */
  private static final double[] BETWEEN = {0.03, 0.25, 0.5, 0.75, 0.97};

  private Surroundings() {}

  /**
   * Frequencies at, beside and between candidates and the band's ends.
   *
   * @param candidates Hz, ascending, inside the band
   * @return Hz, ascending, both ends of the band among them
   */
  static double[] of(double[] candidates, Band band) {
    DoubleStream.Builder points = DoubleStream.builder();
    points.add(band.fromHz()).add(band.toHz());
    double last = band.fromHz();
    for (int i = 0; i <= candidates.length; i++) {
      double next = i < candidates.length ? candidates[i] : band.toHz();
      for (double part : BETWEEN) {
        points.add(last * Math.pow(next / last, part));
      }
      last = next;
    }
    for (double candidate : candidates) {
      points.add(candidate);
      for (double away : AWAY) {
        points.add(candidate / (1 + away)).add(candidate * (1 + away));
      }
    }
    return points
        .build()
        .filter(hz -> band.fromHz() <= hz && hz <= band.toHz())
        .sorted()
        .distinct()
        .toArray();
  }
}
