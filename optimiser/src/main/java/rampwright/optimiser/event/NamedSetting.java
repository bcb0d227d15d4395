package rampwright.optimiser.event;

import java.util.Optional;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.DifferentialSet;
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
   * Returns a setting built from the kit, in the rear axle.
   *
   * @throws InvalidInput when the kit cannot build it
   */
  public static NamedSetting of(String name, PartsKit kit, KitSetting setting) {
    return new NamedSetting(
        name, Optional.of(setting), DifferentialSet.rear(kit.build(setting).law()));
  }
}
