package loadmark.touchstone;

import java.util.Arrays;
import loadmark.diagnostic.SourceText;
import loadmark.diagnostic.Span;

/**
 * Goes through a text line by line, words apart by blanks. Comments and lines without words are
 * left out. A bracket with what is in it is one word.
 */
final class Lines {
  /** Characters that stand between words; an old end-of-file mark is one. */
  private static final String BLANKS = " \t\f\u000B\u001A";

  private static final String ENDS = "\r\n";
  private static final char COMMENT = '!';
  private static final char OPTIONS = '#';
  private static final char KEYWORD = '[';
  private static final char KEYWORD_END = ']';

  /** No message quotes more of a word. */
  private static final int MOST_QUOTED = 32;

  private final SourceText source;
  private final String text;
  private int position;
  private int line;
  private int lineStart;
  private int[] starts = new int[16];
  private int[] ends = new int[16];
  private int count;

  Lines(SourceText source) {
    this.source = source;
    this.text = source.text();
  }

  /** Goes on to the next line that has words; false, and no words, behind the last. */
  boolean next() {
    count = 0;
    while (count == 0 && position < text.length()) {
      line++;
      lineStart = position;
      readWords();
    }
    return count > 0;
  }

  private void readWords() {
    int i = position;
    while (i < text.length() && !isIn(ENDS, i) && text.charAt(i) != COMMENT) {
      if (isIn(BLANKS, i)) {
        i++;
        continue;
      }
      int end = text.charAt(i) == KEYWORD ? keywordEnd(i) : wordEnd(i);
      add(i, end);
      i = end;
    }
    while (i < text.length() && !isIn(ENDS, i)) {
      i++;
    }
    position = text.startsWith("\r\n", i) ? i + 2 : i + 1;
  }

  private int wordEnd(int from) {
    int i = from + 1;
    while (i < text.length()
        && !isIn(BLANKS, i)
        && !isIn(ENDS, i)
        && text.charAt(i) != COMMENT
        && text.charAt(i) != KEYWORD) {
      i++;
    }
    return i;
  }

  private int keywordEnd(int from) {
    int i = from;
    while (i < text.length() && !isIn(ENDS, i) && text.charAt(i) != COMMENT) {
      if (text.charAt(i++) == KEYWORD_END) {
        break;
      }
    }
    return i;
  }

  private boolean isIn(String characters, int i) {
    return characters.indexOf(text.charAt(i)) >= 0;
  }

  private void add(int start, int end) {
    if (count == starts.length) {
      starts = Arrays.copyOf(starts, 2 * count);
      ends = Arrays.copyOf(ends, 2 * count);
    }
    starts[count] = start;
    ends[count] = end;
    count++;
  }

  /** How many words this line has. */
  int count() {
    return count;
  }

  boolean isOptions() {
    return text.charAt(starts[0]) == OPTIONS;
  }

  boolean isKeyword() {
    return text.charAt(starts[0]) == KEYWORD;
  }

  /** A word, from 0. */
  String word(int i) {
    return text.substring(starts[i], ends[i]);
  }

  /** A word as a message quotes it. */
  String quoted(int i) {
    String word = word(i);
    boolean whole = word.codePointCount(0, word.length()) <= MOST_QUOTED;
    return "`"
        + (whole ? word : word.substring(0, word.offsetByCodePoints(0, MOST_QUOTED)) + "…")
        + "`";
  }

  /** A word as a number; see {@link Decimal#parse}. */
  double number(int i, int tenfold) {
    return Decimal.parse(word(i), tenfold);
  }

  Span place(int i) {
    return new Span(
        source,
        line,
        text.codePointCount(lineStart, starts[i]) + 1,
        text.codePointCount(starts[i], ends[i]));
  }

  /** The last character of the text. */
  Span end() {
    return source.end();
  }

  Span whole() {
    return source.whole();
  }
}
