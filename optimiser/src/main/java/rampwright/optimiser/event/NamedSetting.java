package rampwright.optimiser.event;

import java.util.Optional;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.input.InvalidInput;

/**
 * A setting that people talk about.
 *
 * @param name unique in the event
 * @param kitSetting the choice from the kit; empty for a differential that the kit cannot build and
 *     that is only compared with
 * @param differentials the laws that the lap sees
 */
public record NamedSetting(
    String name, Optional<KitSetting> kitSetting, DifferentialSet differentials) {
  /**
   * Returns a setting built from the kit, in the rear axle of a rear-wheel-drive car.
   *
   * @throws InvalidInput when the kit cannot build it
   */
  public static NamedSetting of(String name, PartsKit kit, KitSetting setting) {
    DifferentialSet none = DifferentialSet.rear(OpenDifferential.IDEAL);
    return of(name, kit, setting, DriveLayout.REAR, none);
  }

  /**
   * Returns a setting built from the kit, in the front axle of a front-wheel-drive car and in the
   * rear axle of any other.
   *
   * @param others what is in the other positions
   * @throws InvalidInput when the kit cannot build it
   */
  public static NamedSetting of(
      String name, PartsKit kit, KitSetting setting, DriveLayout layout, DifferentialSet others) {
    Differential law = kit.build(setting).law();
    DifferentialSet all =
        layout == DriveLayout.FRONT
            ? new DifferentialSet(law, others.centre(), others.rear())
            : new DifferentialSet(others.front(), others.centre(), law);
    return new NamedSetting(name, Optional.of(setting), all);
  }
}
