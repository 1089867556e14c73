package loadmark.syntax;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Nearest;
import loadmark.diagnostic.Severity;
import org.antlr.v4.runtime.Token;

/** Words of limits and sweeps that are misspelt or stand in the place of others. */
final class LimitSlips {
  private static final Set<String> BEFORE_WINDOW =
      Set.of("magnitude", "phase", "capacitance", "resistance");

  private final Places places;

  LimitSlips(Places places) {
    this.places = places;
  }

  Optional<Finding> find(Slip slip) {
    String statement = slip.tokens().get(0).getText();
    boolean limit = statement.equals("limit");
    if (slip.atEnd() || slip.index() == 0) {
      return Optional.empty();
    }
    String before = slip.tokens().get(slip.index() - 1).getText();
    String text = slip.token().getText();
    boolean fromDc = limit && before.equals("from") && text.equals("dc");
    boolean sweepFromDc =
        (statement.equals("sweep") || statement.equals("dc"))
            && before.equals("dc")
            && text.equals("to");
    if (fromDc || sweepFromDc) {
      return finding(
          slip.token(),
          "syntax",
          "a band begins above DC",
          "DC stands apart: `at dc` in a limit, `sweep dc and 10 Hz to 1 MHz` in a sweep");
    }
    return limit ? findInLimit(slip, before, text) : Optional.empty();
  }

  private Optional<Finding> findInLimit(Slip slip, String before, String text) {
    if (before.equals("for") && text.equals("port")) {
      return finding(
          slip.token(), "syntax", "behind `for` stand cases", "ports go with `at`: `at port NAME`");
    }
    if (before.equals("at") && text.equals("case")) {
      return finding(
          slip.token(),
          "syntax",
          "behind `at` stand frequencies or a port",
          "cases go with `for`: `for case NAME`");
    }
    if (text.equals("or") && slip.expects(Token.EOF)) {
      return finding(
          slip.token(),
          "left-over",
          "`or` goes with `limit change` alone",
          "`limit change 2 % or 5 Ω` allows the larger of the two; else write two limits");
    }
    return misspelt(slip);
  }

  /** A misspelt word before a bound was taken for the name of a value. */
  private Optional<Finding> misspelt(Slip slip) {
    if (slip.index() < 3) {
      return Optional.empty();
    }
    Token written = slip.tokens().get(slip.index() - 1);
    Token before = slip.tokens().get(slip.index() - 2);
    if (!BEFORE_WINDOW.contains(before.getText())) {
      return Optional.empty();
    }
    List<String> words =
        slip.tokens().get(1) == before
            ? List.of("change", "above", "below")
            : List.of("above", "below");
    return Nearest.find(written.getText(), words)
        .flatMap(
            word ->
                finding(
                    written,
                    "unknown-criterion",
                    "no limit is called `"
                        + before.getText()
                        + " "
                        + Quoted.cut(written.getText())
                        + "`",
                    "did you mean `" + before.getText() + " " + word + "`?"));
  }

  private Optional<Finding> finding(Token at, String code, String message, String hint) {
    return Optional.of(
        new Finding(Severity.ERROR, code, places.of(at), message, Optional.of(hint)));
  }
}
