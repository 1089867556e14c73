package loadmark.response;

import java.util.Arrays;
import java.util.List;
import loadmark.equation.Equations;
import loadmark.network.Load;
import loadmark.solve.Frequencies;
import org.jspecify.annotations.Nullable;

/** A comparison by the elimination engine, prepared for DC and for the rest when first asked. */
final class SolvedComparison implements Comparison {
  /** The laws at DC are real constants: any frequency will do. */
  private static final Frequencies ANY = Frequencies.ofS(new double[] {0}, new double[] {1});

  private final Equations equations;
  private final Equations equationsAtDc;
  private final List<Load> loads;
  private final List<Load> against;
  private volatile @Nullable Regime regime;
  private volatile @Nullable Loading atDc;

  SolvedComparison(
      Equations equations, Equations equationsAtDc, List<Load> loads, List<Load> against) {
    this.equations = equations;
    this.equationsAtDc = equationsAtDc;
    this.loads = loads;
    this.against = against;
  }

  @Override
  public Loading at(double hz) {
    return at(new double[] {hz}).get(0);
  }

  @Override
  public List<Loading> at(double[] hz) {
    Loading[] found = new Loading[hz.length];
    double[] others = new double[hz.length];
    int size = 0;
    for (int i = 0; i < hz.length; i++) {
      if (!(hz[i] >= 0 && hz[i] < Double.POSITIVE_INFINITY)) {
        throw new IllegalArgumentException(hz[i] + " Hz");
      }
      if (hz[i] == 0) {
        found[i] = atDc();
      } else {
        others[size++] = hz[i];
      }
    }
    double[] positive = size == hz.length ? hz : Arrays.copyOf(others, size);
    if (size > 0) {
      List<Loading> solved = regime().solve(Frequencies.ofHz(positive), positive);
      int next = 0;
      for (int i = 0; i < hz.length; i++) {
        found[i] = hz[i] == 0 ? found[i] : solved.get(next++);
      }
    }
    return List.of(found);
  }

  private Regime regime() {
    Regime ready = regime;
    if (ready == null) {
      ready = new Regime(equations, loads, against);
      regime = ready;
    }
    return ready;
  }

  private Loading atDc() {
    Loading ready = atDc;
    if (ready == null) {
      ready = new Regime(equationsAtDc, loads, against).solve(ANY, new double[] {0}).get(0);
      atDc = ready;
    }
    return ready;
  }
}
