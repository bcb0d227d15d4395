package rampwright.optimiser.event;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.file.YamlReader;
import rampwright.vehicle.input.InvalidInput;

class EventFileTest {
  private static final FileSource SAMPLES =
      FileSource.classPath(EventFileTest.class.getClassLoader(), "rampwright/samples/");

  private static final String EVENT =
      """
      name: Club race            # line 1
      car: ../cars/touring_car.yaml
      kit: ../kits/plate_kit.yaml
      circuits:
        - {file: ring.csv, weight: 2}
        - file: oval.csv         # line 6
      conditions: {grip: 0.95, wind_from_deg: 90}
      driver: quick
      limits:
        max_inner_slip: 0.3      # line 10
        max_exit_understeer_change_deg: 0.5
        min_preload_nm: 20
      settings:
        - name: as raced
          kit: {ring_set: 45/60, turned: true, faces_per_side: 6, preload_nm: 60}
        - {name: open, differentials: {rear: open}}
        - {name: spool, differentials: {rear: spool}}
        - name: law              # line 18
          differentials:
            rear: {kind: plate, preload_nm: 50, drive_share: 0.3, coast_share: 0.1}
        - {name: real open, differentials: {rear: {kind: open, friction_share: 0.05}}}
      current_setting: as raced  # line 22
      """;

  private static final EventFile.Names NAMES =
      new EventFile.Names(
          "../cars/touring_car.yaml", "../kits/plate_kit.yaml", List.of("ring.csv", "oval.csv"));

