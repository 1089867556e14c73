package loadmark.evidence;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;

/** Words of the machinery, which must never reach a user. */
final class OutsideWords {
  private static final List<String> MACHINERY =
      List.of(
          "Exception",
          "\tat ",
          "java.",
          "loadmark.cli",
          "org.antlr",
          "org.ejml",
          "mismatched input",
          "extraneous input",
          "no viable alternative",
          "token recognition",
          "<EOF>",
          "Infinity",
          "NaN");

  private OutsideWords() {}

  static void areKeptFrom(Run run) {
    assertThat(run.everything()).doesNotContain(MACHINERY);
  }
}
