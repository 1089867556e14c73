package loadmark.binding;

import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import loadmark.diagnostic.Findings;
import loadmark.network.Case;
import loadmark.syntax.Name;
import loadmark.syntax.Statement;

/**
 * The names that a file declares, each once: parts and loads share one space; ports and cases have
 * one each. A name in a statement that could not be read counts as declared, so that what uses it
 * is not reported too.
 */
final class Declarations {
  static final String GROUND = "ground";

  private final Map<String, Statement.Part> parts = new LinkedHashMap<>();
  private final Map<String, Statement.Load> loads = new LinkedHashMap<>();
  private final Map<String, Statement.Port> ports = new LinkedHashMap<>();
  private final Set<String> nodes = new HashSet<>();
  private final Set<String> doubtful = new HashSet<>();
  private final Set<String> brokenWords = new HashSet<>();
  private final Set<String> brokenParts = new HashSet<>();
  private boolean namelessPart;
  private boolean loadLine;

  static Declarations of(List<Statement> statements, Findings findings) {
    Declarations all = new Declarations();
    Map<String, Name> hung = new HashMap<>();
    Map<String, Name> ports = new HashMap<>();
    for (Statement statement : statements) {
      if (statement instanceof Statement.Part part) {
        if (all.isNew(part.name(), hung, "part or load", findings)) {
          all.parts.put(part.name().text(), part);
        }
      } else if (statement instanceof Statement.Load load) {
        all.loadLine = true;
        if (all.isNew(load.name(), hung, "part or load", findings)) {
          all.loads.put(load.name().text(), load);
        }
        all.note(load.nodes());
      } else if (statement instanceof Statement.Port port) {
        if (all.isNew(port.name(), ports, "port", findings)) {
          all.ports.put(port.name().text(), port);
        }
        all.note(port.nodes());
      } else if (statement instanceof Statement.Wire wire) {
        for (int i = 0; i < wire.items().size(); i += 2) {
          all.nodes.add(wire.items().get(i).name().text());
        }
      } else if (statement instanceof Statement.Broken broken) {
        all.brokenWords.add(broken.word());
        if (isPartWord(broken.word())) {
          broken.declared().ifPresent(name -> all.brokenParts.add(name.text()));
        }
        all.namelessPart |= broken.declared().isEmpty() && isPartWord(broken.word());
        broken.declared().ifPresent(name -> all.doubtful.add(name.text()));
        broken.mentioned().forEach(name -> all.doubtful.add(name.text()));
      }
    }
    return all;
  }

  private static boolean isPartWord(String word) {
    for (Statement.PartKind kind : Statement.PartKind.values()) {
      if (kind.word().equals(word)) {
        return true;
      }
    }
    return false;
  }

  private void note(Statement.NodePair pair) {
    nodes.add(pair.plus().text());
    nodes.add(pair.minus().text());
  }

  private boolean isNew(Name name, Map<String, Name> space, String what, Findings findings) {
    if (isTaken(name.text())) {
      reportTaken(findings, name);
      doubtful.add(name.text());
      return false;
    }
    Name earlier = space.putIfAbsent(name.text(), name);
    if (earlier != null) {
      reportDuplicate(findings, name, earlier, what);
      doubtful.add(name.text());
      return false;
    }
    return true;
  }

  /** Whether a name belongs to the tool. */
  static boolean isTaken(String name) {
    return name.equals(GROUND) || name.equals(Case.BARE) || name.equals(Case.ALL);
  }

  static void reportTaken(Findings findings, Name name) {
    findings.error(
        "reserved-name",
        name.span(),
        "the name `" + name.text() + "` is taken by the language",
        "choose another one");
  }

  static void reportDuplicate(Findings findings, Name again, Name earlier, String what) {
    findings.error(
        "duplicate-name",
        again.span(),
        "there is a " + what + " `" + again.text() + "` already, on line " + earlier.span().line(),
        "give one of them another name");
  }

  Map<String, Statement.Part> parts() {
    return parts;
  }

  Map<String, Statement.Load> loads() {
    return loads;
  }

  Map<String, Statement.Port> ports() {
    return ports;
  }

  /** Whether a statement that could not be read declares or mentions this name. */
  boolean isDoubtful(String name) {
    return doubtful.contains(name);
  }

  /** Whether the file has a load's line, were its name taken. */
  boolean hasLoadLine() {
    return loadLine;
  }

  /** Whether a part has this name, were its value unreadable. */
  boolean isPart(String name) {
    return parts.containsKey(name) || brokenParts.contains(name);
  }

  /** Whether a part's statement could not be read so far as its name: any part may be that one. */
  boolean hasNamelessPart() {
    return namelessPart;
  }

  /** Whether a statement that begins with this word could not be read; the empty word is any. */
  boolean isBroken(String word) {
    return brokenWords.contains(word) || brokenWords.contains("");
  }

  /** Whether a statement that decides what is connected with what could not be read. */
  boolean isTopologyBroken() {
    return isBroken("wire")
        || isBroken("port")
        || isBroken("load")
        || isBroken("supply")
        || (parts.isEmpty() && !brokenWords.isEmpty());
  }

  /** Whether a part, load, port or node has this name. */
  boolean isName(String name) {
    return parts.containsKey(name)
        || loads.containsKey(name)
        || ports.containsKey(name)
        || nodes.contains(name);
  }
}
