package loadmark.report;

import loadmark.response.Loading;
import loadmark.study.CurveTable;

/** Curves as comma-separated values: one row a port, case and frequency. */
public final class CurveCsv {
  private static final String HEADER =
      "port,case,hz,re_ohm,im_ohm,magnitude_ohm,phase_deg,parallel_ohm,parallel_f,change";

  private CurveCsv() {}

  /** What has no bound is {@code inf}; what is not there is empty. */
  public static String write(CurveTable table) {
    Csv csv = new Csv(HEADER);
    for (CurveTable.Curve curve : table.curves()) {
      for (Loading point : curve.points()) {
        csv.name(curve.port().name()).name(curve.shown().name());
        for (CurveColumn column : CurveColumn.values()) {
          csv.number(column.of(point, curve.shown()));
        }
        csv.end();
      }
    }
    return csv.toString();
  }
}
