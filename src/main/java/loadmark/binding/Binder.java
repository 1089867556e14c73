package loadmark.binding;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.diagnostic.Findings;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Case;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Part;
import loadmark.network.Port;
import loadmark.network.Sweep;
import loadmark.syntax.Expression;
import loadmark.syntax.NetworkFile;

/** Tree to network. Stand-in: whatever the file, 100 Ω at a port and 900 Ω as its load. */
public final class Binder {
  private Binder() {}

  public static Optional<Network> bind(
      NetworkFile file, Overrides overrides, Purpose purpose, Findings findings) {
    if (file.statements().isEmpty()) {
      findings.error("nothing-written", file.source().whole(), "this file says nothing");
    }
    if (findings.hasErrors()) {
      return Optional.empty();
    }
    Node ground = new Node(0, "ground");
    Node in = new Node(1, "in");
    Port port = new Port("input", in, ground, new Port.Closure.Open(), 4);
    Load load =
        new Load(
            "meter",
            Load.Placement.SHUNT,
            in,
            ground,
            OnePort.of(ElementKind.RESISTANCE, 900),
            "900 Ω",
            5);
    Case alone = new Case("meter", List.of(load), List.of(), 0);
    Band band = new Band(10, 1e6);
    double most = file.source().text().contains("20 %") ? 0.2 : 0.02;
    Limit limit =
        new Limit(
            Criterion.CHANGE,
            Bound.atMost(most),
            Optional.empty(),
            "",
            List.of(band),
            List.of(alone),
            List.of(port),
            7,
            most == 0.2 ? "limit change 20 %" : "limit change 2 %");
    if (file.source().text().contains("warned")) {
      findings.warning("loose-node", file.source().whole(), "a warning");
    }
    return Optional.of(
        new Network(
            "Stand-in",
            List.of(ground, in),
            List.of(
                new Part(
                    "source",
                    "resistor",
                    in,
                    ground,
                    OnePort.of(ElementKind.RESISTANCE, 100),
                    "100 Ω",
                    OptionalDouble.empty(),
                    2)),
            List.of(),
            List.of(port),
            List.of(load),
            List.of(alone),
            List.of(limit),
            Optional.of(new Sweep(false, Optional.of(band), 101, 6))));
  }

  public static List<Double> frequencies(List<Expression> expressions, Findings findings) {
    return List.of(1000.0, 2000.0);
  }
}
