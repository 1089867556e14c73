package loadmark.diagnostic;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Collects findings while a source is read. Not thread-safe. */
public final class Findings {
  private final List<Finding> all = new ArrayList<>();
  private int errors;

  public void error(String code, Span place, String message) {
    add(new Finding(Severity.ERROR, code, place, message, Optional.empty()));
  }

  public void error(String code, Span place, String message, String hint) {
    add(new Finding(Severity.ERROR, code, place, message, Optional.of(hint)));
  }

  public void warning(String code, Span place, String message) {
    add(new Finding(Severity.WARNING, code, place, message, Optional.empty()));
  }

  public void warning(String code, Span place, String message, String hint) {
    add(new Finding(Severity.WARNING, code, place, message, Optional.of(hint)));
  }

  public void add(Finding finding) {
    all.add(finding);
    if (finding.isError()) {
      errors++;
    }
  }

  public boolean hasErrors() {
    return errors > 0;
  }

  public int errorCount() {
    return errors;
  }

  /** All so far, sorted by place. */
  public List<Finding> sorted() {
    return all.stream().sorted(Finding.BY_PLACE).toList();
  }
}
