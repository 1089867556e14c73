package loadmark.report;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Finding;
import loadmark.quantity.Engineering;
import loadmark.response.Loading;
import loadmark.study.CurveTable;
import org.apache.commons.math3.complex.Complex;

/** Curves as {@code loadmark/curve/1}. */
public final class CurveJson {
  private static final String FORMAT = "loadmark/curve/1";

  private CurveJson() {}

  /**
   * One file's curves.
   *
   * @param file as the user gave it; empty where the command line names none
   * @param table empty where there is no curve
   * @param diagnostics on the command line and on the file
   */
  public static String write(
      Optional<String> file,
      Optional<String> sha256,
      Optional<CurveTable> table,
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
          json.writeArrayFieldStart("curves");
          for (CurveTable.Curve curve : table.map(CurveTable::curves).orElse(List.of())) {
            writeCurve(json, curve);
          }
          json.writeEndArray();
        });
  }

  private static void writeCurve(JsonGenerator json, CurveTable.Curve curve) throws IOException {
    json.writeStartObject();
    json.writeStringField("port", curve.port().name());
    json.writeStringField("case", curve.shown().name());
    for (CurveColumn column : CurveColumn.values()) {
      json.writeArrayFieldStart(column.heading());
      for (Loading point : curve.points()) {
        writeNumber(json, column.of(point, curve.shown()));
      }
      json.writeEndArray();
    }
    if (curve.roots().isPresent()) {
      writeRoots(json, "poles", curve.roots().get().poles());
      writeRoots(json, "zeros", curve.roots().get().zeros());
    }
    json.writeEndObject();
  }

  /** In rad/s, by rising |s|; of a conjugate pair both. */
  private static void writeRoots(JsonGenerator json, String name, List<Complex> roots)
      throws IOException {
    json.writeArrayFieldStart(name);
    for (Complex root : roots) {
      json.writeStartObject();
      Json.writeNumber(json, "re", root.getReal());
      Json.writeNumber(json, "im", root.getImaginary());
      json.writeEndObject();
    }
    json.writeEndArray();
  }

  /** JSON has no infinity: the word that the CSV uses stands for it, and null for nothing. */
  private static void writeNumber(JsonGenerator json, double value) throws IOException {
    if (Double.isNaN(value)) {
      json.writeNull();
    } else if (Double.isInfinite(value)) {
      json.writeString(value > 0 ? "inf" : "-inf");
    } else {
      json.writeNumber(Engineering.exact(value));
    }
  }
}
