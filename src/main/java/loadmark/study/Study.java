package loadmark.study;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import loadmark.allowance.Allowances;
import loadmark.binding.Binder;
import loadmark.binding.Overrides;
import loadmark.binding.Purpose;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import loadmark.judge.Judge;
import loadmark.network.Case;
import loadmark.network.Network;
import loadmark.network.Port;
import loadmark.response.PortResponse;
import loadmark.response.PortRoots;
import loadmark.response.Responses;
import loadmark.study.CurveTable.Curve;
import loadmark.syntax.Expression;
import loadmark.syntax.NetworkFile;
import loadmark.syntax.NetworkReader;
import loadmark.syntax.Statement;

/** Runs the stages on one file after another, with what the command line asks for. */
public final class Study {
  private final Overrides overrides;
  private final Selection selection;
  private final Optional<double[]> frequencies;
  private final boolean poles;

  private Study(
      Overrides overrides, Selection selection, Optional<double[]> frequencies, boolean poles) {
    this.overrides = overrides;
    this.selection = selection;
    this.frequencies = frequencies;
    this.poles = poles;
  }

  /** Reads what is asked for; empty, with findings, where it makes no sense. */
  public static Optional<Study> of(Request request, Findings findings) {
    Optional<Statement.Sweep> sweep =
        request
            .sweep()
            .flatMap(s -> NetworkReader.readSweep(new SourceText("--sweep", s), findings));
    Optional<double[]> frequencies = request.at().map(at -> readFrequencies(at, findings));
    Overrides overrides = new Overrides(sweep, readSets(request.sets(), findings));
    return findings.hasErrors()
        ? Optional.empty()
        : Optional.of(
            new Study(
                overrides,
                new Selection(request.port(), request.caseName()),
                frequencies,
                request.poles()));
  }

  private static double[] readFrequencies(String at, Findings findings) {
    return NetworkReader.readExpressions(new SourceText("--at", at), findings)
        .map(expressions -> Binder.frequencies(expressions, findings))
        .orElse(List.of())
        .stream()
        .mapToDouble(Double::doubleValue)
        .distinct()
        .toArray();
  }

  private static Map<String, Expression> readSets(List<String> sets, Findings findings) {
    Map<String, Expression> lets = new LinkedHashMap<>();
    for (String set : sets) {
      SourceText source = new SourceText("--set", set);
      int equals = set.indexOf('=');
      if (equals < 1) {
        findings.error(
            "set-without-value", source.whole(), "--set wants NAME=VALUE", "--set trim='12 pF'");
        continue;
      }
      String name = set.substring(0, equals).strip();
      SourceText value = new SourceText("--set " + name, set.substring(equals + 1).strip());
      NetworkReader.readExpression(value, findings)
          .filter(expression -> lets.putIfAbsent(name, expression) != null)
          .ifPresent(
              twice ->
                  findings.error(
                      "set-twice", source.whole(), "--set gives `" + name + "` two values"));
    }
    return lets;
  }

  /** Text to verdict. */
  public FileResult check(Source source) {
    Findings findings = new Findings();
    NetworkFile file = NetworkReader.read(source.text(), findings);
    Optional<Network> network =
        Binder.bind(file, overrides, Purpose.CHECK, findings)
            .map(bound -> select(bound, source.text(), findings));
    if (network.isEmpty() || findings.hasErrors()) {
      return new FileResult.Invalid(
          source.text().name(), Optional.of(source.sha256()), findings.sorted());
    }
    return new FileResult.Judged(
        source,
        Judge.judge(network.get(), port -> Responses.of(network.get(), port)),
        findings.sorted());
  }

  private Network select(Network network, SourceText source, Findings findings) {
    selection.check(network, source, findings);
    return selection.narrow(network, source, findings);
  }

  /** Text to the impedances themselves; empty, with findings, where there are none. */
  public Optional<CurveTable> curve(Source source, Findings findings) {
    NetworkFile file = NetworkReader.read(source.text(), findings);
    Optional<Network> bound = Binder.bind(file, overrides, Purpose.CURVE, findings);
    if (bound.isEmpty()) {
      return Optional.empty();
    }
    Network network = bound.get();
    selection.check(network, source.text(), findings);
    Optional<double[]> hz = frequencies.or(() -> network.sweep().map(SweepPoints::of));
    if (hz.isEmpty() && !findings.hasErrors()) {
      findings.error(
          "no-frequencies",
          source.text().whole(),
          "a curve needs frequencies: this file has no sweep",
          "add a line such as `sweep 10 Hz to 1 MHz`, or use --sweep or --at");
    }
    if (findings.hasErrors()) {
      return Optional.empty();
    }
    CurveTable table = draw(network, hz.orElseThrow(), source.text(), findings);
    if (table.countUndetermined() > 0) {
      findings.warning(
          "undetermined",
          source.text().whole(),
          "impedances that could not be determined: " + table.countUndetermined());
    }
    return Optional.of(table);
  }

  /** Text to how heavy each load may be; empty, with findings, where that cannot be said. */
  public Optional<AllowanceTable> allow(Source source, Findings findings) {
    NetworkFile file = NetworkReader.read(source.text(), findings);
    Optional<Network> bound =
        Binder.bind(file, overrides, Purpose.CHECK, findings)
            .map(n -> select(n, source.text(), findings));
    if (bound.isEmpty() || findings.hasErrors()) {
      return Optional.empty();
    }
    Network network = bound.get();
    List<Port> ports = network.ports().stream().filter(selection::wants).toList();
    List<Case> cases = network.cases().stream().filter(selection::wants).toList();
    AllowanceTable table =
        new AllowanceTable(
            network, new Allowances(network).all(ports, cases, AllowancePoints.of(network)));
    if (table.allowances().isEmpty()) {
      findings.error("no-load", source.text().whole(), "no case adds a load to its reference");
      return Optional.empty();
    }
    if (table.countUndetermined() > 0) {
      findings.warning(
          "undetermined",
          source.text().whole(),
          "frequencies whose allowance could not be determined: " + table.countUndetermined());
    }
    return Optional.of(table);
  }

  private CurveTable draw(Network network, double[] hz, SourceText source, Findings findings) {
    List<Curve> curves = new ArrayList<>();
    for (Port port : network.ports().stream().filter(selection::wants).toList()) {
      PortResponse response = Responses.of(network, port);
      Stream.concat(Stream.of(Case.bare()), network.cases().stream().filter(c -> !c.isBare()))
          .filter(selection::wants)
          .forEach(
              one ->
                  curves.add(
                      new Curve(
                          port,
                          one,
                          response.compare(one.loads(), one.against()).at(hz),
                          roots(network, port, one, source, findings))));
    }
    return new CurveTable(network, curves);
  }

  private Optional<PortRoots> roots(
      Network network, Port port, Case one, SourceText source, Findings findings) {
    if (!poles) {
      return Optional.empty();
    }
    try {
      return Optional.of(PortRoots.of(network, port, one.loads()));
    } catch (ArithmeticException failed) {
      findings.warning(
          "no-poles",
          source.whole(),
          "the poles and zeros of case `"
              + one.name()
              + "` at port `"
              + port.name()
              + "` could not be found");
      return Optional.empty();
    }
  }
}
