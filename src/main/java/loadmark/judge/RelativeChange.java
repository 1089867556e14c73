package loadmark.judge;

import java.util.List;
import java.util.Optional;
import loadmark.network.Criterion;
import loadmark.response.Level;
import loadmark.response.Loading;

/** |Z_with − Z_without| / |Z_without| at most {@code most}. */
record RelativeChange(double most) implements Measure {
  @Override
  public Reading read(Loading loading) {
    return loading.change().isUndetermined()
        ? Unknowns.ofChange(loading)
        : Excess.atMost(loading.change().magnitude(), most, loading.changeError());
  }

  @Override
  public List<Level> levels(double excess) {
    return Levels.ofMost(Criterion.CHANGE, Optional.empty(), most, excess);
  }
}
