package loadmark.judge;

import java.util.Arrays;
import java.util.Optional;
import java.util.stream.DoubleStream;
import loadmark.network.Band;
import loadmark.response.Crossings;
import loadmark.response.Level;

/** The crossings of one port with one set of loads, asked for by excess. */
final class Algebra {
  private final Crossings crossings;

  Algebra(Crossings crossings) {
    this.crossings = crossings;
  }

  /** Why it cannot be asked, in words that follow "because". */
  Optional<String> findObstacle() {
    return crossings.findObstacle();
  }

  /**
   * Where a measure may have an excess.
   *
   * @param parts the band is cut into so many, each looked at by itself: more of them see sharper
   * @return Hz, ascending; empty where the algebra failed
   */
  Optional<double[]> candidates(Measure measure, double excess, Band band, int parts) {
    try {
      DoubleStream all = DoubleStream.empty();
      for (Level level : measure.levels(excess)) {
        for (int i = 0; i < parts; i++) {
          Band part = part(band, i, parts);
          all = DoubleStream.concat(all, Arrays.stream(crossings.candidates(level, part)));
        }
      }
      return Optional.of(all.sorted().distinct().toArray());
    } catch (ArithmeticException failed) {
      return Optional.empty();
    }
  }

  private static Band part(Band band, int i, int parts) {
    double ratio = band.toHz() / band.fromHz();
    double from = i == 0 ? band.fromHz() : band.fromHz() * Math.pow(ratio, (double) i / parts);
    double to =
        i == parts - 1 ? band.toHz() : band.fromHz() * Math.pow(ratio, (double) (i + 1) / parts);
    return new Band(from, to);
  }
}
