package loadmark.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import loadmark.allowance.Amount;
import loadmark.allowance.LoadAllowance;
import loadmark.allowance.PointAllowance;
import loadmark.network.Load;
import loadmark.study.AllowanceTable;

/** Allowances for people: what each load may be, then a table over the frequencies. */
public final class AllowText {
  /** A table shows about so many frequencies; the other formats have them all. */
  private static final int MOST_ROWS = 24;

  private static final int LABEL = 12;

  private AllowText() {}

  public static String write(String file, AllowanceTable table, Style style) {
    StringBuilder text = new StringBuilder();
    line(text, style.bold(Visible.cut(Visible.of(file), Page.WIDTH)));
    String title = table.network().title();
    if (!title.isEmpty()) {
      line(text, Visible.cut(Visible.of(title), Page.WIDTH));
    }
    for (LoadAllowance one : table.allowances()) {
      text.append('\n');
      line(text, style.bold(Visible.cut(heading(one), Page.WIDTH)));
      writeHeaviest(text, one);
      writePoints(text, one);
    }
    return text.toString();
  }

  private static void line(StringBuilder text, String line) {
    text.append(line.stripTrailing()).append('\n');
  }

  private static String heading(LoadAllowance one) {
    String others =
        one.within().loads().stream()
            .filter(l -> !l.equals(one.load()))
            .map(l -> Visible.of(l.name()))
            .collect(Collectors.joining(", "));
    return "port "
        + Visible.of(one.port().name())
        + ", load "
        + Visible.of(one.load().name())
        + ", case "
        + Visible.of(one.within().name())
        + (others.isEmpty() ? "" : " (with " + others + ")");
  }

  private static void writeHeaviest(StringBuilder text, LoadAllowance one) {
    Load load = one.load();
    labelled(text, "as it is", CaseText.clean(load.text()));
    labelled(text, "all limits", Room.heaviest(load, one.heaviest()));
    Room.beside(load, one.heaviest()).forEach(beside -> labelled(text, "", beside));
  }

  private static void labelled(StringBuilder text, String label, String rest) {
    List<String> lines = Page.wrap(rest, Page.WIDTH - LABEL - 2);
    for (int i = 0; i < lines.size(); i++) {
      line(text, "  " + Visible.pad(i == 0 ? label : "", LABEL) + lines.get(i));
    }
  }

  private static void writePoints(StringBuilder text, LoadAllowance one) {
    List<PointAllowance> points = one.points();
    if (points.stream().allMatch(p -> isAlways(p, Amount.ANY))) {
      labelled(text, "change", "no limit on it at any of " + points.size() + " frequencies");
      return;
    }
    if (points.stream().allMatch(p -> isAlways(p, Amount.NONE))) {
      labelled(text, "change", "no room at any of " + points.size() + " frequencies");
      return;
    }
    List<PointAllowance> shown = shown(points);
    labelled(
        text,
        "change",
        "what the limits on it leave at each frequency"
            + (shown.size() < points.size()
                ? ", " + shown.size() + " of " + points.size() + " shown"
                : ""));
    boolean shunt = one.load().placement() == Load.Placement.SHUNT;
    Columns columns = new Columns("rrrr");
    columns.add("frequency", "|Z|, any phase", "resistor", shunt ? "capacitor" : "inductor");
    for (PointAllowance point : shown) {
      columns.add(
          Impedances.frequency(point.hz()),
          Room.cell(point.magnitude(), "Ω", shunt),
          Room.cell(point.resistance(), "Ω", shunt),
          Room.cell(point.reactive(), shunt ? "F" : "H", false));
    }
    columns.lines(Page.WIDTH - 2).forEach(l -> line(text, "  " + l));
  }

  private static boolean isAlways(PointAllowance point, Amount amount) {
    return List.of(point.magnitude(), point.resistance(), point.reactive())
        .equals(List.of(amount, amount, amount));
  }

  /** Evenly chosen, the first and the last among them. */
  private static List<PointAllowance> shown(List<PointAllowance> points) {
    int last = points.size() - 1;
    int rows = Math.min(MOST_ROWS, last);
    List<PointAllowance> shown = new ArrayList<>();
    for (int i = 0; i <= rows; i++) {
      shown.add(points.get(rows == 0 ? 0 : (int) Math.round((double) last * i / rows)));
    }
    return shown;
  }
}
