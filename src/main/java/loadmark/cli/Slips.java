package loadmark.cli;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.OverwrittenOptionException;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** What the argument parser could not take, in our words. */
final class Slips {
  private final ArgumentText text;
  private final Findings findings;

  Slips(ArgumentText text, Findings findings) {
    this.text = text;
    this.findings = findings;
  }

  void add(ParameterException slip) {
    CommandSpec command = slip.getCommandLine().getCommandSpec();
    if (slip instanceof UnmatchedArgumentException unmatched) {
      addUnmatched(unmatched.getUnmatched(), command);
    } else if (slip instanceof OverwrittenOptionException twice) {
      String name = name(twice.getOverwritten());
      findings.error("option-twice", text.place(name), name + " is given twice");
    } else if (slip instanceof MissingParameterException missing
        && !missing.getMissing().isEmpty()) {
      String name = name(missing.getMissing().get(0));
      findings.error("option-without-value", text.place(name), name + " needs a value");
    } else {
      addFlagWithValue(command);
    }
  }

  /** What is left of the ways to go wrong: a flag that is given a value. */
  private void addFlagWithValue(CommandSpec command) {
    Optional<String> flag =
        command.options().stream()
            .filter(o -> o.arity().max() == 0)
            .map(OptionSpec::longestName)
            .filter(text::sets)
            .findFirst();
    findings.error(
        "unclear-option",
        flag.map(text::place).orElse(text.whole()),
        flag.map(f -> f + " takes no value").orElse("these arguments cannot be read"),
        help(command));
  }

  private void addUnmatched(List<String> unmatched, CommandSpec command) {
    boolean root = command.parent() == null;
    String first = unmatched.get(0);
    if (root && !first.startsWith("-")) {
      findings.error(
          "unknown-command",
          text.place(first),
          "there is no command `" + first + "`",
          Nearest.find(first, Options.COMMANDS)
              .map(n -> "did you mean `" + n + "`?")
              .orElse(help(command)));
      return;
    }
    for (String argument : unmatched) {
      if (argument.startsWith("-")) {
        addOption(argument, command, root);
      }
      if (root) {
        return;
      }
    }
    if (!findings.hasErrors()) {
      findings.error(
          "unclear-argument",
          text.place(first),
          "`" + first + "` has no meaning here",
          help(command));
    }
  }

  private void addOption(String argument, CommandSpec command, boolean root) {
    int equals = argument.indexOf('=');
    String option = equals < 0 ? argument : argument.substring(0, equals);
    List<String> known = command.options().stream().map(OptionSpec::longestName).toList();
    Optional<String> elsewhere =
        root ? Optional.of("options come after the command") : other(option);
    String hint =
        elsewhere
            .or(() -> meant(option, known).map(n -> "did you mean `" + n + "`?"))
            .orElse(help(command));
    findings.error(
        "unknown-option",
        text.place(argument),
        root
            ? "there is no option " + option + " before a command"
            : command.name() + " has no option " + option,
        hint);
  }

  /** The one that begins so, else the nearest. */
  private static Optional<String> meant(String option, List<String> known) {
    List<String> longer = known.stream().filter(name -> name.startsWith(option)).toList();
    return longer.size() == 1 ? Optional.of(longer.get(0)) : Nearest.find(option, known);
  }

  private static Optional<String> other(String option) {
    return option.equals(Options.AT) || option.equals(Options.POLES)
        ? Optional.of(option + " belongs to curve")
        : Optional.empty();
  }

  private static String name(ArgSpec spec) {
    return spec instanceof OptionSpec option ? option.longestName() : spec.paramLabel();
  }

  private static String help(CommandSpec command) {
    return command.qualifiedName() + " --help lists what there is";
  }
}
