package loadmark.report;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loadmark.diagnostic.Finding;
import loadmark.diagnostic.SourceText;
import loadmark.judge.Blame;
import loadmark.judge.BrokenBand;
import loadmark.judge.CaseJudgement;
import loadmark.judge.LimitJudgement;
import loadmark.judge.LimitJudgement.Method;
import loadmark.judge.NetworkJudgement;
import loadmark.judge.Verdict;
import loadmark.judge.Worst;
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
import loadmark.network.Sweep;
import loadmark.response.Ohms;
import loadmark.study.FileResult;
import loadmark.study.Source;

/** Judgements put together by hand; their values are invented and mean nothing together. */
final class Samples {
  static final Node GROUND = new Node(0, "ground");
  static final Node TAP = new Node(1, "tap");
  static final Band BAND = new Band(10, 1e6);
  static final String DIGEST = "0123456789abcdef".repeat(4);
  static final Ohms BARE = Ohms.of(28700.25, -1234.5);
  static final Ohms LOADED = Ohms.of(28012.5, -2345.75);

  private Samples() {}

  static Port port(String name) {
    return new Port(name, TAP, GROUND, new Port.Closure.Open(), 11);
  }

  static Load load(String name, int line) {
    return new Load(
        name,
        Load.Placement.SHUNT,
        TAP,
        GROUND,
        OnePort.of(ElementKind.RESISTANCE, 1e7),
        "10 MΩ || 13 pF",
        line);
  }

  static Limit limit(Criterion criterion, Bound bound, int line, String text) {
    return limit(criterion, bound, List.of(BAND), line, text);
  }

  static Limit limit(Criterion criterion, Bound bound, List<Band> scope, int line, String text) {
    Case any = Case.bare();
    return new Limit(
        criterion,
        bound,
        Optional.empty(),
        "",
        scope,
        List.of(any),
        List.of(port("input")),
        line,
        text);
  }

  static Limit withReference(Limit limit, OnePort reference, String text) {
    return new Limit(
        limit.criterion(),
        limit.bound(),
        Optional.of(reference),
        text,
        limit.scope(),
        limit.cases(),
        limit.ports(),
        limit.line(),
        limit.text());
  }

  static Worst worst(double hz, double value) {
    return new Worst(hz, OptionalDouble.of(value), OptionalDouble.empty(), BARE, LOADED);
  }

  static LimitJudgement kept(Limit limit, Worst worst) {
    return new LimitJudgement(
        limit,
        Verdict.KEPT,
        bare(limit, Verdict.KEPT),
        Method.SAMPLED,
        "no algebra of it",
        Optional.of(worst),
        List.of(),
        "");
  }

  static LimitJudgement broken(Limit limit, Worst worst, BrokenBand... bands) {
    return new LimitJudgement(
        limit,
        Verdict.BROKEN,
        bare(limit, Verdict.BROKEN),
        Method.SAMPLED,
        "no algebra of it",
        Optional.of(worst),
        List.of(bands),
        "");
  }

  private static Optional<Verdict> bare(Limit limit, Verdict verdict) {
    return limit.criterion().isAbsolute() ? Optional.of(verdict) : Optional.empty();
  }

  static CaseJudgement judged(Case one, Port port, LimitJudgement... limits) {
    return judged(one, port, List.of(), limits);
  }

  static CaseJudgement judged(Case one, Port port, List<Blame> blame, LimitJudgement... limits) {
    Verdict verdict = Verdict.KEPT;
    for (LimitJudgement limit : limits) {
      verdict = verdict.and(limit.verdict());
    }
    return new CaseJudgement(one, port, verdict, List.of(limits), blame);
  }

  static FileResult.Judged file(
      String name, String title, List<Port> ports, List<Load> loads, CaseJudgement... cases) {
    Network network =
        new Network(
            title,
            List.of(GROUND, TAP),
            List.of(),
            List.of(),
            ports,
            loads,
            List.of(),
            List.of(),
            Optional.of(new Sweep(false, Optional.of(BAND), 101, 13)));
    Verdict verdict = Verdict.KEPT;
    for (CaseJudgement one : cases) {
      verdict = verdict.and(one.verdict());
    }
    return new FileResult.Judged(
        new Source(new SourceText(name, ""), DIGEST),
        new NetworkJudgement(network, verdict, List.of(cases)),
        List.<Finding>of());
  }

  /** Two loads, alone and together; the change limit breaks where both are on. */
  static FileResult.Judged packTap() {
    Load converter = load("converter", 9);
    Load probe = load("probe", 10);
    Port port = port("input");
    Limit change = limit(Criterion.CHANGE, Bound.atMost(0.02), 14, "limit change 2 %");
    Limit window =
        limit(
            Criterion.MAGNITUDE,
            Bound.between(20e3, 26.25e3),
            List.of(new Band(10, 100)),
            15,
            "limit magnitude 20 kΩ to 26.25 kΩ from 10 Hz to 100 Hz");
    Worst over = worst(31622.7766, 0.0341234);
    CaseJudgement together =
        judged(
            new Case(Case.ALL, List.of(converter, probe), List.of(), 0),
            port,
            List.of(
                new Blame(converter, Verdict.BROKEN, Optional.of(worst(30500, 0.0213))),
                new Blame(probe, Verdict.KEPT, Optional.of(worst(29000, 0.0120456)))),
            broken(
                change,
                over,
                new BrokenBand(new Band(12345.678, 45600), over),
                new BrokenBand(new Band(250e3, 1e6), worst(1e6, 0.025))),
            broken(
                window,
                worst(10, 28726.789),
                new BrokenBand(new Band(10, 100), worst(10, 28726.789))));
    return file(
        "pack-tap.zin",
        "Pack-voltage tap into a monitor converter",
        List.of(port),
        List.of(converter, probe),
        judged(
            new Case("converter", List.of(converter), List.of(), 0),
            port,
            kept(change, worst(31622.7766, 0.0120456)),
            kept(window, worst(100, 25300.4))),
        judged(
            new Case("probe", List.of(probe), List.of(converter), 12),
            port,
            kept(change, worst(1e6, 0.0004567))),
        together);
  }
}
