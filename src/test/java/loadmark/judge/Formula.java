package loadmark.judge;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.function.Function;
import loadmark.network.Band;
import loadmark.network.Bound;
import loadmark.network.Case;
import loadmark.network.Criterion;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Node;
import loadmark.network.OnePort;
import loadmark.network.OnePort.ElementKind;
import loadmark.network.Port;
import loadmark.network.Value;
import loadmark.response.Change;
import loadmark.response.Comparison;
import loadmark.response.Crossings;
import loadmark.response.Loading;
import loadmark.response.Ohms;
import loadmark.response.PortResponse;
import org.apache.commons.math3.complex.Complex;

/** Closed forms in place of a solved network. */
final class Formula {
  static final Node GROUND = new Node(0, "ground");
  static final Node TAP = new Node(1, "tap");
  static final Port PORT = new Port("input", TAP, GROUND, new Port.Closure.Open(), 1);

  private Formula() {}

  static double omega(double hz) {
    return 2 * Math.PI * hz;
  }

  /** A comparison from two impedances and, where the difference would cancel, the change. */
  record Of(
      DoubleFunction<Ohms> without, DoubleFunction<Ohms> with, Optional<DoubleFunction<Change>> own)
      implements Comparison {
    @Override
    public Loading at(double hz) {
      Ohms a = without.apply(hz);
      Ohms b = with.apply(hz);
      Change change = own.map(f -> f.apply(hz)).orElseGet(() -> change(a, b));
      return new Loading(hz, a, b, change, 0, 0, 0);
    }

    @Override
    public List<Loading> at(double[] hz) {
      return Arrays.stream(hz).mapToObj(this::at).toList();
    }

    private static Change change(Ohms a, Ohms b) {
      if (a.isUndetermined() || b.isUndetermined() || (a.isOpen() && b.isOpen())) {
        return Change.UNDETERMINED;
      }
      if (a.isZero()) {
        return b.isZero() ? Change.UNDETERMINED : Change.UNBOUNDED;
      }
      if (b.isOpen()) {
        return Change.UNBOUNDED;
      }
      if (a.isOpen()) {
        return Change.of(-1, 0);
      }
      Complex h = complex(b).subtract(complex(a)).divide(complex(a));
      return Change.of(h.getReal(), h.getImaginary());
    }
  }

  static Complex complex(Ohms z) {
    return new Complex(z.re(), z.im());
  }

  static Ohms ohms(Complex z) {
    return Ohms.of(z.getReal(), z.getImaginary());
  }

  static Comparison of(DoubleFunction<Ohms> without, DoubleFunction<Ohms> with) {
    return new Of(without, with, Optional.empty());
  }

  /** Of a change given in closed form, on 1 Ω. */
  static Comparison ofChange(DoubleFunction<Complex> h) {
    return new Of(
        hz -> Ohms.of(1, 0),
        hz -> ohms(h.apply(hz).add(1)),
        Optional.of(hz -> Change.of(h.apply(hz).getReal(), h.apply(hz).getImaginary())));
  }

  /** The same impedance with and without. */
  static Comparison alone(DoubleFunction<Ohms> z) {
    return of(z, z);
  }

  static Limit limit(Criterion criterion, Bound bound, Band... scope) {
    return limit(criterion, bound, Optional.empty(), scope);
  }

  static Limit limit(Criterion criterion, Bound bound, OnePort reference, Band... scope) {
    return limit(criterion, bound, Optional.of(reference), scope);
  }

  private static Limit limit(
      Criterion criterion, Bound bound, Optional<OnePort> reference, Band... scope) {
    return new Limit(
        criterion,
        bound,
        reference,
        "",
        List.of(scope),
        List.of(Case.bare()),
        List.of(PORT),
        1,
        "limit");
  }

  static Limit in(Limit limit, List<Case> cases) {
    return new Limit(
        limit.criterion(),
        limit.bound(),
        limit.reference(),
        limit.referenceText(),
        limit.scope(),
        cases,
        limit.ports(),
        limit.line(),
        limit.text());
  }

  static OnePort resistor(double ohm) {
    return OnePort.of(ElementKind.RESISTANCE, ohm);
  }

  static Load load(String name) {
    OnePort value = new OnePort.Element(ElementKind.RESISTANCE, Value.exact(1));
    return new Load(name, Load.Placement.SHUNT, TAP, GROUND, value, "1 Ω", 1);
  }

  static LimitJudgement judge(Comparison comparison, Limit limit) {
    Crossings none = Crossings.none("formula");
    return new LimitJudge(comparison, none, List.of(limit))
        .judge(l -> Optional.empty(), l -> true)
        .get(0);
  }

  static NetworkJudgement judge(List<Case> cases, List<Limit> limits, PortResponse response) {
    Function<Port, PortResponse> responses = port -> response;
    return Judge.judge(
        new Network(
            "",
            List.of(GROUND, TAP),
            List.of(),
            List.of(),
            List.of(PORT),
            List.of(),
            cases,
            limits,
            Optional.empty()),
        responses);
  }
}
