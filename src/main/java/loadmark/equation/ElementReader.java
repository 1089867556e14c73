package loadmark.equation;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import loadmark.network.OnePort;

/** Turns two-terminals into laws and numbers their elements in the order it meets them. */
final class ElementReader {
  private static final int FIRST_SIZE = 16;

  private final boolean dc;
  private double[] values = new double[FIRST_SIZE];
  private int size;

  ElementReader(boolean dc) {
    this.dc = dc;
  }

  Law read(OnePort onePort) {
    if (onePort instanceof OnePort.Element element) {
      return read(element);
    }
    if (onePort instanceof OnePort.Series series) {
      return Law.series(readAll(series.members()));
    }
    return Law.parallel(readAll(((OnePort.Parallel) onePort).members()));
  }

  private List<Law> readAll(List<OnePort> members) {
    List<Law> laws = new ArrayList<>(members.size());
    for (OnePort member : members) {
      laws.add(read(member));
    }
    return laws;
  }

  private Law read(OnePort.Element element) {
    if (size == values.length) {
      values = Arrays.copyOf(values, 2 * size);
    }
    double value = element.value().nominal();
    values[size++] = value;
    return switch (element.kind()) {
      case RESISTANCE -> value == 0 ? Law.Fixed.JOINED : Law.element(element.kind(), size - 1);
      case CONDUCTANCE -> value == 0 ? Law.Fixed.OPEN : Law.element(element.kind(), size - 1);
      case CAPACITANCE -> dc ? Law.Fixed.OPEN : Law.element(element.kind(), size - 1);
      case INDUCTANCE -> dc ? Law.Fixed.JOINED : Law.element(element.kind(), size - 1);
    };
  }

  /** The nominal values of all elements read, SI units. */
  double[] values() {
    return Arrays.copyOf(values, size);
  }
}
