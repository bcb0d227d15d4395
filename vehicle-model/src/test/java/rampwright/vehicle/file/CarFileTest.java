package rampwright.vehicle.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.Map;
import java.util.stream.Stream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.vehicle.Car;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

class CarFileTest {
  private static final FileSource SAMPLES =
      FileSource.classPath(CarFileTest.class.getClassLoader(), "rampwright/samples/");
  private static final String CAR = "cars/touring_car.yaml";

  private static Car sample() {
    return CarFile.read(SAMPLES, CAR);
  }

  @Test
  void theSampleCarIsRead() {
    Car car = sample();
    assertThat(car.chassis().mass()).isEqualTo(1180);
    assertThat(car.driveline().layout()).isEqualTo(DriveLayout.REAR);
    assertThat(car.driveline().gears()).isEqualTo(6);
    assertThat(car.driveline().engine().revLimit()).isCloseTo(890.12, within(0.01));
    assertThat(car.rearTyre().slipAngleAtPeak(2000)).isCloseTo(Math.toRadians(7), within(1e-12));
    assertThat(car.rearTyre().slipAtPeak(5000)).isCloseTo(0.115, within(1e-12));
  }

  @Test
  void aCarThatIsWrittenIsReadBackUnchanged() {
    String text = CarFile.write(sample());
    assertThat(CarFile.read(FileSource.texts(Map.of("c.yaml", text)), "c.yaml"))
        .isEqualTo(sample());
  }

  @Property
  @Tag("property")
  void everyNumberIsReadBackUnchanged(
      @ForAll @DoubleRange(min = 0.01, max = 1e6) @Scale(12) double shown) {
    Quantity angle = Quantity.degrees("a", "a", 0, 1e7, "");
    double si = shown * angle.siPerUnit();
    String text = Fields.shown(angle, si).toPlainString();
    double back = Double.parseDouble(text) * angle.siPerUnit();
    assertThat(back).isCloseTo(si, within(Math.ulp(si)));
  }

  static Stream<Arguments> faults() {
    return Stream.of(
        arguments(
            "cg_to_front_axle_m: 1.31 ",
            "cg_to_front_axle_m: 3.1 ",
            "c.yaml:4: chassis: The distance from front axle to centre of gravity (3.1 m) must be"
                + " less than the wheelbase of 2.68 m."),
        arguments(
            "wheelbase_m: 2.68",
            "wheelbase_m: 2680",
            "c.yaml:7: chassis.wheelbase_m: The wheelbase (2680 m) must be between 0.8 and 8 m."
                + " Maybe the value is in millimetres."),
        arguments(
            "layout: rear ",
            "layout: raer ",
            "c.yaml:26: driveline.layout: The layout (raer) must be one of: all, front, rear."
                + " Maybe you meant rear."),
        arguments(
            "[2.92, 2.16,",
            "[2.16, 2.92,",
            "c.yaml:27: driveline.gear_ratios: The ratio of gear 2 (2.92) must be below that of"
                + " the gear before it. Maybe list first gear first."),
        arguments(
            "[2500, 240]",
            "[1200, 240]",
            "c.yaml:33: driveline.engine.full_load_rpm_nm: The engine speed of torque point 2"
                + " (1200 rpm) must be above that of the point before it. Maybe sort the points by"
                + " speed."),
        arguments(
            "[2500, 240]",
            "[2500]",
            "c.yaml:35: driveline.engine.full_load_rpm_nm[2]: The torque point (1 values) must be"
                + " a pair of speed and torque. Maybe use [rpm, N·m]."),
        arguments(
            "[3000, -35]",
            "[3000, 35]",
            "c.yaml:31: driveline.engine: The overrun torque (35 N·m) must be not above 0. Maybe"
                + " the sign was left out."),
        arguments(
            "rear: ../tyres/dry_slick.yaml",
            "rear: ../tyres/wet.yaml",
            "c.yaml:54: tyres.rear: The file (../tyres/wet.yaml) must be a file that can be read."
                + " Maybe the path is wrong: it counts from the folder of the file that names"
                + " it."));
  }

  @ParameterizedTest
  @MethodSource("faults")
  void aFaultIsToldWithItsPlace(String right, String wrong, String message) {
    String text = SAMPLES.text(CAR, YamlReader.LARGEST);
    assertThat(text).contains(right);
    String tyre = SAMPLES.text("tyres/dry_slick.yaml", YamlReader.LARGEST);
    FileSource source =
        FileSource.texts(
            Map.of("c.yaml", text.replace(right, wrong), "../tyres/dry_slick.yaml", tyre));
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> CarFile.read(source, "c.yaml"))
        .withMessage(message);
  }

  @Test
  void aFaultInATyreFileIsToldAtItsPlaceThere() {
    String tyre = SAMPLES.text("tyres/dry_slick.yaml", YamlReader.LARGEST).replace("5000", "1000");
    FileSource source =
        FileSource.texts(
            Map.of(
                "a/c.yaml", SAMPLES.text(CAR, YamlReader.LARGEST), "tyres/dry_slick.yaml", tyre));
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> CarFile.read(source, "a/c.yaml"))
        .withMessageStartingWith("tyres/dry_slick.yaml:15: heavy: The second tyre load (1000 N)");
  }
}
