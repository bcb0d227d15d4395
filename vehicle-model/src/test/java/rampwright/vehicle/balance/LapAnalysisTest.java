package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;

class LapAnalysisTest {
  private static Lap open;
  private static Lap plate;
  private static Lap locked;

  @BeforeAll
  static void solve() {
    open = SampleLaps.slow(OpenDifferential.IDEAL);
    plate = SampleLaps.slow(new PlateDifferential(40, 0.2, 0.1));
    locked = SampleLaps.fast(new Spool());
  }

  private static List<PhaseReport> phases(Lap lap) {
    return LapAnalysis.report(lap).corners().stream().flatMap(c -> c.phases().stream()).toList();
  }

  @Test
  void everyStationIsInExactlyOnePhase() {
    for (Lap lap : List.of(open, plate, locked)) {
      int n = lap.road().size();
      int[] visits = new int[n];
      int expected = -1;
      for (PhaseReport phase : phases(lap)) {
        assertThat(expected == -1 || phase.firstStation() == expected).isTrue();
        int i = phase.firstStation();
        do {
          visits[i]++;
          i = (i + 1) % n;
        } while (i != phase.endStation());
        expected = phase.endStation();
      }
      assertThat(Arrays.stream(visits).allMatch(v -> v == 1)).isTrue();
      assertThat(phases(lap).stream().mapToDouble(PhaseReport::length).sum())
          .isCloseTo(lap.road().length(), within(1e-9));
    }
  }

  @Test
  void phaseTimesAddUpToTheLapTime() {
    for (Lap lap : List.of(open, plate, locked)) {
      LapReport report = LapAnalysis.report(lap);
      assertThat(phases(lap).stream().mapToDouble(PhaseReport::time).sum())
          .isCloseTo(lap.time(), within(1e-9));
      assertThat(report.corners().stream().mapToDouble(CornerReport::time).sum())
          .isCloseTo(lap.time(), within(1e-9));
    }
  }

  @Test
  void cornersAreTheSameForEverySetting() {
    LapReport one = LapAnalysis.report(open);
    LapReport other = LapAnalysis.report(plate);
    assertThat(other.corners()).hasSameSizeAs(one.corners());
    for (int k = 0; k < one.corners().size(); k++) {
      assertThat(other.corners().get(k).left()).isEqualTo(one.corners().get(k).left());
      assertThat(other.corners().get(k).apexDistance())
          .isCloseTo(one.corners().get(k).apexDistance(), within(40.0));
    }
  }

  @Test
  void aHairpinAfterALongStraightHasAllPhasesInOrder() {
    CornerReport hairpin = LapAnalysis.report(open).corners().get(0);
    assertThat(hairpin.phases()).extracting(PhaseReport::phase).containsExactly(Phase.values());
    assertThat(hairpin.left()).isTrue();
    PhaseReport braking = hairpin.phases().get(0);
    assertThat(braking.meanAx()).isLessThan(-5);
    assertThat(braking.exitSpeed()).isLessThan(braking.entrySpeed());
    PhaseReport straight = hairpin.phases().get(4);
    assertThat(straight.exitSpeed()).isGreaterThan(straight.entrySpeed());
    assertThat(hairpin.fullThrottleDistance())
        .isCloseTo(straight.start() - hairpin.apexDistance(), within(1e-9));
  }

  @Test
  void meanAccelerationIsTheChangeOfSpeedOverTime() {
    for (PhaseReport p : phases(open)) {
      if (p.phase() == Phase.BRAKING && p.time() > 1) {
        double mean = (p.exitSpeed() - p.entrySpeed()) / p.time();
        assertThat(p.meanAx()).isCloseTo(mean, within(0.08 * Math.abs(mean)));
      }
    }
  }

  @Test
  void theOpenDifferentialHasNoTorqueDifferenceNoLockAndNoHeat() {
    LapReport report = LapAnalysis.report(open);
    // zero within the tolerance of the trims
    assertThat(report.plateEnergy()).isCloseTo(0, within(1e-3));
    assertThat(report.peakPlatePower()).isCloseTo(0, within(1e-3));
    assertThat(phases(open)).allMatch(p -> p.lockedShare() == 0);
    assertThat(phases(open)).allMatch(p -> Math.abs(p.meanTorqueDifference()) < 1e-3);
    assertThat(phases(open)).allMatch(p -> Math.abs(p.meanYawMoment()) < 1e-2);
  }

  @Test
  void theSpoolIsAlwaysLockedAndMakesNoHeat() {
    assertThat(phases(locked)).allMatch(p -> Math.abs(p.lockedShare() - 1) < 1e-12);
    assertThat(LapAnalysis.report(locked).plateEnergy()).isCloseTo(0, within(1.0));
  }

  @Test
  void thePlateUnitHeatsUpAndTurnsTheCarOutOnEntry() {
    LapReport report = LapAnalysis.report(plate);
    assertThat(report.plateEnergy()).isPositive();
    assertThat(phases(plate)).allMatch(p -> p.plateEnergy() >= 0 && p.peakPlatePower() >= 0);
    // coasting, the inner wheel is the slower one: torque to it turns the car out of the corner
    for (PhaseReport p : phases(plate)) {
      if (p.phase() == Phase.ENTRY && p.lockedShare() == 0) {
        assertThat(p.meanYawMoment()).isPositive();
      }
    }
  }

  @Test
  void tyreWorkIsPositiveOnBothAxles() {
    assertThat(phases(plate)).allMatch(p -> p.tyreWorkFront() > 0 && p.tyreWorkRear() > 0);
  }

  @Test
  void theWholeLapsExtremesAreThoseOfItsPhases() {
    LapReport report = LapAnalysis.report(plate);
    double top = Arrays.stream(plate.trace().column(Channel.SPEED)).max().orElseThrow();
    assertThat(report.topSpeed()).isEqualTo(top);
    double inner =
        phases(plate).stream()
            .filter(p -> p.phase() == Phase.EXIT)
            .mapToDouble(PhaseReport::peakInnerSlip)
            .max()
            .orElseThrow();
    assertThat(report.peakInnerSlip()).isEqualTo(inner);
  }
}
