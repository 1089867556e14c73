package loadmark.equation;

import java.util.List;
import loadmark.network.Load;
import loadmark.network.OnePort;
import loadmark.network.Value;

/** A load between nothing and itself. */
public final class LoadFactor {
  private LoadFactor() {}

  /**
   * The load with its impedance divided (shunt) or multiplied (series) by a factor.
   *
   * @param factor above 0; 1 is the load itself, towards 0 it goes to an open or to a join
   */
  public static Load apply(Load load, double factor) {
    boolean shunt = load.placement() == Load.Placement.SHUNT;
    OnePort value = scaled(load.value(), shunt ? 1 / factor : factor);
    return new Load(
        load.name(),
        load.placement(),
        load.first(),
        load.second(),
        value,
        load.text(),
        load.line());
  }

  private static OnePort scaled(OnePort one, double factor) {
    if (one instanceof OnePort.Series series) {
      return new OnePort.Series(scaled(series.members(), factor));
    }
    if (one instanceof OnePort.Parallel parallel) {
      return new OnePort.Parallel(scaled(parallel.members(), factor));
    }
    OnePort.Element element = (OnePort.Element) one;
    double nominal = element.value().nominal();
    return switch (element.kind()) {
      case RESISTANCE, INDUCTANCE ->
          new OnePort.Element(element.kind(), Value.exact(nominal * factor));
      case CONDUCTANCE, CAPACITANCE ->
          new OnePort.Element(element.kind(), Value.exact(nominal / factor));
    };
  }

  private static List<OnePort> scaled(List<OnePort> members, double factor) {
    return members.stream().map(member -> scaled(member, factor)).toList();
  }
}
