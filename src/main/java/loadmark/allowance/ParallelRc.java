package loadmark.allowance;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;

/**
 * A conductance beside a capacitance; either may be 0.
 *
 * @param siemens S
 * @param farad F
 */
record ParallelRc(double siemens, double farad) {

  /** The two-terminal in this form, if it is R, C or R‖C, however it is put together. */
  static Optional<ParallelRc> find(OnePort one) {
    if (one instanceof OnePort.Element element) {
      double value = element.value().nominal();
      return switch (element.kind()) {
        case RESISTANCE -> value > 0 ? Optional.of(new ParallelRc(1 / value, 0)) : Optional.empty();
        case CONDUCTANCE -> Optional.of(new ParallelRc(value, 0));
        case CAPACITANCE -> Optional.of(new ParallelRc(0, value));
        case INDUCTANCE -> Optional.empty();
      };
    }
    boolean series = one instanceof OnePort.Series;
    List<OnePort> members =
        series ? ((OnePort.Series) one).members() : ((OnePort.Parallel) one).members();
    List<ParallelRc> parts = new ArrayList<>();
    for (OnePort member : members) {
      find(member).ifPresent(parts::add);
    }
    if (parts.size() < members.size()) {
      return Optional.empty();
    }
    return series ? inSeries(parts) : Optional.of(inParallel(parts));
  }

  private static ParallelRc inParallel(List<ParallelRc> parts) {
    return new ParallelRc(
        parts.stream().mapToDouble(ParallelRc::siemens).sum(),
        parts.stream().mapToDouble(ParallelRc::farad).sum());
  }

  /** Resistors alone or capacitors alone; else it is none. */
  private static Optional<ParallelRc> inSeries(List<ParallelRc> parts) {
    if (parts.stream().allMatch(l -> l.farad == 0)) {
      double ohm = parts.stream().mapToDouble(l -> 1 / l.siemens).sum();
      return Optional.of(new ParallelRc(1 / ohm, 0));
    }
    if (parts.stream().allMatch(l -> l.siemens == 0)) {
      double daraf = parts.stream().mapToDouble(l -> 1 / l.farad).sum();
      return Optional.of(new ParallelRc(0, 1 / daraf));
    }
    return Optional.empty();
  }

  /** What there is of it; empty where both are 0. */
  Optional<OnePort> toOnePort() {
    List<OnePort> members = new ArrayList<>();
    if (siemens > 0) {
      members.add(OnePort.of(ElementKind.CONDUCTANCE, siemens));
    }
    if (farad > 0) {
      members.add(OnePort.of(ElementKind.CAPACITANCE, farad));
    }
    return members.isEmpty() ? Optional.empty() : Optional.of(OnePort.parallel(members));
  }
}
