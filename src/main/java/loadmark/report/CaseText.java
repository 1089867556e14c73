package loadmark.report;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import loadmark.judge.Blame;
import loadmark.judge.BrokenBand;
import loadmark.judge.CaseJudgement;
import loadmark.judge.LimitJudgement;
import loadmark.judge.Verdict;
import loadmark.judge.Worst;
import loadmark.network.Case;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.study.Outcome;

/** One case at one port, with everything its verdicts rest on. */
final class CaseText {
  /** More bands than these are counted; the JSON report has them all. */
  private static final int MOST_BANDS = 12;

  private static final int LONGEST_NAME = 60;

  private final CaseJudgement one;
  private final Page page;

  CaseText(CaseJudgement one, Page page) {
    this.one = one;
    this.page = page;
  }

  void write() {
    Case judged = one.judged();
    page.heading(
        Outcome.of(one.verdict()),
        "case " + name(judged.name()) + " at port " + name(one.port().name()));
    judged.loads().forEach(load -> page.labelled("load", describe(load)));
    if (!judged.against().isEmpty()) {
      page.labelled("against", names(judged.against()));
    }
    for (LimitJudgement limit : one.limits()) {
      page.blank();
      write(limit);
    }
    writeBlame();
  }

  /** Short enough to stand in a line. */
  private static String name(String name) {
    return Visible.cut(Visible.of(name), LONGEST_NAME);
  }

  private static String describe(Load load) {
    return name(load.name())
        + " "
        + load.placement().name().toLowerCase(Locale.ROOT)
        + " "
        + Visible.of(load.first().name())
        + " -- "
        + Visible.of(load.second().name())
        + " = "
        + clean(load.text())
        + " (line "
        + load.line()
        + ")";
  }

  private static String names(List<Load> loads) {
    return loads.stream().map(l -> Visible.of(l.name())).collect(Collectors.joining(", "));
  }

  /** On one line, safe to show. */
  static String clean(String text) {
    StringBuilder line = new StringBuilder();
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      boolean space = c == ' ' || c == '\t' || c == '\r' || c == '\n';
      boolean again = line.length() == 0 || line.charAt(line.length() - 1) == ' ';
      if (!space) {
        line.append(c);
      } else if (!again) {
        line.append(' ');
      }
    }
    return Visible.of(line.toString().stripTrailing());
  }

  private void write(LimitJudgement judged) {
    Limit limit = judged.limit();
    page.labelled(Outcome.of(judged.verdict()), "line " + limit.line(), clean(limit.text()));
    judged.worst().ifPresent(worst -> writeWorst(limit, worst));
    writeBands(judged);
    writeBare(judged);
    if (!judged.undetermined().isEmpty()) {
      page.labelled("unknown", Visible.of(judged.undetermined()));
    }
  }

  private void writeWorst(Limit limit, Worst worst) {
    page.labelled(
        "worst",
        limit.criterion().words()
            + " "
            + Values.worst(limit, worst)
            + place(worst.hz())
            + "; allowed: "
            + Values.bound(limit));
    if (one.judged().isBare()) {
      page.labelled(
          "impedance",
          Impedances.polar(worst.without()) + "    " + Impedances.rectangular(worst.without()));
      return;
    }
    String without = Impedances.polar(worst.without());
    String with = Impedances.polar(worst.with());
    int width = Math.max(Visible.width(without), Visible.width(with)) + 4;
    page.labelled("without", Visible.pad(without, width) + Impedances.rectangular(worst.without()));
    page.labelled("with", Visible.pad(with, width) + Impedances.rectangular(worst.with()));
  }

  private static String place(double hz) {
    return " at " + Impedances.frequency(hz);
  }

  private void writeBands(LimitJudgement judged) {
    List<BrokenBand> bands = judged.bands();
    List<BrokenBand> shown = bands.subList(0, Math.min(MOST_BANDS, bands.size()));
    int width =
        shown.stream().mapToInt(b -> Impedances.band(b.band()).length()).max().orElse(0) + 4;
    String label = "broken";
    for (BrokenBand band : shown) {
      String worst =
          band.band().isPoint() || bands.size() == 1
              ? ""
              : "worst " + Values.worst(judged.limit(), band.worst()) + place(band.worst().hz());
      page.labelled(label, Visible.pad(Impedances.band(band.band()), width) + worst);
      label = "";
    }
    if (bands.size() > shown.size()) {
      String last = Impedances.band(bands.get(bands.size() - 1).band());
      page.labelled("", "and " + (bands.size() - shown.size()) + " more bands, the last " + last);
    }
  }

  /** What an absolute limit says of the network itself, where that matters to who is to blame. */
  private void writeBare(LimitJudgement judged) {
    Optional<Verdict> bare = judged.bareVerdict();
    if (bare.isEmpty() || one.judged().isBare()) {
      return;
    }
    boolean broken = judged.verdict() == Verdict.BROKEN;
    String load = one.judged().loads().size() == 1 ? "the load" : "the loads";
    switch (bare.get()) {
      case BROKEN ->
          page.labelled("bare", "broken without " + load + (broken ? " too" : "; kept with it"));
      case UNDETERMINED -> page.labelled("bare", "undetermined without " + load);
      case KEPT -> {
        if (broken) {
          page.labelled("bare", "kept without " + load);
        }
      }
    }
  }

  private void writeBlame() {
    if (one.blame().isEmpty()) {
      return;
    }
    page.blank();
    page.row("  with one load taken off");
    Limit limit =
        one.limits().stream()
            .filter(l -> l.verdict() == Verdict.BROKEN)
            .map(LimitJudgement::limit)
            .findFirst()
            .orElseThrow();
    Columns columns = new Columns("nl");
    for (Blame blame : one.blame()) {
      String worst =
          blame
              .worst()
              .map(w -> limit.criterion().words() + " " + Values.worst(limit, w) + place(w.hz()))
              .orElse("");
      columns.add("  without " + Visible.of(blame.withoutLoad().name()), worst);
    }
    List<String> lines = columns.lines(page.room());
    for (int i = 0; i < lines.size(); i++) {
      page.row(Outcome.of(one.blame().get(i).verdict()), lines.get(i));
    }
  }
}