  /** The two circuits by name; any other file is unknown. */
  private static Circuit circle(FileSource source, String path) {
    if (!path.equals("events/ring.csv") && !path.equals("events/oval.csv")) {
      throw InvalidInput.of("file", path, "one of the two", "");
    }
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i < 20; i++) {
      double angle = 2 * Math.PI * i / 20;
      stations.add(
          Station.flat(angle * 50, 0.02, 50 * Math.sin(angle), 50 * (1 - Math.cos(angle))));
    }
    return new Circuit(path, true, 2 * Math.PI * 50, stations);
  }

  private static FileSource with(String event) {
    return with(event, "rear");
  }

  private static FileSource with(String event, String layout) {
    Map<String, String> texts = new HashMap<>();
    for (String path :
        List.of("cars/touring_car.yaml", "tyres/dry_slick.yaml", "kits/plate_kit.yaml")) {
      texts.put(path, SAMPLES.text(path, YamlReader.LARGEST));
    }
    texts.computeIfPresent(
        "cars/touring_car.yaml", (path, car) -> car.replace("layout: rear", "layout: " + layout));
    texts.put("events/e.yaml", event);
    return FileSource.texts(texts);
  }

  private static Event read(String text) {
    return read(text, "rear");
  }

  private static Event read(String text, String layout) {
    return EventFile.read(with(text, layout), "events/e.yaml", EventFileTest::circle);
  }

  @Test
  void everyPartOfAnEventIsRead() {
    Event event = read(EVENT);
    assertThat(event.car().name()).isEqualTo("Corvane T4");
    assertThat(event.circuits()).extracting(WeightedCircuit::weight).containsExactly(2.0, 1.0);
    assertThat(event.circuits())
        .extracting(c -> c.circuit().name())
        .last()
        .isEqualTo("events/oval.csv");
    assertThat(event.conditions()).isEqualTo(new Conditions(0.95, 0, 1.225, 0, Math.PI / 2));
    assertThat(event.driver()).isEqualTo(Driver.QUICK);
    assertThat(event.limits())
        .extracting(SettingLimit::measure)
        .containsExactly(
            LimitedMeasure.INNER_SLIP,
            LimitedMeasure.EXIT_UNDERSTEER_CHANGE,
            LimitedMeasure.PRELOAD_MIN);
    assertThat(event.limits().get(1).value()).isCloseTo(Math.toRadians(0.5), within(1e-15));
    assertThat(event.spacing()).isEqualTo(2);
  }

  @Test
  void settingsComeFromTheKitOrFromLaws() {
    Event event = read(EVENT);
    assertThat(event.setting("open").differentials().rear()).isEqualTo(OpenDifferential.IDEAL);
    assertThat(event.setting("spool").differentials().rear()).isEqualTo(new Spool());
    assertThat(event.setting("law").differentials().rear())
        .isEqualTo(new PlateDifferential(50, 0.3, 0.1));
    assertThat(event.setting("real open").differentials().rear())
        .isEqualTo(new OpenDifferential(0.05));
    NamedSetting current = event.current();
    PlateDifferential law = (PlateDifferential) current.differentials().rear();
    assertThat(law).isEqualTo(event.kit().build(current.kitSetting().orElseThrow()).law());
    // turned round: the 60 degrees work on power and lock less than the 45 on overrun
    assertThat(law.driveShare()).isLessThan(law.coastShare());
  }

  @Test
  void anEventThatIsWrittenIsReadBackUnchanged() {
    Event event = read(EVENT);
    assertThat(read(EventFile.write(event, NAMES))).isEqualTo(event);
  }

  @Test
  void theKitSitsInTheFrontAxleOfAFrontWheelDriveCar() {
    Event event =
        read(EVENT.replace("{rear: ", "{front: ").replace(" rear: {", " front: {"), "front");
    KitSetting fitted = event.current().kitSetting().orElseThrow();
    assertThat(event.current().differentials().front()).isEqualTo(event.kit().build(fitted).law());
    assertThat(event.current().differentials().rear()).isEqualTo(OpenDifferential.IDEAL);
    assertThat(event.built("as raced", fitted)).isEqualTo(event.current());
    assertThat(read(EventFile.write(event, NAMES), "front")).isEqualTo(event);
  }

  @Test
  void theOtherPositionsOfAFourWheelDriveCarStandBesideTheKit() {
    String both =
        EVENT.replace(
            "preload_nm: 60}",
            "preload_nm: 60}\n    differentials: {centre: {kind: plate, preload_nm: 90,"
                + " drive_share: 0, coast_share: 0}}");
    Event event = read(both, "all");
    KitSetting fitted = event.current().kitSetting().orElseThrow();
    DifferentialSet set = event.current().differentials();
    assertThat(set.rear()).isEqualTo(event.kit().build(fitted).law());
    assertThat(set.centre()).isEqualTo(new PlateDifferential(90, 0, 0));
    assertThat(set.front()).isEqualTo(OpenDifferential.IDEAL);
    KitSetting other = new KitSetting("45/45", false, 4, 20);
    assertThat(event.built("x", other).differentials().centre()).isEqualTo(set.centre());
    assertThat(event.built("x", other).differentials().rear())
        .isEqualTo(event.kit().build(other).law());
    assertThat(read(EventFile.write(event, NAMES), "all")).isEqualTo(event);
  }

  @Test
  void theKitsPositionIsNotGivenASecondTime() {
    String twice =
        EVENT.replace("preload_nm: 60}", "preload_nm: 60}\n    differentials: {rear: open}");
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> read(twice, "all"))
        .withMessage(
            "events/e.yaml:16: settings[1].differentials: The rear differential (given twice) must"
                + " be the kit's. Maybe leave out one of the two.");
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> read(twice, "rear"))
        .withMessage(
            "events/e.yaml:14: settings[1]: The setting (kit and differentials) must be either a"
                + " kit setting or a set of differentials.");
  }

  @Test
  void theNamedFilesAreKnownWithoutReadingThem() {
    EventFile.Names names = EventFile.names(with(EVENT), "events/e.yaml");
    assertThat(names.car()).isEqualTo("cars/touring_car.yaml");
    assertThat(names.kit()).isEqualTo("kits/plate_kit.yaml");
    assertThat(names.circuits()).containsExactly("events/ring.csv", "events/oval.csv");
  }

  static Stream<Arguments> faults() {
    return Stream.of(
        arguments(
            "max_inner_slip: 0.3",
            "max_inner_slp: 0.3",
            "events/e.yaml:10: limits: The key (max_inner_slp) must be one that is known here."
                + " Maybe you meant max_inner_slip."),
        arguments(
            "max_inner_slip: 0.3",
            "max_inner_slip: 30",
            "events/e.yaml:10: limits.max_inner_slip: The inner wheel slip (30) must be between 0"
                + " and 10. Maybe it was given in percent."),
        arguments(
            "driver: quick",
            "driver: quickly",
            "events/e.yaml:8: driver: The driver (quickly) must be one of: cautious, expert,"
                + " quick. Maybe you meant quick."),
        arguments(
            "current_setting: as raced ",
            "current_setting: as rased ",
            "events/e.yaml:22: current_setting: The current setting (as rased) must be one of the"
                + " event's settings: [as raced, open, spool, law, real open]."),
        arguments(
            "name: open,",
            "name: spool,",
            "events/e.yaml:22: current_setting: The name of a setting (spool) must be unique in"
                + " the event."),
        arguments(
            "ring_set: 45/60",
            "ring_set: 44/60",
            "events/e.yaml:15: settings[1].kit: The ring set (44/60) must be one of the kit's:"
                + " [30/60, 40/80, 45/45, 45/60, 50/90, 55/55, 55/75, 60/85, 65/65, 70/80]."),
        arguments(
            "preload_nm: 60",
            "preload_nm: 61",
            "events/e.yaml:15: settings[1].kit: The preload (whole torque difference) (61 N·m)"
                + " must be from 10.0 to 150.0 in steps of 5.0."),
        arguments(
            "{rear: spool}",
            "{front: spool}",
            "events/e.yaml:17: settings[3].differentials: The key (front) must be one that is"
                + " known here. Maybe use one of: rear."),
        arguments(
            "{kind: plate,",
            "{kind: plat,",
            "events/e.yaml:20: settings[4].differentials.rear.kind: The kind (plat) must be one"
                + " of: brake_lock, open, plate, spool, torque_sensing, viscous, viscous_plates, worm_gear. Maybe you meant plate."),
        arguments(
            "oval.csv ",
            "lost.csv ",
            "events/e.yaml:6: circuits[2].file: The file (events/lost.csv) must be one of the two."),
        arguments(
            "{name: open, differentials: {rear: open}}",
            "{name: open}",
            "events/e.yaml:16: settings[2]: The setting (neither kit nor differentials) must be"
                + " either a kit setting or a set of differentials."));
  }

  @ParameterizedTest
  @MethodSource("faults")
  void aFaultIsToldWithItsPlace(String right, String wrong, String message) {
    assertThat(EVENT).contains(right);
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> read(EVENT.replace(right, wrong)))
        .withMessage(message);
  }
}
