package loadmark.equation;

/**
 * A place where the case and its reference differ.
 *
 * @param series whether its loads stand in series with the rest, so that their impedances add up;
 *     else their admittances
 * @param without what stands there in the reference
 * @param with what stands there in the case
 * @param removed what the loads make up that stand there in the reference alone
 * @param added what the loads make up that stand there in the case alone
 */
public record ChangedPlace(
    int first, int second, boolean series, Law without, Law with, Law removed, Law added) {

  /** A place where nothing is common. */
  public static ChangedPlace of(int first, int second, boolean series, Law without, Law with) {
    return new ChangedPlace(first, second, series, without, with, without, with);
  }

  /**
   * Whether the difference of what stands there is that of finite impedances or admittances that
   * add up, so that what is common to both drops out.
   */
  public boolean isDifference() {
    Law.Fixed absorbing = series ? Law.Fixed.OPEN : Law.Fixed.JOINED;
    return without != absorbing && with != absorbing;
  }

  ChangedPlace between(int a, int b) {
    return new ChangedPlace(a, b, series, without, with, removed, added);
  }
}
