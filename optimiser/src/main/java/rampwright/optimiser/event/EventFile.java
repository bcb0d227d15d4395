package rampwright.optimiser.event;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import rampwright.optimiser.kit.KitFile;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.Fields;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.file.YamlMap;
import rampwright.vehicle.file.YamlNode;
import rampwright.vehicle.file.YamlReader;
import rampwright.vehicle.file.YamlText;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.LapRequest;

/**
 * Events as YAML. Car, kit and circuits are paths relative to the event's file; car and kit may
 * also stand in the event with their own keys. Conditions that are left out are {@link
 * Conditions#STANDARD}.
 */
public final class EventFile {
  private static final String NAME = "name";
  private static final String CAR = "car";
  private static final String KIT = "kit";
  private static final String CIRCUITS = "circuits";
  private static final String FILE = "file";
  private static final String CONDITIONS = "conditions";
  private static final String DRIVER = "driver";
  private static final String LIMITS = "limits";
  private static final String SETTINGS = "settings";
  private static final String CURRENT = "current_setting";

  /** Station spacing (m) of an event that names none. */
  private static final double USUAL_SPACING = 2;

  private static final Fields<Event> FIELDS =
      Fields.<Event>none().with(LapRequest.SPACING, Event::spacing, USUAL_SPACING);

  private static final Fields<WeightedCircuit> CIRCUIT_FIELDS =
      Fields.<WeightedCircuit>none().with(WeightedCircuit.WEIGHT, WeightedCircuit::weight, 1);

  private static final Fields<Conditions> CONDITION_FIELDS =
      Fields.<Conditions>none()
          .with(Conditions.GRIP, Conditions::grip, Conditions.STANDARD.grip())
          .with(Conditions.FUEL_MASS, Conditions::fuelMass, Conditions.STANDARD.fuelMass())
          .with(Conditions.AIR_DENSITY, Conditions::airDensity, Conditions.STANDARD.airDensity())
          .with(Conditions.WIND_SPEED, Conditions::windSpeed, Conditions.STANDARD.windSpeed())
          .with(Conditions.WIND_FROM, Conditions::windFrom, Conditions.STANDARD.windFrom());

  private static final Fields<Driver> DRIVER_FIELDS =
      Fields.<Driver>none()
          .with(Driver.POWER_GROWTH, Driver::powerGrowth)
          .with(Driver.BRAKING_GROWTH, driver -> driver.brakingGrowth());

  private static final Map<String, Driver> DRIVERS =
      Map.of("cautious", Driver.CAUTIOUS, "quick", Driver.QUICK, "expert", Driver.EXPERT);

  private final FileSource source;
  private final String path;
  private final CircuitReader circuits;

  private EventFile(FileSource source, String path, CircuitReader circuits) {
    this.source = source;
    this.path = path;
    this.circuits = circuits;
  }

  /** Reads the circuit files that an event names. */
  @FunctionalInterface
  public interface CircuitReader {
    /**
     * Reads a circuit file.
     *
     * @throws InvalidInput when it breaks a rule
     */
    Circuit read(FileSource source, String path);
  }

  /**
   * Paths of the files that an event names.
   *
   * @param car car file
   * @param kit kit file
   * @param circuits circuit files in the order of the event's circuits
   */
  public record Names(String car, String kit, List<String> circuits) {
    /** Copies the list. */
    public Names {
      circuits = List.copyOf(circuits);
    }
  }

  /**
   * Reads an event and every file that it names.
   *
   * @throws InvalidInput when one of them breaks a rule
   */
  public static Event read(FileSource source, String path) {
    return read(source, path, CircuitFile::read);
  }

  /**
   * Reads an event and every file that it names, its circuits in a way of the caller's.
   *
   * @throws InvalidInput when one of them breaks a rule
   */
  public static Event read(FileSource source, String path, CircuitReader circuits) {
    return new EventFile(source, path, circuits).event(YamlReader.read(source, path));
  }

  /**
   * Reads only which files an event names, as paths within the source.
   *
   * @throws InvalidInput when the event is no plain YAML or names none
   */
  public static Names names(FileSource source, String path) {
    YamlNode root = YamlReader.read(source, path);
    List<String> circuits = new ArrayList<>();
    for (YamlNode item : root.peek(CIRCUITS).items()) {
      circuits.add(FileSource.resolve(path, item.peek(FILE).text()));
    }
    return new Names(
        FileSource.resolve(path, root.peek(CAR).text()),
        FileSource.resolve(path, root.peek(KIT).text()),
        circuits);
  }

