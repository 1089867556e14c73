package loadmark.report;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import loadmark.judge.Blame;
import loadmark.judge.CaseJudgement;
import loadmark.judge.LimitJudgement;
import loadmark.judge.LimitJudgement.Method;
import loadmark.judge.NetworkJudgement;
import loadmark.judge.Verdict;
import loadmark.judge.Worst;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Sweep;
import loadmark.study.FileResult;
import loadmark.study.Outcome;

/** One judged file: the verdict, all judgements at a glance, then each with what it rests on. */
final class FileText {
  private final FileResult.Judged file;
  private final List<String> options;
  private final NetworkJudgement judgement;
  private final Page page;

  FileText(FileResult.Judged file, List<String> options, Style style) {
    this.file = file;
    this.options = options;
    this.judgement = file.judgement();
    this.page = new Page(style, hasUndetermined());
  }

  private boolean hasUndetermined() {
    return judgement.cases().stream()
        .flatMap(
            c ->
                Stream.concat(
                    c.limits().stream().flatMap(l -> verdicts(l)),
                    c.blame().stream().map(Blame::verdict)))
        .anyMatch(v -> v == Verdict.UNDETERMINED);
  }

  private static Stream<Verdict> verdicts(LimitJudgement limit) {
    return Stream.concat(Stream.of(limit.verdict()), limit.bareVerdict().stream());
  }

  String write() {
    Network network = judgement.network();
    page.heading(file.outcome(), Visible.of(file.file()));
    if (!network.title().isEmpty()) {
      page.paragraph(Visible.of(network.title()));
    }
    page.paragraph(
        CheckText.tally(judgement) + network.sweep().map(s -> ", " + sweep(s)).orElse(""));
    if (!options.isEmpty()) {
      page.paragraph("judged with " + Visible.of(String.join(", ", options)));
    }
    writeMethod();
    long judgements = judgement.cases().stream().mapToLong(c -> c.limits().size()).sum();
    if (judgements > 1) {
      page.blank();
      writeGlance();
    }
    for (CaseJudgement one : judgement.cases()) {
      page.blank();
      new CaseText(one, page).write();
    }
    writeNotAlone();
    return page.toString();
  }

  private static String sweep(Sweep sweep) {
    String band = sweep.band().map(b -> "over " + Impedances.band(b)).orElse("");
    String dc = sweep.dc() ? "at DC" : "";
    return dc.isEmpty() || band.isEmpty() ? dc + band : dc + " and " + band;
  }

  /** Where the judgements cannot be trusted not to have missed anything, and why. */
  private void writeMethod() {
    Map<String, SortedSet<Integer>> linesByReason = new LinkedHashMap<>();
    SortedSet<Integer> complete = new TreeSet<>();
    for (CaseJudgement one : judgement.cases()) {
      for (LimitJudgement limit : one.limits()) {
        SortedSet<Integer> lines =
            limit.method() == Method.COMPLETE
                ? complete
                : linesByReason.computeIfAbsent(limit.methodReason(), r -> new TreeSet<>());
        lines.add(limit.limit().line());
      }
    }
    boolean all = complete.isEmpty() && linesByReason.size() == 1;
    linesByReason.forEach(
        (reason, lines) ->
            page.paragraph(
                "sampled"
                    + (all ? "" : " in line " + join(lines))
                    + ": a breach narrower than the grid of frequencies could be missed, because "
                    + Visible.of(reason)));
  }

  private static String join(SortedSet<Integer> lines) {
    return lines.stream().map(line -> Integer.toString(line)).collect(Collectors.joining(", "));
  }

  private void writeGlance() {
    boolean ports = judgement.network().ports().size() > 1;
    Columns columns = new Columns("nnrllll");
    columns.add(ports ? "port" : "", "case", "line", "limit", "worst", "at", "allowed");
    for (CaseJudgement one : judgement.cases()) {
      String port = ports ? Visible.of(one.port().name()) : "";
      String name = Visible.of(one.judged().name());
      for (LimitJudgement limit : one.limits()) {
        addGlance(columns, port, name, limit);
      }
    }
    int room = page.room() + (ports ? 0 : 2);
    List<String> lines = columns.lines(room).stream().map(l -> ports ? l : l.substring(2)).toList();
    page.row(lines.get(0));
    int next = 1;
    for (CaseJudgement one : judgement.cases()) {
      for (LimitJudgement limit : one.limits()) {
        page.row(Outcome.of(limit.verdict()), lines.get(next++));
      }
    }
  }

  private static void addGlance(Columns columns, String port, String name, LimitJudgement judged) {
    Limit limit = judged.limit();
    Optional<Worst> worst = judged.worst();
    columns.add(
        port,
        name,
        Integer.toString(limit.line()),
        limit.criterion().words(),
        worst.map(w -> Values.easierWorst(limit, w)).orElse("–"),
        worst.map(w -> Impedances.frequency(w.hz())).orElse("–"),
        Values.shortBound(limit));
  }

  private void writeNotAlone() {
    List<String> names =
        judgement.network().loads().stream()
            .filter(load -> !isJudgedAlone(load))
            .map(load -> Visible.of(load.name()))
            .toList();
    if (!names.isEmpty()) {
      page.blank();
      page.paragraph("not judged alone: " + String.join(", ", names));
    }
  }

  private boolean isJudgedAlone(Load load) {
    return judgement.cases().stream()
        .anyMatch(c -> c.judged().loads().equals(List.of(load)) && c.judged().against().isEmpty());
  }
}
