package loadmark.allowance;

import java.util.List;
import java.util.Optional;
import loadmark.judge.LimitJudgement;
import loadmark.network.Limit;
import loadmark.network.OnePort;

/**
 * How far a load may grow before it breaks a limit for the first time. What {@link StopFinder} says
 * is judged; where the judgement finds a limit broken, its bands lead to an earlier stop, until it
 * finds none. Lighter loads are judged too, some for safety and all of them, by steps, where a
 * limit's kind has no closed form.
 */
final class GrowthSearch {
  private static final int MOST_ROUNDS = 60;

  /** Two stops nearer than this, relative, are one. */
  private static final double SAME = 1e-7;

  /** How much lighter a load is tried where rounding takes the heaviest for broken. */
  private static final double[] BACK = {1e-11, 1e-10, 1e-9, 1e-8, SAME};

  /** Lighter loads that are judged where the heaviest is known in closed form. */
  private static final double[] LIGHTER = {0.7, 0.3, 0.03};

  /** How far from the load in the file a search without closed forms goes. */
  private static final double RANGE = 1e6;

  /** What a load without bound is tried at. */
  private static final double HEAVY = 1e3;

  private static final double STEP = Math.pow(10, 0.25);

  private final Trial trial;
  private final StopFinder finder;
  private final boolean known;
  private final boolean careful;

  /** What is broken with nothing at the place. */
  private final Optional<Limit> brokenWithout;

  /**
   * @param careful whether some lighter loads are judged too
   */
  GrowthSearch(Trial trial, StopFinder finder, List<Limit> limits, boolean careful) {
    this.trial = trial;
    this.finder = finder;
    this.known = limits.stream().allMatch(Breaches::knows);
    this.careful = careful;
    this.brokenWithout = trial.findBroken(trial.judge(Optional.empty()));
  }

  Stop find(Growth growth) {
    Optional<OnePort> start = growth.start();
    Optional<Limit> broken =
        start.isPresent() ? trial.findBroken(trial.judge(start)) : brokenWithout;
    if (broken.isPresent()) {
      return Stop.at(0, broken.get());
    }
    Stop stop = settle(growth, finder.find(growth));
    if (!known) {
      stop = settle(growth, stop.sooner(climb(growth, stop.t())));
    }
    if (careful && stop.t() > 0) {
      double top = stop.limit().isPresent() ? stop.t() : growth.usual() * HEAVY;
      for (double lighter : LIGHTER) {
        stop = settle(growth, stop, top * lighter);
      }
    }
    return stop;
  }

  private Stop settle(Growth growth, Stop stop) {
    double t = stop.limit().isPresent() ? stop.t() : growth.usual() * HEAVY;
    return t == 0 ? stop : settle(growth, stop, t);
  }

  /** The stop, or an earlier one where the load at {@code t} turns out to break a limit. */
  private Stop settle(Growth growth, Stop stop, double t) {
    Stop settled = stop;
    double tried = t;
    for (int round = 0; round < MOST_ROUNDS; round++) {
      List<LimitJudgement> judged = judge(growth, tried);
      Optional<Limit> broken = trial.findBroken(judged);
      if (broken.isEmpty()) {
        return settled;
      }
      Stop earlier = inBands(growth, judged);
      if (earlier.t() == 0) {
        return earlier;
      }
      if (earlier.t() > tried * (1 + SAME)) {
        return bisect(growth, tried, broken.get());
      }
      if (earlier.t() > tried * (1 - SAME)) {
        return stepBack(growth, earlier.sooner(Stop.at(tried, broken.get())));
      }
      settled = earlier;
      tried = earlier.t();
    }
    return bisect(growth, tried, settled.limit().orElseThrow());
  }

  private List<LimitJudgement> judge(Growth growth, double t) {
    return trial.judge(Optional.of(growth.at(t)));
  }

  private boolean isBroken(Growth growth, double t) {
    return trial.findBroken(judge(growth, t)).isPresent();
  }

  private Stop inBands(Growth growth, List<LimitJudgement> judged) {
    Stop first = Stop.NOWHERE;
    for (int i = 0; i < judged.size(); i++) {
      first = first.sooner(finder.find(trial.limit(i), growth, judged.get(i).bands()));
    }
    return first;
  }

  /** On the bound itself rounding decides. */
  private Stop stepBack(Growth growth, Stop stop) {
    for (double back : BACK) {
      double t = stop.t() * (1 - back);
      if (!isBroken(growth, t)) {
        return new Stop(t, stop.limit());
      }
    }
    return bisect(growth, stop.t(), stop.limit().orElseThrow());
  }

  /** Step by step from light to heavy. */
  private Stop climb(Growth growth, double end) {
    for (double t = growth.usual() / RANGE; t < Math.min(end, growth.usual() * RANGE); t *= STEP) {
      Optional<Limit> broken = trial.findBroken(judge(growth, t));
      if (broken.isPresent()) {
        return bisect(growth, t, broken.get());
      }
    }
    return Stop.NOWHERE;
  }

  /** Between a load that breaks a limit and a lighter one that does not. */
  private Stop bisect(Growth growth, double heavy, Limit limit) {
    double high = heavy;
    double low = heavy / STEP;
    Limit stopped = limit;
    while (isBroken(growth, low)) {
      high = low;
      low /= STEP;
      if (low < growth.usual() / (RANGE * RANGE)) {
        return Stop.at(0, limit);
      }
    }
    while (high > low * (1 + SAME / 100)) {
      double middle = Math.sqrt(low) * Math.sqrt(high);
      Optional<Limit> broken = trial.findBroken(judge(growth, middle));
      if (broken.isPresent()) {
        high = middle;
        stopped = broken.get();
      } else {
        low = middle;
      }
    }
    return Stop.at(low, stopped);
  }
}
