package rampwright.optimiser.event;

import java.util.Optional;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.differential.DifferentialSet;

/**
 * A setting that people talk about.
 *
 * @param name unique in the event
 * @param kitSetting the choice from the kit; empty for a differential that the kit cannot build and
 *     that is only compared with
 * @param differentials the laws that the lap sees
 */
public record NamedSetting(
    String name, Optional<KitSetting> kitSetting, DifferentialSet differentials) {}
