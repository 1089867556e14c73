package loadmark.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import loadmark.quantity.Engineering;
import loadmark.response.PortRoots;
import org.apache.commons.math3.complex.Complex;

/** Poles and zeros for people, a pair on one line, in rising frequency. */
final class RootsText {
  /** A root this near to an axis, as a share of |s|, is on it but for rounding. */
  private static final double ON_AXIS = 1e-9;

  private RootsText() {}

  private record Root(String kind, Complex s) {}

  static List<String> lines(PortRoots roots) {
    List<Root> all = new ArrayList<>();
    roots.poles().forEach(s -> all.add(new Root("pole", s)));
    roots.zeros().forEach(s -> all.add(new Root("zero", s)));
    if (all.isEmpty()) {
      return List.of("no poles and no zeros");
    }
    Columns columns = new Columns("lrrrrr");
    columns.add("root", "|s|/2π", "damping", "time constant", "Re s", "Im s");
    all.stream()
        .filter(r -> r.s.getImaginary() >= 0)
        .sorted(Comparator.comparingDouble(r -> r.s.abs()))
        .forEach(r -> add(columns, r));
    return columns.lines(Page.WIDTH);
  }

  private static void add(Columns columns, Root root) {
    double size = root.s.abs();
    if (size == 0) {
      columns.add(root.kind, "DC", Room.NOTHING, Room.NOTHING, "0", "0");
      return;
    }
    boolean real = root.s.getImaginary() <= ON_AXIS * size;
    double damping = -root.s.getReal() / size;
    boolean undamped = Math.abs(damping) <= ON_AXIS;
    columns.add(
        root.kind + (real ? "" : " pair"),
        Unit.HERTZ.write(size / (2 * Math.PI)),
        real ? Room.NOTHING : undamped ? "0" : Engineering.plain(damping, "", 4),
        undamped ? "∞" : Engineering.result(-1 / root.s.getReal(), "s"),
        undamped ? "0" : Engineering.result(root.s.getReal(), "/s"),
        real ? "0" : "±" + Engineering.result(root.s.getImaginary(), "/s"));
  }
}
