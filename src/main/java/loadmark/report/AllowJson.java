package loadmark.report;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import loadmark.allowance.Amount;
import loadmark.allowance.Heaviest;
import loadmark.allowance.LoadAllowance;
import loadmark.allowance.PointAllowance;
import loadmark.diagnostic.Finding;
import loadmark.network.Load;
import loadmark.quantity.Engineering;
import loadmark.study.AllowanceTable;

/** Allowances as {@code loadmark/allow/1}. */
public final class AllowJson {
  private static final String FORMAT = "loadmark/allow/1";

  private AllowJson() {}

  /**
   * One file's allowances.
   *
   * @param file as the user gave it; empty where the command line names none
   * @param table empty where there are none
   * @param diagnostics on the command line and on the file
   */
  public static String write(
      Optional<String> file,
      Optional<String> sha256,
      Optional<AllowanceTable> table,
      List<Finding> diagnostics,
      List<String> options) {
    return Json.write(
        FORMAT,
        diagnostics,
        json -> {
          if (file.isPresent()) {
            Json.writeSource(json, file.get(), sha256, options);
          }
          if (table.isPresent()) {
            json.writeStringField("network", table.get().network().title());
          }
          json.writeArrayFieldStart("allowances");
          for (LoadAllowance one : table.map(AllowanceTable::allowances).orElse(List.of())) {
            writeAllowance(json, one);
          }
          json.writeEndArray();
        });
  }

  private static void writeAllowance(JsonGenerator json, LoadAllowance one) throws IOException {
    boolean series = one.load().placement() == Load.Placement.SERIES;
    json.writeStartObject();
    json.writeStringField("port", one.port().name());
    json.writeStringField("load", one.load().name());
    json.writeStringField("case", one.within().name());
    json.writeStringField("placement", one.load().placement().name().toLowerCase(Locale.ROOT));
    json.writeObjectFieldStart("change");
    json.writeArrayFieldStart("hz");
    for (PointAllowance point : one.points()) {
      json.writeNumber(Engineering.exact(point.hz()));
    }
    json.writeEndArray();
    writeColumn(json, "magnitude_ohm", one, PointAllowance::magnitude);
    writeColumn(json, "resistance_ohm", one, PointAllowance::resistance);
    writeColumn(json, series ? "inductance_h" : "capacitance_f", one, PointAllowance::reactive);
    json.writeEndObject();
    json.writeObjectFieldStart("all_limits");
    writeHeaviest(json, one.heaviest());
    json.writeEndObject();
    json.writeEndObject();
  }

  private static void writeColumn(
      JsonGenerator json, String name, LoadAllowance one, Function<PointAllowance, Amount> amount)
      throws IOException {
    json.writeArrayFieldStart(name);
    for (PointAllowance point : one.points()) {
      writeAmount(json, amount.apply(point));
    }
    json.writeEndArray();
  }

  /** The fields of the heaviest load, within an object that is open. */
  static void writeHeaviest(JsonGenerator json, Heaviest heaviest) throws IOException {
    json.writeFieldName("heaviest_multiple");
    writeAmount(json, heaviest.multiple());
    if (heaviest.beside().isPresent()) {
      json.writeFieldName("capacitance_f");
      writeAmount(json, heaviest.beside().get().capacitance());
      json.writeFieldName("resistance_ohm");
      writeAmount(json, heaviest.beside().get().resistance());
    }
    if (heaviest.stoppedBy().isPresent()) {
      json.writeNumberField("stopped_by", heaviest.stoppedBy().get().line());
    }
  }

  /** A number, {@code "any"}, {@code "none"}, or null where it could not be determined. */
  private static void writeAmount(JsonGenerator json, Amount amount) throws IOException {
    switch (amount.state()) {
      case NUMBER -> json.writeNumber(Engineering.exact(amount.value()));
      case ANY -> json.writeString("any");
      case NONE -> json.writeString("none");
      case UNDETERMINED -> json.writeNull();
    }
  }
}
