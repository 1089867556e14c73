package loadmark.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import loadmark.judge.CaseJudgement;
import loadmark.network.Bound;
import loadmark.network.Case;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.study.FileResult;
import org.junit.jupiter.api.Test;

class CsvTest {
  @Test
  void namesAreQuotedAndDefused() {
    Csv csv = new Csv("a");
    csv.name("plain").name("=1+2").name("@x").name("+5V").name("-3").name("a,b").name("a\"b").end();
    csv.name("a\nb").number(-3.5).number(Double.POSITIVE_INFINITY).number(Double.NaN).end();
    assertThat(csv.toString())
        .isEqualTo(
            """
            a
            plain,'=1+2,'@x,'+5V,'-3,"a,b","a""b"
            "a
            b",-3.5,inf,
            """);
  }

  @Test
  void checkHasARowForEachLimitOfEachCase() {
    Limit limit = Samples.limit(Criterion.CHANGE, Bound.atMost(0.02), 3, "");
    CaseJudgement one =
        Samples.judged(
            new Case("+probe", List.of(Samples.load("+probe", 2)), List.of(), 0),
            Samples.port("input"),
            Samples.kept(limit, Samples.worst(1e3, 0.015)));
    FileResult file = Samples.file("a.zin", "", List.of(), List.of(), one);
    FileResult invalid = new FileResult.Invalid("b.zin", Optional.empty(), List.of());
    assertThat(CheckCsv.write(List.of(invalid, file)))
        .isEqualTo(
            """
            file,port,case,limit,line,from_hz,to_hz,verdict,worst_hz,worst,bands
            a.zin,input,'+probe,change,3,10,1e6,kept,1000,0.015,0
            """);
  }
}
