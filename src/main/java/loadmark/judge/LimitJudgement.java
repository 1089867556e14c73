package loadmark.judge;

import java.util.List;
import java.util.Optional;
import loadmark.network.Limit;

/**
 * One limit, judged for one case at one port.
 *
 * @param bareVerdict for an absolute limit: the verdict without the case's loads
 * @param methodReason where sampled: why a breach could have been missed, in a few words for people
 *     that follow "because"; else empty
 * @param worst the worst point; empty where nothing could be determined
 * @param bands every stretch where it is broken, in order
 * @param undetermined why, in a few words for people, where something could not be determined; else
 *     empty
 */
public record LimitJudgement(
    Limit limit,
    Verdict verdict,
    Optional<Verdict> bareVerdict,
    Method method,
    String methodReason,
    Optional<Worst> worst,
    List<BrokenBand> bands,
    String undetermined) {

  public LimitJudgement {
    bands = List.copyOf(bands);
  }

  /** How the bands were found. */
  public enum Method {
    COMPLETE("complete"),
    SAMPLED("sampled");

    private final String word;

    Method(String word) {
      this.word = word;
    }

    public String word() {
      return word;
    }
  }
}
