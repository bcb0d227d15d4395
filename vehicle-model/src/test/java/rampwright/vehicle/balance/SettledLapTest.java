package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.PlateFriction;
import rampwright.vehicle.differential.PreloadPath;
import rampwright.vehicle.differential.RefinedPlateDifferential;
import rampwright.vehicle.lap.LapRequest;
import rampwright.vehicle.lap.LimitForm;

class SettledLapTest {
  private static final PlateDifferential PLAIN = new PlateDifferential(40, 0.2, 0.1);
  private static final PlateCooling POOR = new PlateCooling(1.6, 460, 20, 5000, 1, 25);
  private static final double AREA = 0.053;

  private static Differential fading(double perDegree) {
    return new RefinedPlateDifferential(
        PLAIN, 0, PreloadPath.PARALLEL, new PlateFriction(1, 1, 25, 25, perDegree));
  }

  private static SettledLap settled(Differential rear) {
    return SettledLap.of(
        new LapRequest(
            SampleLaps.car(),
            DifferentialSet.rear(rear),
            Conditions.STANDARD,
            Driver.QUICK,
            LimitForm.DRIVER,
            SampleCircuits.fast(),
            SampleLaps.SPACING),
        UnitPosition.REAR,
        POOR,
        AREA);
  }

  @Test
  void withoutFadeTheLapIsTheColdOne() {
    SettledLap found = settled(PLAIN);
    assertThat(found.lap().time()).isEqualTo(SampleLaps.fast(PLAIN).time());
    assertThat(found.temperature()).isCloseTo(found.heat().settled().meanPlates(), within(1e-9));
    double power = found.heat().energy() / found.lap().time();
    assertThat(found.temperature()).isCloseTo(25 + power * (1 + 1 / 20.0), within(0.1));
  }

  @Test
  void theFadingUnitRunsAtTheTemperatureThatItsLapGives() {
    SettledLap found = settled(fading(0.002));
    assertThat(found.change()).isCloseTo(0, within(SettledLap.TOLERANCE));
    RefinedPlateDifferential law =
        (RefinedPlateDifferential) found.lap().request().differentials().rear();
    double factor = 1 - 0.002 * (found.temperature() - 25);
    assertThat(law.capacity(300)).isCloseTo(factor * PLAIN.capacity(300), within(1e-9));
    assertThat(factor).isBetween(0.5, 0.95);
    double time = found.lap().time();
    // between the lap of the cold unit and that without any lock
    assertThat(time).isBetween(SampleLaps.fast(PLAIN).time(), SampleLaps.fast(open()).time());
  }

  private static Differential open() {
    return OpenDifferential.IDEAL;
  }

  @Test
  void aPositionNamesItsUnit() {
    DifferentialSet set = DifferentialSet.rear(PLAIN);
    assertThat(UnitPosition.REAR.of(set)).isEqualTo(PLAIN);
    DifferentialSet front = UnitPosition.FRONT.with(set, PLAIN);
    assertThat(UnitPosition.FRONT.of(front)).isEqualTo(PLAIN);
    assertThat(UnitPosition.CENTRE.of(UnitPosition.CENTRE.with(set, PLAIN))).isEqualTo(PLAIN);
    assertThat(UnitPosition.CENTRE.of(front)).isEqualTo(OpenDifferential.IDEAL);
  }
}
