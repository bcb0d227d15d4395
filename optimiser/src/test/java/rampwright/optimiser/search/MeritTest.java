package rampwright.optimiser.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

class MeritTest {
  /** The three rules of K. Deb 2000. */
  @Test
  @Tag("validation")
  void theFeasibilityRulesHold() {
    Merit slowButAllowed = new Merit(0, 100);
    Merit fast = new Merit(0, 90);
    Merit fasterButForbidden = new Merit(0.1, 80);
    Merit fastestAndWorse = new Merit(0.2, 70);
    assertThat(slowButAllowed).isLessThan(fasterButForbidden);
    assertThat(fast).isLessThan(slowButAllowed);
    assertThat(fasterButForbidden).isLessThan(fastestAndWorse);
    assertThat(fastestAndWorse).isLessThan(Merit.WORST);
  }

  @Test
  void whatHasNoOrderIsRefused() {
    assertThatIllegalArgumentException().isThrownBy(() -> new Merit(Double.NaN, 1));
    assertThatIllegalArgumentException().isThrownBy(() -> new Merit(-1, 1));
    assertThatIllegalArgumentException().isThrownBy(() -> new Merit(0, Double.NaN));
  }
}
