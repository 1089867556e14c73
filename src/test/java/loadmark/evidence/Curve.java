package loadmark.evidence;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Arrays;
import java.util.stream.Collectors;
import org.apache.commons.math3.complex.Complex;

/** What {@code curve} says about a text at given frequencies. */
record Curve(JsonNode root) {

  static Curve of(String network, double... hz) {
    String at = Arrays.stream(hz).mapToObj(f -> f + " Hz").collect(Collectors.joining(","));
    Run run = Run.reading(network, "curve", "--format", "json", "--at", at, "-");
    if (run.status() != Run.KEPT) {
      throw new AssertionError(network + run.everything());
    }
    return new Curve(run.json());
  }

  /** Driving-point impedance without loads at the only port of the file. */
  static Complex[] bare(String network, double... hz) {
    return of(network, hz).z(null, "bare");
  }

  /**
   * Impedances in Ω, in the order of the frequencies; the first port where {@code port} is null.
   */
  Complex[] z(@org.jspecify.annotations.Nullable String port, String caseName) {
    JsonNode curve = find(port, caseName);
    JsonNode re = curve.path("re_ohm");
    JsonNode im = curve.path("im_ohm");
    Complex[] z = new Complex[re.size()];
    for (int i = 0; i < z.length; i++) {
      z[i] = new Complex(re.get(i).asDouble(Double.NaN), im.get(i).asDouble(Double.NaN));
    }
    return z;
  }

  /** |Z_with/Z_without − 1|. */
  double[] change(String port, String caseName) {
    JsonNode change = find(port, caseName).path("change");
    double[] values = new double[change.size()];
    for (int i = 0; i < values.length; i++) {
      values[i] = change.get(i).asDouble(Double.NaN);
    }
    return values;
  }

  private JsonNode find(@org.jspecify.annotations.Nullable String port, String caseName) {
    for (JsonNode one : root.path("curves")) {
      if ((port == null || one.path("port").asText().equals(port))
          && one.path("case").asText().equals(caseName)) {
        return one;
      }
    }
    throw new AssertionError("no curve of " + port + ", " + caseName + " in " + root);
  }
}
