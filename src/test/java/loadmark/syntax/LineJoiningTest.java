package loadmark.syntax;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Collectors;
import loadmark.diagnostic.Finding;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class LineJoiningTest {

  @ParameterizedTest
  @ValueSource(
      strings = {
        "wire a --\nr1 -- b",
        "wire a --   # comment\n\n  # another\n r1 -- b",
        "resistor r =\n 5 Ω",
        "resistor r = 5 Ω ±\n 1 %",
        "resistor r = 5 Ω,\n rated 1 W",
        "let x = 5 *\n 4",
        "let x = 5 -\n\n 4",
        "load l shunt a -- b = 5 Ω ||\n 4 pF",
        "load l shunt a -- b = (5 Ω\n + 4 pF\n)",
        "case x = a,\n load added to b",
        "case x = a,\n load",
        "wire a --\n port -- b",
        "wire a --\n wire -- wire",
      })
  void lineGoesOnWhereItIsNotOver(String text) {
    assertThat(Reading.statements(text)).hasSize(1);
    assertThat(Reading.statements(text.replace("\n", "\r\n"))).hasSize(1);
    assertThat(Reading.statements(text.replace("\n", "\r"))).hasSize(1);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "wire a --\nport p = a -- b",
        "wire a --\nload p shunt a -- b = 5 Ω",
        "wire a --\nsweep 10 Hz to 1 MHz",
        "wire a --\nsweep dc",
        "wire a --\nlimit change 5 %",
        "wire a --\nnetwork \"x\"",
        "resistor r =\nwire a -- b",
        "resistor r = 5 +\nresistor q = 5",
        "case x = a,\nport in = a -- b",
        "load l shunt a -- b = (5 Ω + 4 pF\nwire a -- b",
        "load l shunt a -- b = (5 Ω + 4 pF\n\n# c\ncoupling",
      })
  void unfinishedLineDoesNotSwallowTheNextStatement(String text) {
    List<Finding> slips =
        Reading.findings(text).stream().filter(f -> f.place().line() == 1).toList();
    assertThat(slips).hasSize(1);
    assertThat(Reading.findings(text).size()).isEqualTo(text.endsWith("coupling") ? 2 : 1);
  }

  @Test
  void lineThatBeginsWithAJoiningSignIsReadOnAndTold() {
    assertThat(Reading.findings("wire a\n -- r1\n -- b"))
        .extracting(Finding::code)
        .containsExactly("line-break", "line-break");
  }

  @Test
  void lineEndsOfAnyKindGiveTheSamePlaces() {
    String text = "# a\nwire a -- r1 b\n\nlimit chnge 2 %\nresistor r = 1,5 Ω\n";
    String places = places(text);
    assertThat(places).isEqualTo("2:14 4:7 5:14");
    assertThat(places(text.replace("\n", "\r\n"))).isEqualTo(places);
    assertThat(places(text.replace("\n", "\r"))).isEqualTo(places);
    assertThat(places("\uFEFF" + text)).isEqualTo(places);
  }

  private static String places(String text) {
    return Reading.findings(text).stream()
        .map(f -> f.place().line() + ":" + f.place().column())
        .collect(Collectors.joining(" "));
  }
}
