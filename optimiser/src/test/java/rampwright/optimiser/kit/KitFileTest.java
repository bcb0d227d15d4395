package rampwright.optimiser.kit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.file.YamlReader;
import rampwright.vehicle.input.InvalidInput;

class KitFileTest {
  private static final FileSource SAMPLES =
      FileSource.classPath(KitFileTest.class.getClassLoader(), "rampwright/samples/");
  private static final String KIT = "kits/plate_kit.yaml";

  @Test
  void theSampleKitHoldsEnoughToSearch() {
    PartsKit kit = KitFile.read(SAMPLES, KIT);
    long turnable = kit.ringSets().stream().filter(RingSet::reversible).count();
    long orientations = kit.ringSets().size() + turnable;
    assertThat(kit.ringSets()).hasSizeGreaterThanOrEqualTo(8);
    assertThat(turnable).isGreaterThanOrEqualTo(3);
    assertThat(orientations * kit.facesPerSide().size() * kit.preload().count())
        .isGreaterThanOrEqualTo(2000);
  }

  @Test
  void aKitThatIsWrittenIsReadBackUnchanged() {
    PartsKit kit = KitFile.read(SAMPLES, KIT);
    FileSource written = FileSource.texts(Map.of("k.yaml", KitFile.write(kit)));
    assertThat(KitFile.read(written, "k.yaml")).isEqualTo(kit);
  }

  @Test
  void theSpringsMayBeLeftOut() {
    String text = SAMPLES.text(KIT, YamlReader.LARGEST);
    String without = text.substring(0, text.indexOf("springs:\n  disc"));
    PartsKit kit = KitFile.read(FileSource.texts(Map.of("k.yaml", without)), "k.yaml");
    assertThat(kit.springs()).isEmpty();
    assertThat(KitFile.write(kit)).doesNotContain("springs:");
    assertThat(KitFile.read(SAMPLES, KIT).springs()).isPresent();
  }

  static Stream<Arguments> faults() {
    return Stream.of(
        arguments(
            "{name: 40/80, drive_angle_deg: 40",
            "{name: 30/60, drive_angle_deg: 40",
            "k.yaml:2: The name of a ring set (30/60) must be unique in the kit. Maybe add a"
                + " number to one of the two."),
        arguments(
            "drive_angle_deg: 40, ",
            "",
            "k.yaml:16: ring_sets[2]: The drive ramp angle (missing) must be given here. Maybe a"
                + " line with drive_angle_deg was lost."),
        arguments(
            "drive_angle_deg: 40,",
            "drive_angle_deg: 4,",
            "k.yaml:16: ring_sets[2].drive_angle_deg: The drive ramp angle (4 deg) must be between"
                + " 15 and 90 deg. Maybe the angle was measured from the axle: use 90 minus it."),
        arguments(
            "reversible: false",
            "reversible: perhaps",
            "k.yaml:17: ring_sets[3].reversible: The reversible (perhaps) must be true or false."),
        arguments(
            "[2, 4, 6, 8, 10]",
            "[2, 4.5]",
            "k.yaml:26: faces_per_side[2]: The friction faces per side (4.5) must be a whole"
                + " number."),
        arguments(
            "preload_max_nm: 150",
            "preload_max_nm: 5",
            "k.yaml:30: preload: The largest preload (5 N·m) must be at least the smallest preload"
                + " of 10.0 N·m. Maybe the two were swapped."),
        arguments(
            "discs_series: 2",
            "discs_series: 0",
            "k.yaml:48: springs.discs_series: The disc spring groups in series (0) must be between"
                + " 1 and 50."),
        arguments(
            "disc_inner_diameter_mm: 72",
            "disc_inner_diameter_mm: 99",
            "k.yaml:42: springs: The disc inner diameter (99 mm) must be at most 0.9 of the outer"
                + " diameter of 100.0 mm. Maybe the two were swapped."),
        arguments(
            "face_pressure: uniform_wear ",
            "face_pressure: even ",
            "k.yaml:10: hardware.face_pressure: The face pressure (even) must be one of:"
                + " uniform_pressure, uniform_wear."));
  }

  @ParameterizedTest
  @MethodSource("faults")
  void aFaultIsToldWithItsPlace(String right, String wrong, String message) {
    String text = SAMPLES.text(KIT, YamlReader.LARGEST);
    assertThat(text).contains(right);
    FileSource source = FileSource.texts(Map.of("k.yaml", text.replace(right, wrong)));
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> KitFile.read(source, "k.yaml"))
        .withMessage(message);
  }
}
