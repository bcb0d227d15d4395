package rampwright.optimiser.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.RingSet;

/**
 * What the crew changes from the setting that is in the car.
 *
 * @param from name of the setting that is in the car
 * @param steps what is to be done, one line each; empty when nothing changes
 * @param time time that the kit gives for it (s): the longest of the changes, because the unit is
 *     taken apart once; empty when the unit in the car is none of the kit's
 */
public record SettingChange(String from, List<String> steps, OptionalDouble time) {
  /** Copies the list. */
  public SettingChange {
    steps = List.copyOf(steps);
  }

  /**
   * Returns the change to a setting of the kit.
   *
   * @param kit the kit
   * @param current what is in the car
   * @param wanted what is to be built
   */
  public static SettingChange of(PartsKit kit, NamedSetting current, KitSetting wanted) {
    if (current.kitSetting().isEmpty()) {
      return new SettingChange(
          current.name(),
          List.of("Take out the differential that is in the car; fit the kit's unit as drawn."),
          OptionalDouble.empty());
    }
    return between(kit, current.name(), current.kitSetting().get(), wanted);
  }

  private static SettingChange between(PartsKit kit, String from, KitSetting now, KitSetting then) {
    List<String> steps = new ArrayList<>();
    double time = 0;
    if (!now.ringSet().equals(then.ringSet())) {
      steps.add("Ring set: take out " + now.ringSet() + ", fit " + fitted(kit, then) + ".");
      time = kit.changeTimes().ringSet();
    } else if (now.turned() != then.turned()) {
      steps.add("Ring set: take out " + now.ringSet() + ", refit it " + facing(then) + ".");
      time = kit.changeTimes().ringSet();
    }
    if (now.facesPerSide() != then.facesPerSide()) {
      steps.add(
          "Plates: restack both sides from "
              + now.facesPerSide()
              + " to "
              + then.facesPerSide()
              + " faces per side, order as drawn.");
      time = Math.max(time, kit.changeTimes().faces());
    }
    if (now.preload() != then.preload() || now.facesPerSide() != then.facesPerSide()) {
      steps.add(preload(kit, now, then));
      time = Math.max(time, kit.changeTimes().preload());
    }
    return new SettingChange(from, steps, OptionalDouble.of(time));
  }

  private static String preload(PartsKit kit, KitSetting now, KitSetting then) {
    String change =
        now.preload() == then.preload()
            ? "keep " + Shown.torque(then.preload())
            : "from " + Shown.brief(now.preload(), 1) + " to " + Shown.torque(then.preload());
    if (now.facesPerSide() != then.facesPerSide()) {
      return "Preload: "
          + change
          + "; another number of faces needs another spring force, so shim to the bench.";
    }
    double step = kit.preload().step();
    return "Preload: "
        + change
        + ", shims "
        + Shown.signed((then.preload() - now.preload()) / step, 0)
        + " × "
        + Shown.torque(step)
        + ".";
  }

  private static String fitted(PartsKit kit, KitSetting setting) {
    RingSet set = kit.ringSet(setting.ringSet());
    return set.reversible() ? set.name() + " " + facing(setting) : set.name();
  }

  private static String facing(KitSetting setting) {
    return setting.turned() ? "turned round" : "not turned";
  }
}
