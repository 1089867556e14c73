package loadmark.syntax;

import java.text.Normalizer;
import java.util.List;
import loadmark.syntax.antlr.NetworkParser;
import loadmark.syntax.antlr.NetworkParser.NameContext;
import loadmark.syntax.antlr.NetworkParser.NamesContext;
import org.antlr.v4.runtime.Token;

/** Tokens to names. */
record NameReader(Places places) {

  Name read(Token token) {
    String text = token.getText();
    boolean quoted = token.getType() == NetworkParser.STRING;
    String bare = quoted ? text.substring(1, text.length() - 1) : text;
    return new Name(Normalizer.normalize(bare, Normalizer.Form.NFC), quoted, places.of(token));
  }

  Name read(NameContext context) {
    return read(context.getStart());
  }

  List<Name> read(NamesContext context) {
    return context.name().stream().map(this::read).toList();
  }
}
