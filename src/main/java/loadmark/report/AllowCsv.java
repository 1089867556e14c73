package loadmark.report;

import loadmark.allowance.Amount;
import loadmark.allowance.Heaviest;
import loadmark.allowance.LoadAllowance;
import loadmark.allowance.PointAllowance;
import loadmark.network.Load;
import loadmark.quantity.Engineering;
import loadmark.study.AllowanceTable;

/**
 * Allowances as comma-separated values: for each port, load and case one row without a frequency,
 * for all limits together, then one row a frequency, for limits on the change.
 */
public final class AllowCsv {
  private static final String HEADER =
      "port,load,case,hz,magnitude_ohm,resistance_ohm,capacitance_f,inductance_h,"
          + "heaviest_multiple,stopped_by";

  private AllowCsv() {}

  /** A number, {@code any}, {@code none}, or nothing where there is none or none is known. */
  public static String write(AllowanceTable table) {
    Csv csv = new Csv(HEADER);
    for (LoadAllowance one : table.allowances()) {
      writeHeaviest(csv, one);
      one.points().forEach(point -> writePoint(csv, one, point));
    }
    return csv.toString();
  }

  private static void writeHeaviest(Csv csv, LoadAllowance one) {
    Heaviest heaviest = one.heaviest();
    begin(csv, one).word("").word("");
    csv.word(heaviest.beside().map(b -> word(b.resistance())).orElse(""));
    csv.word(heaviest.beside().map(b -> word(b.capacitance())).orElse("")).word("");
    csv.word(word(heaviest.multiple()));
    csv.word(heaviest.stoppedBy().map(l -> Integer.toString(l.line())).orElse(""));
    csv.end();
  }

  private static void writePoint(Csv csv, LoadAllowance one, PointAllowance point) {
    String reactive = word(point.reactive());
    boolean series = one.load().placement() == Load.Placement.SERIES;
    begin(csv, one).number(point.hz()).word(word(point.magnitude())).word(word(point.resistance()));
    csv.word(series ? "" : reactive).word(series ? reactive : "").word("").word("");
    csv.end();
  }

  private static Csv begin(Csv csv, LoadAllowance one) {
    return csv.name(one.port().name()).name(one.load().name()).name(one.within().name());
  }

  private static String word(Amount amount) {
    return switch (amount.state()) {
      case NUMBER -> Engineering.exact(amount.value());
      case ANY -> "any";
      case NONE -> "none";
      case UNDETERMINED -> "";
    };
  }
}
