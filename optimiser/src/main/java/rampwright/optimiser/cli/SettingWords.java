package rampwright.optimiser.cli;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.file.DifferentialFile;

/** What a setting consists of, in words and as a document. */
final class SettingWords {
  private static final String KIND = "kind";
  private static final String OPEN = "open";

  private SettingWords() {}

  /** Returns the parts of a kit setting or the laws of one that the kit cannot build. */
  static String text(Event event, NamedSetting setting) {
    return setting.kitSetting().map(SettingWords::parts).orElseGet(() -> laws(event, setting));
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

  /** Returns the laws of all driven positions in the words of the event's file. */
  private static String laws(Event event, NamedSetting setting) {
    DriveLayout layout = event.car().driveline().layout();
    return DifferentialFile.writeSet(setting.differentials(), layout).entrySet().stream()
        .map(law -> law.getKey() + " " + law(law.getValue()))
        .collect(Collectors.joining(", "));
  }

  private static String law(Object written) {
    Map<?, ?> law = (Map<?, ?>) written;
    String kind = String.valueOf(law.get(KIND)).replace('_', ' ');
    List<String> numbers = new ArrayList<>();
    law.forEach(
        (key, value) -> {
          boolean ideal = value instanceof BigDecimal number && number.signum() == 0;
          if (!key.equals(KIND) && !(ideal && kind.equals(OPEN))) {
            numbers.add(key + " " + value);
          }
        });
    return numbers.isEmpty() ? kind : kind + " (" + String.join(", ", numbers) + ")";
  }

  /** Adds what a setting consists of. */
  static void put(JsonMap out, Event event, NamedSetting setting) {
    out.put("setting", setting.name());
    setting.kitSetting().ifPresent(fitted -> out.put("kitSetting", document(event, fitted)));
    DriveLayout layout = event.car().driveline().layout();
    out.put("differentials", DifferentialFile.writeSet(setting.differentials(), layout));
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
