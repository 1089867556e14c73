package loadmark.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Severity;
import loadmark.diagnostic.SourceText;
import loadmark.judge.Blame;
import loadmark.judge.BrokenBand;
import loadmark.judge.CaseJudgement;
import loadmark.judge.LimitJudgement;
import loadmark.judge.LimitJudgement.Method;
import loadmark.judge.Verdict;
import loadmark.judge.Worst;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Case;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Port;
import loadmark.response.Ohms;
import loadmark.study.FileResult;
import org.junit.jupiter.api.Test;

class CheckTextTest {
  private static final String ESCAPE = "\u001B";

  @Test
  void reportGoesFromTheVerdictToWhatItRestsOn() {
    assertThat(CheckText.write(List.of(Samples.packTap()), List.of(), Style.PLAIN))
        .isEqualTo(
            """
            BROKEN   pack-tap.zin
                     Pack-voltage tap into a monitor converter
                     5 judgements: 2 broken, 3 kept, over 10 Hz to 1 MHz
                     sampled: a breach narrower than the grid of frequencies could be missed, because no algebra
                     of it

                     case       line  limit      worst      at         allowed
            kept     converter    14  change     1.205 %    31.62 kHz  ≤ 2 %
            kept     converter    15  magnitude  25.30 kΩ   100 Hz     20 kΩ to 26.25 kΩ
            kept     probe        14  change     0.04567 %  1 MHz      ≤ 2 %
            BROKEN   all          14  change     3.412 %    31.62 kHz  ≤ 2 %
            BROKEN   all          15  magnitude  28.73 kΩ   10 Hz      20 kΩ to 26.25 kΩ

            kept     case converter at port input
                       load      converter shunt tap -- ground = 10 MΩ || 13 pF (line 9)

            kept       line 14   limit change 2 %
                       worst     change 1.205 % at 31.62 kHz; allowed: at most 2 %
                       without   28.73 kΩ ∠ -2.463°    28.70 kΩ - j1.234 kΩ
                       with      28.11 kΩ ∠ -4.787°    28.01 kΩ - j2.346 kΩ

            kept       line 15   limit magnitude 20 kΩ to 26.25 kΩ from 10 Hz to 100 Hz
                       worst     magnitude 25.30 kΩ at 100 Hz; allowed: 20 kΩ to 26.25 kΩ
                       without   28.73 kΩ ∠ -2.463°    28.70 kΩ - j1.234 kΩ
                       with      28.11 kΩ ∠ -4.787°    28.01 kΩ - j2.346 kΩ

            kept     case probe at port input
                       load      probe shunt tap -- ground = 10 MΩ || 13 pF (line 10)
                       against   converter

            kept       line 14   limit change 2 %
                       worst     change 0.04567 % at 1 MHz; allowed: at most 2 %
                       without   28.73 kΩ ∠ -2.463°    28.70 kΩ - j1.234 kΩ
                       with      28.11 kΩ ∠ -4.787°    28.01 kΩ - j2.346 kΩ

            BROKEN   case all at port input
                       load      converter shunt tap -- ground = 10 MΩ || 13 pF (line 9)
                       load      probe shunt tap -- ground = 10 MΩ || 13 pF (line 10)

            BROKEN     line 14   limit change 2 %
                       worst     change 3.412 % at 31.62 kHz; allowed: at most 2 %
                       without   28.73 kΩ ∠ -2.463°    28.70 kΩ - j1.234 kΩ
                       with      28.11 kΩ ∠ -4.787°    28.01 kΩ - j2.346 kΩ
                       broken    12.35 kHz to 45.6 kHz    worst 3.412 % at 31.62 kHz
                                 250 kHz to 1 MHz         worst 2.500 % at 1 MHz

            BROKEN     line 15   limit magnitude 20 kΩ to 26.25 kΩ from 10 Hz to 100 Hz
                       worst     magnitude 28.73 kΩ at 10 Hz; allowed: 20 kΩ to 26.25 kΩ
                       without   28.73 kΩ ∠ -2.463°    28.70 kΩ - j1.234 kΩ
                       with      28.11 kΩ ∠ -4.787°    28.01 kΩ - j2.346 kΩ
                       broken    10 Hz to 100 Hz
                       bare      broken without the loads too

                       with one load taken off
            BROKEN     without converter  change 2.130 % at 30.5 kHz
            kept       without probe      change 1.205 % at 29 kHz

                     not judged alone: probe
            """);
  }

  @Test
  void severalFilesEndInASummaryWorstFirst() {
    Limit limit = Samples.limit(Criterion.CHANGE, Bound.atMost(0.02), 3, "limit change 2 %");
    Case one = new Case("probe", List.of(Samples.load("probe", 2)), List.of(), 0);
    FileResult kept =
        Samples.file(
            "kept.zin",
            "",
            List.of(Samples.port("input")),
            List.of(),
            Samples.judged(
                one, Samples.port("input"), Samples.kept(limit, Samples.worst(1e3, 0.01))));
    FileResult invalid = new FileResult.Invalid("slip.zin", Optional.empty(), List.of(error()));
    String text =
        CheckText.write(List.of(kept, Samples.packTap(), invalid), List.of(), Style.PLAIN);
    assertThat(text)
        .startsWith("kept     kept.zin\n")
        .endsWith(
            """

                     3 files: 1 invalid, 1 broken, 1 kept
            INVALID  slip.zin      1 error
            BROKEN   pack-tap.zin  5 judgements: 2 broken, 3 kept
            kept     kept.zin      1 judgement, kept
            """);
    assertThat(CheckText.writeVerdicts(List.of(kept, invalid), Style.PLAIN))
        .isEqualTo("kept     kept.zin\nINVALID  slip.zin\n");
  }

