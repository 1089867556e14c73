package loadmark.response;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.CommonOps_DDRM;

/**
 * A linear system ζ·x = A·x + B·u, y = C·x + D·u with real matrices, not modified once made.
 *
 * @param a n × n
 * @param b n × inputs
 * @param c outputs × n
 * @param d outputs × inputs
 */
record StateSpace(DMatrixRMaj a, DMatrixRMaj b, DMatrixRMaj c, DMatrixRMaj d) {

  /** The system without states whose one output is 0. */
  static StateSpace zero() {
    return wire(0);
  }

  private static StateSpace wire(double factor) {
    return new StateSpace(
        new DMatrixRMaj(0, 0),
        new DMatrixRMaj(0, 1),
        new DMatrixRMaj(1, 0),
        new DMatrixRMaj(1, 1, true, factor));
  }

  int states() {
    return a.numRows;
  }

  int inputs() {
    return d.numCols;
  }

  int outputs() {
    return d.numRows;
  }

  /** Only one input and one output of it, the output multiplied by a factor. */
  StateSpace part(int output, int input, double factor) {
    return part(output, output + 1, input, input + 1, factor);
  }

  /** Only some inputs and outputs, first ones in, last ones out; outputs times a factor. */
  StateSpace part(int fromOutput, int toOutput, int fromInput, int toInput, double factor) {
    DMatrixRMaj rows = block(c, fromOutput, toOutput, 0, states());
    DMatrixRMaj through = block(d, fromOutput, toOutput, fromInput, toInput);
    CommonOps_DDRM.scale(factor, rows);
    CommonOps_DDRM.scale(factor, through);
    return new StateSpace(a, block(b, 0, states(), fromInput, toInput), rows, through);
  }

  /** May be empty, which the library's own does not allow. */
  private static DMatrixRMaj block(
      DMatrixRMaj from, int fromRow, int toRow, int fromColumn, int toColumn) {
    DMatrixRMaj block = new DMatrixRMaj(toRow - fromRow, toColumn - fromColumn);
    for (int i = fromRow; i < toRow; i++) {
      for (int j = fromColumn; j < toColumn; j++) {
        block.set(i - fromRow, j - fromColumn, from.get(i, j));
      }
    }
    return block;
  }

  /** All of it, the outputs multiplied by a factor. */
  StateSpace scaled(double factor) {
    return part(0, outputs(), 0, inputs(), factor);
  }

  /** The output plus the input, of a system with one of each. */
  StateSpace plusInput() {
    return new StateSpace(a, b, c, new DMatrixRMaj(1, 1, true, d.get(0, 0) + 1));
  }

  /** This system's outputs, fed into another's inputs. */
  StateSpace into(StateSpace next) {
    DMatrixRMaj coupling = product(next.b, c);
    return new StateSpace(
        corners(a, new DMatrixRMaj(states(), next.states()), coupling, next.a),
        above(b, product(next.b, d)),
        beside(product(next.d, c), next.c),
        product(next.d, d));
  }

  /** The outputs of both systems, one after the other, with the same inputs. */
  StateSpace with(StateSpace other) {
    return new StateSpace(
        corners(
            a,
            new DMatrixRMaj(states(), other.states()),
            new DMatrixRMaj(other.states(), states()),
            other.a),
        above(b, other.b),
        corners(
            c,
            new DMatrixRMaj(outputs(), other.states()),
            new DMatrixRMaj(other.outputs(), states()),
            other.c),
        above(d, other.d));
  }

  /** The outputs, and after them the input itself, of a system with one input. */
  StateSpace withInput() {
    return with(wire(1));
  }

  private static DMatrixRMaj product(DMatrixRMaj left, DMatrixRMaj right) {
    DMatrixRMaj product = new DMatrixRMaj(left.numRows, right.numCols);
    CommonOps_DDRM.mult(left, right, product);
    return product;
  }

  private static DMatrixRMaj above(DMatrixRMaj top, DMatrixRMaj bottom) {
    DMatrixRMaj all = new DMatrixRMaj(top.numRows + bottom.numRows, top.numCols);
    CommonOps_DDRM.insert(top, all, 0, 0);
    CommonOps_DDRM.insert(bottom, all, top.numRows, 0);
    return all;
  }

  private static DMatrixRMaj beside(DMatrixRMaj left, DMatrixRMaj right) {
    DMatrixRMaj all = new DMatrixRMaj(left.numRows, left.numCols + right.numCols);
    CommonOps_DDRM.insert(left, all, 0, 0);
    CommonOps_DDRM.insert(right, all, 0, left.numCols);
    return all;
  }

  private static DMatrixRMaj corners(
      DMatrixRMaj topLeft, DMatrixRMaj topRight, DMatrixRMaj bottomLeft, DMatrixRMaj bottomRight) {
    return above(beside(topLeft, topRight), beside(bottomLeft, bottomRight));
  }
}
