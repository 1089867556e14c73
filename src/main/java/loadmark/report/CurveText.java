package loadmark.report;

import java.util.ArrayList;
import java.util.List;
import loadmark.response.Change;
import loadmark.response.Loading;
import loadmark.response.Ohms;
import loadmark.study.CurveTable;

/** Curves for people: a table a port and case. */
public final class CurveText {
  private static final String NOTHING = "–";

  private CurveText() {}

  public static String write(String file, CurveTable table, Style style) {
    StringBuilder text = new StringBuilder();
    line(text, style.bold(Visible.cut(Visible.of(file), Page.WIDTH)));
    String title = table.network().title();
    if (!title.isEmpty()) {
      line(text, Visible.cut(Visible.of(title), Page.WIDTH));
    }
    for (CurveTable.Curve curve : table.curves()) {
      text.append('\n');
      String heading =
          "port " + Visible.of(curve.port().name()) + ", case " + Visible.of(curve.shown().name());
      line(text, style.bold(Visible.cut(heading, Page.WIDTH)));
      columns(curve).lines(Page.WIDTH).forEach(l -> line(text, l));
      curve
          .roots()
          .ifPresent(
              roots -> {
                text.append('\n');
                RootsText.lines(roots).forEach(l -> line(text, l));
              });
    }
    return text.toString();
  }

  private static void line(StringBuilder text, String line) {
    text.append(line).append('\n');
  }

  private static Columns columns(CurveTable.Curve curve) {
    boolean bare = curve.shown().isBare();
    Columns columns = new Columns(bare ? "rrrrrrr" : "rrrrrrrr");
    List<String> heading =
        new ArrayList<>(List.of("frequency", "|Z|", "phase", "Re Z", "Im Z", "R par", "C par"));
    if (!bare) {
      heading.add("change");
    }
    columns.add(heading.toArray(String[]::new));
    for (Loading point : curve.points()) {
      List<String> row = row(point);
      if (!bare) {
        row.add(change(point.change()));
      }
      columns.add(row.toArray(String[]::new));
    }
    return columns;
  }

  private static List<String> row(Loading point) {
    Ohms z = point.with();
    boolean finite = z.isFinite();
    List<String> row = new ArrayList<>();
    row.add(Impedances.frequency(point.hz()));
    row.add(
        switch (z.state()) {
          case OPEN -> "open";
          case UNDETERMINED -> "undetermined";
          case FINITE -> Unit.OHM.write(z.magnitude());
        });
    row.add(finite && !z.isZero() ? Impedances.phase(z) : NOTHING);
    row.add(finite ? Unit.OHM.write(z.re()) : NOTHING);
    row.add(finite ? Unit.OHM.write(z.im()) : NOTHING);
    row.add(orNothing(CurveColumn.parallelOhm(z), Unit.OHM));
    row.add(orNothing(CurveColumn.parallelFarad(point), Unit.FARAD));
    return row;
  }

  private static String orNothing(double value, Unit unit) {
    return Double.isFinite(value) ? unit.write(value) : NOTHING;
  }

  private static String change(Change change) {
    return switch (change.state()) {
      case UNDETERMINED -> NOTHING;
      case UNBOUNDED -> Values.UNBOUNDED;
      case FINITE -> Unit.RATIO.write(change.magnitude());
    };
  }
}
