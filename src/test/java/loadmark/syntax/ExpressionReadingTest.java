package loadmark.syntax;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ExpressionReadingTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "-2^2; (-(2^2))",
        "2^3^2; (2^(3^2))",
        "2^-3*4; ((2^(-3))*4)",
        "-2*3; ((-2)*3)",
        "a*b/c; ((a*b)/c)",
        "1 - 2 - 3; ((1-2)-3)",
        "2*3 ± 1 %; ((2*3)±1%)",
        "10 MΩ ± 1 % || 13 pF ± 10 %; ((10MΩ±1%)||(13pF±10%))",
        "50 Ω || 50 µH + 5 Ω; ((50Ω||50µH)+5Ω)",
        "50 Ω + (1 kΩ || 10 nF); (50Ω+<(1kΩ||10nF)>)",
        "a + b || c * d ^ e; (a+(b||(c*(d^e))))",
        "sqrt(l / c) * pi; (sqrt[(l/c)]*pi)",
        "max(1, 2 + 3); max[1, (2+3)]",
        "10 +- 1 %; (10±1%)",
        "1 Ω +− 0.1 Ω; (1Ω±0.1Ω)",
        "5 − 3; (5-3)",
        "−5 Ω; (-5Ω)",
        "s/m; (s/m)",
        "2 s/m; 2s/m",
        "2 s / m; (2s/m)",
        "-20%; (-20%)",
      })
  void operatorsBind(String text, String bracketed) {
    assertThat(Reading.bracketed(Reading.value(text))).isEqualTo(bracketed);
  }

  @ParameterizedTest
  @CsvSource({
    "220 kΩ,220,kΩ,false",
    "220kΩ,220,kΩ,true",
    "4K7,4,K7,true",
    "4 K7,4,K7,false",
    "2u2,2,u2,true",
    "47µ,47,µ,true",
    ".5 %,.5,%,false",
    "1e-9F,1e-9,F,true",
    "1e−9 F,1e-9,F,false",
    "10°,10,°,true",
    "250 nH/m,250,nH/m,false",
    "5 k\u2126/m,5,k\u2126/m,false",
    "6ns/m,6,ns/m,true",
    "1\u00A0kHz,1,kHz,false",
  })
  void literalKeepsNumberAndUnitAsWritten(
      String text, String number, String unit, boolean adjoined) {
    Expression.Literal read = (Expression.Literal) Reading.value(text);
    assertThat(read.number()).isEqualTo(number);
    assertThat(read.value()).isEqualTo(Double.parseDouble(number));
    assertThat(read.unit().map(Expression.Unit::text)).contains(unit);
    assertThat(read.adjoined()).isEqualTo(adjoined);
    assertThat(read.span().length()).isEqualTo(text.codePointCount(0, text.length()));
  }

  @Test
  void unitHasItsOwnPlace() {
    Expression.Literal read = (Expression.Literal) Reading.value("  220 kΩ");
    assertThat(read.span().column()).isEqualTo(3);
    assertThat(read.unit().orElseThrow().span().column()).isEqualTo(7);
    assertThat(read.unit().orElseThrow().span().length()).isEqualTo(2);
  }

  @Test
  void numberBeyondDoublesComesThroughAsInfinite() {
    assertThat(((Expression.Literal) Reading.value("1e400 Ω")).value()).isInfinite();
  }

  @Test
  void letterCodeThatBeginsWithItsLetterIsAReference() {
    assertThat(Reading.value("R47")).isInstanceOf(Expression.Reference.class);
  }

  @Test
  void wordOfTheLanguageIsNeverAUnit() {
    Statement.Limit limit =
        Reading.only(Statement.Limit.class, "limit change 5 from 10 Hz to 20 Hz");
    Expression bound = ((Statement.Criterion.Change) limit.criterion()).bound();
    assertThat(((Expression.Literal) bound).unit()).isEmpty();
  }

  @Test
  void commaInANumberIsOneFindingAndReadOnAsAPoint() {
    Findings findings = new Findings();
    NetworkFile file = NetworkReader.read(new SourceText("t", "limit change 1,5 %\n"), findings);
    assertThat(findings.sorted()).extracting(f -> f.code()).containsExactly("decimal-comma");
    assertThat(findings.sorted().get(0).hint().orElseThrow()).endsWith("write 1.5");
    Statement.Limit limit = (Statement.Limit) file.statements().get(0);
    Expression bound = ((Statement.Criterion.Change) limit.criterion()).bound();
    assertThat(((Expression.Literal) bound).value()).isEqualTo(1.5);
  }

  @Test
  void sweepOfACommandLineIsRead() {
    Findings findings = new Findings();
    Optional<Statement.Sweep> sweep =
        NetworkReader.readSweep(
            new SourceText("--sweep", "dc and 10 Hz to 1 MHz, 50 per decade"), findings);
    assertThat(findings.sorted()).isEmpty();
    assertThat(sweep.orElseThrow().dc()).isTrue();
    assertThat(sweep.orElseThrow().band()).isPresent();
    assertThat(sweep.orElseThrow().density().orElseThrow().perDecade()).isTrue();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {"''", "10 Hz", "10 Hz to", "x to y z", "10 Hz to 1,5 kHz"})
  void wrongSweepOfACommandLineIsOneFinding(String text) {
    Findings findings = new Findings();
    assertThat(NetworkReader.readSweep(new SourceText("--sweep", text), findings)).isEmpty();
    assertThat(findings.sorted()).hasSize(1);
  }

  @Test
  void valuesOfACommandLineAreRead() {
    Findings findings = new Findings();
    Optional<List<Expression>> values =
        NetworkReader.readExpressions(new SourceText("--at", "0 Hz, 1 kHz,2kHz"), findings);
    assertThat(values.orElseThrow()).hasSize(3);
    assertThat(findings.sorted()).isEmpty();
    assertThat(NetworkReader.readExpression(new SourceText("--set", "1, 2"), findings)).isEmpty();
    assertThat(findings.sorted()).hasSize(1);
  }
}
