package loadmark.report;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import java.util.OptionalDouble;
import loadmark.diagnostic.Finding;
import loadmark.judge.Blame;
import loadmark.judge.BrokenBand;
import loadmark.judge.CaseJudgement;
import loadmark.judge.LimitJudgement;
import loadmark.judge.LimitJudgement.Method;
import loadmark.judge.NetworkJudgement;
import loadmark.judge.Verdict;
import loadmark.judge.Worst;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.OnePort;
import loadmark.network.Sweep;
import loadmark.quantity.Engineering;
import loadmark.study.FileResult;

/** Checked files as {@code loadmark/check/1}. */
public final class CheckJson {
  private static final String FORMAT = "loadmark/check/1";

  private CheckJson() {}

  /**
   * Every file in the order given.
   *
   * @param diagnostics on the command line
   * @param options as given, each with its value
   */
  public static String write(
      List<FileResult> files, List<Finding> diagnostics, List<String> options) {
    return Json.write(
        FORMAT,
        diagnostics,
        json -> {
          json.writeArrayFieldStart("files");
          for (FileResult file : files) {
            json.writeStartObject();
            Json.writeSource(json, file.file(), file.sha256(), options);
            writeJudgement(json, file);
            json.writeArrayFieldStart("cautions");
            json.writeEndArray();
            Json.writeFindings(json, file.findings());
            json.writeEndObject();
          }
          json.writeEndArray();
        });
  }

  private static void writeJudgement(JsonGenerator json, FileResult file) throws IOException {
    if (file instanceof FileResult.Judged judged) {
      NetworkJudgement judgement = judged.judgement();
      json.writeStringField("network", judgement.network().title());
      json.writeStringField("verdict", file.outcome().word());
      writeSweep(json, judgement);
      json.writeArrayFieldStart("cases");
      for (CaseJudgement one : judgement.cases()) {
        writeCase(json, one);
      }
    } else {
      json.writeStringField("verdict", file.outcome().word());
      json.writeNullField("sweep");
      json.writeArrayFieldStart("cases");
    }
    json.writeEndArray();
  }

  private static void writeSweep(JsonGenerator json, NetworkJudgement judgement)
      throws IOException {
    if (judgement.network().sweep().isEmpty()) {
      json.writeNullField("sweep");
      return;
    }
    Sweep sweep = judgement.network().sweep().get();
    json.writeObjectFieldStart("sweep");
    writeBand(json, sweep.band().orElse(Band.DC));
    if (sweep.dc() && sweep.band().isPresent()) {
      json.writeBooleanField("dc", true);
    }
    json.writeEndObject();
  }

  private static void writeBand(JsonGenerator json, Band band) throws IOException {
    Json.writeNumber(json, "from_hz", band.fromHz());
    Json.writeNumber(json, "to_hz", band.toHz());
  }

  private static void writeCase(JsonGenerator json, CaseJudgement one) throws IOException {
    json.writeStartObject();
    json.writeStringField("case", one.judged().name());
    json.writeStringField("port", one.port().name());
    json.writeObjectFieldStart("values");
    json.writeEndObject();
    Json.writeStrings(json, "loads", one.judged().loads().stream().map(Load::name).toList());
    Json.writeStrings(json, "against", one.judged().against().stream().map(Load::name).toList());
    json.writeStringField("verdict", one.verdict().word());
    json.writeArrayFieldStart("limits");
    for (LimitJudgement limit : one.limits()) {
      writeLimit(json, limit);
    }
    json.writeEndArray();
    if (!one.blame().isEmpty()) {
      json.writeArrayFieldStart("blame");
      for (Blame blame : one.blame()) {
        writeBlame(json, blame, one);
      }
      json.writeEndArray();
    }
    json.writeEndObject();
  }

