package loadmark.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Function;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import loadmark.response.Loading;
import loadmark.study.CurveTable;
import loadmark.study.CurveTable.Curve;
import loadmark.touchstone.Complex;
import loadmark.touchstone.ImpedancePoint;
import loadmark.touchstone.Touchstone;

/** One port in one case, in the Touchstone open format. */
public final class CurveTouchstone {
  private static final int MOST_NAMES = 8;

  private CurveTouchstone() {}

  /**
   * Whether a table can be written so: one port in one case, every impedance a number. An open one
   * is none, and is not left out, since what reads the file would take the gap for an even stretch.
   *
   * @param source where a finding stands if not
   */
  public static boolean canHold(SourceText source, CurveTable table, Findings findings) {
    if (table.curves().size() != 1) {
      findings.error(
          "s1p-one-curve",
          source.whole(),
          "format s1p holds one port in one case, and this file has "
              + table.curves().size()
              + " of them",
          "choose with"
              + option("--port", table, c -> c.port().name())
              + option("--case", table, c -> c.shown().name()));
      return false;
    }
    Optional<Loading> without =
        table.curves().get(0).points().stream().filter(p -> !p.with().isFinite()).findFirst();
    without.ifPresent(
        point ->
            findings.error(
                "s1p-no-impedance",
                source.whole(),
                "format s1p holds impedances alone; at "
                    + Impedances.frequency(point.hz())
                    + " this one is "
                    + Impedances.polar(point.with()),
                "leave the frequency out with --at or --sweep, or take another format"));
    return without.isEmpty();
  }

  private static String option(String option, CurveTable table, Function<Curve, String> name) {
    List<String> names = table.curves().stream().map(name).distinct().toList();
    if (names.size() < 2) {
      return "";
    }
    String some = String.join(", ", names.subList(0, Math.min(MOST_NAMES, names.size())));
    return " " + option + " (" + some + (names.size() > MOST_NAMES ? ", …)" : ")");
  }

  /**
   * The file, its points in rising frequency.
   *
   * @param table one that {@link #canHold} accepts
   */
  public static String write(String file, CurveTable table) {
    Curve curve = table.curves().get(0);
    List<String> comments = new ArrayList<>();
    comments.add("loadmark " + Version.CURRENT + ": driving-point impedance, Hz and ohm");
    comments.add("file " + file);
    comments.add("port " + curve.port().name());
    comments.add("case " + curve.shown().name());
    // Frequencies may have been asked for in any order, and more than once.
    SortedMap<Double, ImpedancePoint> points = new TreeMap<>();
    for (Loading point : curve.points()) {
      Complex impedance = new Complex(point.with().re(), point.with().im());
      points.put(point.hz(), new ImpedancePoint(point.hz(), impedance));
    }
    return Touchstone.writeOnePort(comments, List.copyOf(points.values()));
  }
}
