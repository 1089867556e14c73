package loadmark.allowance;

import java.util.List;
import loadmark.network.OnePort;

/** A two-terminal whose impedance is multiplied at every frequency. */
final class Scaling {
  private Scaling() {}

  static OnePort of(OnePort one, double factor) {
    if (one instanceof OnePort.Series series) {
      return new OnePort.Series(of(series.members(), factor));
    }
    if (one instanceof OnePort.Parallel parallel) {
      return new OnePort.Parallel(of(parallel.members(), factor));
    }
    OnePort.Element element = (OnePort.Element) one;
    double value = element.value().nominal();
    return switch (element.kind()) {
      case RESISTANCE, INDUCTANCE -> OnePort.of(element.kind(), value * factor);
      case CONDUCTANCE, CAPACITANCE -> OnePort.of(element.kind(), value / factor);
    };
  }

  private static List<OnePort> of(List<OnePort> members, double factor) {
    return members.stream().map(member -> of(member, factor)).toList();
  }
}
