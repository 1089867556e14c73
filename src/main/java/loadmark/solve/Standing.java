package loadmark.solve;

import org.jspecify.annotations.Nullable;

/**
 * What stands at a place: n·I = d·V. {@code null} is zero, so that an open is (1, null) and a join
 * (null, 1).
 */
record Standing(@Nullable Tracked n, @Nullable Tracked d) {}
