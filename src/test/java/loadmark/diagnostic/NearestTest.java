package loadmark.diagnostic;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearestTest {

  /** Counted by hand. "ca" to "abc" is 3 where no letter may be touched twice (Boytsov 2011). */
  @ParameterizedTest
  @CsvSource({"ab,ab,0", "ab,ba,1", "ab,a,1", "ab,abc,1", "ab,ax,1", "ca,abc,3", "'',abc,3"})
  void distanceCountsSlips(String a, String b, int slips) {
    assertThat(Nearest.distance(a, b)).isEqualTo(slips);
    assertThat(Nearest.distance(b, a)).isEqualTo(slips);
  }

  @Test
  void nearestIsTheOneWithTheFewestSlips() {
    assertThat(Nearest.find("uper", List.of("lower", "upper", "hold"))).contains("upper");
    assertThat(Nearest.find("form", List.of("for", "from"))).contains("from");
    assertThat(Nearest.find("UPPER", List.of("upper"))).contains("upper");
  }

  @Test
  void farWordsAreNotOffered() {
    assertThat(Nearest.find("x", List.of("a", "b"))).isEmpty();
    assertThat(Nearest.find("tap", List.of("ground"))).isEmpty();
    assertThat(Nearest.find("a".repeat(100_000), List.of("a"))).isEmpty();
  }
}
