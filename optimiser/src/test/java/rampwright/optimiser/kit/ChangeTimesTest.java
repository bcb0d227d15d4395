package rampwright.optimiser.kit;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import rampwright.optimiser.kit.PartsKit.ChangeTimes;

class ChangeTimesTest {
  private static final ChangeTimes TIMES = new ChangeTimes(1500, 3000, 3600);
  private static final KitSetting NOW = new KitSetting("45/60", false, 6, 80);

  @Test
  void nothingToChangeTakesNoTime() {
    assertThat(TIMES.between(NOW, new KitSetting("45/60", false, 6, 80))).isZero();
  }

  @Test
  void oneJobTakesItsTime() {
    assertThat(TIMES.between(NOW, new KitSetting("45/60", false, 6, 85))).isEqualTo(1500);
    assertThat(TIMES.between(NOW, new KitSetting("45/60", false, 8, 80))).isEqualTo(3000);
    assertThat(TIMES.between(NOW, new KitSetting("55/75", false, 6, 80))).isEqualTo(3600);
    assertThat(TIMES.between(NOW, new KitSetting("45/60", true, 6, 80))).isEqualTo(3600);
  }

  @Test
  void ofSeveralJobsTheLargestCounts() {
    assertThat(TIMES.between(NOW, new KitSetting("45/60", false, 8, 20))).isEqualTo(3000);
    assertThat(TIMES.between(NOW, new KitSetting("55/75", true, 2, 20))).isEqualTo(3600);
  }

  @Test
  void theWayBackTakesAsLong() {
    KitSetting other = new KitSetting("55/75", false, 8, 80);
    assertThat(TIMES.between(other, NOW)).isEqualTo(TIMES.between(NOW, other));
  }
}
