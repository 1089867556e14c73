package loadmark.response;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import loadmark.network.Load;
import loadmark.network.OnePort;

/** Seeded random ladders and bridged networks with shunt and series loads, and cases of them. */
final class RandomCircuits {

  /** How far apart values may be. */
  record Span(double from, double to) {}

  /** How far apart the values are: Ω, F, H, Hz. */
  record Range(String name, Span ohm, Span farad, Span henry, Span hz) {
    static final Range MILD =
        new Range(
            "mild",
            new Span(10, 1e5),
            new Span(1e-11, 1e-7),
            new Span(1e-7, 1e-2),
            new Span(1e2, 1e7));
    static final Range EXTREME =
        new Range(
            "extreme",
            new Span(1e-3, 1e9),
            new Span(1e-15, 1e-3),
            new Span(1e-10, 1),
            new Span(0.1, 1e10));

    static Range[] both() {
      return new Range[] {MILD, EXTREME};
    }
  }

  /** A circuit at one frequency, and which loads are on. */
  record Sample(Circuit circuit, double hz, List<Load> with, List<Load> without) {}

  private static final int MOST_NODES = 14;
  private static final int MOST_LOADS = 3;

  private final Random random;
  private final Range range;

  private RandomCircuits(Random random, Range range) {
    this.random = random;
    this.range = range;
  }

  static Sample of(long seed, Range range) {
    return new RandomCircuits(new Random(seed), range).sample();
  }

  private Sample sample() {
    Circuit circuit = new Circuit();
    int nodes = 2 + random.nextInt(MOST_NODES - 1);
    int next = nodes + 1;
    int loads = 1 + random.nextInt(MOST_LOADS);
    for (int i = 1; i < nodes; i++) {
      if (loads > 1 && random.nextInt(nodes) == 0) {
        circuit.series(i, next, load());
        circuit.part(next++, i + 1, element());
        loads--;
      } else {
        circuit.part(i, i + 1, element());
      }
      if (random.nextInt(3) > 0) {
        circuit.part(i, 0, element());
      }
    }
    circuit.part(nodes, 0, element());
    if (random.nextBoolean()) {
      for (int i = 0; i < nodes / 2; i++) {
        int a = random.nextInt(nodes + 1);
        circuit.part(a, other(a, nodes), element());
      }
    }
    for (int i = 0; i < loads; i++) {
      int a = 1 + random.nextInt(nodes);
      circuit.shunt(a, random.nextInt(3) == 0 ? other(a, nodes) : 0, load());
    }
    circuit.port(1, random.nextInt(4) == 0 ? other(1, nodes) : 0);
    return chooseCase(circuit, of(range.hz));
  }

  private Sample chooseCase(Circuit circuit, double hz) {
    List<Load> with = new ArrayList<>();
    List<Load> without = new ArrayList<>();
    for (Load load : circuit.network().loads()) {
      int kind = random.nextInt(5);
      if (kind != 3) {
        with.add(load);
      }
      if (kind > 2) {
        without.add(load);
      }
    }
    return new Sample(circuit, hz, with, without);
  }

  /** Any node but one. */
  private int other(int than, int nodes) {
    return (than + 1 + random.nextInt(nodes)) % (nodes + 1);
  }

  private OnePort load() {
    return switch (random.nextInt(3)) {
      case 0 -> element();
      case 1 -> Circuit.parallel(element(), element());
      default -> Circuit.series(element(), Circuit.parallel(element(), element()));
    };
  }

  private OnePort element() {
    return switch (random.nextInt(3)) {
      case 0 -> Circuit.r(of(range.ohm));
      case 1 -> Circuit.c(of(range.farad));
      default -> Circuit.l(of(range.henry));
    };
  }

  /** Evenly spread over the decades. */
  private double of(Span span) {
    return span.from * Math.pow(span.to / span.from, random.nextDouble());
  }
}
