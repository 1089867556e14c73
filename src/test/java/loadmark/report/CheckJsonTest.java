package loadmark.report;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Severity;
import loadmark.diagnostic.SourceText;
import loadmark.diagnostic.Span;
import loadmark.judge.BrokenBand;
import loadmark.judge.LimitJudgement;
import loadmark.judge.Worst;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Case;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.response.Ohms;
import loadmark.study.FileResult;
import org.junit.jupiter.api.Test;

class CheckJsonTest {
  @Test
  void keysStandInThePublishedOrder() throws Exception {
    JsonNode root = write(Samples.packTap());
    assertThat(root.fieldNames())
        .toIterable()
        .containsExactly("format", "version", "diagnostics", "files");
    assertThat(root.path("format").asText()).isEqualTo("loadmark/check/1");
    JsonNode file = root.path("files").path(0);
    assertThat(file.fieldNames())
        .toIterable()
        .containsExactly(
            "file",
            "sha256",
            "uses",
            "options",
            "network",
            "verdict",
            "sweep",
            "cases",
            "cautions",
            "diagnostics");
    assertThat(file.path("options").path(0).asText()).isEqualTo("--sweep 10 Hz to 1 MHz");
    JsonNode all = file.path("cases").path(2);
    assertThat(all.fieldNames())
        .toIterable()
        .containsExactly(
            "case", "port", "values", "loads", "against", "verdict", "limits", "blame");
    assertThat(file.path("cases").path(1).path("against").path(0).asText()).isEqualTo("converter");
    assertThat(file.path("cases").path(0).has("blame")).isFalse();
    assertThat(all.path("limits").path(0).fieldNames())
        .toIterable()
        .containsExactly(
            "limit",
            "line",
            "bound",
            "from_hz",
            "to_hz",
            "verdict",
            "bare_verdict",
            "method",
            "method_reason",
            "worst",
            "bands");
    assertThat(all.path("limits").path(0).path("bare_verdict").isNull()).isTrue();
    assertThat(all.path("limits").path(1).path("bare_verdict").asText()).isEqualTo("broken");
  }

  @Test
  void valuesAreThoseOfTheJudgement() throws Exception {
    JsonNode all = write(Samples.packTap()).path("files").path(0).path("cases").path(2);
    JsonNode change = all.path("limits").path(0);
    assertThat(change.path("bound").toString()).isEqualTo("{\"at_most\":0.02}");
    assertThat(change.path("worst").path("value").asDouble()).isEqualTo(0.0341234);
    assertThat(change.path("worst").path("with").path("im").asDouble()).isEqualTo(-2345.75);
    assertThat(change.path("bands").path(1).toString())
        .isEqualTo(
            "{\"from_hz\":250000,\"to_hz\":1000000.0,\"worst_hz\":1000000.0,\"worst\":0.025}");
    assertThat(all.path("limits").path(1).path("bound").toString())
        .isEqualTo("{\"from\":20000,\"to\":26250}");
    assertThat(all.path("blame").path(0).toString())
        .isEqualTo(
            "{\"without_load\":\"converter\",\"verdict\":\"broken\","
                + "\"worst\":0.0213,\"worst_hz\":30500}");
  }

  @Test
  void everyDoubleReadsBackTheSame() throws Exception {
    long seed = 99;
    Random random = new Random(seed);
    Limit limit = Samples.limit(Criterion.CHANGE, Bound.atMost(0.02), 3, "");
    for (int i = 0; i < 300; i++) {
      double value = Double.longBitsToDouble(random.nextLong() & Long.MAX_VALUE);
      if (Double.isFinite(value)) {
        JsonNode worst =
            limit(Samples.kept(limit, Samples.worst(1, value))).path("worst").path("value");
        assertThat(worst.asDouble()).as("seed %d", seed).isEqualTo(value);
      }
    }
  }

  @Test
  void openUndeterminedAndUnboundedHaveTheirOwnForms() throws Exception {
    Worst worst =
        new Worst(0, OptionalDouble.empty(), OptionalDouble.empty(), Ohms.UNDETERMINED, Ohms.OPEN);
    Limit limit = Samples.limit(Criterion.CHANGE, Bound.atMost(0.02), 3, "");
    JsonNode json = limit(Samples.broken(limit, worst, new BrokenBand(Band.DC, worst)));
    assertThat(json.path("worst").toString())
        .isEqualTo(
            "{\"hz\":0,\"value\":null,\"unbounded\":true,"
                + "\"without\":null,\"with\":{\"open\":true}}");
    assertThat(json.path("bands").path(0).toString())
        .isEqualTo("{\"from_hz\":0,\"to_hz\":0,\"worst_hz\":0,\"worst\":null,\"unbounded\":true}");
  }

