package loadmark.solve;

import org.jspecify.annotations.Nullable;

/**
 * What stands at a place: n·I = d·V. {@code null} is zero, so that an open is (1, null) and a join
 * (null, 1).
 */
record Standing(@Nullable Tracked n, @Nullable Tracked d) {

  /**
   * What stands at a place without and with, and how both differ.
   *
   * @param difference n′·d − n·d′
   */
  record Pair(Standing without, Standing with, @Nullable Tracked difference) {}
}
