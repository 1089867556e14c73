package loadmark.evidence;

import com.fasterxml.jackson.databind.JsonNode;

/** What {@code allow} says about one file, as its JSON has it. */
record Allowed(JsonNode root) {

  /** Of a text that has nothing wrong with it. */
  static Allowed text(String network, String... options) {
    return of(Run.reading(network, command(options, "-")));
  }

  static Allowed path(String path) {
    return of(Run.of(command(new String[0], path)));
  }

  private static String[] command(String[] options, String file) {
    String[] all = new String[options.length + 4];
    all[0] = "allow";
    all[1] = "--format";
    all[2] = "json";
    System.arraycopy(options, 0, all, 3, options.length);
    all[all.length - 1] = file;
    return all;
  }

  private static Allowed of(Run run) {
    JsonNode root = run.json();
    if (root.path("allowances").isEmpty()) {
      throw new AssertionError(run.everything());
    }
    return new Allowed(root);
  }

  JsonNode one(String port, String caseName, String load) {
    for (JsonNode one : root.path("allowances")) {
      if (one.path("port").asText().equals(port)
          && one.path("case").asText().equals(caseName)
          && one.path("load").asText().equals(load)) {
        return one;
      }
    }
    throw new AssertionError("no " + load + " in " + caseName + " at " + port + " in " + root);
  }

  /** For all limits together. */
  JsonNode all(String port, String caseName, String load) {
    return one(port, caseName, load).path("all_limits");
  }

  /** A column of what the limits on the change allow, at the frequency {@code hz}. */
  JsonNode change(String port, String caseName, String load, String column, double hz) {
    JsonNode change = one(port, caseName, load).path("change");
    for (int i = 0; i < change.path("hz").size(); i++) {
      if (change.path("hz").get(i).asDouble() == hz) {
        return change.path(column).get(i);
      }
    }
    throw new AssertionError("no " + hz + " Hz in " + change.path("hz"));
  }
}
