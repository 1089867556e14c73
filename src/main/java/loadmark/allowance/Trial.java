package loadmark.allowance;

import java.util.List;
import java.util.Optional;
import loadmark.judge.Judge;
import loadmark.judge.LimitJudgement;
import loadmark.judge.Verdict;
import loadmark.network.Case;
import loadmark.network.Limit;
import loadmark.network.Load;
import loadmark.network.Network;
import loadmark.network.OnePort;
import loadmark.network.Port;
import loadmark.response.Responses;

/** Hangs a load's place with other loads and has them judged as the file's own would be. */
final class Trial {
  private final PlaceNetwork variants;
  private final Port port;
  private final Case within;
  private final Load load;
  private final List<Limit> limits;

  /**
   * @param limits those that hold for the case at the port
   */
  Trial(Network network, Port port, Case within, Load load, List<Limit> limits) {
    this.variants = new PlaceNetwork(network, load);
    this.port = port;
    this.within = within;
    this.load = load;
    this.limits = List.copyOf(limits);
  }

  /** One judgement a limit, in order, with {@code value} at the place, or nothing. */
  List<LimitJudgement> judge(Optional<OnePort> value) {
    if (limits.isEmpty()) {
      return List.of();
    }
    Load hung = value.map(variants::with).orElse(load);
    List<Load> on = variants.replaced(within.loads(), value.map(v -> hung));
    Case tried = new Case(within.name(), on, within.against(), within.line());
    List<Limit> same = limits.stream().map(l -> of(l, tried)).toList();
    Network network = variants.with(hung, tried, same);
    return Judge.judge(network, p -> Responses.of(network, p)).cases().get(0).limits();
  }

  private Limit of(Limit limit, Case tried) {
    return new Limit(
        limit.criterion(),
        limit.bound(),
        limit.reference(),
        limit.referenceText(),
        limit.scope(),
        List.of(tried),
        List.of(port),
        limit.line(),
        limit.text());
  }

  /** The limit that the judgement at {@code index} is of, as the network has it. */
  Limit limit(int index) {
    return limits.get(index);
  }

  /** The first limit of some judgements that is broken, as the network has it. */
  Optional<Limit> findBroken(List<LimitJudgement> judged) {
    for (int i = 0; i < judged.size(); i++) {
      if (judged.get(i).verdict() == Verdict.BROKEN) {
        return Optional.of(limits.get(i));
      }
    }
    return Optional.empty();
  }
}
