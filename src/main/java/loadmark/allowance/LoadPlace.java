package loadmark.allowance;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loadmark.network.Case;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Port;
import loadmark.response.Change;
import loadmark.response.Comparison;
import loadmark.response.Loading;
import loadmark.response.Ohms;
import loadmark.response.Responses;
import org.apache.commons.math3.complex.Complex;

/**
 * The place of a load as one port sees it, the other loads of a case on. What is needed is had from
 * three comparisons, so that nothing is subtracted: without the load; with a resistor there; and
 * from the place itself, with the port open.
 */
final class LoadPlace {
  /** Any resistance will do: its change is known to the same digits however small. */
  private static final double PROBE_OHM = 1e3;

  private final boolean series;
  private final Comparison without;
  private final Comparison probed;
  private final Comparison seen;

  private LoadPlace(boolean series, Comparison without, Comparison probed, Comparison seen) {
    this.series = series;
    this.without = without;
    this.probed = probed;
    this.seen = seen;
  }

  static LoadPlace of(Network network, Port port, Case within, Load load) {
    PlaceNetwork variants = new PlaceNetwork(network, load);
    List<Load> others = variants.replaced(within.loads(), Optional.empty());
    Load probe = variants.with(OnePort.of(ElementKind.RESISTANCE, PROBE_OHM));
    List<Load> withProbe = variants.replaced(within.loads(), Optional.of(probe));
    PlaceNetwork.Seen place = variants.seen(port);
    return new LoadPlace(
        load.placement() == Load.Placement.SERIES,
        Responses.of(network, port).compare(others, within.against()),
        Responses.of(variants.with(probe, within, List.of()), port).compare(withProbe, others),
        Responses.of(place.network(), place.place())
            .compare(PlaceNetwork.same(others, place.network()), List.of()));
  }

  /** What one frequency shows. */
  record Point(Loading without, Optional<PlaceResponse> response) {}

  Point at(double hz) {
    return at(new double[] {hz}).get(0);
  }

  /** In the order given; without a response where something is open or undetermined. */
  List<Point> at(double[] hz) {
    List<Loading> bare = without.at(hz);
    List<Loading> loaded = probed.at(hz);
    List<Loading> from = seen.at(hz);
    List<Point> points = new ArrayList<>(hz.length);
    for (int i = 0; i < hz.length; i++) {
      points.add(new Point(bare.get(i), response(bare.get(i), loaded.get(i), from.get(i).with())));
    }
    return points;
  }

  private Optional<PlaceResponse> response(Loading bare, Loading loaded, Ohms z) {
    if (!bare.with().isFinite() || !loaded.with().isFinite() || z.isUndetermined()) {
      return Optional.empty();
    }
    boolean far = series ? z.isOpen() : z.isZero();
    boolean near = series ? z.isZero() : z.isOpen();
    Complex own = far || near ? Complex.ONE : PlaceResponse.complex(z);
    Complex base = near ? Complex.ZERO : series ? own : Complex.ONE;
    Complex slope = far ? Complex.ZERO : series ? Complex.ONE : own;
    double v = series ? PROBE_OHM : 1 / PROBE_OHM;
    Complex effect = difference(loaded).multiply(base.add(slope.multiply(v))).divide(v);
    boolean finite = !effect.isNaN() && !effect.isInfinite();
    return finite ? Optional.of(new PlaceResponse(bare, base, slope, effect)) : Optional.empty();
  }

  /** Z_with − Z_without, Ω, of two finite ones. */
  private static Complex difference(Loading loading) {
    Complex without = PlaceResponse.complex(loading.without());
    Change change = loading.change();
    return change.isFinite()
        ? without.multiply(new Complex(change.re(), change.im()))
        : PlaceResponse.complex(loading.with()).subtract(without);
  }
}
