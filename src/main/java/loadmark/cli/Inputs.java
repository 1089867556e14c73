package loadmark.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceReader;
import loadmark.diagnostic.SourceText;
import loadmark.study.Source;

/** Reads network files, and {@code -} as standard input. */
final class Inputs {
  static final String STANDARD_INPUT = "-";

  /** One byte past what is read: devices that never end are stopped by it too. */
  private static final int ENOUGH = SourceReader.MOST_BYTES + 1;

  private final InputStream in;

  Inputs(InputStream in) {
    this.in = in;
  }

  /** The file as it is now; empty, with a finding on the whole file, where it cannot be had. */
  Optional<Source> read(String name, Findings findings) {
    Optional<byte[]> bytes = readBytes(name, findings);
    return bytes.flatMap(
        all -> SourceReader.decode(name, all, findings).map(text -> new Source(text, sha256(all))));
  }

  private Optional<byte[]> readBytes(String name, Findings findings) {
    try {
      byte[] bytes;
      if (name.equals(STANDARD_INPUT)) {
        bytes = in.readNBytes(ENOUGH);
      } else {
        Path path = Path.of(name);
        if (Files.isDirectory(path)) {
          return refuse(name, "is-directory", "this is a directory, not a network file", findings);
        }
        try (InputStream file = Files.newInputStream(path)) {
          bytes = file.readNBytes(ENOUGH);
        }
      }
      return Optional.of(bytes);
    } catch (NoSuchFileException | InvalidPathException missing) {
      return refuse(name, "no-such-file", "there is no such file", findings);
    } catch (AccessDeniedException denied) {
      return refuse(name, "not-readable", "this file may not be read", findings);
    } catch (IOException failed) {
      return refuse(name, "not-readable", "this file could not be read", findings);
    }
  }

  private static Optional<byte[]> refuse(
      String name, String code, String message, Findings findings) {
    findings.error(code, SourceText.unread(name).whole(), message);
    return Optional.empty();
  }

  private static String sha256(byte[] bytes) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException("every Java platform has SHA-256", impossible);
    }
  }
}
