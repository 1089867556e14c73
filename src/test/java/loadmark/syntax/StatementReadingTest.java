package loadmark.syntax;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Collectors;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import loadmark.syntax.Statement.Closure;
import loadmark.syntax.Statement.Criterion;
import loadmark.syntax.Statement.DriveKind;
import loadmark.syntax.Statement.PropertyKind;
import loadmark.syntax.Statement.Relation;
import loadmark.syntax.Statement.ScopeItem;
import loadmark.syntax.Statement.Window;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class StatementReadingTest {

  @Test
  void titleIsTheQuotedText() {
    assertThat(Reading.only(Statement.Title.class, "network \"Tap # 1\" # x").title().text())
        .isEqualTo("Tap # 1");
  }

  @Test
  void everyPropertyIsRead() {
    Statement.Part part =
        Reading.only(
            Statement.Part.class,
            "impedance z = 5 Ω, series resistance 1 Ω, series inductance 1 nH,\n"
                + " parallel capacitance 1 pF, leakage 1 GΩ, self-resonance 30 MHz,"
                + " rated 0.1 W, tolerance -20 % to +80 %");
    assertThat(part.properties())
        .extracting(Statement.Property::kind)
        .containsExactly(
            PropertyKind.SERIES_RESISTANCE,
            PropertyKind.SERIES_INDUCTANCE,
            PropertyKind.PARALLEL_CAPACITANCE,
            PropertyKind.LEAKAGE,
            PropertyKind.SELF_RESONANCE,
            PropertyKind.RATED,
            PropertyKind.TOLERANCE);
    assertThat(part.properties().get(6).second()).isPresent();
    assertThat(part.properties().get(5).second()).isEmpty();
    assertThat(part.span().length()).isEqualTo(65);
  }

  @ParameterizedTest
  @ValueSource(strings = {"resistor", "capacitor", "inductor", "impedance"})
  void partsKnowTheirKind(String word) {
    assertThat(Reading.only(Statement.Part.class, word + " x = 1").kind().word()).isEqualTo(word);
  }

  @Test
  void wireListsItsItems() {
    Statement.Wire wire = Reading.only(Statement.Wire.class, "wire in -- t.primary -- \"3V3\"");
    assertThat(wire.items()).extracting(i -> i.name().text()).containsExactly("in", "t", "3V3");
    assertThat(wire.items().get(1).port().orElseThrow().text()).isEqualTo("primary");
    assertThat(wire.items().get(2).name().quoted()).isTrue();
  }

  @Test
  void portsMayBeTerminatedOrDriven() {
    Statement.Port open = Reading.only(Statement.Port.class, "port p = a -- b");
    assertThat(open.closure()).isEmpty();
    Statement.Port terminated =
        Reading.only(Statement.Port.class, "port p = a -- b, terminated 50 Ω || 1 pF");
    assertThat(terminated.closure().orElseThrow()).isInstanceOf(Closure.Terminated.class);
    Closure.Driven mains =
        (Closure.Driven)
            Reading.only(
                    Statement.Port.class, "port p = a -- b, driven 325 V peak behind 0.2 Ω, mains")
                .closure()
                .orElseThrow();
    assertThat(mains.kind()).isEqualTo(DriveKind.PEAK);
    assertThat(mains.mains()).isTrue();
    assertThat(mains.behind()).isPresent();
    Closure.Driven dc =
        (Closure.Driven)
            Reading.only(Statement.Port.class, "port p = a -- b, driven 5 V dc")
                .closure()
                .orElseThrow();
    assertThat(dc.kind()).isEqualTo(DriveKind.DC);
    assertThat(dc.mains()).isFalse();
    assertThat(dc.behind()).isEmpty();
  }

  @Test
  void supplyNamesItsNode() {
    Statement.Supply supply =
        Reading.only(Statement.Supply.class, "supply \"+5V\" = 5 V behind 0.1 Ω");
    assertThat(supply.node().text()).isEqualTo("+5V");
    assertThat(supply.behind()).isPresent();
  }

  @Test
  void loadsKnowTheirPlace() {
    Statement.Load load =
        Reading.only(Statement.Load.class, "load shunt series from -- to = 250 Ω");
    assertThat(load.name().text()).isEqualTo("shunt");
    assertThat(load.placement()).isEqualTo(Statement.Placement.SERIES);
    assertThat(load.nodes().plus().text()).isEqualTo("from");
    assertThat(load.nodes().minus().text()).isEqualTo("to");
  }

  @Test
  void casesSayWhatTheyAreHeldAgainst() {
    Statement.Case plain = Reading.only(Statement.Case.class, "case both = a, b");
    assertThat(plain.relation()).isEqualTo(Relation.AGAINST_BARE);
    assertThat(plain.each()).isFalse();
    Statement.Case added = Reading.only(Statement.Case.class, "case x = added added to to, of");
    assertThat(added.relation()).isEqualTo(Relation.ADDED_TO);
    assertThat(added.loads()).extracting(Name::text).containsExactly("added");
    assertThat(added.others()).extracting(Name::text).containsExactly("to", "of");
    Statement.Case instead = Reading.only(Statement.Case.class, "case x = hi instead of lo");
    assertThat(instead.relation()).isEqualTo(Relation.INSTEAD_OF);
    assertThat(Reading.only(Statement.Case.class, "case each = a, b").each()).isTrue();
    assertThat(Reading.only(Statement.Case.class, "case \"each\" = a, b").each()).isFalse();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "sweep dc; true; false; false",
        "sweep dc and 10 Hz to 1 MHz; true; true; false",
        "sweep 10 Hz to 1 MHz, 400 points; false; true; true",
      })
  void sweepsHaveABandOrDcOrBoth(String text, boolean dc, boolean band, boolean density) {
    Statement.Sweep sweep = Reading.only(Statement.Sweep.class, text);
    assertThat(sweep.dc()).isEqualTo(dc);
    assertThat(sweep.band().isPresent()).isEqualTo(band);
    assertThat(sweep.density().isPresent()).isEqualTo(density);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "change 2 %; Change",
        "change 2 % or 5 Ω; Change",
        "magnitude change 2 %; MagnitudeChange",
        "phase change 1 deg; PhaseChange",
        "magnitude 45 Ω to 55 Ω; Magnitude",
        "phase -10 deg to 10 deg; Phase",
        "within 20 %, 11.5 deg of 50 Ω || (50 µH + 5 Ω); Within",
        "within 20 % of z; Within",
        "parallel capacitance below 75 pF; ParallelCapacitance",
        "parallel resistance 23.75 kΩ to 26.25 kΩ; ParallelResistance",
        "return loss 20 dB in 50 Ω; ReturnLoss",
      })
  void everyCriterionIsRead(String text, String type) {
    Criterion read = Reading.only(Statement.Limit.class, "limit " + text).criterion();
    assertThat(read.getClass().getSimpleName()).isEqualTo(type);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "45 Ω to 55 Ω; Between",
        "50 Ω ± 20 %; Around",
        "above 1 kΩ; Above",
        "below 5 Ω; Below"
      })
  void everyWindowIsRead(String text, String type) {
    Criterion.Magnitude read =
        (Criterion.Magnitude)
            Reading.only(Statement.Limit.class, "limit magnitude " + text).criterion();
    Window window = read.window();
    assertThat(window.getClass().getSimpleName()).isEqualTo(type);
  }

  @Test
  void scopeItemsStandInAnyOrder() {
    Statement.Limit limit =
        Reading.only(
            Statement.Limit.class,
            "limit change 2 % for case a, at at port in from 1 kHz to 2 kHz at 5 kHz, dc, 6 kHz");
    assertThat(limit.scope())
        .extracting(i -> i.getClass().getSimpleName())
        .containsExactly("ForCases", "AtPort", "FromTo", "At");
    assertThat(((ScopeItem.ForCases) limit.scope().get(0)).cases())
        .extracting(Name::text)
        .containsExactly("a", "at");
    ScopeItem.At at = (ScopeItem.At) limit.scope().get(3);
    assertThat(at.dc()).isTrue();
    assertThat(at.points()).hasSize(2);
    assertThat(at.span().column()).isEqualTo(64); // 17 + 15 + 11 + 20 characters stand before it
  }

  @Test
  void everyWordIsFreeAsANameButNotOfAValue() {
    for (String word : words()) {
      Statement.Wire wire =
          Reading.only(Statement.Wire.class, "wire " + word + " -- " + word + " -- " + word);
      assertThat(wire.items()).hasSize(3);
      Reading.only(Statement.Part.class, "resistor " + word + " = 5 Ω");
      Reading.only(Statement.Load.class, "load " + word + " shunt a -- " + word + " = 5 Ω");
      Reading.only(Statement.Case.class, "case " + word + " = " + word + ", " + word);
      Reading.only(Statement.Port.class, "port " + word + " = " + word + " -- " + word);
      assertThat(Reading.findings("let " + word + " = 5"))
          .extracting(f -> f.code())
          .containsExactly("reserved-word");
    }
  }

  private static List<String> words() {
    return java.util.stream.IntStream.rangeClosed(
            1, loadmark.syntax.antlr.NetworkParser.VOCABULARY.getMaxTokenType())
        .filter(Words::isWord)
        .mapToObj(Words::text)
        .filter(word -> !word.contains("-"))
        .collect(Collectors.toList());
  }

  @Test
  void namesAreComparedInComposedForm() {
    Statement.Wire wire = Reading.only(Statement.Wire.class, "wire e\u0301 -- \"e\u0301\"");
    assertThat(wire.items()).extracting(i -> i.name().text()).containsOnly("é");
    assertThat(wire.items().get(1).span().column()).isEqualTo(12);
  }

  @Test
  void placesCountCodePoints() {
    Statement.Wire wire = Reading.only(Statement.Wire.class, "wire \"𝛺𝛺\" -- r1 -- 𝛺");
    assertThat(wire.items().get(1).span().column()).isEqualTo(14);
    assertThat(wire.items().get(2).span().column()).isEqualTo(20);
    assertThat(wire.items().get(2).span().length()).isEqualTo(1);
  }

  @Test
  void brokenStatementTellsWhatItCan() {
    Findings findings = new Findings();
    List<Statement> all =
        NetworkReader.read(
                new SourceText("t", "resistor upper 220 kΩ\nwire a -- upper 3V3 -- \"b\"\nfoo x"),
                findings)
            .statements();
    Statement.Broken part = (Statement.Broken) all.get(0);
    assertThat(part.word()).isEqualTo("resistor");
    assertThat(part.declared().orElseThrow().text()).isEqualTo("upper");
    Statement.Broken wire = (Statement.Broken) all.get(1);
    assertThat(wire.declared()).isEmpty();
    assertThat(wire.mentioned()).extracting(Name::text).containsExactly("a", "upper", "3V3", "b");
    Statement.Broken unknown = (Statement.Broken) all.get(2);
    assertThat(unknown.word()).isEmpty();
    assertThat(unknown.declared().orElseThrow().text()).isEqualTo("x");
  }
}
