package loadmark.cli;

import java.io.Console;
import loadmark.report.Style;

/** Whether results are shown in colour. */
final class Terminal {
  /** From this release of Java on, a console may exist where there is no terminal. */
  private static final int CONSOLE_ALWAYS = 22;

  private Terminal() {}

  /** Colour only on a terminal that wants it. */
  static Style style(Invocation.Manner manner) {
    String noColor = System.getenv("NO_COLOR");
    boolean refused = manner.plain() || (noColor != null && !noColor.isEmpty());
    boolean dumb = "dumb".equals(System.getenv("TERM"));
    return refused || dumb || manner.output().isPresent() || !isTerminal()
        ? Style.PLAIN
        : Style.COLOUR;
  }

  @SuppressWarnings("SystemConsoleNull") // Later releases are asked in their own way.
  private static boolean isTerminal() {
    Object console = System.console();
    if (console == null || Runtime.version().feature() < CONSOLE_ALWAYS) {
      return console != null;
    }
    try {
      return (boolean) Console.class.getMethod("isTerminal").invoke(console);
    } catch (ReflectiveOperationException unknown) {
      return false;
    }
  }
}
