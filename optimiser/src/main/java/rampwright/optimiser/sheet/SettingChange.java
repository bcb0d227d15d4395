package rampwright.optimiser.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.driveline.DriveLayout;

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
   * Returns the change from the current setting of an event.
   *
   * @param event the event
   * @param setting what is to be built
   * @param wanted its choice from the kit
   */
  static SettingChange of(Event event, NamedSetting setting, KitSetting wanted) {
    NamedSetting current = event.current();
    List<String> steps = new ArrayList<>();
    OptionalDouble time = OptionalDouble.empty();
    if (current.kitSetting().isPresent()) {
      KitSetting now = current.kitSetting().get();
      steps.addAll(between(event.kit(), now, wanted));
      time = OptionalDouble.of(event.kit().changeTimes().between(now, wanted));
    } else {
      steps.add("Take out the differential that is in the car; fit the kit's unit as drawn.");
    }
    if (othersDiffer(event, setting)) {
      steps.add("Other axles: their differentials differ too, see the event; time not counted.");
    }
    return new SettingChange(current.name(), steps, time);
  }

  private static boolean othersDiffer(Event event, NamedSetting setting) {
    DifferentialSet now = event.current().differentials();
    DifferentialSet then = setting.differentials();
    boolean front = event.car().driveline().layout() == DriveLayout.FRONT;
    return !now.centre().equals(then.centre())
        || !(front ? now.rear().equals(then.rear()) : now.front().equals(then.front()));
  }

  private static List<String> between(PartsKit kit, KitSetting now, KitSetting then) {
    List<String> steps = new ArrayList<>();
    if (!now.ringSet().equals(then.ringSet())) {
      steps.add("Ring set: take out " + now.ringSet() + ", fit " + fitted(kit, then) + ".");
    } else if (now.turned() != then.turned()) {
      steps.add("Ring set: take out " + now.ringSet() + ", refit it " + facing(then) + ".");
    }
    if (now.facesPerSide() != then.facesPerSide()) {
      steps.add(
          "Plates: restack both sides from "
              + now.facesPerSide()
              + " to "
              + then.facesPerSide()
              + " faces per side, order as drawn.");
    }
    if (now.preload() != then.preload() || now.facesPerSide() != then.facesPerSide()) {
      steps.add("Preload: " + preload(now, then) + ", " + shims(kit, now, then) + ".");
    }
    return steps;
  }

  private static String preload(KitSetting now, KitSetting then) {
    return now.preload() == then.preload()
        ? "keep " + Shown.torque(then.preload())
        : "from " + Shown.brief(now.preload(), 1) + " to " + Shown.torque(then.preload());
  }

  /** Another number of faces turns the same spring force into another torque. */
  private static String shims(PartsKit kit, KitSetting now, KitSetting then) {
    Optional<Shims> before = Shims.of(kit, kit.build(now));
    Optional<Shims> after = Shims.of(kit, kit.build(then));
    if (before.isPresent() && after.isPresent()) {
      String from = before.get().millimetres();
      String to = after.get().millimetres();
      return "shims on each side "
          + (from.equals(to) ? "stay at " + to : "from " + from + " to " + to)
          + "\u00a0mm, then check on the bench";
    }
    if (now.facesPerSide() != then.facesPerSide()) {
      return "another number of faces needs another spring force: shim to the bench";
    }
    double step = kit.preload().step();
    return "shims "
        + Shown.signed((then.preload() - now.preload()) / step, 0)
        + " × "
        + Shown.torque(step);
  }

  private static String fitted(PartsKit kit, KitSetting setting) {
    RingSet set = kit.ringSet(setting.ringSet());
    return set.reversible() ? set.name() + " " + facing(setting) : set.name();
  }

  private static String facing(KitSetting setting) {
    return setting.turned() ? "turned round" : "not turned";
  }
}
