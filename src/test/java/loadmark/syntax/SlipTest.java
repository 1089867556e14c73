package loadmark.syntax;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Span;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** One slip, one finding, at its place; guillemets mark the place in the text. */
class SlipTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      quoteCharacter = '\'',
      value = {
        // Statements
        "unknown-statement; «resistr» r = 5 Ω; `resistor`",
        "unknown-statement; «Resistor» r = 5 Ω; `resistor`",
        "unknown-statement; «flurb» r = 5 Ω; known are",
        "unknown-statement; «\"wire\"» a -- b; such as",
        "unknown-statement; «5» Ω; such as",
        "unopened-block; «end»; ''",
        "not-known-yet; «coupling» l1 with l2 = 0.98; ''",
        "not-known-yet; «tolerance» resistor ± 1 %, capacitor ± 20 %; ''",
        "not-known-yet; «sampler» s shunt a -- b = 12 pF through 200 Ω, every 1 µs; ''",
        "not-known-yet; «line» w = length 300 mm, resistance 5 Ω/m; ''",
        "not-known-yet; limit «resonance» shift 20 ppm; ''",
        "not-known-yet; limit «level» change 0.1 dB at tap; ''",
        "not-known-yet; limit «settling» 0.5 lsb; ''",
        "not-known-yet; capacitor c = 1 nF, «loss» tangent 0.02; ''",
        "not-known-yet; inductor l = 1 nH, «quality» 60 at 1 MHz; ''",
        "not-known-yet; load p shunt a -- b = «\"probe.s1p\"»; ''",
        "not-known-yet; load p shunt a -- b = 5 Ω + «probe»(trim = 12 pF); ''",
        "title-needs-quotes; network «Tap» one; \"…\"",
        "title-needs-quotes; network«»; \"…\"",
        // Names
        "name-needs-quotes; wire a -- r1 -- «3V3»; \"3V3\"",
        "name-needs-quotes; wire a -- r1 -- «+5V» -- b; \"+5V\"",
        "name-needs-quotes; resistor «4k» = 5 Ω; \"4k\"",
        "name-needs-quotes; limit change 2 % at port «1»; \"1\"",
        "missing-name; resistor «=» 5 Ω; ''",
        "missing-name; wire a -- r1 --«»; ''",
        "missing-name; wire a --«--» b; ''",
        "missing-name; case x =«»; ''",
        "reserved-word; let «in» = 5; ''",
        "reserved-word; let «length» = 5; ''",
        "not-known-yet; «vary» x = 1,2; ''",
        // Joints
        "missing-joint; wire a -- r1 «b»; `--`",
        "missing-joint; wire a «r1» -- b; `--`",
        "missing-joint; wire a «-» r1 -- b; hyphen",
        "missing-joint; port p = a «b»; `--`",
        "missing-joint; port p = a«»; a -- b",
        "missing-joint; load l shunt a «=» 5 Ω; `--`",
        // Parts
        "missing-equals; resistor r «220» kΩ; resistor NAME = …",
        "missing-value; resistor r =«»; ''",
        "missing-value; resistor r = «,» rated 5 W; ''",
        "missing-value; resistor r = 5 Ω ±«»; ''",
        "missing-value; let x = 2 * «*» 3; ''",
        "missing-value; let x = 2 + «in»; word of the language",
        "missing-comma; resistor r = 5 Ω «rated» 1 W; ''",
        "missing-property; resistor r = 5 Ω,«»; properties are",
        "unknown-property; resistor r = 5 Ω, «ratd» 1 W; `rated`",
        "unknown-property; capacitor c = 5 pF, series «resistence» 1 Ω; `series resistance`",
        "unknown-property; capacitor c = 5 pF, «serie» resistance 1 Ω; `series resistance`",
        "syntax; capacitor c = 5 pF, tolerance -20 %«»; ''",
        "left-over; resistor r = 5 Ω «6»; ''",
        "left-over; resistor r = 33 k «Ω»; `kΩ`",
        "left-over; let x = 5 «--» 3; ''",
        "decimal-comma; resistor r = «1,5» kΩ; 1.5",
        "decimal-comma; resistor r = «1,234,567» Ω; ''",
        // What is judged
        "syntax; load l «a» -- b = 5 Ω; ''",
        "syntax; case x = a added «b»; ''",
        "missing-comma; case x = a «b»; ''",
        "syntax; sweep 10 Hz «1» MHz; ''",
        "syntax; sweep 10 Hz«»; ''",
        "syntax; sweep 10 Hz to 1 MHz, 50 «par» decade; `per`",
        "missing-comma; port p = a -- b «terminated» 50 Ω; ''",
        "unknown-criterion; limit «chnge» 2 %; `limit change`",
        "unknown-criterion; limit «phse» change 2 deg; `limit phase change`",
        "unknown-criterion; limit return «los» 20 dB in 50 Ω; `limit return loss`",
        "unknown-criterion; limit magnitude «chnge» 3 %; `magnitude change`",
        "unknown-criterion; limit phase «abov» 3 deg; `phase above`",
        "unknown-criterion; limit parallel capacitance «belw» 3 pF; `capacitance below`",
        "left-over; limit magnitude change 3 % «or» 1 Ω; `limit change",
        "missing-bound; limit magnitude 45 Ω «-» 55 Ω; `45 Ω to 55 Ω`",
        "syntax; limit change 2 % for «port» p; `at port",
        "syntax; limit change 2 % at «case» l; `for case",
        "syntax; limit change 2 % from «dc» to 1 kHz; `at dc`",
        "syntax; sweep dc «to» 1 kHz; `sweep dc and",
        "dc-mains; port p = a -- b, driven 5 V dc behind 1 Ω, «mains»; `dc`",
        "missing-criterion; limit«»; limits are",
        "missing-value; limit change«»; ''",
        "missing-bound; limit magnitude 5 Ω«»; above",
        "syntax; limit change 5 «form» 10 Hz to 20 Hz; `from`",
        "left-over; limit change 5 % «form» 10 Hz to 20 Hz; `from`",
        "syntax; limit within 5 %«»; ''",
        "syntax; limit change 5 % for «x»; ''",
        // Characters
        "unclosed-bracket; let x = «(»5 + 3; ''",
        "unclosed-bracket; let x = «(»5 + (3); ''",
        "unopened-bracket; let x = (5 + 3)«)»; ''",
        "unclosed-quote; wire a -- «\"b -- c»; ''",
        "unknown-character; wire a «—» r1 -- b; two hyphens",
        "unknown-character; resistor r = 5 «$»; quotes",
        "unknown-character; load l shunt a -- b = 5 Ω «|» 4 pF; `||`",
        "unreadable-character; wire a «\u0007»-- b; ''",
        "unreadable-character; wire a -- b # «\u202e»; ''",
      })
  void isOneFindingAtItsPlace(String code, String marked, String told) {
    String text = marked.replace("«", "").replace("»", "");
    // Slips on the other lines would show if the marked one reached beyond its own.
    List<Finding> all = Reading.findings("wire a -- b\n" + text + "\n\nwire c -- d\n");
    assertThat(all).as(text).hasSize(1);
    Finding finding = all.get(0);
    assertThat(finding.code()).isEqualTo(code);
    Span place = finding.place();
    int start = marked.codePointCount(0, marked.indexOf('«')) + 1;
    int length = marked.substring(marked.indexOf('«') + 1, marked.indexOf('»')).length();
    assertThat(List.of(place.line(), place.column(), place.length()))
        .isEqualTo(List.of(2, start, length));
    assertThat(finding.message() + " " + finding.hint().orElse("")).contains(told);
  }

  @Test
  void threeSlipsAreThreeFindings() {
    assertThat(
            Reading.findings("resistor a = \nwire x -- a y\nlimit chnge 2 %\nresistor ok = 5 Ω\n"))
        .extracting(Finding::code)
        .containsExactly("missing-value", "missing-joint", "unknown-criterion");
  }

  @Test
  void blockIsRefusedAsAWhole() {
    String text =
        """
        block probe (ratio = 10,
          trim = 11 pF)
          port tip = a -- b
          resistor r = rubbish rubbish
        end
        wire a -- b
        """;
    assertThat(Reading.findings(text)).extracting(Finding::code).containsExactly("not-known-yet");
  }

  @Test
  void unreadableCharactersAreOneFindingALine() {
    assertThat(Reading.findings("wire \u0001\u0002\u0003 a b c\n\u0004\nwire a -- b"))
        .extracting(f -> f.place().line())
        .containsExactly(1, 2);
  }

  @Test
  void messagesShowOnlyTheStartOfAnEndlessWord() {
    Finding finding = Reading.findings("x".repeat(1_000_000)).get(0);
    assertThat(finding.message()).hasSizeLessThan(100);
  }

  @Test
  void emptyFileIsNoSlipOfItsSyntax() {
    assertThat(Reading.findings("")).isEmpty();
    assertThat(Reading.findings("\n# nothing\n\n")).isEmpty();
  }
}
