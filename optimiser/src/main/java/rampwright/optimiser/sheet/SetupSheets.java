package rampwright.optimiser.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.SettingLimit;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.sheet.SetupSheet.LimitLine;
import rampwright.vehicle.differential.PlateBuild;
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
    KitSetting wanted = setting.kitSetting().orElseThrow(() -> notBuilt(event, setting));
    PlateBuild build = event.kit().build(wanted);
    return new SetupSheet(
        event.name(),
        setting.name(),
        event.car().name(),
        event.conditions(),
        event.driver(),
        event.kit().name(),
        build,
        PlateStack.of(event.kit(), wanted.facesPerSide()),
        BenchCheck.of(build, event.kit().preload().step()),
        event.kit().springs().isPresent(),
        Shims.of(event.kit(), build),
        SettingChange.of(event.kit(), event.current(), wanted),
        event.circuits().stream()
            .map(circuit -> LapComparison.of(event, setting, circuit))
            .toList(),
        event.limits().stream().map(limit -> line(limit, build)).toList(),
        CAUTIONS);
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

  private static LimitLine line(SettingLimit limit, PlateBuild build) {
    OptionalDouble value =
        switch (limit.measure()) {
          case PRELOAD_MIN, PRELOAD_MAX -> OptionalDouble.of(build.preload());
          case DRIVE_SHARE_MAX -> OptionalDouble.of(build.law().driveShare());
          case COAST_SHARE_MAX -> OptionalDouble.of(build.law().coastShare());
          default -> OptionalDouble.empty();
        };
    return new LimitLine(limit, value);
  }
}
