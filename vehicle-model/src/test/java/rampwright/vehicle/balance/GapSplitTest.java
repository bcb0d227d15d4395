package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.Car;
import rampwright.vehicle.Driver;
import rampwright.vehicle.balance.GapSplit.Cause;
import rampwright.vehicle.balance.GapSplit.Part;
import rampwright.vehicle.chassis.Aero;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapRequest;
import rampwright.vehicle.lap.LapSolver;

class GapSplitTest {
  private static final Differential PLATE = new PlateDifferential(40, 0.2, 0.1);
  private static Lap open;
  private static Lap plate;
  private static Lap slowOpen;
  private static Lap slowPlate;

  @BeforeAll
  static void solve() {
    open = SampleLaps.fast(OpenDifferential.IDEAL);
    plate = SampleLaps.fast(PLATE);
    slowOpen = SampleLaps.slow(OpenDifferential.IDEAL);
    slowPlate = SampleLaps.slow(PLATE);
  }

  private static double sum(GapSplit split) {
    return split.parts().stream().mapToDouble(Part::seconds).sum();
  }

  @Test
  void thePartsAddUpToTheDifferenceOfTheLapTimes() {
    for (Lap[] pair : new Lap[][] {{open, plate}, {plate, open}, {slowOpen, slowPlate}}) {
      GapSplit split = GapSplit.between(pair[0], pair[1]);
      assertThat(split.total()).isEqualTo(pair[1].time() - pair[0].time());
      assertThat(sum(split)).isCloseTo(split.total(), within(1e-9));
    }
  }

  @Test
  void aLapHasNoGapToItself() {
    GapSplit split = GapSplit.between(open, open);
    assertThat(split.parts()).isEmpty();
    assertThat(split.total()).isZero();
    assertThat(split.gap()).containsOnly(0.0);
  }

  @Test
  void swappingTheLapsTurnsTheSignOfEveryCause() {
    GapSplit there = GapSplit.between(open, plate);
    GapSplit back = GapSplit.between(plate, open);
    for (Cause cause : Cause.values()) {
      assertThat(back.seconds(cause)).isCloseTo(-there.seconds(cause), within(1e-3));
    }
  }

  @Test
  void theGapIsTheDifferenceOfTimesAtEachStation() {
    GapSplit split = GapSplit.between(open, plate);
    double[] gap = split.gap();
    assertThat(gap).hasSize(open.road().size());
    assertThat(gap[0]).isZero();
    int i = 400;
    assertThat(gap[i])
        .isEqualTo(plate.trace().get(Channel.TIME, i) - open.trace().get(Channel.TIME, i));
    gap[i] = 99;
    assertThat(split.gap()[i]).isNotEqualTo(99);
  }

  @Test
  void aSlowerGearChangeIsAllGearChanges() {
    Car car = SampleLaps.car();
    Driveline d = car.driveline();
    Driveline slow =
        new Driveline(
            d.engine(),
            d.gearRatios(),
            d.finalDrive(),
            d.efficiency(),
            0.2,
            d.layout(),
            d.frontTorqueShare());
    GapSplit split = GapSplit.between(open, lap(with(car, slow, car.aero()), Driver.QUICK));
    assertThat(split.total()).isGreaterThan(0.05);
    assertThat(split.seconds(Cause.GEAR_CHANGES))
        .isBetween(0.8 * split.total(), 1.2 * split.total());
    assertThat(Math.abs(split.seconds(Cause.CORNERING_SPEED))).isLessThan(0.1 * split.total());
    assertThat(Math.abs(split.seconds(Cause.TRACTION))).isLessThan(0.1 * split.total());
  }

  @Test
  void aDriverWhoIsMoreCarefulOnTheBrakesLosesByBraking() {
    Driver careful = new Driver(Driver.QUICK.powerGrowth(), 0);
    GapSplit split = GapSplit.between(open, lap(SampleLaps.car(), careful));
    assertThat(split.total()).isGreaterThan(0.05);
    assertThat(split.seconds(Cause.BRAKING)).isBetween(0.9 * split.total(), 1.1 * split.total());
  }

  @Test
  void moreDragIsOther() {
    Car car = SampleLaps.car();
    Aero aero = car.aero();
    Aero draggy =
        new Aero(1.1 * aero.dragArea(), aero.downforceAreaFront(), aero.downforceAreaRear());
    GapSplit split = GapSplit.between(open, lap(with(car, car.driveline(), draggy), Driver.QUICK));
    assertThat(split.total()).isGreaterThan(0.05);
    assertThat(split.seconds(Cause.OTHER)).isGreaterThan(0.6 * split.total());
  }

  @Test
  void moreLockGainsByTractionOutOfTheHairpins() {
    GapSplit split = GapSplit.between(slowOpen, slowPlate);
    assertThat(split.seconds(Cause.TRACTION)).isNegative();
    assertThat(split.parts()).allMatch(p -> p.corner() >= 1 && p.corner() <= 10);
  }

  @Test
  void lapsOfDifferentLinesAreNotCompared() {
    assertThatThrownBy(() -> GapSplit.between(open, slowOpen))
        .isInstanceOf(InvalidInput.class)
        .hasMessageContaining("Kestrelwick, 460 stations")
        .hasMessageContaining("on the same line as the reference (Velmoor, 800)");
  }

  private static Car with(Car car, Driveline driveline, Aero aero) {
    return new Car(
        car.name(),
        car.chassis(),
        aero,
        car.brakes(),
        driveline,
        car.frontTyre(),
        car.rearTyre(),
        car.frontRadius(),
        car.rearRadius());
  }

  private static Lap lap(Car car, Driver driver) {
    LapRequest like = open.request();
    return LapSolver.solve(
        new LapRequest(
            car,
            DifferentialSet.rear(OpenDifferential.IDEAL),
            like.conditions(),
            driver,
            like.form(),
            SampleCircuits.fast(),
            SampleLaps.SPACING));
  }
}
