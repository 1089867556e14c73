package loadmark.cli;

import java.util.List;
import java.util.Optional;
import loadmark.cli.Invocation.Manner;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.Nearest;
import loadmark.study.Request;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;

/** Arguments to what they ask for; slips become findings in our own words. */
final class Arguments {
  private static final String STANDARD_INPUT = "-";
  private static final char REPLACEMENT = '\uFFFD';

  private final ArgumentText text;
  private final Findings findings;

  private Arguments(ArgumentText text, Findings findings) {
    this.text = text;
    this.findings = findings;
  }

  /** What is asked for; empty, with findings, where it makes no sense. */
  static Optional<Invocation> parse(String[] arguments, Findings findings) {
    ArgumentText text = new ArgumentText(arguments);
    checkLocale(arguments, text, findings);
    if (findings.hasErrors()) {
      return Optional.empty();
    }
    CommandLine commands = Options.commandLine();
    try {
      return new Arguments(text, findings).read(commands.parseArgs(arguments));
    } catch (ParameterException slip) {
      new Slips(text, findings).add(slip);
      return Optional.empty();
    }
  }

  /**
   * Where the locale is not UTF-8 this sign is all that arrives of a character it does not have.
   */
  private static void checkLocale(String[] arguments, ArgumentText text, Findings findings) {
    for (String argument : arguments) {
      if (argument.indexOf(REPLACEMENT) >= 0) {
        findings.error(
            "locale-not-utf8",
            text.place(argument),
            "characters of this argument are lost: the locale is not UTF-8",
            "set LC_ALL=C.UTF-8, or write `ohm` for Ω and `u` for µ");
      }
    }
  }

  /**
   * Whether the results are asked for as JSON. Told without parsing, so that a slip is told as JSON
   * too.
   */
  static boolean wantJson(String[] arguments) {
    List<String> all = List.of(arguments);
    int format = all.lastIndexOf(Options.FORMAT);
    boolean apart = format >= 0 && format + 1 < all.size() && all.get(format + 1).equals("json");
    return apart || all.contains(Options.FORMAT + "=json");
  }

  private Optional<Invocation> read(ParseResult root) {
    ParseResult command = root.hasSubcommand() ? root.subcommand() : root;
    String name = command.commandSpec().name();
    if (command.isUsageHelpRequested()) {
      return Optional.of(new Invocation.Help(name));
    }
    if (command.isVersionHelpRequested()) {
      return Optional.of(new Invocation.ShowVersion());
    }
    if (command == root) {
      findings.error(
          "no-command", text.whole(), "a command is missing", "loadmark check FILE judges a file");
      return Optional.empty();
    }
    return read(name, command);
  }

  private Optional<Invocation> read(String name, ParseResult command) {
    List<String> files = command.matchedPositionalValue(0, List.of());
    checkFiles(name, files);
    if (find(command, Options.OUTPUT).filter(String::isEmpty).isPresent()) {
      findings.error("empty-name", text.place(Options.OUTPUT), "--output needs a name");
    }
    Manner manner =
        new Manner(
            format(name, find(command, Options.FORMAT)),
            find(command, Options.OUTPUT),
            command.hasMatchedOption(Options.QUIET),
            command.hasMatchedOption(Options.NO_COLOR));
    Request request =
        new Request(
            find(command, Options.SWEEP),
            name.equals(Options.CURVE) ? find(command, Options.AT) : Optional.empty(),
            command.matchedOptionValue(Options.SET, List.of()),
            find(command, Options.PORT),
            find(command, Options.CASE),
            name.equals(Options.CURVE) && command.hasMatchedOption(Options.POLES));
    checkPoles(request, manner);
    if (findings.hasErrors()) {
      return Optional.empty();
    }
    return Optional.of(
        switch (name) {
          case Options.CURVE -> new Invocation.Curve(files.get(0), request, manner);
          case Options.ALLOW -> new Invocation.Allow(files.get(0), request, manner);
          default -> new Invocation.Check(files, request, manner);
        });
  }

  private void checkPoles(Request request, Manner manner) {
    if (request.poles() && manner.format() != Format.TEXT && manner.format() != Format.JSON) {
      findings.error(
          "poles-in-format",
          text.place(Options.POLES),
          "format " + manner.format().word() + " has no room for poles and zeros",
          "take --format json, or text");
    }
  }

  private static Optional<String> find(ParseResult command, String option) {
    return Optional.ofNullable(command.<String>matchedOptionValue(option, null));
  }

  private void checkFiles(String command, List<String> files) {
    if (files.isEmpty()) {
      findings.error(
          "no-file",
          text.place(command),
          command + " needs a FILE",
          "a network file, or - for standard input");
    } else if (files.contains("")) {
      findings.error("empty-name", text.place(""), "the name of a FILE is empty");
    } else if (!command.equals(Options.CHECK) && files.size() > 1) {
      findings.error("too-many-files", text.place(files.get(1)), command + " takes one FILE alone");
    } else if (files.stream().filter(STANDARD_INPUT::equals).count() > 1) {
      findings.error(
          "stdin-twice", text.place(STANDARD_INPUT), "standard input can be read only once");
    }
  }

  private Format format(String command, Optional<String> word) {
    if (word.isEmpty()) {
      return Format.TEXT;
    }
    Optional<Format> format = Format.find(word.get());
    if (format.isEmpty()) {
      findings.error(
          "unknown-format",
          text.place(Options.FORMAT),
          "there is no format `" + word.get() + "`",
          Nearest.find(word.get(), Format.words(command))
              .map(n -> "did you mean `" + n + "`?")
              .orElse("--format takes " + String.join(", ", Format.words(command))));
    } else if (!format.get().isOf(command)) {
      findings.error(
          "unknown-format",
          text.place(Options.FORMAT),
          command + " has no format `" + word.get() + "`",
          "--format " + word.get() + " belongs to " + Options.CURVE);
    }
    return format.orElse(Format.TEXT);
  }
}
