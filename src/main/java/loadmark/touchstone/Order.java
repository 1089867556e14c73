package loadmark.touchstone;

/** Which pair of a row is which entry of the matrix. */
enum Order {
  ONE_PORT,
  /** Two ports of version 1.1, and {@code 21_12}: 11 21 12 22. */
  COLUMNS,
  /** {@code 12_21}: 11 12 21 22. */
  ROWS,
  /** One triangle of a symmetric matrix of two ports, the upper or the lower. */
  TRIANGLE;

  int ports() {
    return this == ONE_PORT ? 1 : 2;
  }

  /** How many pairs a row has. */
  int pairs() {
    return switch (this) {
      case ONE_PORT -> 1;
      case COLUMNS, ROWS -> 4;
      case TRIANGLE -> 3;
    };
  }

  /** How many entries the matrix has. */
  int entries() {
    return ports() * ports();
  }

  /**
   * The pair that is an entry.
   *
   * @param entry from 0, row by row
   */
  int pairOf(int entry) {
    return switch (this) {
      case ONE_PORT, ROWS -> entry;
      case COLUMNS -> entry == 1 ? 2 : entry == 2 ? 1 : entry;
      case TRIANGLE -> (entry + 1) / 2;
    };
  }
}
