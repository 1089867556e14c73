package loadmark.cli;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.report.AllowCsv;
import loadmark.report.AllowJson;
import loadmark.report.AllowText;
import loadmark.study.AllowanceTable;
import loadmark.study.Outcome;
import loadmark.study.Source;
import loadmark.study.Study;

/** {@code allow FILE}. */
final class AllowCommand {
  private final Invocation.Allow asked;
  private final Study study;
  private final Inputs inputs;
  private final Streams streams;

  AllowCommand(Invocation.Allow asked, Study study, Inputs inputs, Streams streams) {
    this.asked = asked;
    this.study = study;
    this.inputs = inputs;
    this.streams = streams;
  }

  Outcome run() {
    Findings findings = new Findings();
    Optional<Source> source = inputs.read(asked.file(), findings);
    Optional<AllowanceTable> table = source.flatMap(s -> study.allow(s, findings));
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

  private String write(
      Optional<Source> source,
      Optional<AllowanceTable> table,
      Findings findings,
      Findings undelivered) {
    return switch (asked.manner().format()) {
      case TEXT ->
          table
              .map(t -> AllowText.write(asked.file(), t, Terminal.style(asked.manner())))
              .orElse("");
      case CSV -> table.map(AllowCsv::write).orElse("");
      case S1P -> throw new IllegalStateException("an allowance has no such format");
      case JSON -> {
        undelivered.sorted().forEach(findings::add);
        yield AllowJson.write(
            Optional.of(asked.file()),
            source.map(Source::sha256),
            table,
            findings.sorted(),
            asked.request().options());
      }
    };
  }
}
