package loadmark.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A table: columns as wide as what stands in them, two spaces apart. */
final class Columns {
  private static final int GAP = 2;

  /** A column is not cut below this. */
  private static final int LEAST = 4;

  private final List<String[]> rows = new ArrayList<>();
  private final String alignment;

  /**
   * @param alignment a letter a column: {@code r} for right, {@code l} for left; {@code n} for left
   *     and names, which may be cut
   */
  Columns(String alignment) {
    this.alignment = alignment;
  }

  void add(String... cells) {
    if (cells.length != alignment.length()) {
      throw new IllegalArgumentException(Arrays.toString(cells) + " in " + alignment);
    }
    rows.add(cells);
  }

  /**
   * The rows as lines of at most {@code room} columns as far as cutting names makes them so, the
   * widest first; nothing else is cut.
   */
  List<String> lines(int room) {
    int[] widths = new int[alignment.length()];
    for (String[] row : rows) {
      for (int i = 0; i < widths.length; i++) {
        widths[i] = Math.max(widths[i], Visible.width(row[i]));
      }
    }
    shrink(widths, room);
    int roomy = Arrays.stream(widths).sum() + GAP * (widths.length - 1);
    int gap = roomy <= room ? GAP : 1;
    return rows.stream().map(row -> line(row, widths, gap)).toList();
  }

  private void shrink(int[] widths, int room) {
    int over = Arrays.stream(widths).sum() + GAP * (widths.length - 1) - room;
    while (over > 0) {
      int widest = -1;
      for (int i = 0; i < widths.length; i++) {
        boolean name = alignment.charAt(i) == 'n' && widths[i] > LEAST;
        widest = name && (widest < 0 || widths[i] > widths[widest]) ? i : widest;
      }
      if (widest < 0) {
        return;
      }
      widths[widest]--;
      over--;
    }
  }

  private String line(String[] row, int[] widths, int gap) {
    StringBuilder line = new StringBuilder();
    for (int i = 0; i < widths.length; i++) {
      String cell = Visible.cut(row[i], widths[i]);
      line.append(i == 0 ? "" : " ".repeat(gap));
      line.append(
          alignment.charAt(i) == 'r'
              ? Visible.padLeft(cell, widths[i])
              : Visible.pad(cell, widths[i]));
    }
    return line.toString().stripTrailing();
  }
}
