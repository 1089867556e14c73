package loadmark.cli;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.FindingPrinter;
import loadmark.diagnostic.Severity;

/** Standard output for results, standard error for everything else; UTF-8 whatever the locale. */
final class Streams {
  private static final String CLOSED = "Broken pipe";

  private final OutputStream out;
  private final OutputStream err;

  Streams(OutputStream out, OutputStream err) {
    this.out = out;
    this.err = err;
  }

  /**
   * Writes a result whole.
   *
   * @return whether all that is wanted of it arrived: a reader that has gone away has had enough,
   *     anything else is told on standard error
   */
  boolean result(String text) {
    try {
      out.write(text.getBytes(StandardCharsets.UTF_8));
      out.flush();
      return true;
    } catch (IOException failed) {
      if (CLOSED.equals(failed.getMessage())) {
        return true;
      }
      message("loadmark: standard output could not be written\n");
      return false;
    }
  }

  /** Writes a message; where it cannot be written there is nobody to tell. */
  void message(String text) {
    try {
      err.write(text.getBytes(StandardCharsets.UTF_8));
      err.flush();
    } catch (IOException unheard) {
      return;
    }
  }

  void findings(List<Finding> findings, boolean warningsToo) {
    List<Finding> told =
        warningsToo
            ? findings
            : findings.stream().filter(f -> f.severity() == Severity.ERROR).toList();
    if (!told.isEmpty()) {
      message(new FindingPrinter(false).print(told));
    }
  }
}
