package loadmark.judge;

import loadmark.response.Loading;

/** |Z_with − Z_without| / |Z_without| at most {@code most}. */
record RelativeChange(double most) implements Measure {
  @Override
  public Reading read(Loading loading) {
    return loading.change().isUndetermined()
        ? Unknowns.ofChange(loading)
        : Excess.atMost(loading.change().magnitude(), most);
  }
}
