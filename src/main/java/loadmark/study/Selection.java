package loadmark.study;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.diagnostic.SourceText;
import loadmark.network.Case;
import loadmark.network.Limit;
import loadmark.network.Network;
import loadmark.network.Port;

/** The only port and the only case that are of interest, where the user named one. */
record Selection(Optional<String> port, Optional<String> caseName) {
  /** A hint lists no more names than these. */
  private static final int MOST_NAMES = 8;

  boolean wants(Port one) {
    return port.isEmpty() || port.get().equals(one.name());
  }

  boolean wants(Case one) {
    return caseName.isEmpty() || caseName.get().equals(one.name());
  }

  /** Adds a finding for each chosen name that the network does not have. */
  void check(Network network, SourceText source, Findings findings) {
    checkName("port", port, network.ports(), Port::name, source, findings);
    Collection<Case> cases = new ArrayList<>(network.cases());
    cases.add(Case.bare());
    checkName("case", caseName, cases, Case::name, source, findings);
  }

  private static <T> void checkName(
      String kind,
      Optional<String> chosen,
      Collection<T> known,
      Function<T, String> name,
      SourceText source,
      Findings findings) {
    List<String> names = known.stream().map(name).distinct().toList();
    if (chosen.isEmpty() || names.contains(chosen.get())) {
      return;
    }
    String hint =
        Nearest.find(chosen.get(), names)
            .map(n -> "did you mean `--" + kind + " " + n + "`?")
            .orElse(
                "it has "
                    + String.join(", ", names.subList(0, Math.min(MOST_NAMES, names.size())))
                    + (names.size() > MOST_NAMES ? ", …" : ""));
    findings.error(
        "unknown-" + kind,
        source.whole(),
        "this file has no " + kind + " `" + chosen.get() + "`, which --" + kind + " asks for",
        hint);
  }

  /** The network with the limits that hold for what is chosen, and nothing else changed. */
  Network narrow(Network network, SourceText source, Findings findings) {
    if (port.isEmpty() && caseName.isEmpty()) {
      return network;
    }
    List<Limit> limits =
        network.limits().stream()
            .map(this::narrow)
            .filter(l -> !l.cases().isEmpty() && !l.ports().isEmpty())
            .toList();
    if (limits.isEmpty() && !findings.hasErrors()) {
      findings.error(
          "nothing-selected", source.whole(), "no limit holds for what --port and --case ask for");
    }
    return new Network(
        network.title(),
        network.nodes(),
        network.parts(),
        network.supplies(),
        network.ports(),
        network.loads(),
        network.cases(),
        limits,
        network.sweep());
  }

  private Limit narrow(Limit limit) {
    return new Limit(
        limit.criterion(),
        limit.bound(),
        limit.reference(),
        limit.referenceText(),
        limit.scope(),
        limit.cases().stream().filter(this::wants).toList(),
        limit.ports().stream().filter(this::wants).toList(),
        limit.line(),
        limit.text());
  }
}
