package rampwright.web.store;

import java.util.ArrayList;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.SettingLimit;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;

/** Events that differ from another in one respect; each is checked like any other event. */
public final class EventChange {
  private EventChange() {}

  /** Returns the event under other conditions. */
  public static Event conditions(Event e, Conditions conditions) {
    return event(
        e, e.circuits(), conditions, e.driver(), e.limits(), e.settings(), e.currentSetting());
  }

  /** Returns the event with another driver. */
  public static Event driver(Event e, Driver driver) {
    return event(
        e, e.circuits(), e.conditions(), driver, e.limits(), e.settings(), e.currentSetting());
  }

  /** Returns the event with other limits. */
  public static Event limits(Event e, List<SettingLimit> limits) {
    return event(
        e, e.circuits(), e.conditions(), e.driver(), limits, e.settings(), e.currentSetting());
  }

  /** Returns the event on other circuits. */
  public static Event circuits(Event e, List<WeightedCircuit> circuits) {
    return event(
        e, circuits, e.conditions(), e.driver(), e.limits(), e.settings(), e.currentSetting());
  }

  /** Returns the event with another of its settings in the car. */
  public static Event current(Event e, String setting) {
    return event(e, e.circuits(), e.conditions(), e.driver(), e.limits(), e.settings(), setting);
  }

  /** Returns the event with a setting added, or changed where one has its name. */
  public static Event setting(Event e, NamedSetting setting) {
    List<NamedSetting> settings = new ArrayList<>(e.settings());
    int known = settings.stream().map(NamedSetting::name).toList().indexOf(setting.name());
    if (known < 0) {
      settings.add(setting);
    } else {
      settings.set(known, setting);
    }
    return event(
        e, e.circuits(), e.conditions(), e.driver(), e.limits(), settings, e.currentSetting());
  }

  /** Returns the event without a setting; the one in the car cannot go. */
  public static Event withoutSetting(Event e, String name) {
    List<NamedSetting> settings =
        e.settings().stream().filter(setting -> !setting.name().equals(name)).toList();
    return event(
        e, e.circuits(), e.conditions(), e.driver(), e.limits(), settings, e.currentSetting());
  }

  private static Event event(
      Event e,
      List<WeightedCircuit> circuits,
      Conditions conditions,
      Driver driver,
      List<SettingLimit> limits,
      List<NamedSetting> settings,
      String current) {
    return new Event(
        e.name(),
        e.car(),
        circuits,
        e.kit(),
        conditions,
        driver,
        limits,
        settings,
        current,
        e.spacing());
  }
}
