package rampwright.web.widget;

import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;

/** Settings in words. */
public final class SettingWords {
  private SettingWords() {}

  /** Returns what the crew fits, or the kind of a differential that the kit cannot build. */
  public static String parts(NamedSetting setting) {
    return setting
        .kitSetting()
        .map(SettingWords::parts)
        .orElseGet(() -> kind(setting.differentials().rear()) + ", for comparison only");
  }

  /** Returns what the crew fits. */
  public static String parts(KitSetting setting) {
    return "ring set "
        + setting.ringSet()
        + (setting.turned() ? " turned round, " : ", ")
        + setting.facesPerSide()
        + " faces per side";
  }

  /** Returns everything about a choice from the kit. */
  public static String whole(KitSetting setting) {
    return parts(setting) + ", preload " + Shown.of(PlateDifferential.PRELOAD, setting.preload());
  }

  private static String kind(Differential differential) {
    if (differential instanceof OpenDifferential) {
      return "open differential";
    }
    if (differential instanceof Spool) {
      return "locked axle (spool)";
    }
    return differential instanceof PlateDifferential
        ? "plate differential by its law"
        : differential.getClass().getSimpleName();
  }
}
