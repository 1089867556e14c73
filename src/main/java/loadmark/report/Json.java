package loadmark.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.FindingPrinter;
import loadmark.quantity.Engineering;
import loadmark.response.Ohms;

/** What every JSON report is made of. */
final class Json {
  private static final JsonFactory FACTORY = new JsonFactory();

  private Json() {}

  /** Writes one part of a report. */
  interface Part {
    void write(JsonGenerator json) throws IOException;
  }

  /** One object, indented, ended by a line feed. */
  static String write(String format, List<Finding> diagnostics, Part rest) {
    StringWriter text = new StringWriter();
    try (JsonGenerator json = FACTORY.createGenerator(text)) {
      json.setPrettyPrinter(printer());
      json.writeStartObject();
      json.writeStringField("format", format);
      json.writeStringField("version", Version.CURRENT);
      writeFindings(json, diagnostics);
      rest.write(json);
      json.writeEndObject();
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
    return text + "\n";
  }

  private static DefaultPrettyPrinter printer() {
    Separators separators =
        Separators.createDefaultInstance()
            .withObjectFieldValueSpacing(Separators.Spacing.AFTER)
            .withObjectEmptySeparator("")
            .withArrayEmptySeparator("");
    return new DefaultPrettyPrinter(separators).withObjectIndenter(new DefaultIndenter("  ", "\n"));
  }

  static void writeFindings(JsonGenerator json, List<Finding> findings) throws IOException {
    json.writeArrayFieldStart("diagnostics");
    for (Finding finding :
        findings.subList(0, Math.min(FindingPrinter.MOST_SHOWN, findings.size()))) {
      json.writeStartObject();
      json.writeStringField("severity", finding.severity().word());
      json.writeStringField("code", finding.code());
      json.writeStringField("file", finding.place().source().name());
      json.writeNumberField("line", finding.place().line());
      json.writeNumberField("column", finding.place().column());
      json.writeStringField("message", finding.message());
      if (finding.hint().isPresent()) {
        json.writeStringField("hint", finding.hint().get());
      }
      json.writeEndObject();
    }
    json.writeEndArray();
    if (findings.size() > FindingPrinter.MOST_SHOWN) {
      json.writeNumberField("more_diagnostics", findings.size() - FindingPrinter.MOST_SHOWN);
      Optional<Finding> stop = FindingPrinter.findStop(findings);
      if (stop.isPresent()) {
        json.writeNumberField("not_read_from_line", stop.get().place().line());
      }
    }
  }

  /** Which file, of which bytes, judged with which options. */
  static void writeSource(
      JsonGenerator json, String file, Optional<String> sha256, List<String> options)
      throws IOException {
    json.writeStringField("file", file);
    if (sha256.isPresent()) {
      json.writeStringField("sha256", sha256.get());
    }
    json.writeArrayFieldStart("uses");
    json.writeEndArray();
    writeStrings(json, "options", options);
  }

  static void writeStrings(JsonGenerator json, String name, List<String> values)
      throws IOException {
    json.writeArrayFieldStart(name);
    for (String value : values) {
      json.writeString(value);
    }
    json.writeEndArray();
  }

  /** The shortest decimal that reads back the same double; {@code value} is finite. */
  static void writeNumber(JsonGenerator json, String name, double value) throws IOException {
    json.writeFieldName(name);
    json.writeNumber(Engineering.exact(value));
  }

  static void writeOhms(JsonGenerator json, String name, Ohms z) throws IOException {
    switch (z.state()) {
      case UNDETERMINED -> json.writeNullField(name);
      case OPEN -> {
        json.writeObjectFieldStart(name);
        json.writeBooleanField("open", true);
        json.writeEndObject();
      }
      case FINITE -> {
        json.writeObjectFieldStart(name);
        writeNumber(json, "re", z.re());
        writeNumber(json, "im", z.im());
        json.writeEndObject();
      }
    }
  }
}
