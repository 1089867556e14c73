package loadmark.evidence;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;

/** What {@code check} says about one file, as its JSON has it. */
record Judged(int status, JsonNode file) {

  /** Judges a text that has nothing wrong with it. */
  static Judged text(String network) {
    return of(Run.reading(network, "check", "--format", "json", "-"));
  }

  static Judged path(String path) {
    return of(Run.of("check", "--format", "json", path));
  }

  private static Judged of(Run run) {
    JsonNode file = run.json().path("files").path(0);
    if (file.path("verdict").asText().equals("invalid") || file.isMissingNode()) {
      throw new AssertionError(run.everything());
    }
    return new Judged(run.status(), file);
  }

  String verdict() {
    return file.path("verdict").asText();
  }

  JsonNode caseOf(String name, String port) {
    for (JsonNode one : file.path("cases")) {
      if (one.path("case").asText().equals(name) && one.path("port").asText().equals(port)) {
        return one;
      }
    }
    throw new AssertionError("no case " + name + " at port " + port + " in " + file);
  }

  /** All limits of one kind in a case, in their order. */
  List<JsonNode> limits(String caseName, String port, String kind) {
    List<JsonNode> found = new ArrayList<>();
    for (JsonNode limit : caseOf(caseName, port).path("limits")) {
      if (limit.path("limit").asText().equals(kind)) {
        found.add(limit);
      }
    }
    return found;
  }

  JsonNode limit(String caseName, String port, String kind) {
    List<JsonNode> found = limits(caseName, port, kind);
    if (found.size() != 1) {
      throw new AssertionError(found.size() + " limits on " + kind + " in " + file);
    }
    return found.get(0);
  }

  /** The worst value of the only limit of that kind. */
  double worst(String caseName, String port, String kind) {
    return limit(caseName, port, kind).path("worst").path("value").asDouble(Double.NaN);
  }
}
