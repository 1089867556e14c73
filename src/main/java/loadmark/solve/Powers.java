package loadmark.solve;

import java.util.Arrays;

/**
 * Sums over branches of |y|·|Δv|² and its like at each frequency of a block. With one volt at the
 * port the derivative of the port's admittance by a branch's admittance is Δv², Δv being the
 * voltage across the branch (Director and Rohrer, The generalized adjoint network and network
 * sensitivities, 1969). So these sums turn relative errors of branches into errors of the port's
 * admittance: without the loads (Δv), with them (Δv′), and of the difference of both (Δv′² − Δv²).
 */
final class Powers {
  final double[] without;
  final double[] with;
  final double[] change;
  private final double[] part;
  private final double[] partWith;
  private final double[] partChange;

  Powers(int size) {
    without = new double[size];
    with = new double[size];
    change = new double[size];
    part = new double[size];
    partWith = new double[size];
    partChange = new double[size];
  }

  void clear(int n) {
    Arrays.fill(without, 0, n, 0);
    Arrays.fill(with, 0, n, 0);
    Arrays.fill(change, 0, n, 0);
  }

  /** Adds a branch of the given sizes |y| between two nodes. */
  void add(double[] size, NodeBlock a, NodeBlock b, int n) {
    Kernels.distanceSquare(part, a.re, a.im, b.re, b.im, n);
    Kernels.distanceSquare(partWith, a.withRe, a.withIm, b.withRe, b.withIm, n);
    Kernels.distanceSquare(partChange, a.changeRe, a.changeIm, b.changeRe, b.changeIm, n);
    Kernels.addProduct(without, size, part, n);
    Kernels.addProduct(with, size, partWith, n);
    Kernels.addMixed(change, size, part, partWith, partChange, n);
  }
}
