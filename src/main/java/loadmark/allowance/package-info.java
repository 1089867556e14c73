/**
 * How heavy a load may be. A network, one of its loads and a case go in; out comes the heaviest
 * load that keeps the limits, at each frequency and over all of them.
 *
 * <p>Loads grow from nothing: the heaviest is the last before the first one that breaks a limit,
 * not the heaviest that is kept anywhere. At a single frequency that is found in closed form. Over
 * all frequencies it is the least of those, looked for on a grid and narrowed down; the answer is
 * then judged, and where the judgement finds a band that the grid did not, the search goes on from
 * there.
 */
@NullMarked
package loadmark.allowance;

import org.jspecify.annotations.NullMarked;
