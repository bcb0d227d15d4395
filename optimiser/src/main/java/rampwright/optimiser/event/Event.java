package rampwright.optimiser.event;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.file.Suggestion;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.LapRequest;
import rampwright.vehicle.lap.LimitForm;

/**
 * The whole question of a race weekend.
 *
 * @param name a name for people
 * @param car the car
 * @param circuits at least one
 * @param kit the parts kit of the differential under discussion
 * @param conditions the conditions
 * @param driver the driver's limits
 * @param limits what every proposed setting must meet
 * @param settings at least one; names are unique
 * @param currentSetting name of the setting that is in the car now
 * @param spacing station spacing of a lap (m)
 */
public record Event(
    String name,
    Car car,
    List<WeightedCircuit> circuits,
    PartsKit kit,
    Conditions conditions,
    Driver driver,
    List<SettingLimit> limits,
    List<NamedSetting> settings,
    String currentSetting,
    double spacing) {
  /** Checks the lists and that the current setting exists. */
  public Event {
    circuits = List.copyOf(circuits);
    limits = List.copyOf(limits);
    settings = List.copyOf(settings);
    if (name == null || name.isBlank()) {
      throw InvalidInput.of("name of the event", "blank", "some text", "");
    }
    if (circuits.isEmpty()) {
      throw InvalidInput.of("list of circuits", "empty", "at least one circuit", "");
    }
    LapRequest.SPACING.check(spacing);
    Set<String> names = new HashSet<>();
    for (NamedSetting setting : settings) {
      if (!names.add(setting.name())) {
        throw InvalidInput.of("name of a setting", setting.name(), "unique in the event", "");
      }
    }
    if (!names.contains(currentSetting)) {
      throw InvalidInput.of(
          "current setting",
          String.valueOf(currentSetting),
          "one of the event's settings: " + settings.stream().map(NamedSetting::name).toList(),
          "");
    }
  }

  /**
   * Returns the setting of a name.
   *
   * @throws InvalidInput when there is none
   */
  public NamedSetting setting(String wanted) {
    return settings.stream()
        .filter(s -> s.name().equals(wanted))
        .findFirst()
        .orElseThrow(() -> unknown(wanted));
  }

  private InvalidInput unknown(String wanted) {
    List<String> names = settings.stream().map(NamedSetting::name).toList();
    String advice = Suggestion.nearest(wanted, names).map(near -> "you meant " + near).orElse("");
    return InvalidInput.of("setting", wanted, "one of the event's: " + names, advice);
  }

  /** Returns the setting that is in the car now. */
  public NamedSetting current() {
    return setting(currentSetting);
  }

  /**
   * Returns a setting that the kit builds, in its place in this car; other positions stay as they
   * are in the current setting.
   *
   * @throws InvalidInput when the kit cannot build it
   */
  public NamedSetting built(String settingName, KitSetting setting) {
    return NamedSetting.of(
        settingName, kit, setting, car.driveline().layout(), current().differentials());
  }

  /** Returns the lap request of a setting on one of the circuits. */
  public LapRequest lapRequest(NamedSetting setting, Circuit circuit, LimitForm form) {
    return new LapRequest(car, setting.differentials(), conditions, driver, form, circuit, spacing);
  }
}
