package loadmark.diagnostic;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** Bytes to text. */
public final class SourceReader {
  /** The largest file that is read, in bytes. */
  public static final int MOST_BYTES = 4 << 20;

  private SourceReader() {}

  /**
   * Decodes UTF-8; a byte order mark at the start is dropped.
   *
   * @return empty, after one finding, where the bytes are too many or no UTF-8. The finding quotes
   *     the text up to the first wrong byte.
   */
  public static Optional<SourceText> decode(String name, byte[] bytes, Findings findings) {
    if (bytes.length > MOST_BYTES) {
      reportTooLarge(name, findings);
      return Optional.empty();
    }
    CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    ByteBuffer in = ByteBuffer.wrap(bytes);
    CharBuffer out = CharBuffer.allocate(bytes.length + 1);
    CoderResult result = decoder.decode(in, out, true);
    String text = withoutMark(out.flip().toString());
    if (result.isError()) {
      SourceText shown = new SourceText(name, text + "\uFFFD");
      findings.error(
          "not-utf8",
          shown.end(),
          "the file is no UTF-8 text from here on",
          isUtf16(bytes)
              ? "it looks like UTF-16: save it as UTF-8"
              : "save it as UTF-8 in the editor that wrote it");
      return Optional.empty();
    }
    return Optional.of(new SourceText(name, text));
  }

  /** The finding on a text of more than {@link #MOST_BYTES}. */
  public static void reportTooLarge(String name, Findings findings) {
    findings.error(
        "too-large",
        SourceText.unread(name).whole(),
        "the file is larger than " + (MOST_BYTES >> 20) + " MB",
        "a network file is a text of some lines: is it the right file?");
  }

  private static String withoutMark(String text) {
    return text.startsWith("\uFEFF") ? text.substring(1) : text;
  }

  private static boolean isUtf16(byte[] bytes) {
    int first = bytes.length < 2 ? 0 : (bytes[0] & 0xFF) << 8 | (bytes[1] & 0xFF);
    return first == 0xFFFE || first == 0xFEFF;
  }
}
