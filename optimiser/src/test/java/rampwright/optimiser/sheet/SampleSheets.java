package rampwright.optimiser.sheet;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.EventFile;
import rampwright.optimiser.kit.PartsKit;
import rampwright.optimiser.sheet.SetupSheet.CornerEffect;
import rampwright.optimiser.sheet.SetupSheet.ExpectedLap;
import rampwright.optimiser.sheet.SetupSheet.LimitLine;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Segment.Corner;
import rampwright.vehicle.circuit.Segment.Straight;
import rampwright.vehicle.circuit.SegmentLine;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.file.YamlReader;

/** Events and sheets for the tests of this package. */
final class SampleSheets {
  private static final String EVENT =
      """
      name: Club race
      car: ../cars/touring_car.yaml
      kit: ../kits/plate_kit.yaml
      circuits:
        - {file: skid pan, weight: 2}
        - {file: stadium}
      conditions: {grip: 0.95, fuel_mass_kg: 30, wind_speed_mps: 3, wind_from_deg: 90}
      driver: quick
      limits:
        min_preload_nm: 90
        max_drive_share: 0.9
        max_coast_share: 0.2
        max_plate_energy_kj: 1000
      settings:
        - name: as raced
          kit: {ring_set: 45/60, turned: true, faces_per_side: 6, preload_nm: 60}
        - name: harder
          kit: {ring_set: 40/80, turned: false, faces_per_side: 8, preload_nm: 80}
        - {name: open, differentials: {rear: open}}
      current_setting: as raced
      station_spacing_m: 5
      """;

  private SampleSheets() {}

  /**
   * Returns an event on a circle of 30 m radius and on two straights with a hairpin at each end.
   */
  static Event event() {
    return event(EVENT);
  }

  /** Returns the event with a kit whose springs are not known. */
  static Event eventWithoutSprings() {
    Event event = event();
    PartsKit kit = event.kit();
    PartsKit plain =
        new PartsKit(
            kit.name(),
            kit.hardware(),
            kit.ringSets(),
            kit.facesPerSide(),
            kit.preload(),
            kit.changeTimes());
    return new Event(
        event.name(),
        event.car(),
        event.circuits(),
        plain,
        event.conditions(),
        event.driver(),
        event.limits(),
        event.settings(),
        event.currentSetting(),
        event.spacing());
  }

  /** Returns the event with another setting in the car. */
  static Event eventWithCurrent(String setting) {
    return event(EVENT.replace("current_setting: as raced", "current_setting: " + setting));
  }

  private static Event event(String text) {
    FileSource samples =
        FileSource.classPath(SampleSheets.class.getClassLoader(), SampleFiles.BASE);
    Map<String, String> texts = new HashMap<>();
    for (String path :
        List.of("cars/touring_car.yaml", "tyres/dry_slick.yaml", "kits/plate_kit.yaml")) {
      texts.put(path, samples.text(path, YamlReader.LARGEST));
    }
    texts.put("events/e.yaml", text);
    return EventFile.read(
        FileSource.texts(texts),
        "events/e.yaml",
        (source, path) -> path.endsWith("stadium") ? stadium() : circle(path));
  }

  private static Circuit stadium() {
    return SegmentLine.closed(
        "stadium",
        List.of(
            new Straight(120),
            Corner.degrees(20, 180, 20),
            new Straight(120),
            Corner.degrees(20, 180, 20)),
        450,
        5);
  }

  private static Circuit circle(String name) {
    List<Station> stations = new ArrayList<>();
    for (int i = 0; i < 20; i++) {
      double angle = 2 * Math.PI * i / 20;
      stations.add(
          Station.flat(angle * 30, 1.0 / 30, 30 * Math.sin(angle), 30 * (1 - Math.cos(angle))));
    }
    return new Circuit(name, true, 2 * Math.PI * 30, stations);
  }

  /** Returns the sheet of the harder setting. */
  static SetupSheet sheet() {
    Event event = event();
    return SetupSheets.of(event, event.setting("harder"));
  }

  /** Returns a sheet with everything long: names, circuits, corners, limits. */
  static SetupSheet full(int circuits, int corners, int copiesOfLimits, String name) {
    SetupSheet plain = sheet();
    List<ExpectedLap> laps = new ArrayList<>();
    for (int i = 0; i < circuits; i++) {
      List<CornerEffect> effects = new ArrayList<>();
      for (int k = 1; k <= corners; k++) {
        effects.add(new CornerEffect(k, 211.0 * k, 20 + k, -0.001 * k, "cornering speed"));
      }
      double total = -0.001 * corners * (corners + 1) / 2;
      laps.add(
          new ExpectedLap(
              "circuit " + (i + 1) + " " + name, 1, 90, 90 - total, total / 2, 0.01, effects, 0));
    }
    List<LimitLine> limits = new ArrayList<>();
    for (int i = 0; i < copiesOfLimits; i++) {
      plain.limits().forEach(line -> limits.add(new LimitLine(line.limit(), OptionalDouble.of(1))));
    }
    return new SetupSheet(
        "event " + name,
        "setting " + name,
        "car " + name,
        plain.axle(),
        plain.conditions(),
        plain.driver(),
        "kit " + name,
        plain.build(),
        plain.stack(),
        plain.bench(),
        plain.springsKnown(),
        plain.shims(),
        plain.change(),
        laps,
        limits,
        plain.cautions());
  }
}
