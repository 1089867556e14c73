package loadmark.evidence;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.IntFunction;
import org.apache.commons.math3.complex.Complex;

/**
 * A connected network of resistors, capacitors and inductors, each kind within two decades, between
 * nodes 1…n and the common node 0: a chain with legs to the common node, and some bridges.
 *
 * @param loadOhm of the load between {@code tap} and {@code foot}
 * @param loadFarad across that resistance
 */
record RandomNetwork(
    int nodes, List<Element> elements, int tap, int foot, double loadOhm, double loadFarad) {
  static final double LOWEST_HZ = 1e5;
  static final double HIGHEST_HZ = 1e7;

  enum Kind {
    RESISTOR("resistor", "Ω", 100),
    CAPACITOR("capacitor", "F", 100e-12),
    INDUCTOR("inductor", "H", 1e-6);

    final String word;
    final String unit;
    final double least;

    Kind(String word, String unit, double least) {
      this.word = word;
      this.unit = unit;
      this.least = least;
    }
  }

  record Element(Kind kind, double value, int from, int to) {
    Complex siemens(double hz) {
      double omega = 2 * Math.PI * hz;
      return switch (kind) {
        case RESISTOR -> new Complex(1 / value);
        case CAPACITOR -> new Complex(0, omega * value);
        case INDUCTOR -> new Complex(0, -1 / (omega * value));
      };
    }
  }

  static RandomNetwork of(Random random) {
    int nodes = 3 + random.nextInt(6);
    List<Element> elements = new ArrayList<>();
    for (int k = 1; k < nodes; k++) {
      elements.add(element(random, k, k + 1));
      if (random.nextInt(5) < 3) {
        elements.add(element(random, k, 0));
      }
    }
    elements.add(element(random, nodes, 0));
    for (int bridges = random.nextInt(4); bridges > 0; bridges--) {
      int from = random.nextInt(nodes + 1);
      int to = random.nextInt(nodes + 1);
      if (from != to) {
        elements.add(element(random, from, to));
      }
    }
    int tap = 2 + random.nextInt(nodes - 1);
    int foot = random.nextInt(3) == 0 ? 1 : 0;
    double ohm = twoDecades(random, Kind.RESISTOR.least);
    double farad = twoDecades(random, Kind.CAPACITOR.least);
    return new RandomNetwork(nodes, List.copyOf(elements), tap, foot, ohm, farad);
  }

  private static Element element(Random random, int from, int to) {
    Kind kind = Kind.values()[random.nextInt(3)];
    return new Element(kind, twoDecades(random, kind.least), from, to);
  }

  private static double twoDecades(Random random, double least) {
    return least * Math.pow(100, random.nextDouble());
  }

  static double hz(Random random) {
    return LOWEST_HZ * Math.pow(HIGHEST_HZ / LOWEST_HZ, random.nextDouble());
  }

  /** Impedances times {@code ohms}, at frequencies times {@code hertz}. */
  RandomNetwork scaled(double ohms, double hertz) {
    List<Element> all = new ArrayList<>();
    for (Element e : elements) {
      double factor =
          switch (e.kind) {
            case RESISTOR -> ohms;
            case CAPACITOR -> 1 / (ohms * hertz);
            case INDUCTOR -> ohms / hertz;
          };
      all.add(new Element(e.kind, e.value * factor, e.from, e.to));
    }
    return new RandomNetwork(
        nodes, List.copyOf(all), tap, foot, loadOhm * ohms, loadFarad / (ohms * hertz));
  }

  Complex loadSiemens(double hz) {
    return new Complex(1 / loadOhm, 2 * Math.PI * hz * loadFarad);
  }

  /** The branches for an independent solution, at one frequency. */
  List<NodalSolution.Branch> branches(double hz) {
    List<NodalSolution.Branch> branches = new ArrayList<>();
    for (Element e : elements) {
      branches.add(new NodalSolution.Branch(e.from, e.to, e.siemens(hz)));
    }
    return branches;
  }

  List<NodalSolution.Branch> loadedBranches(double hz) {
    List<NodalSolution.Branch> branches = branches(hz);
    branches.add(new NodalSolution.Branch(tap, foot, loadSiemens(hz)));
    return branches;
  }

  /** The lines of the file, without ports. */
  List<String> lines() {
    return lines(k -> k == 0 ? "ground" : "n" + k, k -> "x" + k);
  }

  List<String> lines(IntFunction<String> node, IntFunction<String> part) {
    List<String> lines = new ArrayList<>();
    for (int k = 0; k < elements.size(); k++) {
      Element e = elements.get(k);
      lines.add(e.kind.word + " " + part.apply(k) + " = " + Text.of(e.value, e.kind.unit));
      lines.add(
          "wire %s -- %s -- %s".formatted(node.apply(e.from), part.apply(k), node.apply(e.to)));
    }
    lines.add(
        "load probe shunt %s -- %s = %s || %s"
            .formatted(
                node.apply(tap), node.apply(foot), Text.ohm(loadOhm), Text.farad(loadFarad)));
    return lines;
  }

  /** A file of these lines and more. */
  String text(String... more) {
    List<String> lines = new ArrayList<>(lines());
    lines.addAll(List.of(more));
    return String.join("\n", lines) + "\n";
  }

  String input() {
    return "port input = n1 -- ground";
  }

  String place() {
    return "port place = n%d -- %s".formatted(tap, foot == 0 ? "ground" : "n" + foot);
  }
}
