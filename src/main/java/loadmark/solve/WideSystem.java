package loadmark.solve;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * A small dense system of linear equations, to about 32 digits, and its transpose.
 *
 * <p>Each pivot is the entry that is largest beside its row's and its column's largest, |a|²/(r·c):
 * the choice stays the same however equations and unknowns are scaled (rook pivoting made
 * scale-free; compare Higham, Accuracy and Stability of Numerical Algorithms, 2002, section 9.1).
 * What rounding leaves of zero is zero. Equations that say nothing new are left out and their
 * unknowns are 0.
 */
final class WideSystem {
  private final int size;
  private final WideComplex[][] matrix;
  private final WideComplex[][] factors;
  private final double[][] terms;
  private final int[] row;
  private final int[] column;
  private int rank;

  /** A system of zeros. */
  WideSystem(int size) {
    this.size = size;
    matrix = new WideComplex[size][size];
    for (WideComplex[] line : matrix) {
      Arrays.fill(line, WideComplex.ZERO);
    }
    factors = new WideComplex[size][];
    terms = new double[size][size];
    row = new int[size];
    column = new int[size];
    Arrays.setAll(row, i -> i);
    Arrays.setAll(column, i -> i);
  }

  int size() {
    return size;
  }

  void add(int i, int j, WideComplex value) {
    matrix[i][j] = matrix[i][j].plus(value);
    terms[i][j] += value.size();
  }

  /** Factors the matrix; nothing may be added any more. */
  void factor() {
    double[][] left = new double[size][];
    for (int i = 0; i < size; i++) {
      factors[i] = matrix[i].clone();
      left[i] = terms[i].clone();
      for (int j = 0; j < size; j++) {
        drop(i, j, left);
      }
    }
    while (rank < size && pivot()) {
      WideComplex[] top = factors[row[rank]];
      WideComplex inverse = top[column[rank]].inverse();
      for (int i = rank + 1; i < size; i++) {
        WideComplex[] line = factors[row[i]];
        if (line[column[rank]].isZero()) {
          continue;
        }
        WideComplex factor = line[column[rank]].times(inverse);
        line[column[rank]] = factor;
        for (int j = rank + 1; j < size; j++) {
          if (!top[column[j]].isZero()) {
            WideComplex product = factor.times(top[column[j]]);
            line[column[j]] = line[column[j]].minus(product);
            left[row[i]][column[j]] += product.size();
            drop(row[i], column[j], left);
          }
        }
      }
      rank++;
    }
  }

  private void drop(int i, int j, double[][] left) {
    if (factors[i][j].size() <= WideLaw.NOTHING * left[i][j]) {
      factors[i][j] = WideComplex.ZERO;
    }
  }

  /** Moves the best pivot to the rank's place; false if all is zero. */
  private boolean pivot() {
    double[] ofRow = new double[size];
    double[] ofColumn = new double[size];
    for (int i = rank; i < size; i++) {
      for (int j = rank; j < size; j++) {
        double entry = factors[row[i]][column[j]].size();
        ofRow[i] = Math.max(ofRow[i], entry);
        ofColumn[j] = Math.max(ofColumn[j], entry);
      }
    }
    double best = 0;
    int bestRow = rank;
    int bestColumn = rank;
    for (int i = rank; i < size; i++) {
      for (int j = rank; j < size; j++) {
        double entry = factors[row[i]][column[j]].size();
        double merit = entry == 0 ? 0 : entry / ofRow[i] * (entry / ofColumn[j]);
        if (merit > best) {
          best = merit;
          bestRow = i;
          bestColumn = j;
        }
      }
    }
    swap(row, rank, bestRow);
    swap(column, rank, bestColumn);
    return best > 0;
  }

  private static void swap(int[] order, int a, int b) {
    int kept = order[a];
    order[a] = order[b];
    order[b] = kept;
  }

  /** x with M·x = b; {@code null} if there is none. */
  WideComplex @Nullable [] solve(WideComplex[] b) {
    WideComplex[] known = permute(b, row);
    double[] sizes = sizes(known);
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < Math.min(i, rank); j++) {
        subtract(known, sizes, i, factors[row[i]][column[j]], j);
      }
    }
    if (contradicts(known, sizes)) {
      return null;
    }
    WideComplex[] solution = zeros();
    for (int i = rank - 1; i >= 0; i--) {
      for (int j = i + 1; j < rank; j++) {
        known[i] = known[i].minus(factors[row[i]][column[j]].times(solution[column[j]]));
      }
      solution[column[i]] = known[i].over(factors[row[i]][column[i]]);
    }
    return solution;
  }

  /** x with Mᵀ·x = c; {@code null} if there is none. */
  WideComplex @Nullable [] solveTransposed(WideComplex[] c) {
    WideComplex[] known = permute(c, column);
    double[] sizes = sizes(known);
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < Math.min(i, rank); j++) {
        subtract(known, sizes, i, factors[row[j]][column[i]], j);
      }
      if (i < rank) {
        WideComplex pivot = factors[row[i]][column[i]];
        sizes[i] /= pivot.size();
        known[i] = known[i].over(pivot);
      }
    }
    if (contradicts(known, sizes)) {
      return null;
    }
    WideComplex[] solution = zeros();
    for (int i = rank - 1; i >= 0; i--) {
      WideComplex sum = known[i];
      for (int j = i + 1; j < rank; j++) {
        sum = sum.minus(factors[row[j]][column[i]].times(solution[row[j]]));
      }
      solution[row[i]] = sum;
    }
    return solution;
  }

  private static WideComplex[] permute(WideComplex[] of, int[] order) {
    WideComplex[] permuted = new WideComplex[of.length];
    Arrays.setAll(permuted, i -> of[order[i]]);
    return permuted;
  }

  /** A vector for one side of the system: 0 but for a 1. */
  WideComplex[] unit(int at) {
    WideComplex[] unit = zeros();
    unit[at] = WideComplex.ONE;
    return unit;
  }

  private static double[] sizes(WideComplex[] of) {
    double[] sizes = new double[of.length];
    for (int i = 0; i < of.length; i++) {
      sizes[i] = of[i].size();
    }
    return sizes;
  }

  WideComplex[] zeros() {
    WideComplex[] zeros = new WideComplex[size];
    Arrays.fill(zeros, WideComplex.ZERO);
    return zeros;
  }

  private static void subtract(
      WideComplex[] known, double[] sizes, int i, WideComplex factor, int j) {
    if (!factor.isZero() && !known[j].isZero()) {
      WideComplex product = factor.times(known[j]);
      known[i] = known[i].minus(product);
      sizes[i] += product.size();
    }
  }

  /** Whether an equation that says nothing of the unknowns is not met. */
  private boolean contradicts(WideComplex[] known, double[] sizes) {
    for (int i = rank; i < size; i++) {
      if (known[i].size() > WideLaw.NOTHING * sizes[i]) {
        return true;
      }
    }
    return false;
  }

  /** Σ |a|·|x|·|y| over the matrix's entries: what roundings of them do to yᵀ·M·x. */
  double rounding(WideComplex[] x, WideComplex[] y) {
    double sum = 0;
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        if (terms[i][j] > 0) {
          sum += terms[i][j] * x[j].size() * y[i].size();
        }
      }
    }
    return sum;
  }
}
