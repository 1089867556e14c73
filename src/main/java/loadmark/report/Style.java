package loadmark.report;

import loadmark.study.Outcome;

/** How words are set off: with colour where the reader's terminal shows it, else by case alone. */
public enum Style {
  PLAIN,
  COLOUR;

  private static final String BOLD = "\u001B[1m";
  private static final String RED = "\u001B[1;31m";
  private static final String GREEN = "\u001B[32m";
  private static final String RESET = "\u001B[0m";

  String bold(String text) {
    return set(BOLD, text);
  }

  /** Anything but kept stands in capitals, so that it is seen without colour too. */
  static String word(Outcome outcome) {
    return switch (outcome) {
      case KEPT -> "kept";
      case UNDETERMINED -> "UNDETERMINED";
      case BROKEN -> "BROKEN";
      case INVALID -> "INVALID";
    };
  }

  String verdict(Outcome outcome, String shown) {
    return switch (outcome) {
      case KEPT -> set(GREEN, shown);
      case BROKEN, INVALID -> set(RED, shown);
      case UNDETERMINED -> set(BOLD, shown);
    };
  }

  private String set(String code, String text) {
    return this == COLOUR && !text.isEmpty() ? code + text + RESET : text;
  }
}
