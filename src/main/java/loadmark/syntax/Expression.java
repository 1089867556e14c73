package loadmark.syntax;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Span;

/** What may stand as a value. Its meaning (arithmetic or impedance) is settled in binding. */
public sealed interface Expression {

  Span span();

  /**
   * A number with the word behind it, if any.
   *
   * @param number the number as written, with {@code .} as its point
   * @param unit prefix and unit as written: {@code kΩ}, {@code %}, {@code nH/m}; also the rest of
   *     an IEC 60062 code: {@code K7} of {@code 4K7}
   * @param adjoined whether the unit follows the number without a space
   */
  record Literal(String number, double value, Optional<Unit> unit, boolean adjoined, Span span)
      implements Expression {}

  /** The word behind a number. */
  record Unit(String text, Span span) {}

  /**
   * A name where a value may stand: a {@code let}, a letter code such as {@code R47}, or a slip.
   */
  record Reference(Name name, Span span) implements Expression {}

  /** A quoted text: the name of a data file. */
  record Data(Name file, Span span) implements Expression {}

  /** {@code sqrt(x)}, {@code block(trim = 12 pF)}. */
  record Invocation(Name name, List<Argument> arguments, Span span) implements Expression {}

  /** One argument; named where a block's parameter is set. */
  record Argument(Optional<Name> name, Expression value) {}

  /** {@code -x}; {@code +x} has {@code negative} false. */
  record Signed(boolean negative, Expression operand, Span span) implements Expression {}

  /** Two operands and what joins them. */
  record Operation(
      Operator operator, Expression left, Expression right, Span operatorSpan, Span span)
      implements Expression {}

  /** {@code value ± amount}. */
  record Toleranced(Expression value, Expression amount, Span span) implements Expression {}

  /** An expression in brackets. */
  record Grouped(Expression inside, Span span) implements Expression {}

  /** What joins two operands, tightest first. */
  enum Operator {
    POWER("^"),
    TIMES("*"),
    DIVIDED("/"),
    PARALLEL("||"),
    PLUS("+"),
    MINUS("-");

    private final String sign;

    Operator(String sign) {
      this.sign = sign;
    }

    public String sign() {
      return sign;
    }
  }
}
