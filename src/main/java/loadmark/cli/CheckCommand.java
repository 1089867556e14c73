package loadmark.cli;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.report.CheckCsv;
import loadmark.report.CheckJson;
import loadmark.report.CheckText;
import loadmark.report.Style;
import loadmark.study.FileResult;
import loadmark.study.Outcome;
import loadmark.study.Study;

/** {@code check FILE…}. */
final class CheckCommand {
  private final Invocation.Check asked;
  private final Study study;
  private final Inputs inputs;
  private final Streams streams;

  CheckCommand(Invocation.Check asked, Study study, Inputs inputs, Streams streams) {
    this.asked = asked;
    this.study = study;
    this.inputs = inputs;
    this.streams = streams;
  }

  Outcome run() {
    List<FileResult> results = asked.files().stream().map(this::check).toList();
    Findings findings = new Findings();
    Delivery delivery = new Delivery(asked.manner(), asked.files(), streams);
    boolean judged = results.stream().anyMatch(FileResult.Judged.class::isInstance);
    boolean delivered = delivery.deliver(() -> write(results, findings), judged, findings);
    return results.stream()
        .map(FileResult::outcome)
        .reduce(delivered ? Outcome.KEPT : Outcome.INVALID, Outcome::and);
  }

  private FileResult check(String name) {
    Findings findings = new Findings();
    FileResult result =
        inputs
            .read(name, findings)
            .map(study::check)
            .orElseGet(() -> new FileResult.Invalid(name, Optional.empty(), findings.sorted()));
    new Delivery(asked.manner(), asked.files(), streams).tell(result.findings());
    return result;
  }

  private String write(List<FileResult> results, Findings findings) {
    Style style = Terminal.style(asked.manner());
    return switch (asked.manner().format()) {
      case TEXT ->
          asked.manner().quiet()
              ? CheckText.writeVerdicts(results, style)
              : CheckText.write(results, asked.request().options(), style);
      case JSON -> CheckJson.write(results, findings.sorted(), asked.request().options());
      case CSV -> CheckCsv.write(results);
      case S1P -> throw new IllegalStateException("a verdict has no such format");
    };
  }
}
