package loadmark.touchstone;

import java.util.List;
import java.util.Optional;
import java.util.function.BinaryOperator;
import java.util.stream.IntStream;

/**
 * A square matrix for one or two ports.
 *
 * @param entries row by row: 1, or 11 12 21 22
 */
public record Matrix(List<Complex> entries) {
  static final Matrix ONE = new Matrix(List.of(Complex.ONE));
  static final Matrix UNIT =
      new Matrix(List.of(Complex.ONE, Complex.ZERO, Complex.ZERO, Complex.ONE));

  /** Roundings that a difference of two products carries, as a bound. */
  private static final double ROUNDING = 8 * Math.ulp(1.0);

  public Matrix {
    entries = List.copyOf(entries);
    if (entries.size() != 1 && entries.size() != 4) {
      throw new IllegalArgumentException("entries: " + entries.size());
    }
  }

  static Matrix unit(int ports) {
    return ports == 1 ? ONE : UNIT;
  }

  /** How many ports: 1 or 2. */
  public int ports() {
    return entries.size() == 1 ? 1 : 2;
  }

  /**
   * One entry.
   *
   * @param row from 1: the port that answers
   * @param column from 1: the port that drives
   */
  public Complex at(int row, int column) {
    int ports = ports();
    if (row < 1 || row > ports || column < 1 || column > ports) {
      throw new IllegalArgumentException(row + ", " + column + " of " + ports);
    }
    return entries.get((row - 1) * ports + column - 1);
  }

  boolean isFinite() {
    return entries.stream().allMatch(Complex::isFinite);
  }

  Matrix plus(Matrix other) {
    return combine(other, Complex::plus);
  }

  Matrix minus(Matrix other) {
    return combine(other, Complex::minus);
  }

  private Matrix combine(Matrix other, BinaryOperator<Complex> operator) {
    return new Matrix(
        IntStream.range(0, entries.size())
            .mapToObj(i -> operator.apply(entries.get(i), other.entries.get(i)))
            .toList());
  }

  /**
   * The matrix X of (this)·X = right.
   *
   * @return empty where this cannot be told from a singular matrix, or where X is beyond doubles
   */
  Optional<Matrix> solve(Matrix right) {
    return (ports() == 1 ? quotient(right) : cramer(right)).filter(Matrix::isFinite);
  }

  private Optional<Matrix> quotient(Matrix right) {
    Complex divisor = entries.get(0);
    return divisor.isZero()
        ? Optional.empty()
        : Optional.of(new Matrix(List.of(right.entries.get(0).dividedBy(divisor))));
  }

  private Optional<Matrix> cramer(Matrix right) {
    Complex determinant = determinant(at(1, 1), at(1, 2), at(2, 1), at(2, 2));
    double products =
        at(1, 1).magnitude() * at(2, 2).magnitude() + at(1, 2).magnitude() * at(2, 1).magnitude();
    if (!(determinant.magnitude() > ROUNDING * products)) {
      return Optional.empty();
    }
    return Optional.of(
        new Matrix(
            List.of(
                determinant(right.at(1, 1), at(1, 2), right.at(2, 1), at(2, 2))
                    .dividedBy(determinant),
                determinant(right.at(1, 2), at(1, 2), right.at(2, 2), at(2, 2))
                    .dividedBy(determinant),
                determinant(at(1, 1), right.at(1, 1), at(2, 1), right.at(2, 1))
                    .dividedBy(determinant),
                determinant(at(1, 1), right.at(1, 2), at(2, 1), right.at(2, 2))
                    .dividedBy(determinant))));
  }

  private static Complex determinant(Complex a, Complex b, Complex c, Complex d) {
    return a.times(d).minus(b.times(c));
  }
}
