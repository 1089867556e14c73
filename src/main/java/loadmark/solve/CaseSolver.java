package loadmark.solve;

import java.util.Arrays;
import java.util.concurrent.atomic.AtomicReference;
import loadmark.equation.ComparedNetwork;
import org.jspecify.annotations.Nullable;

/**
 * Solves a case and its reference at any frequencies, compiled once for a topology. Thread-safe;
 * values may be replaced from call to call.
 */
public final class CaseSolver {
  /** About what a processor keeps near, in doubles. */
  private static final int NEAR = 1 << 17;

  private static final int LEAST_BLOCK = 64;
  private static final int LARGEST_BLOCK = 256;

  private final CasePlan plan;
  private final boolean estimates;
  private final Storage storage;
  private final int block;
  private final GeneralPath general;
  private final AtomicReference<@Nullable CaseBlock> idleOne = new AtomicReference<>();
  private final AtomicReference<@Nullable CaseBlock> idleBlock = new AtomicReference<>();

  /** With error estimates. */
  public CaseSolver(ComparedNetwork network) {
    this(network, true);
  }

  /**
   * Compiles a case.
   *
   * @param estimates whether each result is to carry an estimate of its error, which takes several
   *     times as long; without, results are guarded by the growth of the eliminations alone
   */
  public CaseSolver(ComparedNetwork network, boolean estimates) {
    plan = new CasePlan(network);
    this.estimates = estimates;
    general = new GeneralPath(plan);
    storage = Storage.of(plan.main, estimates);
    int footprint = BranchBlock.footprint(plan.main, storage, estimates);
    block = Math.max(LEAST_BLOCK, Math.min(LARGEST_BLOCK, NEAR / footprint / 32 * 32));
  }

  /**
   * Solves at each frequency.
   *
   * @param values of all elements, in the network's order, SI units
   */
  public Solutions solve(double[] values, Frequencies s) {
    Solutions to = Solutions.of(s.size(), estimates);
    boolean[] doubtful = new boolean[s.size()];
    if (general.isNeeded()) {
      Arrays.fill(doubtful, true);
    } else {
      solve(values, s, to, doubtful);
    }
    for (int i = 0; i < doubtful.length; i++) {
      if (doubtful[i]) {
        Solutions again = Solutions.of(1, true);
        if (general.solve(values, s, i, again)) {
          to.improve(i, again);
        } else {
          to.setUndetermined(i);
        }
      }
    }
    return to;
  }

  private void solve(double[] values, Frequencies s, Solutions to, boolean[] doubtful) {
    int size = s.size() == 1 ? 1 : block;
    AtomicReference<@Nullable CaseBlock> idle = s.size() == 1 ? idleOne : idleBlock;
    CaseBlock found = idle.getAndSet(null);
    CaseBlock work = found == null ? new CaseBlock(plan, storage, size, estimates) : found;
    for (int from = 0; from < s.size(); from += size) {
      work.solve(values, s, from, Math.min(size, s.size() - from), to, doubtful);
    }
    idle.set(work);
  }
}
