package loadmark.study;

import java.util.List;
import java.util.Optional;
import loadmark.diagnostic.Finding;
import loadmark.judge.NetworkJudgement;

/** What came of checking one file. */
public sealed interface FileResult {

  /** The path as the user gave it, or {@code -}. */
  String file();

  /** The digest of the file's bytes; empty where it could not be read. */
  Optional<String> sha256();

  /** Sorted by place. */
  List<Finding> findings();

  Outcome outcome();

  /** The file was judged; its findings are warnings. */
  record Judged(Source source, NetworkJudgement judgement, List<Finding> findings)
      implements FileResult {
    public Judged {
      findings = List.copyOf(findings);
    }

    @Override
    public String file() {
      return source.text().name();
    }

    @Override
    public Optional<String> sha256() {
      return Optional.of(source.sha256());
    }

    @Override
    public Outcome outcome() {
      return Outcome.of(judgement.verdict());
    }
  }

  /** At least one error kept the file from being judged. */
  record Invalid(String file, Optional<String> sha256, List<Finding> findings)
      implements FileResult {
    public Invalid {
      findings = List.copyOf(findings);
    }

    @Override
    public Outcome outcome() {
      return Outcome.INVALID;
    }
  }
}
