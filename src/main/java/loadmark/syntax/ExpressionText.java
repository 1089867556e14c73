package loadmark.syntax;

import java.util.StringJoiner;

/** Writes an expression as its user would, on one line however it was laid out. */
public final class ExpressionText {
  private ExpressionText() {}

  public static String of(Expression expression) {
    StringBuilder text = new StringBuilder();
    append(expression, text);
    return text.toString();
  }

  private static void append(Expression expression, StringBuilder text) {
    if (expression instanceof Expression.Literal literal) {
      text.append(literal.number());
      literal.unit().ifPresent(u -> text.append(literal.adjoined() ? "" : " ").append(u.text()));
    } else if (expression instanceof Expression.Reference reference) {
      text.append(reference.name().text());
    } else if (expression instanceof Expression.Data data) {
      text.append('"').append(data.file().text()).append('"');
    } else if (expression instanceof Expression.Invocation call) {
      StringJoiner arguments = new StringJoiner(", ", call.name().text() + "(", ")");
      for (Expression.Argument argument : call.arguments()) {
        String name = argument.name().map(n -> n.text() + " = ").orElse("");
        arguments.add(name + of(argument.value()));
      }
      text.append(arguments);
    } else if (expression instanceof Expression.Signed signed) {
      text.append(signed.negative() ? '-' : '+');
      append(signed.operand(), text);
    } else if (expression instanceof Expression.Operation operation) {
      String room = operation.operator() == Expression.Operator.POWER ? "" : " ";
      append(operation.left(), text);
      text.append(room).append(operation.operator().sign()).append(room);
      append(operation.right(), text);
    } else if (expression instanceof Expression.Toleranced toleranced) {
      append(toleranced.value(), text);
      text.append(" ± ");
      append(toleranced.amount(), text);
    } else if (expression instanceof Expression.Grouped grouped) {
      text.append('(');
      append(grouped.inside(), text);
      text.append(')');
    }
  }
}
