package loadmark.cli;

import java.util.List;
import java.util.function.Supplier;
import loadmark.cli.Invocation.Manner;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Findings;

/** Brings results and findings to where the user wants them. */
final class Delivery {
  private final Manner manner;
  private final List<String> inputs;
  private final Streams streams;

  Delivery(Manner manner, List<String> inputs, Streams streams) {
    this.manner = manner;
    this.inputs = inputs;
    this.streams = streams;
  }

  private boolean isJson() {
    return manner.format() == Format.JSON;
  }

  /**
   * Findings for people: all with text and CSV; only errors where the JSON has them all or the user
   * wants quiet, and none where both hold.
   */
  void tell(List<Finding> findings) {
    if (!isJson() || !manner.quiet()) {
      streams.findings(findings, !isJson() && !manner.quiet());
    }
  }

  /**
   * Writes a result to {@code --output}, else to standard output. A file is touched only where
   * there is something to put there; JSON goes to standard output then, so that it is never lost.
   *
   * @param result written anew after a finding, which is part of it
   * @param worthy whether anything came out
   * @return whether it is where it should be
   */
  boolean deliver(Supplier<String> result, boolean worthy, Findings findings) {
    if (manner.output().isEmpty()) {
      return streams.result(result.get());
    }
    boolean written =
        worthy && OutputFile.write(manner.output().get(), result.get(), inputs, findings);
    if (!written) {
      tell(findings.sorted());
      if (isJson()) {
        streams.result(result.get());
      }
    }
    return written;
  }
}
