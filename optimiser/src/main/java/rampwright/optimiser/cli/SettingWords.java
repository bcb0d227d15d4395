package rampwright.optimiser.cli;

import java.util.Map;
import java.util.stream.Collectors;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;

/** What a setting consists of, in words and as a document. */
final class SettingWords {
  private SettingWords() {}

  /** Returns the parts of a kit setting or the laws of one that the kit cannot build. */
  static String text(Event event, NamedSetting setting) {
    return setting
        .kitSetting()
        .map(SettingWords::parts)
        .orElseGet(
            () ->
                Position.driven(event).stream()
                    .map(p -> p.label() + " " + law(p.of(setting.differentials())))
                    .collect(Collectors.joining(", ")));
  }

  /** Returns what the crew fits. */
  static String parts(KitSetting fitted) {
    return "ring set "
        + fitted.ringSet()
        + (fitted.turned() ? " turned round, " : ", ")
        + fitted.facesPerSide()
        + " faces per side, preload "
        + Shown.number(fitted.preload(), 0)
        + " N·m";
  }

  private static String law(Differential law) {
    if (law instanceof OpenDifferential) {
      return "open";
    }
    if (law instanceof Spool) {
      return "spool";
    }
    if (law instanceof PlateDifferential plate) {
      return "plates with preload "
          + Shown.number(plate.preload(), 0)
          + " N·m, drive share "
          + Shown.number(plate.driveShare(), 3)
          + ", coast share "
          + Shown.number(plate.coastShare(), 3);
    }
    return law.getClass().getSimpleName();
  }

  /** Returns what the crew fits and the law that it gives. */
  static Map<String, Object> document(Event event, KitSetting fitted) {
    PlateBuild build = event.kit().build(fitted);
    PlateDifferential law = build.law();
    return new JsonMap()
        .put("ringSet", fitted.ringSet())
        .put("turned", fitted.turned())
        .put("driveAngleDeg", Math.toDegrees(build.driveAngle()))
        .put("coastAngleDeg", Math.toDegrees(build.coastAngle()))
        .put("facesPerSide", fitted.facesPerSide())
        .put("preloadNm", fitted.preload())
        .put("driveShare", law.driveShare())
        .put("coastShare", law.coastShare())
        .map();
  }
}
