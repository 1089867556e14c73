package loadmark.network;

import java.util.List;

/**
 * Which loads are on together, and which in the reference.
 *
 * @param loads everything that is on; empty for {@code bare}
 * @param against everything that is on in the reference
 * @param line where it is declared; 0 where the tool made it
 */
public record Case(String name, List<Load> loads, List<Load> against, int line) {
  public static final String BARE = "bare";
  public static final String ALL = "all";

  public Case {
    loads = List.copyOf(loads);
    against = List.copyOf(against);
  }

  public static Case bare() {
    return new Case(BARE, List.of(), List.of(), 0);
  }

  public boolean isBare() {
    return name.equals(BARE);
  }
}
