package loadmark.evidence;

import static java.nio.charset.StandardCharsets.UTF_8;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import loadmark.cli.Loadmark;

/** One run of the tool in this process. */
record Run(int status, String out, String err) {
  static final int KEPT = 0;
  static final int BROKEN = 1;
  static final int INVALID = 2;

  private static final JsonMapper MAPPER = new JsonMapper();

  static Run of(String... arguments) {
    return reading("", arguments);
  }

  static Run reading(String standardInput, String... arguments) {
    return reading(standardInput.getBytes(UTF_8), arguments);
  }

  static Run reading(byte[] standardInput, String... arguments) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int status =
        Loadmark.run(
            arguments,
            new ByteArrayInputStream(standardInput),
            new PrintStream(out, true, UTF_8),
            new PrintStream(err, true, UTF_8));
    return new Run(status, out.toString(UTF_8), err.toString(UTF_8));
  }

  /** Standard output as JSON. */
  JsonNode json() {
    try {
      return MAPPER.readTree(out);
    } catch (JsonProcessingException e) {
      throw new AssertionError("standard output is no JSON: " + out + "\n" + err, e);
    }
  }

  /** Both streams, to search for what must not be there. */
  String everything() {
    return out + err;
  }
}
