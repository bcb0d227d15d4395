package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.balance.GapSplit.Part;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Segment;
import rampwright.vehicle.circuit.SegmentLine;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.Lap;

/** Runs from a start to a finish, with and without corners. */
class OpenRunTest {
  private static final PlateDifferential PLATE = new PlateDifferential(60, 0.3, 0.2);

  private static Circuit sprint() {
    return SegmentLine.open(
        "sprint",
        List.of(
            new Segment.Straight(150),
            Segment.Corner.degrees(30, 90, 20),
            new Segment.Straight(120),
            Segment.Corner.degrees(45, -60, 20),
            new Segment.Straight(100)),
        2);
  }

  private static List<PhaseReport> phases(LapReport report) {
    return report.corners().stream().flatMap(c -> c.phases().stream()).toList();
  }

  @Test
  void whatComesBeforeTheFirstCornerBelongsToIt() {
    Lap run = SampleLaps.lap(sprint(), PLATE, 2);
    LapReport report = LapAnalysis.report(run);
    assertThat(report.corners()).hasSize(2);
    CornerReport first = report.corners().get(0);
    assertThat(first.phases().get(0).phase()).isEqualTo(Phase.STRAIGHT);
    assertThat(first.phases().get(0).firstStation()).isZero();
    assertThat(first.left()).isTrue();
    assertThat(report.corners().get(1).left()).isFalse();
    double time = phases(report).stream().mapToDouble(PhaseReport::time).sum();
    assertThat(time).isCloseTo(run.time(), within(1e-9));
    double length = phases(report).stream().mapToDouble(PhaseReport::length).sum();
    assertThat(length).isCloseTo(run.road().length(), within(1e-9));
    PhaseReport last = phases(report).get(phases(report).size() - 1);
    assertThat(last.endStation()).isEqualTo(run.road().size());
  }

  @Test
  void aRunwayIsOneStraightWithoutACorner() {
    Circuit runway = SegmentLine.open("runway", List.of(new Segment.Straight(400)), 5);
    LapReport report = LapAnalysis.report(SampleLaps.lap(runway, PLATE, 5));
    assertThat(report.corners()).hasSize(1);
    assertThat(report.corners().get(0).number()).isZero();
    assertThat(phases(report)).extracting(PhaseReport::phase).containsExactly(Phase.STRAIGHT);
    assertThat(report.corners().get(0).time()).isCloseTo(report.lapTime(), within(1e-9));
    assertThat(report.peakSigmaEntry()).isNaN();
  }

  @Test
  void theGapOfTwoRunsAddsUp() {
    Lap open = SampleLaps.lap(sprint(), OpenDifferential.IDEAL, 2);
    Lap plate = SampleLaps.lap(sprint(), PLATE, 2);
    GapSplit split = GapSplit.between(open, plate);
    assertThat(split.parts().stream().mapToDouble(Part::seconds).sum())
        .isCloseTo(plate.time() - open.time(), within(1e-9));
  }

  @Test
  void aRunIsNoStint() {
    Lap run = SampleLaps.lap(sprint(), PLATE, 2);
    assertThatThrownBy(
            () -> PlateHeat.of(run, UnitPosition.REAR, PlateCooling.TYPICAL, 0.05, 3, 25))
        .isInstanceOf(InvalidInput.class)
        .hasMessageContaining("circuit of a stint (sprint) must be closed");
  }
}
