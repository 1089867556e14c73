package loadmark.judge;

import loadmark.response.Loading;

/** A point of a grid, with the curves' values there; NaN where a curve has none. */
final class GridPoint {
  private final double x;
  private final Loading loading;
  private final double[] values;

  GridPoint(Loading loading, double[] values) {
    this.x = Math.log(loading.hz());
    this.loading = loading;
    this.values = values.clone();
  }

  /** ln f. */
  double x() {
    return x;
  }

  double hz() {
    return loading.hz();
  }

  Loading loading() {
    return loading;
  }

  int curves() {
    return values.length;
  }

  double value(int curve) {
    return values[curve];
  }
}
