package loadmark.touchstone;

import static org.assertj.core.api.Assertions.assertThat;

import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;

/** Reads texts that are right. */
final class Read {
  private Read() {}

  static MeasuredData onePort(String text) {
    return data("data.s1p", text);
  }

  static MeasuredData twoPort(String text) {
    return data("data.s2p", text);
  }

  private static MeasuredData data(String name, String text) {
    Findings findings = new Findings();
    MeasuredData data = Touchstone.read(new SourceText(name, text), findings).orElse(null);
    assertThat(findings.sorted()).isEmpty();
    assertThat(data).isNotNull();
    return java.util.Objects.requireNonNull(data);
  }
}
