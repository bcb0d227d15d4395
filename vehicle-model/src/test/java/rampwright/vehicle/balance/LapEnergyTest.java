package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.Car;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.ViscousDifferential;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;

/**
 * First law over a lap: what the engine brings to the case goes to drag, into tyres, plates and
 * brakes and into the motion of the car. Flat roads without wind.
 */
@Tag("property")
class LapEnergyTest {
  private static List<Lap> laps;

  @BeforeAll
  static void solve() {
    Differential open = OpenDifferential.IDEAL;
    Differential plate = new PlateDifferential(60, 0.4, 0.3);
    laps =
        List.of(
            SampleLaps.lap(SampleCircuits.slow(), open, 2),
            SampleLaps.lap(SampleCircuits.slow(), plate, 2),
            SampleLaps.lap(SampleCircuits.fast(), plate, 2),
            SampleLaps.of("front_drive_saloon", new DifferentialSet(plate, open, open)),
            SampleLaps.of(
                "all_wheel_drive_rally",
                new DifferentialSet(plate, new ViscousDifferential(10, 5, 1), plate)));
  }

  private static double get(Lap lap, Channel channel, int i) {
    return lap.trace().get(channel, i);
  }

  private static double engine(Lap lap, int i) {
    Driveline driveline = lap.request().car().driveline();
    double front =
        switch (driveline.layout()) {
          case REAR -> 0;
          case FRONT -> 1;
          case ALL -> driveline.frontTorqueShare();
        };
    double caseSpeed = front * frontSpeed(lap, i) + (1 - front) * rearSpeed(lap, i);
    return get(lap, Channel.CAGE_TORQUE, i) * caseSpeed;
  }

  private static double frontSpeed(Lap lap, int i) {
    return (get(lap, Channel.WHEEL_SPEED_FL, i) + get(lap, Channel.WHEEL_SPEED_FR, i)) / 2;
  }

  private static double rearSpeed(Lap lap, int i) {
    return (get(lap, Channel.WHEEL_SPEED_RL, i) + get(lap, Channel.WHEEL_SPEED_RR, i)) / 2;
  }

  private static double brakes(Lap lap, int i) {
    double share = lap.request().car().brakes().frontShare();
    return get(lap, Channel.BRAKE_TORQUE, i)
        * (share * frontSpeed(lap, i) + (1 - share) * rearSpeed(lap, i));
  }

  private static double drag(Lap lap, int i) {
    double v = get(lap, Channel.SPEED, i);
    double area = lap.request().car().aero().dragArea();
    return 0.5 * lap.request().conditions().airDensity() * area * v * v * v;
  }

  /** Power into the motion: {@code m v ax + Izz r dr/dt}. */
  private static double motion(Lap lap, int i) {
    Car car = lap.request().car();
    double v = get(lap, Channel.SPEED, i);
    double ax = get(lap, Channel.AX, i);
    double curvature = get(lap, Channel.CURVATURE, i);
    double yaw = v * curvature * (v * v * get(lap, Channel.CURVATURE_GRADIENT, i) + curvature * ax);
    return car.chassis().mass() * v * ax + car.chassis().yawInertia() * yaw;
  }

  /** Within the tolerance of the trims: some watts of the engine's 250 kW. */
  @Test
  void powerBalancesAtEveryStation() {
    for (Lap lap : laps) {
      LapPower power = new LapPower(lap);
      for (int i = 0; i < lap.road().size(); i++) {
        double lost = power.frontTyres(i) + power.rearTyres(i) + power.plates(i) + brakes(lap, i);
        assertThat(engine(lap, i) - lost - drag(lap, i) - motion(lap, i))
            .as("station %d", i)
            .isCloseTo(0, within(10.0));
      }
    }
  }

  @Test
  void nothingThatDissipatesEverGivesPowerBack() {
    for (Lap lap : laps) {
      LapPower power = new LapPower(lap);
      for (int i = 0; i < lap.road().size(); i++) {
        assertThat(power.plates(i)).isNotNegative();
        assertThat(power.frontTyres(i)).isNotNegative();
        assertThat(power.rearTyres(i)).isNotNegative();
        assertThat(brakes(lap, i)).isNotNegative();
        assertThat(drag(lap, i)).isPositive();
      }
    }
  }

  /**
   * On a closed lap the car ends as fast as it starts. The tolerance is that of 1 m stations in
   * hairpins of 12 m radius, where the acceleration changes by 8 m/s² from station to station; what
   * is dissipated is checked far more closely at each station above.
   */
  @Test
  void overALapTheEnginesWorkIsAllLost() {
    for (Lap lap : laps) {
      LapPower power = new LapPower(lap);
      double work = power.lapEnergy(i -> engine(lap, i));
      double lost =
          power.lapEnergy(i -> brakes(lap, i))
              + power.lapEnergy(i -> drag(lap, i))
              + power.lapEnergy(power::plates)
              + power.lapEnergy(power::frontTyres)
              + power.lapEnergy(power::rearTyres);
      assertThat(lost).isCloseTo(work, within(0.01 * work));
    }
  }
}
