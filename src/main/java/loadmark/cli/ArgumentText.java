package loadmark.cli;

import java.util.ArrayList;
import java.util.List;
import loadmark.diagnostic.SourceText;
import loadmark.diagnostic.Span;

/** The command line as a text of one line, so that a finding on it has a place to point at. */
final class ArgumentText {
  private static final String NAME = "command line";
  private static final String PLAIN = "-_=./,:+@%";

  private final List<String> arguments;
  private final SourceText source;
  private final List<Integer> columns = new ArrayList<>();
  private final List<Integer> lengths = new ArrayList<>();

  ArgumentText(String[] arguments) {
    this.arguments = List.of(arguments);
    StringBuilder line = new StringBuilder("loadmark");
    for (String argument : arguments) {
      String quoted = isPlain(argument) ? argument : "'" + argument + "'";
      columns.add(line.codePointCount(0, line.length()) + 2);
      lengths.add(quoted.codePointCount(0, quoted.length()));
      line.append(' ').append(quoted);
    }
    source = new SourceText(NAME, line.toString());
  }

  private static boolean isPlain(String argument) {
    return !argument.isEmpty()
        && argument
            .codePoints()
            .allMatch(c -> Character.isLetterOrDigit(c) || PLAIN.indexOf(c) >= 0);
  }

  /** The place of the last argument that is {@code word} or sets it with {@code =}. */
  Span place(String word) {
    for (int i = arguments.size() - 1; i >= 0; i--) {
      if (arguments.get(i).equals(word) || arguments.get(i).startsWith(word + "=")) {
        return new Span(source, 1, columns.get(i), lengths.get(i));
      }
    }
    return whole();
  }

  Span whole() {
    return new Span(source, 1, 1, "loadmark".length());
  }
}
