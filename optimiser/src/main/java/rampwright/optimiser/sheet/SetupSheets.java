package rampwright.optimiser.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.SettingLimit;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.search.EvaluatedSetting;
import rampwright.optimiser.search.SettingEvaluator;
import rampwright.optimiser.sheet.SetupSheet.LimitLine;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.input.InvalidInput;

/** Makes the content of setup sheets. */
public final class SetupSheets {
  /** What every sheet says: common practice, no source. */
  static final List<String> CAUTIONS =
      List.of(
          "The maker's manual and torque figures prevail over this sheet; so do the rules of the"
              + " event.",
          "Wheels off the ground, car on stands, before anything is undone or any wheel is"
              + " turned.",
          "Eye protection: springs are under load when the case is opened and closed.",
          "A computed proposal: try it only where fast driving is licensed, and build up to it.");

  private SetupSheets() {}

  /**
   * Returns the sheet of a setting. Solves the laps of this setting and of the current one.
   *
   * @throws InvalidInput when the setting is none that the kit builds
   */
  public static SetupSheet of(Event event, NamedSetting setting) {
    return of(event, setting, SettingEvaluator.of(event));
  }

  /**
   * Returns the sheet of a setting, with an evaluator of the same event that may know it already.
   *
   * @throws InvalidInput when the setting is none that the kit builds
   */
  public static SetupSheet of(Event event, NamedSetting setting, SettingEvaluator evaluator) {
    KitSetting wanted = setting.kitSetting().orElseThrow(() -> notBuilt(event, setting));
    PlateBuild build = event.kit().build(wanted);
    return new SetupSheet(
        event.name(),
        setting.name(),
        event.car().name(),
        event.car().driveline().layout() == DriveLayout.FRONT ? "front axle" : "rear axle",
        event.conditions(),
        event.driver(),
        event.kit().name(),
        build,
        PlateStack.of(event.kit(), wanted.facesPerSide()),
        BenchCheck.of(build, event.kit().preload().step()),
        event.kit().springs().isPresent(),
        Shims.of(event.kit(), build),
        SettingChange.of(event, setting, wanted),
        event.circuits().stream()
            .map(circuit -> LapComparison.of(event, setting, circuit))
            .toList(),
        limits(event, wanted, evaluator),
        CAUTIONS);
  }

  private static List<LimitLine> limits(
      Event event, KitSetting wanted, SettingEvaluator evaluator) {
    if (event.limits().isEmpty()) {
      return List.of();
    }
    EvaluatedSetting evaluated = evaluator.evaluate(wanted);
    return event.limits().stream().map(limit -> line(limit, evaluated)).toList();
  }

  private static InvalidInput notBuilt(Event event, NamedSetting setting) {
    List<String> built = new ArrayList<>();
    for (NamedSetting other : event.settings()) {
      if (other.kitSetting().isPresent()) {
        built.add(other.name());
      }
    }
    return InvalidInput.of(
        "setting of a setup sheet",
        setting.name(),
        "built from the parts kit; a differential that is only compared with has no parts to fit",
        built.isEmpty() ? "give the event a setting from its kit" : "use one of: " + built);
  }

  /** A measure that no lap has, and so no value, is possible: a growth rate where no exit is. */
  private static LimitLine line(SettingLimit limit, EvaluatedSetting evaluated) {
    Double value = evaluated.measures().get(limit.measure());
    return new LimitLine(limit, value == null ? OptionalDouble.empty() : OptionalDouble.of(value));
  }
}
