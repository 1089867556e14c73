package loadmark.response;

import java.util.List;
import loadmark.network.Load;

/**
 * The driving-point impedance of one judged port with any loads. Compiled once, thread-safe. While
 * it is judged, what closes the port is off and every other port is closed.
 */
public interface PortResponse {

  /** With {@code loads} on, against {@code against} on; both may be empty. */
  Comparison compare(List<Load> loads, List<Load> against);

  /** Where a criterion of the same comparison has a level; without algebra there is an obstacle. */
  default Crossings crossings(List<Load> loads, List<Load> against) {
    return Crossings.none("the laws of its parts are not known as constants");
  }
}
