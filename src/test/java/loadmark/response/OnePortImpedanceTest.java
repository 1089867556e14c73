package loadmark.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import loadmark.network.OnePort;
import org.junit.jupiter.api.Test;

class OnePortImpedanceTest {

  /** 50 Ω ∥ (50 µH + 5 Ω); magnitude and phase at 150 kHz: CISPR 16-1-2, V-network tables. */
  @Test
  void artificialMainsNetwork() {
    OnePort network =
        Circuit.parallel(Circuit.r(50), Circuit.series(Circuit.l(50e-6), Circuit.r(5)));
    Ohms z = OnePortImpedance.at(network, 150e3);
    assertThat(z.magnitude()).isCloseTo(32.72, within(0.01));
    assertThat(z.phaseDegrees()).isCloseTo(43.35, within(0.01));
  }

  @Test
  void openAndZeroAtDc() {
    OnePort blocked = Circuit.series(Circuit.r(5), Circuit.c(1e-6));
    assertThat(OnePortImpedance.at(blocked, 0).isOpen()).isTrue();
    OnePort bypassed = Circuit.parallel(Circuit.r(5), Circuit.l(1e-6));
    assertThat(OnePortImpedance.at(bypassed, 0).isZero()).isTrue();
    OnePort both = Circuit.parallel(blocked, Circuit.r(7));
    assertThat(OnePortImpedance.at(both, 0).re()).isCloseTo(7, within(1e-15));
    assertThat(OnePortImpedance.at(Circuit.series(bypassed, blocked), 0).isOpen()).isTrue();
  }

  @Test
  void overflowIsUndetermined() {
    OnePort huge = Circuit.series(Circuit.r(1e308), Circuit.r(1e308));
    assertThat(OnePortImpedance.at(huge, 50).isUndetermined()).isTrue();
  }
}
