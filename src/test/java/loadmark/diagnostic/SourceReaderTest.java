package loadmark.diagnostic;

import static java.nio.charset.StandardCharsets.ISO_8859_1;
import static java.nio.charset.StandardCharsets.UTF_16;
import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class SourceReaderTest {
  private final Findings findings = new Findings();

  private Finding refused(byte[] bytes) {
    assertThat(SourceReader.decode("f", bytes, findings)).isEmpty();
    assertThat(findings.sorted()).hasSize(1);
    return findings.sorted().get(0);
  }

  @Test
  void utf8IsReadAndItsMarkDropped() {
    byte[] bytes = "\uFEFFresistor r = 1 kΩ\r\n".getBytes(UTF_8);
    assertThat(SourceReader.decode("f", bytes, findings).orElseThrow().text())
        .isEqualTo("resistor r = 1 kΩ\r\n");
    assertThat(findings.sorted()).isEmpty();
  }

  @Test
  void otherEncodingIsOneFindingAtItsFirstWrongByte() {
    Finding finding = refused("# Ok\nlet µ = 5\nlet x = 2".getBytes(ISO_8859_1));
    assertThat(finding.code()).isEqualTo("not-utf8");
    assertThat(finding.place().line()).isEqualTo(2);
    assertThat(finding.place().column()).isEqualTo(5);
    assertThat(new FindingPrinter(false).print(findings.sorted())).contains("let \uFFFD\n");
  }

  @Test
  void columnsBeforeTheWrongByteCountCodePoints() {
    byte[] good = "\"𝛺µ\"".getBytes(UTF_8);
    byte[] bytes = java.util.Arrays.copyOf(good, good.length + 1);
    bytes[good.length] = (byte) 0xC3;
    assertThat(refused(bytes).place().column()).isEqualTo(5);
  }

  @Test
  void utf16IsNamed() {
    Finding finding = refused("resistor".getBytes(UTF_16));
    assertThat(finding.place().column()).isEqualTo(1);
    assertThat(finding.hint().orElseThrow()).contains("UTF-16");
  }

  @Test
  void tooLargeIsNotDecoded() {
    assertThat(refused(new byte[SourceReader.MOST_BYTES + 1]).code()).isEqualTo("too-large");
  }

  @Test
  void emptyIsAText() {
    assertThat(SourceReader.decode("f", new byte[0], findings)).isPresent();
  }
}
