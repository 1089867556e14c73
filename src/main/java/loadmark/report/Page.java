package loadmark.report;

import java.util.ArrayList;
import java.util.List;
import loadmark.study.Outcome;
import org.jspecify.annotations.Nullable;

/**
 * Lines of at most {@value #WIDTH} columns. Verdicts stand in a gutter at the left and nowhere
 * else, so that one look down the edge finds what is broken; everything else hangs to the right of
 * it.
 */
final class Page {
  static final int WIDTH = 100;
  private static final String INDENT = "  ";
  private static final int LABEL = 10;

  private final StringBuilder text = new StringBuilder();
  private final Style style;
  private final int gutter;

  /**
   * @param undetermined whether the gutter must hold that word, which is the widest
   */
  Page(Style style, boolean undetermined) {
    this.style = style;
    this.gutter = 2 + Style.word(undetermined ? Outcome.UNDETERMINED : Outcome.INVALID).length();
  }

  /** Columns to the right of the gutter. */
  int room() {
    return WIDTH - gutter;
  }

  void blank() {
    text.append('\n');
  }

  /** A verdict and a heading. */
  void heading(Outcome outcome, String heading) {
    boolean first = true;
    for (String line : wrap(heading, room())) {
      gutter(first ? outcome : null).append(style.bold(line)).append('\n');
      first = false;
    }
  }

  /** Running text beside an empty gutter. */
  void paragraph(String paragraph) {
    wrap(paragraph, room()).forEach(line -> gutter(null).append(line).append('\n'));
  }

  /** One line as it is beside a verdict; the caller has measured it. */
  void row(Outcome outcome, String row) {
    gutter(outcome).append(row.stripTrailing()).append('\n');
  }

  /** One line as it is beside an empty gutter; the caller has measured it. */
  void row(String row) {
    gutter(null).append(row.stripTrailing()).append('\n');
  }

  /** A label below a heading, and text that hangs beside it. */
  void labelled(String label, String rest) {
    labelled(null, label, rest);
  }

  void labelled(@Nullable Outcome outcome, String label, String rest) {
    int column = Math.max(LABEL, label.length() + 1);
    boolean first = true;
    for (String line : wrap(rest, room() - INDENT.length() - column)) {
      String left = INDENT + Visible.pad(first ? label : "", column);
      gutter(first ? outcome : null).append((left + line).stripTrailing()).append('\n');
      first = false;
    }
  }

  private StringBuilder gutter(@Nullable Outcome outcome) {
    if (outcome == null) {
      return text.append(" ".repeat(gutter));
    }
    String word = Style.word(outcome);
    return text.append(style.verdict(outcome, word)).append(" ".repeat(gutter - word.length()));
  }

  /** Broken at spaces, and within a word only where the word alone is too long. */
  static List<String> wrap(String text, int columns) {
    List<String> lines = new ArrayList<>();
    String rest = text;
    while (Visible.width(rest) > columns) {
      int fitting = Visible.fitting(rest, columns);
      int space = rest.lastIndexOf(' ', fitting);
      int end = space > 0 ? space : Math.max(1, fitting);
      lines.add(rest.substring(0, end).stripTrailing());
      rest = rest.substring(end).stripLeading();
    }
    lines.add(rest);
    return lines;
  }

  @Override
  public String toString() {
    return text.toString();
  }
}
