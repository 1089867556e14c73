package loadmark.binding;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.network.Band;
import loadmark.network.Case;
import loadmark.network.Limit;
import loadmark.network.Port;
import loadmark.syntax.ExpressionText;
import loadmark.syntax.Name;
import loadmark.syntax.Statement;
import loadmark.syntax.Statement.ScopeItem;

/** Reads the limits with their scopes. */
final class Limits {
  private final Declarations declared;
  private final Criteria criteria;
  private final Scopes scopes;
  private final Map<String, Case> cases;
  private final Map<String, Port> ports;
  private final Findings findings;
  private final Case bare = Case.bare();
  private boolean missedLoad;

  /**
   * @param cases by name, in the order of judging, without {@code bare}
   * @param ports those that were bound, by name
   */
  Limits(
      Declarations declared,
      Criteria criteria,
      Scopes scopes,
      Map<String, Case> cases,
      Map<String, Port> ports,
      Findings findings) {
    this.declared = declared;
    this.criteria = criteria;
    this.scopes = scopes;
    this.cases = cases;
    this.ports = ports;
    this.findings = findings;
  }

  List<Limit> read(List<Statement> statements) {
    List<Limit> limits = new ArrayList<>();
    for (Statement statement : statements) {
      if (statement instanceof Statement.Limit line) {
        read(line, limits);
      }
    }
    return limits;
  }

  private void read(Statement.Limit line, List<Limit> limits) {
    List<Criteria.Bounded> bounded = criteria.read(line.criterion());
    reportRepeated(line);
    Optional<List<Band>> scope = scopes.read(line);
    List<Case> chosenCases = readCases(line, bounded);
    List<Port> chosenPorts = readPorts(line);
    if (scope.isEmpty() || chosenCases.isEmpty() || chosenPorts.isEmpty()) {
      return;
    }
    for (Criteria.Bounded one : bounded) {
      limits.add(
          new Limit(
              one.criterion(),
              one.bound(),
              one.reference().map(Criteria.Reference::value),
              one.reference().map(r -> ExpressionText.of(r.written())).orElse(""),
              scope.get(),
              chosenCases,
              chosenPorts,
              line.span().line(),
              line.text()));
    }
  }

  private void reportRepeated(Statement.Limit line) {
    for (int i = 0; i < line.scope().size(); i++) {
      for (int j = 0; j < i; j++) {
        if (line.scope().get(i).getClass().equals(line.scope().get(j).getClass())) {
          findings.error(
              "duplicate-statement",
              line.scope().get(i).span(),
              "this limit says such a thing already",
              "several frequencies or cases are joined by commas");
          break;
        }
      }
    }
  }

  private List<Case> readCases(Statement.Limit line, List<Criteria.Bounded> bounded) {
    boolean absolute = bounded.stream().allMatch(one -> one.criterion().isAbsolute());
    List<Case> chosen = new ArrayList<>();
    boolean named = false;
    for (ScopeItem item : line.scope()) {
      if (item instanceof ScopeItem.ForCases cases) {
        named = true;
        for (Name name : cases.cases()) {
          findCase(name, absolute).ifPresent(chosen::add);
        }
      }
    }
    if (named) {
      return chosen;
    }
    if (!cases.isEmpty()) {
      return List.copyOf(cases.values());
    }
    if (absolute) {
      return List.of(bare);
    }
    if (!missedLoad
        && !declared.hasLoadLine()
        && !declared.isBroken("load")
        && !declared.isBroken("case")) {
      missedLoad = true;
      findings.error(
          "no-load",
          line.span(),
          "this limit bounds a change, and the file has no load that could make one",
          "add a line such as: load probe shunt NODE -- ground = 10 MΩ || 12 pF");
    }
    return List.of();
  }

  private Optional<Case> findCase(Name name, boolean absolute) {
    if (name.text().equals(Case.BARE)) {
      if (absolute) {
        return Optional.of(bare);
      }
      findings.error(
          "unknown-case",
          name.span(),
          "nothing changes in the case `bare`",
          "only windows, distances and return loss are judged on the bare network");
      return Optional.empty();
    }
    Case one = cases.get(name.text());
    boolean doubtful = declared.isDoubtful(name.text()) || declared.isBroken("case");
    if (one == null && !doubtful) {
      findings.error(
          "unknown-case",
          name.span(),
          "there is no case `" + name.text() + "`",
          Nearest.find(name.text(), cases.keySet())
              .map(near -> "did you mean `" + near + "`?")
              .orElse("the cases are " + String.join(", ", cases.keySet())));
    }
    return Optional.ofNullable(one);
  }

  private List<Port> readPorts(Statement.Limit line) {
    for (ScopeItem item : line.scope()) {
      if (item instanceof ScopeItem.AtPort at) {
        Name name = at.port();
        Port port = ports.get(name.text());
        if (port == null && !declared.isDoubtful(name.text()) && !isDeclaredPort(name)) {
          findings.error(
              "unknown-port",
              name.span(),
              "there is no port `" + name.text() + "`",
              Nearest.find(name.text(), ports.keySet())
                  .map(near -> "did you mean `" + near + "`?")
                  .orElse("the ports are " + String.join(", ", ports.keySet())));
        }
        return port == null ? List.of() : List.of(port);
      }
    }
    return List.copyOf(ports.values());
  }

  private boolean isDeclaredPort(Name name) {
    return declared.ports().containsKey(name.text());
  }

  /** The case without loads. */
  Case bare() {
    return bare;
  }
}
