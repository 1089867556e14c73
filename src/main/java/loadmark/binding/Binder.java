package loadmark.binding;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.diagnostic.Findings;
import loadmark.network.Case;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.OnePort;
import loadmark.network.Part;
import loadmark.network.Port;
import loadmark.network.Supply;
import loadmark.network.Sweep;
import loadmark.syntax.Expression;
import loadmark.syntax.ExpressionText;
import loadmark.syntax.NetworkFile;
import loadmark.syntax.Statement;

/** Syntax tree to network: names, values, wiring, what is judged, and the checks of it all. */
public final class Binder {
  /** Stands for a value that could not be read, so that the wiring can still be checked. */
  private static final PartValues.PartValue UNREAD =
      new PartValues.PartValue(
          OnePort.of(OnePort.ElementKind.RESISTANCE, 1), OptionalDouble.empty());

  private final List<Statement> statements;
  private final Findings findings;
  private final Declarations declared;
  private final Values values;
  private final Impedances impedances;
  private final Nodes nodes = new Nodes();

  private Binder(NetworkFile file, Overrides overrides, Findings findings) {
    this.statements = file.statements();
    this.findings = findings;
    this.declared = Declarations.of(statements, findings);
    this.values = new Values(findings);
    values.declare(statements, overrides.lets());
    this.impedances = new Impedances(values, findings);
  }

  /**
   * Binds a file.
   *
   * @param findings takes what is found, beside what reading the file found before
   * @return empty where there is any error
   */
  public static Optional<Network> bind(
      NetworkFile file, Overrides overrides, Purpose purpose, Findings findings) {
    if (file.statements().isEmpty()) {
      if (!findings.hasErrors()) {
        findings.error(
            "empty-file",
            file.source().whole(),
            "the file holds no statement",
            "a network needs parts, wires, a port, and a limit to be checked against");
      }
      return Optional.empty();
    }
    return new Binder(file, overrides, findings).bind(file, overrides, purpose);
  }

  /** The frequencies of a list such as that of {@code --at}, Hz; {@code 0 Hz} is DC. */
  public static List<Double> frequencies(List<Expression> expressions, Findings findings) {
    Values values = new Values(findings);
    List<Double> frequencies = new ArrayList<>();
    for (Expression expression : expressions) {
      OptionalDouble hz =
          values.read(expression, Expected.FREQUENCY.in(Expected.Range.NOT_NEGATIVE));
      hz.ifPresent(frequencies::add);
    }
    return frequencies;
  }

  private Optional<Network> bind(NetworkFile file, Overrides overrides, Purpose purpose) {
    values.readAll();
    Wiring wiring = new Wiring(declared, nodes, findings);
    wiring.read(statements);
    new UnknownNodes(statements, declared, wiring, nodes).report(findings);
    List<Part> parts = readParts(wiring);
    List<Supply> supplies = readSupplies();
    Map<String, Port> ports = readPorts();
    Map<String, Load> loads = readLoads();
    checkTopology(wiring, parts, supplies, ports, loads);

    Map<String, Case> cases = new Cases(declared, loads, findings).read(statements);
    Sweeps sweeps = new Sweeps(values, findings);
    Optional<Statement.Sweep> stated = sweeps.find(statements);
    boolean overriding = overrides.sweep().isPresent();
    Optional<Statement.Sweep> effective = overriding ? overrides.sweep() : stated;
    int before = findings.errorCount();
    Optional<Sweep> sweep = effective.flatMap(sweeps::read);
    boolean sweepUnread = findings.errorCount() > before || declared.isBroken("sweep");
    Scopes scopes = new Scopes(values, sweeps, sweep, sweepUnread, overriding, findings);
    Criteria criteria = new Criteria(values, impedances, findings);
    List<Limit> limits =
        new Limits(declared, criteria, scopes, cases, ports, findings).read(statements);
    checkEnough(file, purpose, overriding, ports, limits);
    return findings.hasErrors()
        ? Optional.empty()
        : Optional.of(
            new Network(
                readTitle(),
                nodes.all(),
                parts,
                supplies,
                List.copyOf(ports.values()),
                List.copyOf(loads.values()),
                withBare(cases, limits),
                limits,
                sweep));
  }

  private String readTitle() {
    Optional<Statement.Title> first = Optional.empty();
    for (Statement statement : statements) {
      if (statement instanceof Statement.Title title) {
        if (first.isPresent()) {
          findings.error(
              "duplicate-statement",
              title.span(),
              "the network has a title already, on line " + first.get().span().line());
        } else {
          first = Optional.of(title);
        }
      }
    }
    return first.map(title -> title.title().text()).orElse("");
  }

  private List<Part> readParts(Wiring wiring) {
    PartValues reader = new PartValues(values, impedances, this::isName, findings);
    List<Part> parts = new ArrayList<>();
    for (Statement.Part line : declared.parts().values()) {
      PartValues.PartValue value = reader.read(line).orElse(UNREAD);
      Wiring.Place place = wiring.places().get(line.name().text());
      if (place != null) {
        parts.add(
            new Part(
                line.name().text(),
                line.kind().word(),
                place.first(),
                place.second(),
                value.value(),
                ExpressionText.of(line.value()),
                value.rated(),
                line.span().line()));
      }
    }
    return parts;
  }

  private boolean isName(String name) {
    return declared.isName(name) || values.isDeclared(name);
  }

