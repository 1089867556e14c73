package loadmark.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Findings;
import loadmark.report.AllowJson;
import loadmark.report.CheckJson;
import loadmark.report.CurveJson;
import loadmark.report.Version;
import loadmark.study.Outcome;
import loadmark.study.Request;
import loadmark.study.Study;

/** The program, apart from the process that it runs in. */
public final class Loadmark {
  private static final int FAULT = 3;
  private static final String TRACE = "LOADMARK_TRACE";

  private final Inputs inputs;
  private final Streams streams;

  private Loadmark(Inputs inputs, Streams streams) {
    this.inputs = inputs;
    this.streams = streams;
  }

  /**
   * Does all that the arguments ask for.
   *
   * @return the exit status: 0 kept, 1 broken, 2 invalid or undetermined, 3 a fault of the program
   */
  public static int run(String[] arguments, InputStream in, OutputStream out, OutputStream err) {
    Streams streams = new Streams(out, err);
    try {
      return new Loadmark(new Inputs(in), streams).run(arguments);
    } catch (RuntimeException | Error fault) {
      streams.message(describe(fault));
      return FAULT;
    }
  }

  private int run(String[] arguments) {
    Findings findings = new Findings();
    Optional<Invocation> invocation = Arguments.parse(arguments, findings);
    if (invocation.isEmpty()) {
      return refuse(arguments, findings, Request.NOTHING);
    }
    if (invocation.get() instanceof Invocation.Help help) {
      return streams.result(help(help.topic())) ? 0 : Outcome.INVALID.status();
    }
    if (invocation.get() instanceof Invocation.Check check) {
      return Study.of(check.request(), findings)
          .map(study -> new CheckCommand(check, study, inputs, streams).run().status())
          .orElseGet(() -> refuse(arguments, findings, check.request()));
    }
    if (invocation.get() instanceof Invocation.Curve curve) {
      return Study.of(curve.request(), findings)
          .map(study -> new CurveCommand(curve, study, inputs, streams).run().status())
          .orElseGet(() -> refuse(arguments, findings, curve.request()));
    }
    if (invocation.get() instanceof Invocation.Allow allow) {
      return Study.of(allow.request(), findings)
          .map(study -> new AllowCommand(allow, study, inputs, streams).run().status())
          .orElseGet(() -> refuse(arguments, findings, allow.request()));
    }
    return streams.result("loadmark " + Version.CURRENT + "\n") ? 0 : Outcome.INVALID.status();
  }

  /** Tells what is wrong with the command line. */
  private int refuse(String[] arguments, Findings findings, Request request) {
    List<String> all = Arrays.asList(arguments);
    boolean json = Arguments.wantJson(arguments);
    if (json) {
      streams.result(
          refusal(all.isEmpty() ? "" : all.get(0), findings.sorted(), request.options()));
    }
    if (!json || !all.contains(Options.QUIET)) {
      streams.findings(findings.sorted(), false);
    }
    return Outcome.INVALID.status();
  }

  /** The JSON of a command that had nothing to do. */
  private static String refusal(String command, List<Finding> findings, List<String> options) {
    Optional<String> none = Optional.empty();
    return switch (command) {
      case Options.CURVE -> CurveJson.write(none, none, Optional.empty(), findings, options);
      case Options.ALLOW -> AllowJson.write(none, none, Optional.empty(), findings, options);
      default -> CheckJson.write(List.of(), findings, options);
    };
  }

  private static String help(String topic) {
    try (InputStream text = Loadmark.class.getResourceAsStream(topic + ".txt")) {
      if (text == null) {
        throw new IllegalStateException("no help on " + topic);
      }
      return new String(text.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  /** One line for the user to report; the trace only where it is asked for. */
  private static String describe(Throwable fault) {
    String place =
        Arrays.stream(fault.getStackTrace())
            .filter(f -> f.getClassName().startsWith("loadmark."))
            .findFirst()
            .map(f -> f.getFileName() + ":" + f.getLineNumber())
            .orElse("unknown place");
    String line =
        "loadmark: this is a fault of loadmark, not of your input; please report it with the file"
            + " and the command line (version "
            + Version.CURRENT
            + ", at "
            + place
            + ")\n";
    if (System.getenv(TRACE) == null) {
      return line;
    }
    StringWriter trace = new StringWriter();
    fault.printStackTrace(new PrintWriter(trace));
    return line + trace;
  }
}
