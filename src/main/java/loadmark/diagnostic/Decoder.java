package loadmark.diagnostic;

import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** Bytes to text. Stand-in. */
public final class Decoder {
  private Decoder() {}

  public static Optional<SourceText> decode(String name, byte[] bytes, Findings findings) {
    String text = new String(bytes, StandardCharsets.UTF_8);
    if (text.indexOf('\uFFFD') >= 0) {
      findings.error("not-utf8", SourceText.unread(name).whole(), "this file is not UTF-8");
      return Optional.empty();
    }
    return Optional.of(new SourceText(name, text));
  }
}
