package loadmark.evidence;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;

/**
 * Reports as they were last looked at and found right. {@code -Dbless=true} writes them anew; read
 * the difference before it is committed.
 */
final class Golden {
  private static final Path FOLDER = Path.of("src/test/golden");

  /** What the tool promises for its values, relative. */
  private static final double PROMISE = 1e-9;

  /** The place of a flat worst value, and the impedances there, are right to the root of that. */
  private static final double FLAT = 1e-6;

  /** Below this a value is a rounding of zero. */
  private static final double ZERO = 1e-12;

  private static final JsonMapper MAPPER = new JsonMapper();

  private Golden() {}

  static void matchesText(String name, String actual) throws IOException {
    Path golden = FOLDER.resolve(name);
    if (bless(golden, actual)) {
      return;
    }
    assertThat(actual).isEqualTo(Files.readString(golden, UTF_8));
  }

  static void matchesJson(String name, String actual) throws IOException {
    Path golden = FOLDER.resolve(name);
    if (bless(golden, actual)) {
      return;
    }
    same("", MAPPER.readTree(actual), MAPPER.readTree(Files.readString(golden, UTF_8)));
  }

  private static boolean bless(Path golden, String actual) throws IOException {
    if (!Boolean.getBoolean("bless")) {
      return false;
    }
    Files.createDirectories(FOLDER);
    Files.writeString(golden, actual, UTF_8);
    return true;
  }

  private static void same(String where, JsonNode actual, JsonNode expected) {
    assertThat(actual.getNodeType()).as(where).isEqualTo(expected.getNodeType());
    assertThat(actual.size()).as(where).isEqualTo(expected.size());
    if (expected.isNumber()) {
      double value = expected.asDouble();
      boolean place = where.contains("worst") && !where.matches(".*/(value|value_ohm|worst)");
      double tolerance = Math.abs(value) * (place ? FLAT : PROMISE) + ZERO;
      assertThat(actual.asDouble()).as(where).isCloseTo(value, within(tolerance));
    } else if (expected.isObject()) {
      for (Map.Entry<String, JsonNode> field : expected.properties()) {
        same(where + "/" + field.getKey(), actual.path(field.getKey()), field.getValue());
      }
    } else if (expected.isArray()) {
      for (int i = 0; i < expected.size(); i++) {
        same(where + "/" + i, actual.get(i), expected.get(i));
      }
    } else {
      assertThat(actual).as(where).isEqualTo(expected);
    }
  }
}