  @Test
  void limitInOhmGivesItsValueInOhm() throws Exception {
    Worst worst =
        new Worst(1e3, OptionalDouble.of(0.04), OptionalDouble.of(7), Samples.BARE, Samples.LOADED);
    JsonNode alone =
        limit(Samples.kept(Samples.limit(Criterion.CHANGE, Bound.atMostOhm(8), 3, ""), worst));
    assertThat(alone.path("bound").toString()).isEqualTo("{\"at_most_ohm\":8}");
    assertThat(alone.path("worst").path("value").asDouble()).isEqualTo(7);
    JsonNode either =
        limit(
            Samples.kept(
                Samples.limit(Criterion.CHANGE, Bound.atMost(0.02).orAtMostOhm(8), 3, ""), worst));
    assertThat(either.path("worst").path("value").asDouble()).isEqualTo(0.04);
    assertThat(either.path("worst").path("value_ohm").asDouble()).isEqualTo(7);
  }

  @Test
  void scopesOfPointsListThemAndDcBesideABandIsFlagged() throws Exception {
    JsonNode points = scope(Band.DC, Band.at(1e3), Band.at(5e3));
    assertThat(points.path("from_hz").asDouble()).isZero();
    assertThat(points.path("to_hz").asDouble()).isEqualTo(5e3);
    assertThat(points.path("at_hz").toString()).isEqualTo("[0,1000,5000]");
    JsonNode both = scope(Band.DC, Samples.BAND);
    assertThat(both.path("from_hz").asDouble()).isEqualTo(10);
    assertThat(both.path("dc").asBoolean()).isTrue();
    assertThat(both.has("at_hz")).isFalse();
  }

  private static JsonNode scope(Band... scope) throws Exception {
    Limit limit = Samples.limit(Criterion.CHANGE, Bound.atMost(1), List.of(scope), 3, "");
    return limit(Samples.kept(limit, Samples.worst(1, 0)));
  }

  @Test
  void referenceIsANumberWhereItIsAResistance() throws Exception {
    Limit limit = Samples.limit(Criterion.RETURN_LOSS, Bound.atLeast(20), 3, "");
    OnePort fifty = OnePort.of(ElementKind.RESISTANCE, 50);
    JsonNode plain =
        limit(Samples.kept(Samples.withReference(limit, fifty, "50 Ω"), Samples.worst(1, 30)));
    assertThat(plain.path("reference_ohm").asDouble()).isEqualTo(50);
    assertThat(plain.has("reference")).isFalse();
    OnePort network = OnePort.parallel(List.of(fifty, OnePort.of(ElementKind.INDUCTANCE, 50e-6)));
    JsonNode text =
        limit(
            Samples.kept(
                Samples.withReference(limit, network, "50 Ω || 50 µH"), Samples.worst(1, 30)));
    assertThat(text.path("reference").asText()).isEqualTo("50 Ω || 50 µH");
    assertThat(text.has("reference_ohm")).isFalse();
  }

  @Test
  void invalidFileHasNoCasesAndItsFindings() throws Exception {
    Finding finding =
        new Finding(
            Severity.ERROR,
            "unknown-part",
            new Span(new SourceText("a.zin", "wire a -- rr -- b"), 1, 11, 2),
            "there is no part 'rr'",
            Optional.of("did you mean 'r'?"));
    JsonNode file =
        write(new FileResult.Invalid("a.zin", Optional.of(Samples.DIGEST), List.of(finding)))
            .path("files")
            .path(0);
    assertThat(file.path("verdict").asText()).isEqualTo("invalid");
    assertThat(file.path("sweep").isNull()).isTrue();
    assertThat(file.path("cases").isEmpty()).isTrue();
    assertThat(file.path("diagnostics").path(0).toString())
        .isEqualTo(
            "{\"severity\":\"error\",\"code\":\"unknown-part\",\"file\":\"a.zin\",\"line\":1,"
                + "\"column\":11,\"message\":\"there is no part 'rr'\","
                + "\"hint\":\"did you mean 'r'?\"}");
  }

  private static JsonNode limit(LimitJudgement judged) throws Exception {
    FileResult file =
        Samples.file(
            "a.zin",
            "",
            List.of(Samples.port("input")),
            List.of(),
            Samples.judged(Case.bare(), Samples.port("input"), judged));
    return write(file).path("files").path(0).path("cases").path(0).path("limits").path(0);
  }

  private static JsonNode write(FileResult file) throws Exception {
    return new ObjectMapper()
        .readTree(CheckJson.write(List.of(file), List.of(), List.of("--sweep 10 Hz to 1 MHz")));
  }
}
