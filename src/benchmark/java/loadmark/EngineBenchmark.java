package loadmark;

import java.util.List;
import java.util.concurrent.TimeUnit;
import loadmark.equation.Equations;
import loadmark.network.Network;
import loadmark.solve.CaseSolver;
import loadmark.solve.Frequencies;
import loadmark.solve.Solutions;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Threads;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Network solutions a second on a ladder: Z bare and Z loaded together are one solution, assembly
 * included. The branch engine runs guarded by its growth monitor, without error estimates.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
@Threads(1)
@Fork(1)
@Warmup(iterations = 8, time = 1)
@Measurement(iterations = 5, time = 1)
public class EngineBenchmark {
  private static final int POINTS = 2000;

  /** An invocation takes every eighth frequency, so that the slow ones end in time. */
  private static final int SLICES = 8;

  private static final double FROM_HZ = 1e3;
  private static final double TO_HZ = 3e6;

  /** Both engines must agree to this before they are timed. */
  private static final double AGREEMENT = 1e-6;

  @Param({"5", "10", "20", "50", "100", "200"})
  public int nodes;

  @Param({"branch", "dense"})
  public String engine = "branch";

  private final double[][] slices = new double[SLICES][POINTS / SLICES];
  private int next;
  private DenseLadder dense;
  private CaseSolver branch;
  private double[] values;

  /** Builds both engines' networks and compares their answers. */
  @Setup
  public void build() {
    for (int i = 0; i < POINTS; i++) {
      double hz = FROM_HZ * Math.pow(TO_HZ / FROM_HZ, i / (POINTS - 1.0));
      slices[i % SLICES][i / SLICES] = hz;
    }
    Ladder ladder = new Ladder(nodes);
    Network network = ladder.network();
    Equations equations = Equations.of(network, network.ports().get(0), false);
    branch = new CaseSolver(equations.compare(List.of(), network.loads()), false);
    values = equations.nominalValues();
    dense = new DenseLadder(ladder);
    double[] few = {FROM_HZ, 1e5, TO_HZ};
    double[] expected = dense.solve(few);
    Solutions found = branch.solve(values, Frequencies.ofHz(few));
    for (int i = 0; i < few.length; i++) {
      check(expected[4 * i], expected[4 * i + 1], found.without(), i);
      check(expected[4 * i + 2], expected[4 * i + 3], found.with(), i);
    }
  }

  private static void check(double re, double im, Solutions.Quantity found, int i) {
    double apart = Math.hypot(re - found.re(i), im - found.im(i));
    if (!(apart <= AGREEMENT * Math.hypot(re, im))) {
      throw new IllegalStateException(
          re + " + j" + im + " is not " + found.re(i) + " + j" + found.im(i));
    }
  }

  /** Solves the ladder at the next slice of the frequencies. */
  @Benchmark
  @OperationsPerInvocation(POINTS / SLICES)
  public Object solve() {
    double[] hz = slices[next];
    next = (next + 1) % SLICES;
    return engine.equals("dense") ? dense.solve(hz) : branch.solve(values, Frequencies.ofHz(hz));
  }
}
