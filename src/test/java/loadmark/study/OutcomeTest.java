package loadmark.study;

import static loadmark.study.Outcome.BROKEN;
import static loadmark.study.Outcome.INVALID;
import static loadmark.study.Outcome.KEPT;
import static loadmark.study.Outcome.UNDETERMINED;
import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class OutcomeTest {
  @Test
  void invalidOutweighsBrokenOutweighsUndeterminedOutweighsKept() {
    assertThat(INVALID.and(BROKEN)).isEqualTo(INVALID);
    assertThat(UNDETERMINED.and(BROKEN)).isEqualTo(BROKEN);
    assertThat(KEPT.and(UNDETERMINED)).isEqualTo(UNDETERMINED);
    assertThat(KEPT.and(KEPT)).isEqualTo(KEPT);
  }

  @Test
  void statusesAreThePublishedOnes() {
    assertThat(KEPT.status()).isZero();
    assertThat(BROKEN.status()).isEqualTo(1);
    assertThat(UNDETERMINED.status()).isEqualTo(2);
    assertThat(INVALID.status()).isEqualTo(2);
  }
}
