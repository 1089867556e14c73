package loadmark.network;

import java.util.List;

/** A two-terminal of R, L and C: one element, or several in series or in parallel. */
public sealed interface OnePort {

  /** A single ideal element. */
  record Element(ElementKind kind, Value value) implements OnePort {}

  /** Joined end to end; at least two. */
  record Series(List<OnePort> members) implements OnePort {
    public Series {
      members = List.copyOf(members);
    }
  }

  /** Joined side by side; at least two. */
  record Parallel(List<OnePort> members) implements OnePort {
    public Parallel {
      members = List.copyOf(members);
    }
  }

  /** What a single element is, and the SI unit of its value. */
  enum ElementKind {
    /** Ω; 0 is a link. */
    RESISTANCE,
    /** S. */
    CONDUCTANCE,
    /** F. */
    CAPACITANCE,
    /** H. */
    INDUCTANCE
  }

  static OnePort of(ElementKind kind, double value) {
    return new Element(kind, Value.exact(value));
  }

  static OnePort series(List<OnePort> members) {
    return members.size() == 1 ? members.get(0) : new Series(members);
  }

  static OnePort parallel(List<OnePort> members) {
    return members.size() == 1 ? members.get(0) : new Parallel(members);
  }

  /** Whether this joins its ends at every frequency: 0 Ω, alone or beside anything. */
  static boolean isLink(OnePort one) {
    if (one instanceof Element element) {
      return element.kind() == ElementKind.RESISTANCE && element.value().nominal() == 0;
    }
    if (one instanceof Series series) {
      return series.members().stream().allMatch(OnePort::isLink);
    }
    return ((Parallel) one).members().stream().anyMatch(OnePort::isLink);
  }
}
