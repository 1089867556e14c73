package loadmark.report;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import loadmark.judge.LimitJudgement;
import loadmark.judge.NetworkJudgement;
import loadmark.judge.Verdict;
import loadmark.study.FileResult;
import loadmark.study.Outcome;

/** Checked files for people. */
public final class CheckText {
  private CheckText() {}

  /**
   * Every judged file in the order given; after several files a summary, worst first.
   *
   * @param options as given, each with its value
   */
  public static String write(List<FileResult> files, List<String> options, Style style) {
    StringBuilder text = new StringBuilder();
    for (FileResult file : files) {
      if (file instanceof FileResult.Judged judged) {
        text.append(new FileText(judged, options, style).write()).append('\n');
      }
    }
    if (files.size() > 1) {
      text.append(summary(files, style));
    }
    return text.toString().stripTrailing() + (text.isEmpty() ? "" : "\n");
  }

  /** The verdict of each file, a line each; names are whole however long, for scripts. */
  public static String writeVerdicts(List<FileResult> files, Style style) {
    Page page = new Page(style, anyUndetermined(files));
    files.forEach(f -> page.row(f.outcome(), Visible.of(f.file())));
    return page.toString();
  }

  private static String summary(List<FileResult> files, Style style) {
    Page page = new Page(style, anyUndetermined(files));
    page.row(
        style.bold(files.size() + " files: " + counts(files.stream().map(FileResult::outcome))));
    Columns columns = new Columns("nl");
    List<FileResult> ordered =
        files.stream().sorted(Comparator.comparing(FileResult::outcome).reversed()).toList();
    ordered.forEach(f -> columns.add(Visible.of(f.file()), inShort(f)));
    List<String> lines = columns.lines(page.room());
    for (int i = 0; i < lines.size(); i++) {
      page.row(ordered.get(i).outcome(), lines.get(i));
    }
    return page.toString();
  }

  private static boolean anyUndetermined(List<FileResult> files) {
    return files.stream().anyMatch(f -> f.outcome() == Outcome.UNDETERMINED);
  }

  private static String inShort(FileResult file) {
    if (file instanceof FileResult.Judged judged) {
      return tally(judged.judgement());
    }
    long errors = file.findings().stream().filter(f -> f.isError()).count();
    return errors == 1 ? "1 error" : errors + " errors";
  }

  /** {@code 8 judgements: 3 broken, 5 kept}. */
  static String tally(NetworkJudgement judgement) {
    List<Verdict> verdicts =
        judgement.cases().stream()
            .flatMap(c -> c.limits().stream())
            .map(LimitJudgement::verdict)
            .toList();
    String all = verdicts.size() == 1 ? "1 judgement" : verdicts.size() + " judgements";
    if (verdicts.stream().distinct().count() == 1) {
      return all + (verdicts.size() == 1 ? ", " : ", all ") + verdicts.get(0).word();
    }
    return all + ": " + counts(verdicts.stream().map(Outcome::of));
  }

  /** {@code 1 invalid, 2 broken, 3 kept}: the gravest first. */
  private static String counts(Stream<Outcome> outcomes) {
    return outcomes
        .collect(Collectors.groupingBy(o -> o, Collectors.counting()))
        .entrySet()
        .stream()
        .sorted(Map.Entry.<Outcome, Long>comparingByKey().reversed())
        .map(e -> e.getValue() + " " + e.getKey().word())
        .collect(Collectors.joining(", "));
  }
}
