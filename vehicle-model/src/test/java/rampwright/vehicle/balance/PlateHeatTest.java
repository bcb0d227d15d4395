package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import rampwright.vehicle.balance.PlateHeat.LapHeat;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.Lap;

class PlateHeatTest {
  private static final double AREA = 0.053;
  private static Lap lap;

  @BeforeAll
  static void solve() {
    lap = SampleLaps.slow(new PlateDifferential(60, 0.4, 0.3));
  }

  private static PlateHeat stint(PlateCooling cooling, int laps) {
    return PlateHeat.of(lap, UnitPosition.REAR, cooling, AREA, laps, 25);
  }

  @Test
  void energyAndPeakPowerAreThoseOfTheReport() {
    PlateHeat heat = stint(PlateCooling.TYPICAL, 1);
    LapReport report = LapAnalysis.report(lap);
    assertThat(heat.energy()).isCloseTo(report.plateEnergy(), within(1e-6));
    assertThat(heat.peakPower()).isCloseTo(report.peakPlatePower(), within(1e-6));
  }

  /** First law: what slides into the plates is stored or goes to the air. */
  @Test
  void withoutCoolingTheWholeLapsEnergyIsStored() {
    PlateCooling cooling = new PlateCooling(1.6, 460, 60, 5000, 1e-6, 25);
    PlateTemperature end = stint(cooling, 1).laps().get(0).end();
    double stored =
        cooling.plateCapacity() * (end.plates() - 25) + cooling.oilCapacity() * (end.oil() - 25);
    assertThat(stored).isCloseTo(stint(cooling, 1).energy(), within(1.0));
  }

  @Test
  void aLongStintSettles() {
    PlateHeat heat = stint(PlateCooling.TYPICAL, 100);
    LapHeat last = heat.laps().get(99);
    assertThat(last.hottestPlates()).isCloseTo(heat.settled().hottestPlates(), within(1e-6));
    assertThat(last.meanPlates()).isCloseTo(heat.settled().meanPlates(), within(1e-6));
    assertThat(last.hottestAt()).isEqualTo(heat.settled().hottestAt());
    // settled, the mean flow to the air is the mean power
    double mean = 25 + heat.energy() / lap.time() * (1 / 15.0 + 1 / 60.0);
    assertThat(heat.settled().meanPlates()).isCloseTo(mean, within(0.01));
  }

  @Test
  void temperatureRisesFromLapToLapAndPeaksAboveItsMean() {
    List<LapHeat> laps = stint(PlateCooling.TYPICAL, 10).laps();
    for (int k = 1; k < laps.size(); k++) {
      assertThat(laps.get(k).meanPlates()).isGreaterThan(laps.get(k - 1).meanPlates());
    }
    assertThat(laps).allMatch(l -> l.hottestPlates() > l.meanPlates());
    assertThat(laps).allMatch(l -> l.hottestAt() >= 0 && l.hottestAt() <= lap.road().length());
  }

  @Test
  void wearIsTheFrictionWorkPerAreaOverAHundredKilometres() {
    PlateHeat heat = stint(PlateCooling.TYPICAL, 1);
    double lapsDriven = 100e3 / 2300;
    assertThat(heat.wearPerArea()).isCloseTo(lapsDriven * heat.energy() / AREA, within(1e-3));
  }

  @Test
  void aUnitThatIsNotThereStaysCold() {
    PlateHeat heat = PlateHeat.of(lap, UnitPosition.CENTRE, PlateCooling.TYPICAL, AREA, 3, 25);
    assertThat(heat.energy()).isZero();
    assertThat(heat.settled().hottestPlates()).isCloseTo(25, within(1e-9));
  }

  @Test
  void areaAndLapsAreChecked() {
    assertThatThrownBy(() -> PlateHeat.of(lap, UnitPosition.REAR, PlateCooling.TYPICAL, 0, 1, 25))
        .isInstanceOf(InvalidInput.class)
        .hasMessageContaining("friction area (0 mm²)");
    assertThatThrownBy(() -> stint(PlateCooling.TYPICAL, 0))
        .isInstanceOf(InvalidInput.class)
        .hasMessageContaining("laps of a stint (0)");
  }

  /** Neale, The Tribology Handbook, table 7.4: 2.3 W/mm² on one face of 100 by 75 mm. */
  @Test
  @Tag("validation")
  void sinteredMetalInOilBearsEightKilowattOnOneFace() {
    double face = Math.PI / 4 * (0.100 * 0.100 - 0.075 * 0.075);
    assertThat(face * 1e6).isCloseTo(3436.1, within(0.05));
    assertThat(FrictionMaterial.SINTERED_IN_OIL.powerLimit(face)).isCloseTo(7903, within(0.5));
  }

  @ParameterizedTest
  @EnumSource(FrictionMaterial.class)
  void rangesOfTheTableAreInOrder(FrictionMaterial m) {
    assertThat(m.leastFriction()).isPositive().isLessThanOrEqualTo(m.mostFriction());
    assertThat(m.leastPressure()).isGreaterThan(1e5).isLessThan(m.mostPressure());
    assertThat(m.leastRating()).isGreaterThanOrEqualTo(3e5).isLessThanOrEqualTo(m.mostRating());
    boolean none = Double.isNaN(m.highestTemperature());
    assertThat(none || m.continuousTemperature() < m.highestTemperature()).isTrue();
    assertThat(Arrays.stream(FrictionMaterial.values()).filter(o -> o.label().equals(m.label())))
        .hasSize(1);
  }
}
