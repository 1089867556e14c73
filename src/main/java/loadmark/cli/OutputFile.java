package loadmark.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.List;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;

/** A file that is written whole or not at all. */
final class OutputFile {
  private OutputFile() {}

  /**
   * Writes beside the target, then puts it in the target's place.
   *
   * @param inputs files that must not be overwritten
   * @return whether it is written; if not, there is a finding and nothing is left behind
   */
  static boolean write(String name, String text, List<String> inputs, Findings findings) {
    try {
      Path named = Path.of(name);
      Path target = Files.exists(named) ? named.toRealPath() : named.toAbsolutePath();
      if (Files.isDirectory(target)) {
        return refuse(name, "this is a directory", findings);
      }
      if (Files.exists(target) && (!Files.isRegularFile(target) || !Files.isWritable(target))) {
        return refuse(name, "this may not be overwritten", findings);
      }
      if (isAmong(target, inputs)) {
        return refuse(name, "this is the file that is read", findings);
      }
      replace(target, text);
      return true;
    } catch (IOException | InvalidPathException failed) {
      return refuse(name, "this could not be written", findings);
    }
  }

  private static boolean isAmong(Path target, List<String> inputs) throws IOException {
    for (String input : inputs) {
      boolean same =
          !input.equals(Inputs.STANDARD_INPUT)
              && Files.exists(target)
              && Files.exists(Path.of(input))
              && Files.isSameFile(target, Path.of(input));
      if (same) {
        return true;
      }
    }
    return false;
  }

  private static void replace(Path target, String text) throws IOException {
    String beside = "." + target.getFileName() + "." + ProcessHandle.current().pid() + ".part";
    Path part = target.resolveSibling(beside);
    try {
      Files.write(
          part,
          text.getBytes(StandardCharsets.UTF_8),
          StandardOpenOption.CREATE_NEW,
          StandardOpenOption.WRITE);
      try {
        Files.move(part, target, StandardCopyOption.ATOMIC_MOVE);
      } catch (AtomicMoveNotSupportedException unknown) {
        Files.move(part, target, StandardCopyOption.REPLACE_EXISTING);
      }
    } finally {
      Files.deleteIfExists(part);
    }
  }

  private static boolean refuse(String name, String message, Findings findings) {
    findings.error("not-writable", SourceText.unread(name).whole(), "--output: " + message);
    return false;
  }
}
