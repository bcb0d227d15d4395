package rampwright.optimiser.sheet;

import java.util.Optional;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.preload.DiscStack;
import rampwright.vehicle.differential.preload.PreloadSprings;

/**
 * The shims that give a build its preload, from the kit's springs. A starting point: the bench
 * decides.
 *
 * @param stack springs of one side
 * @param thickness shims on each side (m)
 * @param deflection how far they press the springs (m)
 * @param rate change of the whole torque difference per shim thickness (N·m/m)
 * @param reliable whether the springs stay where their force follows the formula
 */
public record Shims(
    DiscStack stack, double thickness, double deflection, double rate, boolean reliable) {
  /** Returns the shims; empty when the kit's springs are unknown or cannot give the preload. */
  public static Optional<Shims> of(PartsKit kit, PlateBuild build) {
    return kit.springs().filter(springs -> springs.gives(build)).map(s -> of(s, build));
  }

  private static Shims of(PreloadSprings springs, PlateBuild build) {
    double shim = springs.shim(build);
    return new Shims(
        springs.stack(),
        shim,
        springs.deflection(shim),
        springs.preloadRate(shim, build),
        springs.reliable(shim));
  }

  /** Returns the thickness in millimetres as the bench needs it. */
  String millimetres() {
    return Shown.number(thickness * 1e3, 2);
  }
}
