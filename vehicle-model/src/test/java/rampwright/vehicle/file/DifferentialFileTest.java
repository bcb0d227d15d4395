package rampwright.vehicle.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.vehicle.differential.BrakeLock;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.PlateFriction;
import rampwright.vehicle.differential.PreloadPath;
import rampwright.vehicle.differential.RefinedPlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.differential.TorqueSensingDifferential;
import rampwright.vehicle.differential.ViscousDifferential;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.input.InvalidInput;

class DifferentialFileTest {
  private static DifferentialSet read(String text, DriveLayout layout) {
    FileSource source = FileSource.texts(Map.of("d.yaml", text));
    return DifferentialFile.readSet(YamlReader.read(source, "d.yaml"), layout);
  }

  private static Differential rear(String law) {
    return read("rear: " + law + "\n", DriveLayout.REAR).rear();
  }

  static Stream<Arguments> laws() {
    PlateDifferential plate = new PlateDifferential(50, 0.3, 0.1);
    return Stream.of(
        arguments("open", OpenDifferential.IDEAL),
        arguments("spool", new Spool()),
        arguments("{kind: spool}", new Spool()),
        arguments("{kind: open, friction_share: 0.05}", new OpenDifferential(0.05)),
        arguments("{kind: plate, preload_nm: 50, drive_share: 0.3, coast_share: 0.1}", plate),
        arguments(
            "{kind: plate, preload_nm: 50, drive_share: 0.3, coast_share: 0.1,"
                + " preload_path: series, side_gear_share: 0.04, sliding_ratio: 0.8,"
                + " sliding_speed_radps: 3, plate_temperature_c: 120, friction_fade_1pk: 0.001}",
            new RefinedPlateDifferential(
                plate, 0.04, PreloadPath.SERIES, new PlateFriction(0.8, 3, 120, 80, 0.001))),
        arguments(
            "{kind: viscous, coefficient_nmsprad: 10.47}", ViscousDifferential.newtonian(10.47)),
        arguments(
            "{kind: viscous, coefficient_nmsprad: 60, thinning_speed_radps: 4,"
                + " thinning_exponent: 0.5}",
            new ViscousDifferential(60, 4, 0.5)),
        arguments(
            "{kind: torque_sensing, preload_nm: 12, drive_bias_ratio: 2.6, coast_bias_ratio: 1.8}",
            new TorqueSensingDifferential(12, 2.6, 1.8)),
        arguments(
            "{kind: brake_lock, slip_threshold: 0.04, gain_nm: 9000, brake_limit_nm: 800}",
            new BrakeLock(0.04, 9000, 800)));
  }

  @ParameterizedTest
  @MethodSource("laws")
  void aLawIsReadAndReadBackUnchanged(String text, Differential law) {
    assertThat(rear(text)).isEqualTo(law);
    Map<String, Object> written =
        DifferentialFile.writeSet(DifferentialSet.rear(law), DriveLayout.REAR);
    assertThat(read(YamlText.write(written), DriveLayout.REAR).rear()).isEqualTo(law);
  }

  @Test
  void aViscousUnitMayBeGivenByItsPlatesAndOil() {
    ViscousDifferential law =
        (ViscousDifferential)
            rear(
                "{kind: viscous_plates, plate_outer_radius_mm: 150, plate_inner_radius_mm: 0,"
                    + " gap_mm: 3, gaps: 1, arrangement: output_to_output, viscosity_25c_pas: 0.38,"
                    + " temperature_c: 25}");
    // the worked example of ViscousPlatesTest, twice because the whole difference counts
    assertThat(law.viscousTorque(52 * Math.PI / 30)).isCloseTo(2 * 0.5485, within(0.01));
  }

  @Test
  void aTorqueSensingUnitMayBeGivenByItsWorm() {
    Differential law =
        rear("{kind: worm_gear, lead_angle_deg: 35, pressure_angle_deg: 20, gear_friction: 0.12}");
    assertThat(law).isInstanceOf(TorqueSensingDifferential.class);
    assertThat(
            rear("{kind: worm_gear, lead_angle_deg: 5, pressure_angle_deg: 20, gear_friction: .1}"))
        .isEqualTo(new Spool());
  }

  @Test
  void eachPositionOfAFourWheelDriveCarHasItsOwnLaw() {
    DifferentialSet set =
        read(
            "front: open\ncentre: {kind: viscous, coefficient_nmsprad: 40}\nrear: spool\n",
            DriveLayout.ALL);
    assertThat(set.front()).isEqualTo(OpenDifferential.IDEAL);
    assertThat(set.centre()).isEqualTo(ViscousDifferential.newtonian(40));
    assertThat(set.rear()).isEqualTo(new Spool());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "{kind: viscos} | d.yaml:1: rear.kind: The kind (viscos) must be one of:",
        "{kind: viscous, coefficient_nm: 3} | d.yaml:1: rear: The key (coefficient_nm) must be one",
        "{kind: viscous} | d.yaml:1: rear: The viscous coefficient (whole torque difference)",
        "{kind: torque_sensing, drive_bias_ratio: 0.4, coast_bias_ratio: 2} | d.yaml:1:"
            + " rear.drive_bias_ratio: The torque bias ratio on power (0.4) must be between 1 and"
            + " 100.",
        "{kind: brake_lock, slip_threshold: 4, gain_nm: 1, brake_limit_nm: 1} | d.yaml:1:"
            + " rear.slip_threshold: The slip difference at first braking (4) must be between 0"
            + " and 1. Maybe it was given in percent."
      })
  void aFaultIsToldWithItsPlace(String law, String message) {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> rear(law))
        .withMessageStartingWith(message);
  }
}
