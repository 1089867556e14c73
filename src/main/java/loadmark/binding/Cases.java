package loadmark.binding;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.network.Case;
import loadmark.network.Load;
import loadmark.syntax.Name;
import loadmark.syntax.Statement;

/** Reads the cases, or makes the usual ones where the file states none. */
final class Cases {
  private final Declarations declared;
  private final Map<String, Load> loads;
  private final Findings findings;
  private final Map<String, Case> byName = new LinkedHashMap<>();
  private final Map<String, Name> lines = new HashMap<>();
  private boolean incomplete;

  /**
   * @param loads the loads that were bound, by name, in the order declared
   */
  Cases(Declarations declared, Map<String, Load> loads, Findings findings) {
    this.declared = declared;
    this.loads = loads;
    this.findings = findings;
  }

  /** The cases by name, in the order of judging; without {@code bare}. */
  Map<String, Case> read(List<Statement> statements) {
    boolean stated = declared.isBroken("case");
    for (Statement statement : statements) {
      if (statement instanceof Statement.Case line) {
        stated = true;
        read(line);
      }
    }
    if (!stated) {
      for (Load load : loads.values()) {
        byName.put(load.name(), new Case(load.name(), List.of(load), List.of(), 0));
      }
      if (loads.size() > 1) {
        List<Load> all = List.copyOf(loads.values());
        byName.put(Case.ALL, new Case(Case.ALL, all, List.of(), 0));
      }
    } else if (!declared.isBroken("case") && !incomplete) {
      warnOfUnjudged();
    }
    return byName;
  }

  private void read(Statement.Case line) {
    List<Load> named = resolve(line.loads());
    if (line.each()) {
      for (int i = 0; i < named.size(); i++) {
        Load load = named.get(i);
        add(line.loads().get(i), load.name(), List.of(load), List.of());
      }
      return;
    }
    List<Load> others = resolve(line.others());
    for (Name other : line.others()) {
      if (line.loads().stream().anyMatch(name -> name.text().equals(other.text()))) {
        findings.error(
            "duplicate-name",
            other.span(),
            "`" + other.text() + "` stands on both sides of this case");
        return;
      }
    }
    Set<Load> on = new LinkedHashSet<>(named);
    if (line.relation() == Statement.Relation.ADDED_TO) {
      on.addAll(others);
    }
    add(line.name(), line.name().text(), List.copyOf(on), others);
  }

  private void add(Name place, String name, List<Load> on, List<Load> against) {
    if (Declarations.isTaken(name)) {
      Declarations.reportTaken(findings, place);
      incomplete = true;
      return;
    }
    Name earlier = lines.putIfAbsent(name, place);
    if (earlier != null) {
      Declarations.reportDuplicate(findings, place, earlier, "case");
      return;
    }
    byName.put(name, new Case(name, on, against, place.span().line()));
  }

  /** The loads of these names; unknown ones are reported and left out. */
  private List<Load> resolve(List<Name> names) {
    List<Load> found = new ArrayList<>();
    Set<String> seen = new LinkedHashSet<>();
    for (Name name : names) {
      Load load = loads.get(name.text());
      incomplete |= load == null;
      if (load == null && !declared.isDoubtful(name.text())) {
        if (!declared.loads().containsKey(name.text())) {
          findings.error(
              "unknown-load",
              name.span(),
              "there is no load `" + name.text() + "`",
              Nearest.find(name.text(), declared.loads().keySet())
                  .map(near -> "did you mean `" + near + "`?")
                  .orElse("declare it on a line of its own: load " + name.text() + " shunt …"));
        }
      } else if (!seen.add(name.text())) {
        findings.error("duplicate-name", name.span(), "`" + name.text() + "` stands here twice");
      } else if (load != null) {
        found.add(load);
      }
    }
    return found;
  }

  private void warnOfUnjudged() {
    for (Load load : loads.values()) {
      boolean judged = false;
      boolean reference = false;
      for (Case one : byName.values()) {
        judged |= one.loads().contains(load) && !one.against().contains(load);
        reference |= one.against().contains(load);
      }
      if (!judged) {
        findings.warning(
            "load-not-judged",
            Objects.requireNonNull(declared.loads().get(load.name())).name().span(),
            "the load `"
                + load.name()
                + "` "
                + (reference ? "stands only in references" : "is in no case"),
            "name it in a case, or it is not judged");
      }
    }
  }
}
