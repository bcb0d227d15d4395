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
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.vehicle.Car;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.tyre.MagicFormulaTyre;
import rampwright.vehicle.tyre.MagicLateral;
import rampwright.vehicle.tyre.Tyre;
import rampwright.vehicle.tyre.TyreForces;

class TyreFileTest {
  private static final FileSource SAMPLES =
      FileSource.classPath(TyreFileTest.class.getClassLoader(), "rampwright/samples/");
  private static final String MAGIC = "tyres/road_radial.yaml";

  private static MagicFormulaTyre sample() {
    return (MagicFormulaTyre) TyreFile.read(SAMPLES, MAGIC);
  }

  @Test
  void theSampleMagicFormulaTyreIsReadWithoutItsShifts() {
    MagicFormulaTyre tyre = sample();
    assertThat(tyre.nominalLoad()).isEqualTo(4000);
    assertThat(tyre.lateral().pKy1()).isEqualTo(-17.5);
    assertThat(tyre.lateral().pKy4()).isEqualTo(2);
    assertThat(tyre.lateral().pHy1()).isZero();
    assertThat(tyre).isEqualTo(tyre.centred());
    TyreForces forces = new TyreForces();
    tyre.evaluate(4000, 0, -tyre.slipAngleAtPeak(4000), 1, forces);
    assertThat(forces.fy).isCloseTo(1.04 * 4000, within(1e-6));
  }

  @Test
  void aMagicFormulaTyreThatIsWrittenIsReadBackUnchanged() {
    String text = YamlText.write(TyreFile.write(sample()));
    assertThat(TyreFile.read(FileSource.texts(Map.of("t.yaml", text)), "t.yaml"))
        .isEqualTo(sample());
  }

  @Test
  void aCarTakesNoTyreWithShifts() {
    Car car = CarFile.read(SAMPLES, "cars/touring_car.yaml");
    MagicFormulaTyre tyre = sample();
    MagicLateral l = tyre.lateral();
    Tyre shifted =
        new MagicFormulaTyre(
            4000,
            tyre.longitudinal(),
            new MagicLateral(
                l.pCy1(), l.pDy1(), l.pDy2(), l.pEy1(), l.pEy2(), 0, l.pKy1(), l.pKy2(), l.pKy4(),
                0, 0, 0.01, 0),
            tyre.longitudinalWeight(),
            tyre.lateralWeight());
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(
            () ->
                new Car(
                    car.name(),
                    car.chassis(),
                    car.aero(),
                    car.brakes(),
                    car.driveline(),
                    shifted,
                    tyre,
                    0.3,
                    0.3))
        .withMessageStartingWith("The force of the front tyre without slip (30 N) must be zero.");
  }

  static Stream<Arguments> faults() {
    return Stream.of(
        arguments(
            "pCx1: 1.62",
            "pCx1: 16.2",
            "t.yaml:10: longitudinal.pCx1: The coefficient pCx1 (16.2) must be between 0.5 and"
                + " 2.4."),
        arguments(
            "  pCx1: 1.62",
            "  pXc1: 1.62",
            "t.yaml:10: longitudinal: The key (pXc1) must be one that is known here. Maybe you"
                + " meant pCx1."),
        arguments(
            "pKy1: -17.5",
            "pKy1: 17.5",
            "t.yaml:25: lateral.pKy1: The coefficient pKy1 (17.5) must be between -500 and -1."
                + " Maybe the signs are not those of ISO 8855."),
        arguments(
            "magic_formula",
            "magic",
            "t.yaml:6: model: The model (magic) must be one of: magic_formula, peak_slip."),
        arguments(
            "pDy1: 1.04",
            "pDy1: 0.01",
            "t.yaml:19: lateral: The coefficient pDy1 (0.01) must be at least 0.05 in size."));
  }

  @ParameterizedTest
  @MethodSource("faults")
  void aFaultIsToldWithItsPlace(String right, String wrong, String message) {
    String text = SAMPLES.text(MAGIC, YamlReader.LARGEST);
    assertThat(text).contains(right);
    FileSource source = FileSource.texts(Map.of("t.yaml", text.replace(right, wrong)));
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> TyreFile.read(source, "t.yaml"))
        .withMessageStartingWith(message);
  }
}
