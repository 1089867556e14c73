package loadmark.cli;

import java.util.List;
import java.util.Optional;
import loadmark.study.Request;

/** What a command line asks for. */
sealed interface Invocation {

  /**
   * A help text.
   *
   * @param topic the command it is about, or {@code loadmark}
   */
  record Help(String topic) implements Invocation {}

  /** The version. */
  record ShowVersion() implements Invocation {}

  /** To judge files. */
  record Check(List<String> files, Request request, Manner manner) implements Invocation {}

  /** To write out one file's impedances. */
  record Curve(String file, Request request, Manner manner) implements Invocation {}

  /** To tell how heavy one file's loads may be. */
  record Allow(String file, Request request, Manner manner) implements Invocation {}

  /**
   * How results are given.
   *
   * @param output where to, in place of standard output
   * @param plain whether colour is refused
   */
  record Manner(Format format, Optional<String> output, boolean quiet, boolean plain) {}
}
