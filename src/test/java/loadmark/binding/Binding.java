package loadmark.binding;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import loadmark.network.Network;
import loadmark.network.Part;
import loadmark.syntax.NetworkReader;

/** Reads and binds a text, for tests. */
final class Binding {
  private Binding() {}

  /** The network of a text without any finding. */
  static Network of(String... lines) {
    Findings findings = new Findings();
    Optional<Network> network = bind(findings, lines);
    assertThat(findings.sorted()).isEmpty();
    return network.orElseThrow();
  }

  /** What is found in a text: {@code LINE:COLUMN code}. */
  static List<String> findings(String... lines) {
    Findings findings = new Findings();
    bind(findings, lines);
    return findings.sorted().stream()
        .map(f -> f.place().line() + ":" + f.place().column() + " " + f.code())
        .toList();
  }

  /** The network, whatever was warned of. */
  static Network withWarnings(String... lines) {
    return bind(new Findings(), lines).orElseThrow();
  }

  static Part part(Network network, String name) {
    return network.parts().stream().filter(p -> p.name().equals(name)).findFirst().orElseThrow();
  }

  private static Optional<Network> bind(Findings findings, String... lines) {
    SourceText source = new SourceText("test.zin", String.join("\n", lines) + "\n");
    return Binder.bind(
        NetworkReader.read(source, findings), Overrides.NONE, Purpose.CHECK, findings);
  }
}
