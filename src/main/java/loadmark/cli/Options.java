package loadmark.cli;

import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/**
 * The commands and their options. They are put together here and not by annotations: reading those
 * costs more at start than reading the arguments does.
 */
final class Options {
  static final String NAME = "loadmark";
  static final String CHECK = "check";
  static final String CURVE = "curve";
  static final String ALLOW = "allow";
  static final List<String> COMMANDS = List.of(CHECK, CURVE, ALLOW);

  static final String FORMAT = "--format";
  static final String OUTPUT = "--output";
  static final String AT = "--at";
  static final String POLES = "--poles";
  static final String SWEEP = "--sweep";
  static final String PORT = "--port";
  static final String CASE = "--case";
  static final String SET = "--set";
  static final String QUIET = "--quiet";
  static final String NO_COLOR = "--no-color";
  static final String HELP = "--help";
  static final String VERSION = "--version";

  private Options() {}

  static CommandLine commandLine() {
    CommandSpec check = common(CHECK);
    CommandSpec curve = common(CURVE).addOption(text(AT)).addOption(flag(POLES).build());
    CommandSpec root = withHelp(CommandSpec.create().name(NAME));
    root.addSubcommand(CHECK, check)
        .addSubcommand(CURVE, curve)
        .addSubcommand(ALLOW, common(ALLOW));
    return new CommandLine(root).setExpandAtFiles(false).setAllowOptionsAsOptionParameters(false);
  }

  private static CommandSpec common(String name) {
    CommandSpec spec = withHelp(CommandSpec.create().name(name));
    for (String option : List.of(FORMAT, OUTPUT, SWEEP, PORT, CASE)) {
      spec.addOption(text(option));
    }
    return spec.addOption(
            OptionSpec.builder(SET).type(List.class).auxiliaryTypes(String.class).build())
        .addOption(flag(QUIET).build())
        .addOption(flag(NO_COLOR).build())
        .addPositional(
            PositionalParamSpec.builder()
                .paramLabel("FILE")
                .type(List.class)
                .auxiliaryTypes(String.class)
                .arity("0..*")
                .build());
  }

  private static CommandSpec withHelp(CommandSpec spec) {
    return spec.addOption(flag(HELP).usageHelp(true).build())
        .addOption(flag(VERSION).versionHelp(true).build());
  }

  private static OptionSpec text(String name) {
    return OptionSpec.builder(name).type(String.class).build();
  }

  private static OptionSpec.Builder flag(String name) {
    return OptionSpec.builder(name).type(boolean.class).arity("0");
  }
}
