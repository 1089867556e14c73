package loadmark.syntax;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceReader;
import loadmark.diagnostic.SourceText;
import loadmark.diagnostic.Span;
import org.antlr.v4.runtime.Token;

/** Reads network files, and pieces of their language that stand on a command line. */
public final class NetworkReader {
  /** Errors after which the rest of a file is not read: nobody has made them one by one. */
  static final int MOST_ERRORS = 1000;

  private NetworkReader() {}

  /**
   * Reads a whole file. Each statement is read on its own, so that a slip in one gives one finding
   * and a {@link Statement.Broken}, and the next ones are read.
   */
  public static NetworkFile read(SourceText source, Findings findings) {
    if (isTooLarge(source, findings)) {
      return new NetworkFile(source, List.of());
    }
    Places places = new Places(source);
    Set<Integer> unreadable = findUnreadableLines(source, findings);
    List<List<Token>> lines = LineJoiner.join(TokenReader.read(source), places, findings);
    LineReader reader = new LineReader(places, findings);
    List<Statement> statements = new ArrayList<>();
    for (int i = 0; i < lines.size(); i++) {
      List<Token> line = lines.get(i);
      if (findings.errorCount() >= MOST_ERRORS) {
        findings.error(
            Finding.READING_STOPS,
            places.of(line.get(0)),
            "too many errors: the file is not read from here on",
            "is it the right file?");
        break;
      }
      int end = begins(line, Words.BLOCK) ? findEnd(lines, i) : i;
      if (line.stream().anyMatch(token -> unreadable.contains(token.getLine()))) {
        statements.add(reader.broken(line));
      } else if (end > i) {
        List<Token> block = lines.subList(i, end + 1).stream().flatMap(List::stream).toList();
        statements.add(reader.refuse(block));
        i = end;
      } else {
        statements.add(reader.read(line));
      }
    }
    return new NetworkFile(source, statements);
  }

  /** Reads what follows the word {@code sweep}; empty, after a finding, where it is wrong. */
  public static Optional<Statement.Sweep> readSweep(SourceText source, Findings findings) {
    return tokens(source, "a sweep", findings)
        .flatMap(tokens -> reader(source, findings).readSweep(tokens));
  }

  /** Reads values between commas; empty, after a finding, where one is wrong. */
  public static Optional<List<Expression>> readExpressions(SourceText source, Findings findings) {
    return tokens(source, "a value", findings)
        .flatMap(tokens -> reader(source, findings).readValues(tokens));
  }

  /** Reads one value; empty, after a finding, where it is wrong. */
  public static Optional<Expression> readExpression(SourceText source, Findings findings) {
    Optional<List<Expression>> values = readExpressions(source, findings);
    if (values.isPresent() && values.get().size() > 1) {
      findings.error("left-over", values.get().get(1).span(), "one value is expected, not several");
      return Optional.empty();
    }
    return values.map(list -> list.get(0));
  }

  private static LineReader reader(SourceText source, Findings findings) {
    return new LineReader(new Places(source), findings);
  }

  private static Optional<List<Token>> tokens(SourceText source, String due, Findings findings) {
    if (isTooLarge(source, findings) || !findUnreadableLines(source, findings).isEmpty()) {
      return Optional.empty();
    }
    List<Token> tokens = TokenReader.read(source);
    if (tokens.isEmpty()) {
      findings.error("missing-value", source.whole(), due + " is missing");
      return Optional.empty();
    }
    return Optional.of(tokens);
  }

  private static boolean isTooLarge(SourceText source, Findings findings) {
    boolean large = source.text().length() > SourceReader.MOST_BYTES;
    if (large) {
      SourceReader.reportTooLarge(source.name(), findings);
    }
    return large;
  }

  /** One finding a line with characters that no text holds. */
  private static Set<Integer> findUnreadableLines(SourceText source, Findings findings) {
    Set<Integer> found = new HashSet<>();
    int line = 0;
    for (String text : source.lines()) {
      line++;
      if (found.size() >= MOST_ERRORS) {
        break;
      }
      for (int i = 0, column = 1; i < text.length(); column++) {
        int c = text.codePointAt(i);
        if (isUnreadable(c)) {
          found.add(line);
          findings.error(
              "unreadable-character",
              new Span(source, line, column, 1),
              String.format("a control character (U+%04X)", c),
              "is this a text file? a network file holds visible characters only");
          break;
        }
        i += Character.charCount(c);
      }
    }
    return found;
  }

  /** Control characters, halves of characters, and marks that turn the direction of writing. */
  private static boolean isUnreadable(int c) {
    return (Character.isISOControl(c) && c != '\t')
        || Character.getType(c) == Character.SURROGATE
        || (c >= 0x202A && c <= 0x202E)
        || (c >= 0x2066 && c <= 0x2069);
  }

  private static boolean begins(List<Token> line, String word) {
    return line.get(0).getText().equals(word);
  }

  /** The line that ends the block; the block's own line where there is none. */
  private static int findEnd(List<List<Token>> lines, int block) {
    for (int i = block + 1; i < lines.size(); i++) {
      if (begins(lines.get(i), Words.END)) {
        return i;
      }
    }
    return block;
  }
}
