package loadmark.report;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.judge.CaseJudgement;
import loadmark.judge.LimitJudgement;
import loadmark.judge.Worst;
import loadmark.network.Band;
import loadmark.network.Limit;
import loadmark.study.FileResult;

/** Checked files as comma-separated values: one row a limit, case and port. */
public final class CheckCsv {
  private static final String HEADER =
      "file,port,case,limit,line,from_hz,to_hz,verdict,worst_hz,worst,bands";

  private CheckCsv() {}

  /** {@code worst} is in the limit's own unit, {@code inf} without bound. */
  public static String write(List<FileResult> files) {
    Csv csv = new Csv(HEADER);
    for (FileResult file : files) {
      if (file instanceof FileResult.Judged judged) {
        for (CaseJudgement one : judged.judgement().cases()) {
          one.limits().forEach(limit -> writeRow(csv, file.file(), one, limit));
        }
      }
    }
    return csv.toString();
  }

  private static void writeRow(Csv csv, String file, CaseJudgement one, LimitJudgement judged) {
    Limit limit = judged.limit();
    List<Band> scope = limit.scope();
    csv.name(file).name(one.port().name()).name(one.judged().name());
    csv.word(limit.criterion().words()).word(Integer.toString(limit.line()));
    csv.number(scope.get(0).fromHz()).number(scope.get(scope.size() - 1).toHz());
    csv.word(judged.verdict().word());
    Optional<Worst> worst = judged.worst();
    csv.number(worst.isPresent() ? worst.get().hz() : Double.NaN);
    csv.number(worst.isPresent() ? value(limit, worst.get()) : Double.NaN);
    csv.word(Integer.toString(judged.bands().size()));
    csv.end();
  }

  private static double value(Limit limit, Worst worst) {
    OptionalDouble value = Unit.inOhmAlone(limit) ? worst.valueOhm() : worst.value();
    return value.orElse(Double.POSITIVE_INFINITY);
  }
}
