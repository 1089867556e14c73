package loadmark.syntax;

import java.util.List;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.misc.IntervalSet;

/**
 * Where a line stopped being readable.
 *
 * @param tokens the line
 * @param index of the first token that cannot stand where it stands; the number of tokens where the
 *     line ends too soon
 * @param expected the types of what could have stood there
 * @param rules the rules being read, innermost first
 */
record Slip(List<Token> tokens, int index, IntervalSet expected, List<Integer> rules) {

  boolean atEnd() {
    return index >= tokens.size();
  }

  /** The token that cannot stand; the last one of the line at its end. */
  Token token() {
    return tokens.get(Math.min(index, tokens.size() - 1));
  }

  boolean expects(int type) {
    return expected.contains(type);
  }

  boolean isIn(int rule) {
    return rules.contains(rule);
  }

  /** The innermost rule, 0 out. */
  int rule(int out) {
    return out < rules.size() ? rules.get(out) : -1;
  }
}
