package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.Lap;

class NearLimitsTest {
  private static Lap lap;

  @BeforeAll
  static void solve() {
    lap = SampleLaps.fast(new PlateDifferential(40, 0.2, 0.1));
  }

  @Test
  void atTheLimitItIsTheLapsOwnTrim() {
    List<NearLimit> points = NearLimits.of(lap, 1);
    long same =
        points.stream()
            .filter(p -> Math.abs(p.understeer() - p.limitUndersteer()) < Math.toRadians(0.01))
            .count();
    // where a corner is left or entered the lap may have crossed a dip that this trim does not
    assertThat(same).isGreaterThanOrEqualTo((long) (0.9 * points.size()));
  }

  @Test
  void fivePercentBelowTheLimitNoSlideGrowsFaster() {
    List<NearLimit> points = NearLimits.of(lap, NearLimits.USUAL_SHARE);
    assertThat(points).isNotEmpty().noneMatch(p -> Double.isNaN(p.growth()));
    assertThat(points).allMatch(p -> p.growth() < p.limitGrowth() + 0.01);
    double limit = points.stream().mapToDouble(NearLimit::limitGrowth).sum();
    double below = points.stream().mapToDouble(NearLimit::growth).sum();
    assertThat(below).isLessThan(limit - 0.5 * points.size());
  }

  @Test
  void thePointsAreThoseOfTheReport() {
    List<NearLimit> points = NearLimits.of(lap, 0.9);
    List<PhaseReport> phases =
        LapAnalysis.report(lap).corners().stream()
            .flatMap(c -> c.phases().stream())
            .filter(p -> p.phase() != Phase.STRAIGHT)
            .toList();
    assertThat(points).hasSameSizeAs(phases);
    for (int k = 0; k < points.size(); k++) {
      assertThat(points.get(k).phase()).isEqualTo(phases.get(k).phase());
      assertThat(points.get(k).limitGrowth()).isEqualTo(phases.get(k).peakSigma());
      assertThat(points.get(k).distance())
          .isCloseTo(phases.get(k).peakSigmaDistance(), within(1e-9));
    }
  }

  @Test
  void theShareIsChecked() {
    assertThatThrownBy(() -> NearLimits.of(lap, 95))
        .isInstanceOf(InvalidInput.class)
        .hasMessageContaining("share of the limit (95) must be between 0.05 and 1")
        .hasMessageContaining("percent");
  }
}
