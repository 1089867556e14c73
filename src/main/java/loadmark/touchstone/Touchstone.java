package loadmark.touchstone;

import static java.nio.charset.StandardCharsets.ISO_8859_1;
import static java.nio.charset.StandardCharsets.UTF_8;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;
import loadmark.quantity.Engineering;

/** Reads and writes files in the Touchstone open format. */
public final class Touchstone {
  /** The largest file that is read, in bytes: some million rows. */
  public static final int MOST_BYTES = 256 << 20;

  /** A file with so many errors is not read on. */
  public static final int MOST_ERRORS = 25;

  private static final char BYTE_ORDER_MARK = '\uFEFF';

  private Touchstone() {}

  /**
   * Bytes to text. The format is plain ASCII; but comments hold what instruments put there, so that
   * bytes that are no UTF-8 are taken one by one.
   *
   * @param name the path as the user gave it
   * @return empty, after one finding, where there are too many bytes or they are no text
   */
  public static Optional<SourceText> decode(String name, byte[] bytes, Findings findings) {
    if (bytes.length > MOST_BYTES) {
      reportTooLarge(name, findings);
      return Optional.empty();
    }
    String text = decode(bytes);
    if (text.indexOf('\0') >= 0) {
      findings.error(
          "data-not-text",
          SourceText.unread(name).whole(),
          "this is no text file",
          "data files are plain ASCII; UTF-16 is not read");
      return Optional.empty();
    }
    return Optional.of(new SourceText(name, text));
  }

  /** The finding on a file of more than {@link #MOST_BYTES}. */
  public static void reportTooLarge(String name, Findings findings) {
    findings.error(
        "data-too-large",
        SourceText.unread(name).whole(),
        "the file is larger than " + (MOST_BYTES >> 20) + " MB");
  }

  private static String decode(byte[] bytes) {
    if (isAscii(bytes)) {
      // The usual case, without a detour over wide characters.
      return new String(bytes, ISO_8859_1);
    }
    try {
      String text = UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return !text.isEmpty() && text.charAt(0) == BYTE_ORDER_MARK ? text.substring(1) : text;
    } catch (CharacterCodingException other) {
      return new String(bytes, ISO_8859_1);
    }
  }

  private static boolean isAscii(byte[] bytes) {
    for (byte b : bytes) {
      if (b < 0) {
        return false;
      }
    }
    return true;
  }

  /**
   * Text to data. The end of the name (.s1p, .s2p) tells how many ports a file of version 1.1 has,
   * else its first row does.
   *
   * @return empty, after at least one error, where the file cannot be read right; after {@link
   *     #MOST_ERRORS} or a few more it is not read on
   */
  public static Optional<MeasuredData> read(SourceText source, Findings findings) {
    int before = findings.errorCount();
    Lines lines = new Lines(source);
    if (!lines.next()) {
      findings.error("data-empty", source.whole(), "the file has no data");
      return Optional.empty();
    }
    Optional<Points> points =
        lines.isKeyword()
            ? new VersionTwo(lines, findings).read()
            : new VersionOne(lines, source.name(), findings).read();
    if (findings.errorCount() > before) {
      return Optional.empty();
    }
    return points.map(Points::toData);
  }

  /**
   * Impedances to a file of version 1.1 that reads back as the same doubles (signs of zeros aside):
   * Z in real and imaginary parts, in ohm, since it is against 1 Ω; shortest decimals that read
   * back.
   *
   * @param comments a line each; what is no printable ASCII is written as Java escapes it
   * @param points at least one, in rising frequency
   */
  public static String writeOnePort(List<String> comments, List<ImpedancePoint> points) {
    if (points.isEmpty()) {
      throw new IllegalArgumentException("no points");
    }
    StringBuilder text = new StringBuilder();
    comments.forEach(c -> text.append("! ").append(ascii(c)).append('\n'));
    text.append("# Hz Z RI R 1\n");
    double lastHz = -1;
    for (ImpedancePoint point : points) {
      if (point.hz() <= lastHz) {
        throw new IllegalArgumentException(point.hz() + " Hz behind " + lastHz);
      }
      lastHz = point.hz();
      text.append(Engineering.exact(point.hz()))
          .append(' ')
          .append(Engineering.exact(point.impedance().re()))
          .append(' ')
          .append(Engineering.exact(point.impedance().im()))
          .append('\n');
    }
    return text.toString();
  }

  private static String ascii(String comment) {
    StringBuilder plain = new StringBuilder();
    for (int i = 0; i < comment.length(); i++) {
      char c = comment.charAt(i);
      if (c >= ' ' && c <= '~') {
        plain.append(c);
      } else {
        String hex = "000" + Integer.toHexString(c);
        plain.append("\\u").append(hex.substring(hex.length() - 4));
      }
    }
    return plain.toString();
  }
}
