package loadmark.judge;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.stream.Stream;
import loadmark.network.Case;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.Port;
import loadmark.response.PortResponse;

/** Judges a network: every case at every port for which some limit holds. */
public final class Judge {
  private Judge() {}

  /**
   * Ports in the network's order, at each port the cases in theirs. Cases are judged side by side;
   * the result does not depend on it.
   *
   * @param responses called once for each port at which some limit holds
   */
  public static NetworkJudgement judge(Network network, Function<Port, PortResponse> responses) {
    List<CaseJudgement> cases =
        network.ports().stream()
            .filter(port -> network.cases().stream().anyMatch(c -> isJudged(network, c, port)))
            .flatMap(port -> new PortJudge(network, port, responses.apply(port)).judge())
            .toList();
    Verdict verdict = worst(cases.stream().map(CaseJudgement::verdict));
    return new NetworkJudgement(network, verdict, cases);
  }

  private static boolean isJudged(Network network, Case one, Port port) {
    return network.limits().stream().anyMatch(l -> l.holdsFor(one, port));
  }

  private static Verdict worst(Stream<Verdict> verdicts) {
    return verdicts.reduce(Verdict.KEPT, Verdict::and);
  }

  /** One port. */
  private static final class PortJudge {
    private final Network network;
    private final Port port;
    private final PortResponse response;

    /** The absolute limits judged without any load; by identity, since limits compare deeply. */
    private final IdentityHashMap<Limit, LimitJudgement> bare = new IdentityHashMap<>();

    PortJudge(Network network, Port port, PortResponse response) {
      this.network = network;
      this.port = port;
      this.response = response;
      List<Limit> absolute =
          network.limits().stream()
              .filter(l -> l.criterion().isAbsolute() && l.ports().contains(port))
              .toList();
      limits(Case.bare(), absolute, l -> Optional.empty(), l -> false)
          .forEach(j -> bare.put(j.limit(), j));
    }

    Stream<CaseJudgement> judge() {
      List<Case> judged = network.cases().stream().filter(c -> isJudged(network, c, port)).toList();
      return judged.parallelStream().map(this::judge).toList().stream();
    }

    private CaseJudgement judge(Case one) {
      List<Limit> holding = network.limits().stream().filter(l -> l.holdsFor(one, port)).toList();
      List<LimitJudgement> limits = limits(one, holding, this::bareVerdict, l -> true);
      Verdict verdict = worst(limits.stream().map(LimitJudgement::verdict));
      List<Blame> blame =
          verdict == Verdict.BROKEN && one.loads().size() > 1 ? blame(one, limits) : List.of();
      return new CaseJudgement(one, port, verdict, limits, blame);
    }

    private Optional<Verdict> bareVerdict(Limit limit) {
      return Optional.ofNullable(bare.get(limit)).map(LimitJudgement::verdict);
    }

    private List<LimitJudgement> limits(
        Case one,
        List<Limit> limits,
        Function<Limit, Optional<Verdict>> bareVerdict,
        Predicate<Limit> raising) {
      return new LimitJudge(
              response.compare(one.loads(), one.against()),
              response.crossings(one.loads(), one.against()),
              limits)
          .judge(bareVerdict, raising);
    }

    /** The case with each of its loads taken off in turn, from its reference too. */
    private List<Blame> blame(Case one, List<LimitJudgement> broken) {
      List<Limit> same = broken.stream().map(LimitJudgement::limit).toList();
      int first = broken.stream().map(LimitJudgement::verdict).toList().indexOf(Verdict.BROKEN);
      List<Blame> blame = new ArrayList<>();
      for (Load load : one.loads()) {
        Case without =
            new Case(
                one.name(), allBut(load, one.loads()), allBut(load, one.against()), one.line());
        Limit shown = same.get(first);
        List<LimitJudgement> then = limits(without, same, this::bareVerdict, shown::equals);
        Verdict verdict = worst(then.stream().map(LimitJudgement::verdict));
        blame.add(new Blame(load, verdict, then.get(first).worst()));
      }
      return blame;
    }

    private static List<Load> allBut(Load load, List<Load> loads) {
      return loads.stream().filter(l -> !l.equals(load)).toList();
    }
  }
}
