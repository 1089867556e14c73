package loadmark.cli;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.report.CurveCsv;
import loadmark.report.CurveJson;
import loadmark.report.CurveText;
import loadmark.report.CurveTouchstone;
import loadmark.study.CurveTable;
import loadmark.study.Outcome;
import loadmark.study.Source;
import loadmark.study.Study;

/** {@code curve FILE}. */
final class CurveCommand {
  private final Invocation.Curve asked;
  private final Study study;
  private final Inputs inputs;
  private final Streams streams;

  CurveCommand(Invocation.Curve asked, Study study, Inputs inputs, Streams streams) {
    this.asked = asked;
    this.study = study;
    this.inputs = inputs;
    this.streams = streams;
  }

  Outcome run() {
    Findings findings = new Findings();
    Optional<Source> source = inputs.read(asked.file(), findings);
    Optional<CurveTable> table =
        source.flatMap(s -> study.curve(s, findings).filter(t -> canWrite(s, t, findings)));
    Delivery delivery = new Delivery(asked.manner(), List.of(asked.file()), streams);
    delivery.tell(findings.sorted());
    Findings undelivered = new Findings();
    boolean delivered =
        delivery.deliver(
            () -> write(source, table, findings, undelivered), table.isPresent(), undelivered);
    if (!delivered || table.isEmpty()) {
      return Outcome.INVALID;
    }
    return table.get().countUndetermined() > 0 ? Outcome.UNDETERMINED : Outcome.KEPT;
  }

  private boolean canWrite(Source source, CurveTable table, Findings findings) {
    return asked.manner().format() != Format.S1P
        || CurveTouchstone.canHold(source.text(), table, findings);
  }

  private String write(
      Optional<Source> source,
      Optional<CurveTable> table,
      Findings findings,
      Findings undelivered) {
    return switch (asked.manner().format()) {
      case TEXT ->
          table
              .map(t -> CurveText.write(asked.file(), t, Terminal.style(asked.manner())))
              .orElse("");
      case CSV -> table.map(CurveCsv::write).orElse("");
      case S1P -> table.map(t -> CurveTouchstone.write(asked.file(), t)).orElse("");
      case JSON -> {
        undelivered.sorted().forEach(findings::add);
        yield CurveJson.write(
            Optional.of(asked.file()),
            source.map(Source::sha256),
            table,
            findings.sorted(),
            asked.request().options());
      }
    };
  }
}
