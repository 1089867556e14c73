package loadmark.equation;

import java.util.ArrayList;
import java.util.List;
import loadmark.network.OnePort.ElementKind;

/** What a two-terminal asks of its voltage and current: nothing but one of three things. */
public sealed interface Law {

  /** A two-terminal that is open, or a join, at every frequency asked. */
  enum Fixed implements Law {
    OPEN,
    JOINED
  }

  /**
   * A sum over elements and over the inverses of inner sums: an admittance where they stand side by
   * side, an impedance where they stand end to end. Inner sums are of the other sort.
   */
  final class Sum implements Law {
    private final boolean impedance;
    private final ElementKind[] kinds;
    private final int[] elements;
    private final Sum[] inner;

    private Sum(boolean impedance, ElementKind[] kinds, int[] elements, Sum[] inner) {
      this.impedance = impedance;
      this.kinds = kinds;
      this.elements = elements;
      this.inner = inner;
    }

    /** Whether the sum is an impedance, Ω; else an admittance, S. */
    public boolean isImpedance() {
      return impedance;
    }

    public int elements() {
      return elements.length;
    }

    /** The place of an element's value in the vector of values. */
    public int element(int i) {
      return elements[i];
    }

    /** Whether the sum holds 1/value of an element rather than its value. */
    public boolean isInverse(int i) {
      return switch (kinds[i]) {
        case RESISTANCE, INDUCTANCE -> !impedance;
        case CONDUCTANCE, CAPACITANCE -> impedance;
      };
    }

    /** The power of s that goes with an element's coefficient: −1, 0 or 1. */
    public int power(int i) {
      return switch (kinds[i]) {
        case RESISTANCE, CONDUCTANCE -> 0;
        case INDUCTANCE -> impedance ? 1 : -1;
        case CAPACITANCE -> impedance ? -1 : 1;
      };
    }

    public int inners() {
      return inner.length;
    }

    public Sum inner(int i) {
      return inner[i];
    }

    /**
     * The sum of the coefficients of one power of s.
     *
     * @param values of all elements, in the network's order, SI units
     */
    public double coefficient(int power, double[] values) {
      double sum = 0;
      for (int i = 0; i < elements.length; i++) {
        if (power(i) == power) {
          double value = values[elements[i]];
          sum += isInverse(i) ? 1 / value : value;
        }
      }
      return sum;
    }

    /** How many elements it has in all. */
    public int size() {
      int size = elements.length;
      for (Sum sum : inner) {
        size += sum.size();
      }
      return size;
    }

    private Sum as(boolean wanted) {
      if (wanted == impedance) {
        return this;
      }
      return elements.length == 1 && inner.length == 0
          ? new Sum(wanted, kinds, elements, inner)
          : new Sum(wanted, new ElementKind[0], new int[0], new Sum[] {this});
    }
  }

  /** A single element, by the place of its value. */
  static Law element(ElementKind kind, int index) {
    return new Sum(false, new ElementKind[] {kind}, new int[] {index}, new Sum[0]);
  }

  /** Side by side; open where there is none. */
  static Law parallel(List<Law> members) {
    return combine(false, members, Fixed.OPEN, Fixed.JOINED);
  }

  /** End to end; a join where there is none. */
  static Law series(List<Law> members) {
    return combine(true, members, Fixed.JOINED, Fixed.OPEN);
  }

  private static Law combine(boolean impedance, List<Law> members, Fixed nothing, Fixed all) {
    List<Sum> sums = new ArrayList<>(members.size());
    for (Law member : members) {
      if (member == all) {
        return all;
      }
      if (member instanceof Sum sum) {
        sums.add(sum);
      }
    }
    if (sums.size() < 2) {
      return sums.isEmpty() ? nothing : sums.get(0);
    }
    int elements = 0;
    int inners = 0;
    for (int i = 0; i < sums.size(); i++) {
      Sum sum = sums.get(i).as(impedance);
      sums.set(i, sum);
      elements += sum.elements.length;
      inners += sum.inner.length;
    }
    ElementKind[] kinds = new ElementKind[elements];
    int[] indices = new int[elements];
    Sum[] inner = new Sum[inners];
    for (Sum sum : sums) {
      elements -= sum.elements.length;
      inners -= sum.inner.length;
      System.arraycopy(sum.kinds, 0, kinds, elements, sum.elements.length);
      System.arraycopy(sum.elements, 0, indices, elements, sum.elements.length);
      System.arraycopy(sum.inner, 0, inner, inners, sum.inner.length);
    }
    return new Sum(impedance, kinds, indices, inner);
  }
}