  /**
   * Returns an event as the text of a file.
   *
   * @param event the event
   * @param names where its car, kit and circuits are kept, relative to the event's file
   */
  public static String write(Event event, Names names) {
    Map<String, Object> out = new LinkedHashMap<>();
    out.put(NAME, event.name());
    out.put(CAR, names.car());
    out.put(KIT, names.kit());
    List<Map<String, Object>> circuits = new ArrayList<>();
    for (int i = 0; i < event.circuits().size(); i++) {
      Map<String, Object> circuit = new LinkedHashMap<>();
      circuit.put(FILE, names.circuits().get(i));
      circuit.putAll(CIRCUIT_FIELDS.write(event.circuits().get(i)));
      circuits.add(circuit);
    }
    out.put(CIRCUITS, circuits);
    out.put(CONDITIONS, CONDITION_FIELDS.write(event.conditions()));
    out.put(DRIVER, DRIVER_FIELDS.write(event.driver()));
    Map<String, Object> limits = new LinkedHashMap<>();
    for (SettingLimit limit : event.limits()) {
      limits.put(
          limit.measure().quantity().key(),
          Fields.shown(limit.measure().quantity(), limit.value()));
    }
    out.put(LIMITS, limits);
    out.put(
        SETTINGS,
        event.settings().stream()
            .map(setting -> SettingFile.write(setting, event.car().driveline().layout()))
            .toList());
    out.put(CURRENT, event.currentSetting());
    out.putAll(FIELDS.write(event));
    return YamlText.write(out);
  }

  private Event event(YamlNode root) {
    YamlMap map =
        root.map(
            FIELDS.keysAnd(
                NAME, CAR, KIT, CIRCUITS, CONDITIONS, DRIVER, LIMITS, SETTINGS, CURRENT));
    String name = map.get(NAME).text();
    Car car = car(map.get(CAR));
    PartsKit kit = kit(map.get(KIT));
    List<WeightedCircuit> circuits = map.get(CIRCUITS).items().stream().map(this::circuit).toList();
    Conditions conditions =
        map.find(CONDITIONS).map(EventFile::conditions).orElse(Conditions.STANDARD);
    Driver driver = driver(map.get(DRIVER));
    List<SettingLimit> limits = map.find(LIMITS).map(EventFile::limits).orElse(List.of());
    List<NamedSetting> settings =
        map.get(SETTINGS).items().stream()
            .map(node -> SettingFile.read(node, kit, car.driveline().layout()))
            .toList();
    double spacing = FIELDS.read(map).of(LapRequest.SPACING);
    YamlNode current = map.get(CURRENT);
    return current.place(
        () ->
            new Event(
                name,
                car,
                circuits,
                kit,
                conditions,
                driver,
                limits,
                settings,
                current.text(),
                spacing));
  }

  private Car car(YamlNode node) {
    if (node.isMap()) {
      return CarFile.read(source, path, node);
    }
    String file = resolved(node);
    return node.place(() -> CarFile.read(source, file));
  }

  private PartsKit kit(YamlNode node) {
    if (node.isMap()) {
      return KitFile.read(node);
    }
    String file = resolved(node);
    return node.place(() -> KitFile.read(source, file));
  }

  private WeightedCircuit circuit(YamlNode node) {
    YamlMap map = node.map(CIRCUIT_FIELDS.keysAnd(FILE));
    String file = resolved(map.get(FILE));
    Circuit circuit = map.get(FILE).place(() -> circuits.read(source, file));
    return new WeightedCircuit(circuit, CIRCUIT_FIELDS.read(map).of(WeightedCircuit.WEIGHT));
  }

  private String resolved(YamlNode node) {
    return FileSource.resolve(path, node.text());
  }

  private static Conditions conditions(YamlNode node) {
    Fields.Numbers n = CONDITION_FIELDS.read(node);
    return new Conditions(
        n.of(Conditions.GRIP),
        n.of(Conditions.FUEL_MASS),
        n.of(Conditions.AIR_DENSITY),
        n.of(Conditions.WIND_SPEED),
        n.of(Conditions.WIND_FROM));
  }

  private static Driver driver(YamlNode node) {
    if (!node.isMap()) {
      return node.choice(DRIVERS);
    }
    Fields.Numbers n = DRIVER_FIELDS.read(node);
    return new Driver(n.of(Driver.POWER_GROWTH), n.of(Driver.BRAKING_GROWTH));
  }

  private static List<SettingLimit> limits(YamlNode node) {
    Map<String, LimitedMeasure> measures =
        Stream.of(LimitedMeasure.values())
            .collect(Collectors.toMap(m -> m.quantity().key(), Function.identity()));
    YamlMap map =
        node.map(Stream.of(LimitedMeasure.values()).map(m -> m.quantity().key()).toList());
    List<SettingLimit> limits = new ArrayList<>();
    for (Map.Entry<String, YamlNode> entry : map.entries().entrySet()) {
      LimitedMeasure measure = measures.get(entry.getKey());
      limits.add(new SettingLimit(measure, entry.getValue().number(measure.quantity())));
    }
    return limits;
  }
}