  private static Finding error() {
    return new Finding(
        Severity.ERROR, "slip", new SourceText("slip.zin", "").whole(), "slip", Optional.empty());
  }

  @Test
  void optionsThatBentTheFileAreTold() {
    assertThat(
            CheckText.write(
                List.of(Samples.packTap()), List.of("--set trim=12 pF", "--case all"), Style.PLAIN))
        .contains("\n         judged with --set trim=12 pF, --case all\n");
  }

  @Test
  void undeterminedSaysWhyAndClaimsNothing() {
    Limit limit = Samples.limit(Criterion.CHANGE, Bound.atMost(0.02), 3, "limit change 2 %");
    LimitJudgement unknown =
        new LimitJudgement(
            limit,
            Verdict.UNDETERMINED,
            Optional.empty(),
            Method.SAMPLED,
            "no algebra of it",
            Optional.empty(),
            List.of(),
            "the port is shorted at DC with and without the load");
    Case one = new Case("probe", List.of(Samples.load("probe", 2)), List.of(), 0);
    String text =
        CheckText.write(
            List.of(
                Samples.file(
                    "a.zin",
                    "",
                    List.of(Samples.port("input")),
                    List.of(),
                    Samples.judged(one, Samples.port("input"), unknown))),
            List.of(),
            Style.PLAIN);
    assertThat(text)
        .contains("UNDETERMINED    line 3    limit change 2 %\n")
        .contains("unknown   the port is shorted at DC with and without the load\n")
        .doesNotContain("worst");
  }

  @Test
  void valueWithoutBoundSaysSo() {
    Limit limit = Samples.limit(Criterion.CHANGE, Bound.atMost(0.02), 3, "limit change 2 %");
    Worst unbounded =
        new Worst(0, OptionalDouble.empty(), OptionalDouble.empty(), Ohms.of(0, 0), Ohms.OPEN);
    Case one = new Case("probe", List.of(Samples.load("probe", 2)), List.of(), 0);
    String text =
        CheckText.write(
            List.of(
                Samples.file(
                    "a.zin",
                    "",
                    List.of(Samples.port("input")),
                    List.of(),
                    Samples.judged(
                        one,
                        Samples.port("input"),
                        Samples.broken(limit, unbounded, new BrokenBand(Band.DC, unbounded))))),
            List.of(),
            Style.PLAIN);
    assertThat(text)
        .contains("worst     change without bound at DC; allowed: at most 2 %\n")
        .contains("without   0 Ω\n")
        .contains("with      open\n")
        .contains("broken    DC\n");
  }

  @Test
  void colourIsThereOnlyWhenAskedFor() {
    assertThat(CheckText.write(List.of(Samples.packTap()), List.of(), Style.PLAIN))
        .doesNotContain(ESCAPE);
    String coloured = CheckText.write(List.of(Samples.packTap()), List.of(), Style.COLOUR);
    assertThat(coloured).contains(ESCAPE + "[1;31mBROKEN");
    assertThat(coloured.replaceAll(ESCAPE + "\\[[0-9;]*m", ""))
        .isEqualTo(CheckText.write(List.of(Samples.packTap()), List.of(), Style.PLAIN));
  }

  @Test
  void longAndHostileNamesStayWithinTheWidthAndSteerNothing() {
    long seed = 4711;
    Random random = new Random(seed);
    for (int i = 0; i < 300; i++) {
      String text =
          CheckText.write(
              List.of(generated(random)), List.of("--set " + name(random)), Style.PLAIN);
      assertThat(text).as("seed %d, round %d", seed, i).doesNotContain(ESCAPE, "\u202E", "\r");
      assertThat(text.lines())
          .as("seed %d, round %d", seed, i)
          .allSatisfy(line -> assertThat(Visible.width(line)).isLessThanOrEqualTo(100));
    }
  }

  private static FileResult generated(Random random) {
    Load first = Samples.load(name(random), 1 + random.nextInt(99999));
    Load second = Samples.load(name(random), 2);
    List<Port> ports = new ArrayList<>();
    for (int i = 0; i <= random.nextInt(3); i++) {
      ports.add(Samples.port(name(random)));
    }
    List<CaseJudgement> cases = new ArrayList<>();
    for (Port port : ports) {
      Case one = new Case(name(random), List.of(first, second), List.of(second), 0);
      Limit limit =
          Samples.limit(
              List.of(Criterion.values()).get(random.nextInt(Criterion.values().length)),
              Bound.between(random.nextDouble() * 1e-9, 1e9 + random.nextDouble()),
              1 + random.nextInt(99999),
              "limit " + name(random) + " " + name(random));
      Worst worst = Samples.worst(random.nextDouble() * 1e9, Math.exp(random.nextGaussian() * 30));
      cases.add(
          Samples.judged(
              one,
              port,
              List.of(new Blame(first, Verdict.KEPT, Optional.of(worst))),
              Samples.broken(
                  limit,
                  worst,
                  new BrokenBand(new Band(1, 2), worst),
                  new BrokenBand(new Band(3, 3.00000000001), worst)),
              Samples.kept(limit, worst)));
    }
    return Samples.file(
        name(random),
        name(random),
        ports,
        List.of(first, second),
        cases.toArray(CaseJudgement[]::new));
  }

  private static String name(Random random) {
    String letters = "abcxyz09 _+=\u001B[31m\u202E\r\n\t漢字é\u0301🔌Ω";
    int[] points = letters.codePoints().toArray();
    StringBuilder name = new StringBuilder();
    int length = 1 + random.nextInt(random.nextBoolean() ? 10 : 150);
    for (int i = 0; i < length; i++) {
      name.appendCodePoint(points[random.nextInt(points.length)]);
    }
    return name.toString();
  }
}
