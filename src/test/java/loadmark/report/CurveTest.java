package loadmark.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.List;
import java.util.Optional;
import loadmark.network.Case;
import loadmark.network.Network;
import loadmark.response.Change;
import loadmark.response.Loading;
import loadmark.response.Ohms;
import loadmark.study.CurveTable;
import loadmark.study.CurveTable.Curve;
import org.junit.jupiter.api.Test;

class CurveTest {
  /** A handful of roundings. */
  private static final double ROUNDING = 1e-14;

  private static final Case PROBE =
      new Case("probe", List.of(Samples.load("probe", 2)), List.of(), 0);

  private static final CurveTable TABLE =
      new CurveTable(
          new Network(
              "Title",
              List.of(),
              List.of(),
              List.of(),
              List.of(),
              List.of(),
              List.of(),
              List.of(),
              Optional.empty()),
          List.of(
              new Curve(
                  Samples.port("input"),
                  Case.bare(),
                  List.of(
                      point(0, Ohms.OPEN, Change.UNDETERMINED),
                      point(1e3, Ohms.UNDETERMINED, Change.UNDETERMINED))),
              new Curve(
                  Samples.port("input"),
                  PROBE,
                  List.of(
                      point(0, Ohms.OPEN, Change.UNBOUNDED),
                      point(1e3, Ohms.of(4, -3), Change.of(0.3, -0.4))))));

  private static Loading point(double hz, Ohms with, Change change) {
    return new Loading(hz, Samples.BARE, with, change, 0, 0, 0);
  }

  @Test
  void parallelFormIsThatOfAResistorBesideACapacitor() {
    // Closed form: Z = 1/(1/R + jωC).
    double r = 4700;
    double c = 33e-9;
    double hz = 1234;
    double x = 2 * Math.PI * hz * c * r;
    Ohms z = Ohms.of(r / (1 + x * x), -r * x / (1 + x * x));
    assertThat(CurveColumn.parallelOhm(z)).isCloseTo(r, within(r * ROUNDING));
    assertThat(CurveColumn.parallelFarad(point(hz, z, Change.NONE)))
        .isCloseTo(c, within(c * ROUNDING));
  }

  @Test
  void csvLeavesOutWhatIsNotThere() {
    String[] rows = CurveCsv.write(TABLE).split("\n", -1);
    assertThat(rows)
        .startsWith(
            "port,case,hz,re_ohm,im_ohm,magnitude_ohm,phase_deg,parallel_ohm,parallel_f,change",
            "input,bare,0,,,inf,,inf,,0",
            "input,bare,1000,,,,,,,",
            "input,probe,0,,,inf,,inf,,inf");
    // Pythagoras: 3, 4, 5; 1/Re(1/Z) = 25/4.
    assertThat(rows[4]).startsWith("input,probe,1000,4,-3,5,-36.8698976458").endsWith(",0.5");
    assertThat(rows[4].split(",", -1)[7]).isEqualTo("6.25");
  }

  @Test
  void jsonHasTheSameColumnsAsArrays() throws Exception {
    String text =
        CurveJson.write(
            Optional.of("a.zin"),
            Optional.of(Samples.DIGEST),
            Optional.of(TABLE),
            List.of(),
            List.of());
    JsonNode root = new ObjectMapper().readTree(text);
    assertThat(root.path("format").asText()).isEqualTo("loadmark/curve/1");
    JsonNode probe = root.path("curves").path(1);
    assertThat(probe.fieldNames())
        .toIterable()
        .containsExactly(
            "port",
            "case",
            "hz",
            "re_ohm",
            "im_ohm",
            "magnitude_ohm",
            "phase_deg",
            "parallel_ohm",
            "parallel_f",
            "change");
    assertThat(probe.path("magnitude_ohm").toString()).isEqualTo("[\"inf\",5]");
    assertThat(probe.path("re_ohm").toString()).isEqualTo("[null,4]");
    assertThat(root.path("curves").path(0).path("change").toString()).isEqualTo("[0,null]");
  }

  @Test
  void textIsAlignedAndKeepsTheWidth() {
    String text = CurveText.write("a.zin", TABLE, Style.PLAIN);
    assertThat(text)
        .isEqualTo(
            """
            a.zin
            Title

            port input, case bare
            frequency           |Z|  phase  Re Z  Im Z  R par  C par
                   DC          open      –     –     –      –      –
                1 kHz  undetermined      –     –     –      –      –

            port input, case probe
            frequency      |Z|    phase     Re Z      Im Z    R par     C par         change
                   DC     open        –        –         –        –         –  without bound
                1 kHz  5.000 Ω  -36.87°  4.000 Ω  -3.000 Ω  6.250 Ω  19.10 µF        50.00 %
            """);
  }
}