  private List<Supply> readSupplies() {
    Map<String, Statement.Supply> byNode = new LinkedHashMap<>();
    List<Supply> supplies = new ArrayList<>();
    for (Statement statement : statements) {
      if (!(statement instanceof Statement.Supply line)) {
        continue;
      }
      Statement.Supply earlier = byNode.putIfAbsent(line.node().text(), line);
      if (line.node().text().equals(Declarations.GROUND)) {
        Declarations.reportTaken(findings, line.node());
        continue;
      }
      if (earlier != null) {
        Declarations.reportDuplicate(findings, line.node(), earlier.node(), "supply of");
        continue;
      }
      OptionalDouble volts = values.read(line.volts(), Expected.VOLTAGE);
      Optional<OnePort> behind = line.behind().flatMap(impedances::read);
      supplies.add(
          new Supply(nodes.mention(line.node()), volts.orElse(0), behind, line.span().line()));
    }
    return supplies;
  }

  private Map<String, Port> readPorts() {
    Map<String, Port> ports = new LinkedHashMap<>();
    for (Statement.Port line : declared.ports().values()) {
      String name = line.name().text();
      ports.put(
          name,
          new Port(
              name,
              nodes.mention(line.nodes().plus()),
              nodes.mention(line.nodes().minus()),
              readClosure(line.closure()),
              line.span().line()));
    }
    return ports;
  }

  private Port.Closure readClosure(Optional<Statement.Closure> closure) {
    if (closure.isEmpty()) {
      return new Port.Closure.Open();
    }
    if (closure.get() instanceof Statement.Closure.Terminated terminated) {
      return new Port.Closure.Terminated(
          impedances.read(terminated.value()).orElse(UNREAD.value()));
    }
    Statement.Closure.Driven driven = (Statement.Closure.Driven) closure.get();
    OptionalDouble volts = values.read(driven.volts(), Expected.VOLTAGE);
    if (volts.isEmpty()) {
      return new Port.Closure.Open();
    }
    Port.DriveKind kind =
        switch (driven.kind()) {
          case RMS -> Port.DriveKind.RMS;
          case PEAK -> Port.DriveKind.PEAK;
          case DC -> Port.DriveKind.DC;
        };
    Port.Drive drive = new Port.Drive(volts.getAsDouble(), kind, driven.mains());
    return driven.behind().isEmpty()
        ? new Port.Closure.Shorted(drive)
        : new Port.Closure.Driven(
            drive, impedances.read(driven.behind().get()).orElse(UNREAD.value()));
  }

  private Map<String, Load> readLoads() {
    Map<String, Load> loads = new LinkedHashMap<>();
    for (Statement.Load line : declared.loads().values()) {
      String name = line.name().text();
      OnePort value = impedances.read(line.value()).orElse(UNREAD.value());
      if (line.nodes().plus().text().equals(line.nodes().minus().text())) {
        findings.error(
            "same-node",
            line.nodes().span(),
            "both ends of the load `" + name + "` are on one node",
            "a load hangs between two different nodes");
      }
      loads.put(
          name,
          new Load(
              name,
              line.placement() == Statement.Placement.SHUNT
                  ? Load.Placement.SHUNT
                  : Load.Placement.SERIES,
              nodes.mention(line.nodes().plus()),
              nodes.mention(line.nodes().minus()),
              value,
              ExpressionText.of(line.value()),
              line.span().line()));
    }
    return loads;
  }

  private void checkTopology(
      Wiring wiring,
      List<Part> parts,
      List<Supply> supplies,
      Map<String, Port> ports,
      Map<String, Load> loads) {
    if (wiring.isDoubtful() || declared.isTopologyBroken()) {
      return;
    }
    Draft draft =
        new Draft(
            nodes,
            parts,
            wiring.places(),
            supplies,
            List.copyOf(ports.values()),
            declared.ports(),
            List.copyOf(loads.values()),
            declared.loads());
    for (Check check : Check.ALL) {
      check.check(draft, findings);
    }
  }

  private void checkEnough(
      NetworkFile file,
      Purpose purpose,
      boolean overriding,
      Map<String, Port> ports,
      List<Limit> limits) {
    if (ports.isEmpty() && !declared.isBroken("port") && declared.ports().isEmpty()) {
      findings.error(
          "no-port",
          file.source().whole(),
          "the file names no port whose impedance is judged",
          "add a line such as: port input = NODE -- ground");
    }
    boolean stated = statements.stream().anyMatch(s -> s instanceof Statement.Limit);
    if (purpose == Purpose.CHECK && !stated && !declared.isBroken("limit")) {
      findings.error(
          "no-limit",
          file.source().whole(),
          "the file states no limit to check against",
          "add a line such as: limit change 2 %");
    } else if (purpose == Purpose.CHECK
        && overriding
        && limits.isEmpty()
        && !findings.hasErrors()) {
      findings.error(
          "no-limit", file.source().whole(), "no limit is left inside the sweep asked for");
    }
  }

  private static List<Case> withBare(Map<String, Case> cases, List<Limit> limits) {
    List<Case> all = new ArrayList<>();
    for (Limit limit : limits) {
      for (Case one : limit.cases()) {
        if (one.isBare() && all.isEmpty()) {
          all.add(one);
        }
      }
    }
    if (all.isEmpty() && cases.isEmpty()) {
      all.add(Case.bare());
    }
    all.addAll(cases.values());
    return all;
  }
}