  private static void writeLimit(JsonGenerator json, LimitJudgement judged) throws IOException {
    Limit limit = judged.limit();
    json.writeStartObject();
    json.writeStringField("limit", limit.criterion().words());
    json.writeNumberField("line", limit.line());
    writeBound(json, limit.bound());
    writeReference(json, limit);
    writeScope(json, limit.scope());
    json.writeStringField("verdict", judged.verdict().word());
    json.writeFieldName("bare_verdict");
    json.writeString(judged.bareVerdict().map(Verdict::word).orElse(null));
    json.writeStringField("method", judged.method().word());
    if (judged.method() == Method.SAMPLED) {
      json.writeStringField("method_reason", judged.methodReason());
    }
    if (judged.worst().isPresent()) {
      Worst worst = judged.worst().get();
      json.writeObjectFieldStart("worst");
      Json.writeNumber(json, "hz", worst.hz());
      writeValue(json, "value", limit, worst);
      if (worst.valueOhm().isPresent()) {
        Json.writeNumber(json, "value_ohm", worst.valueOhm().getAsDouble());
      }
      Json.writeOhms(json, "without", worst.without());
      Json.writeOhms(json, "with", worst.with());
      json.writeEndObject();
    }
    json.writeArrayFieldStart("bands");
    for (BrokenBand band : judged.bands()) {
      json.writeStartObject();
      writeBand(json, band.band());
      Json.writeNumber(json, "worst_hz", band.worst().hz());
      writeValue(json, "worst", limit, band.worst());
      json.writeEndObject();
    }
    json.writeEndArray();
    if (!judged.undetermined().isEmpty()) {
      json.writeStringField("undetermined", judged.undetermined());
    }
    json.writeEndObject();
  }

  private static void writeBound(JsonGenerator json, Bound bound) throws IOException {
    json.writeObjectFieldStart("bound");
    boolean window = bound.atLeast().isPresent() && bound.atMost().isPresent();
    writeIfPresent(json, window ? "from" : "at_least", bound.atLeast());
    writeIfPresent(json, window ? "to" : "at_most", bound.atMost());
    writeIfPresent(json, "at_most_ohm", bound.atMostOhm());
    json.writeEndObject();
  }

  private static void writeIfPresent(JsonGenerator json, String name, OptionalDouble value)
      throws IOException {
    if (value.isPresent()) {
      Json.writeNumber(json, name, value.getAsDouble());
    }
  }

  private static void writeReference(JsonGenerator json, Limit limit) throws IOException {
    if (limit.reference().isEmpty()) {
      return;
    }
    if (limit.reference().get() instanceof OnePort.Element element
        && element.kind() == OnePort.ElementKind.RESISTANCE) {
      Json.writeNumber(json, "reference_ohm", element.value().nominal());
    } else {
      json.writeStringField("reference", limit.referenceText());
    }
  }

  /** The outer ends; beside them what they do not tell: single points, DC, gaps. */
  private static void writeScope(JsonGenerator json, List<Band> scope) throws IOException {
    List<Band> stretches = scope.stream().filter(b -> !b.isPoint()).toList();
    List<Band> points = scope.stream().filter(Band::isPoint).toList();
    List<Band> ends = stretches.isEmpty() ? points : stretches;
    Json.writeNumber(json, "from_hz", ends.get(0).fromHz());
    Json.writeNumber(json, "to_hz", ends.get(ends.size() - 1).toHz());
    boolean dcBesideBand = !stretches.isEmpty() && points.contains(Band.DC);
    if (dcBesideBand) {
      json.writeBooleanField("dc", true);
    }
    List<Band> listed = points.stream().filter(p -> !dcBesideBand || p.fromHz() != 0).toList();
    if (!listed.isEmpty()) {
      json.writeArrayFieldStart("at_hz");
      for (Band point : listed) {
        json.writeNumber(Engineering.exact(point.fromHz()));
      }
      json.writeEndArray();
    }
    if (stretches.size() > 1) {
      json.writeArrayFieldStart("scope");
      for (Band stretch : stretches) {
        json.writeStartObject();
        writeBand(json, stretch);
        json.writeEndObject();
      }
      json.writeEndArray();
    }
  }

  private static void writeValue(JsonGenerator json, String name, Limit limit, Worst worst)
      throws IOException {
    OptionalDouble value = Unit.inOhmAlone(limit) ? worst.valueOhm() : worst.value();
    if (value.isPresent()) {
      Json.writeNumber(json, name, value.getAsDouble());
    } else {
      json.writeNullField(name);
      json.writeBooleanField("unbounded", true);
    }
  }

  private static void writeBlame(JsonGenerator json, Blame blame, CaseJudgement one)
      throws IOException {
    json.writeStartObject();
    json.writeStringField("without_load", blame.withoutLoad().name());
    json.writeStringField("verdict", blame.verdict().word());
    if (blame.worst().isPresent()) {
      writeValue(json, "worst", firstBroken(one), blame.worst().get());
      Json.writeNumber(json, "worst_hz", blame.worst().get().hz());
    }
    json.writeEndObject();
  }

  /** The limit that the worst values of blame are those of. */
  private static Limit firstBroken(CaseJudgement one) {
    return one.limits().stream()
        .filter(l -> l.verdict() == Verdict.BROKEN)
        .findFirst()
        .map(LimitJudgement::limit)
        .orElseThrow();
  }
}
