package loadmark.syntax;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.Findings;
import loadmark.diagnostic.SourceText;

/** Reads texts for tests. */
final class Reading {
  private Reading() {}

  /** The statements of a text that must be without a slip. */
  static List<Statement> statements(String text) {
    Findings findings = new Findings();
    NetworkFile file = NetworkReader.read(new SourceText("test", text), findings);
    assertThat(findings.sorted()).isEmpty();
    return file.statements();
  }

  static <T extends Statement> T only(Class<T> type, String text) {
    List<Statement> all = statements(text);
    assertThat(all).hasSize(1);
    return type.cast(all.get(0));
  }

  static Expression value(String text) {
    Findings findings = new Findings();
    Expression read =
        NetworkReader.readExpression(new SourceText("test", text), findings).orElseThrow();
    assertThat(findings.sorted()).isEmpty();
    return read;
  }

  static List<Finding> findings(String text) {
    Findings findings = new Findings();
    NetworkReader.read(new SourceText("test", text), findings);
    return findings.sorted();
  }

  /** An expression with every operation in brackets, to show how it binds. */
  static String bracketed(Expression e) {
    if (e instanceof Expression.Literal l) {
      return l.number() + l.unit().map(Expression.Unit::text).orElse("");
    }
    if (e instanceof Expression.Reference r) {
      return r.name().text();
    }
    if (e instanceof Expression.Data d) {
      return '"' + d.file().text() + '"';
    }
    if (e instanceof Expression.Invocation i) {
      return i.name().text() + i.arguments().stream().map(a -> bracketed(a.value())).toList();
    }
    if (e instanceof Expression.Signed s) {
      return "(" + (s.negative() ? "-" : "+") + bracketed(s.operand()) + ")";
    }
    if (e instanceof Expression.Operation o) {
      return "(" + bracketed(o.left()) + o.operator().sign() + bracketed(o.right()) + ")";
    }
    if (e instanceof Expression.Toleranced t) {
      return "(" + bracketed(t.value()) + "±" + bracketed(t.amount()) + ")";
    }
    return "<" + bracketed(((Expression.Grouped) e).inside()) + ">";
  }
}
