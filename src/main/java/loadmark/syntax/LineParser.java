package loadmark.syntax;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import loadmark.syntax.antlr.NetworkParser;
import org.antlr.v4.runtime.CommonTokenStream;
import org.antlr.v4.runtime.DefaultErrorStrategy;
import org.antlr.v4.runtime.ListTokenSource;
import org.antlr.v4.runtime.Parser;
import org.antlr.v4.runtime.RecognitionException;
import org.antlr.v4.runtime.RuleContext;
import org.antlr.v4.runtime.Token;
import org.antlr.v4.runtime.atn.ATN;
import org.antlr.v4.runtime.atn.ATNState;
import org.antlr.v4.runtime.atn.PredictionMode;
import org.antlr.v4.runtime.atn.RuleTransition;
import org.antlr.v4.runtime.misc.IntervalSet;
import org.antlr.v4.runtime.misc.ParseCancellationException;

/** Reads the tokens of one line by a rule of the grammar, up to the first slip. */
final class LineParser {
  private final NetworkParser parser = new NetworkParser(stream(List.of()));

  LineParser() {
    parser.removeErrorListeners();
    parser.setErrorHandler(new StopAtFirst());
  }

  /** Either what was read or why not. */
  record Outcome<T>(Optional<T> read, Optional<Slip> slip) {}

  <T> Outcome<T> parse(List<Token> tokens, Function<NetworkParser, T> rule) {
    // The quick prediction decides nearly always; where it finds a slip the exact one has a say.
    try {
      return parse(tokens, rule, PredictionMode.SLL);
    } catch (Stopped quick) {
      try {
        return parse(tokens, rule, PredictionMode.LL);
      } catch (Stopped exact) {
        return new Outcome<>(Optional.empty(), Optional.of(exact.slip(tokens)));
      }
    }
  }

  private <T> Outcome<T> parse(
      List<Token> tokens, Function<NetworkParser, T> rule, PredictionMode mode) {
    parser.setTokenStream(stream(tokens));
    parser.getInterpreter().setPredictionMode(mode);
    return new Outcome<>(Optional.of(rule.apply(parser)), Optional.empty());
  }

  private static CommonTokenStream stream(List<Token> tokens) {
    return new CommonTokenStream(new ListTokenSource(tokens));
  }

  /** Neither mends nor reports, but looks at every choice whether the next token fits. */
  private static final class StopAtFirst extends DefaultErrorStrategy {
    @Override
    public void sync(Parser parser) {
      if (!fits(parser, parser.getInputStream().LA(1))) {
        throw new Stopped(parser, parser.getCurrentToken());
      }
    }

    /** Asks the rule being read and, as far as it may end here, the rules that called it. */
    private static boolean fits(Parser parser, int next) {
      ATN atn = parser.getATN();
      IntervalSet here = atn.nextTokens(atn.states.get(parser.getState()));
      RuleContext rule = parser.getContext();
      while (!here.contains(next)) {
        if (!here.contains(Token.EPSILON) || rule.invokingState < 0) {
          return false;
        }
        ATNState caller = atn.states.get(rule.invokingState);
        here = atn.nextTokens(((RuleTransition) caller.transition(0)).followState);
        rule = rule.getParent();
      }
      return true;
    }

    @Override
    public void recover(Parser parser, RecognitionException e) {
      throw new Stopped(parser, e.getOffendingToken());
    }

    @Override
    public Token recoverInline(Parser parser) {
      throw new Stopped(parser, parser.getCurrentToken());
    }
  }

  /** Leaves the parser; never leaves this class. */
  private static final class Stopped extends ParseCancellationException {
    private static final long serialVersionUID = 1L;

    private final transient Token token;
    private final transient IntervalSet expected;
    private final transient List<Integer> rules = new ArrayList<>();

    Stopped(Parser parser, Token token) {
      this.token = token;
      this.expected = parser.getExpectedTokens();
      for (RuleContext c = parser.getContext(); c != null; c = c.getParent()) {
        rules.add(c.getRuleIndex());
      }
    }

    Slip slip(List<Token> tokens) {
      int index = token.getType() == Token.EOF ? tokens.size() : token.getTokenIndex();
      return new Slip(tokens, index, expected, List.copyOf(rules));
    }
  }
}
