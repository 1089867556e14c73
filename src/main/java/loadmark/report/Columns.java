package loadmark.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A table: columns as wide as what stands in them, two spaces apart. */
final class Columns {
  private static final int GAP = 2;

  /** A column is not cut below this. */
  private static final int LEAST = 8;

  private final List<String[]> rows = new ArrayList<>();
  private final String right;

  /**
   * @param alignment a letter a column: {@code r} for right, {@code l} for left
   */
  Columns(String alignment) {
    this.right = alignment;
  }

  void add(String... cells) {
    if (cells.length != right.length()) {
      throw new IllegalArgumentException(Arrays.toString(cells) + " in " + right);
    }
    rows.add(cells);
  }

  /** The rows as lines of at most {@code room} columns; the widest columns are cut first. */
  List<String> lines(int room) {
    int[] widths = new int[right.length()];
    for (String[] row : rows) {
      for (int i = 0; i < widths.length; i++) {
        widths[i] = Math.max(widths[i], Visible.width(row[i]));
      }
    }
    shrink(widths, room);
    return rows.stream().map(row -> line(row, widths)).toList();
  }

  private static void shrink(int[] widths, int room) {
    int over = Arrays.stream(widths).sum() + GAP * (widths.length - 1) - room;
    while (over > 0) {
      int widest = 0;
      for (int i = 1; i < widths.length; i++) {
        widest = widths[i] > widths[widest] ? i : widest;
      }
      if (widths[widest] <= LEAST) {
        return;
      }
      widths[widest]--;
      over--;
    }
  }

  private String line(String[] row, int[] widths) {
    StringBuilder line = new StringBuilder();
    for (int i = 0; i < widths.length; i++) {
      String cell = Visible.cut(row[i], widths[i]);
      line.append(i == 0 ? "" : " ".repeat(GAP));
      line.append(
          right.charAt(i) == 'r' ? Visible.padLeft(cell, widths[i]) : Visible.pad(cell, widths[i]));
    }
    return line.toString().stripTrailing();
  }
}
