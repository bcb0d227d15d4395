package rampwright.vehicle.differential.preload;

import java.util.Locale;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * The preload springs of a unit and the shims that set them. One stack presses on each plate pack;
 * it stands between pack and cover in a room whose length is known without shims:
 *
 * <pre>
 *   deflection = free height + shim - room          P = 2 N mu r_m F(deflection)
 * </pre>
 *
 * {@code P} is the whole torque difference, the preload of the law. A room longer than the free
 * height leaves the springs loose until the shims fill it.
 *
 * @param stack springs of one side
 * @param room length of the room for stack and shims with the case closed (m)
 */
public record PreloadSprings(DiscStack stack, double room) {
  public static final Quantity ROOM =
      new Quantity("spring_room_mm", "room for springs and shims", "mm", 1e-3, 0.1, 500, "");

  /** Deflection per cone height up to which the force follows the formula (-). */
  public static final double RELIABLE = 0.75;

  /** Checks the room. */
  public PreloadSprings {
    ROOM.check(room);
  }

  /** Returns the deflection of the stack (m) with shims of a thickness (m) on each side. */
  public double deflection(double shim) {
    return Math.max(0, stack.freeHeight() + shim - room);
  }

  /** Returns the whole torque difference (N·m) of the springs with shims of a thickness (m). */
  public double preload(double shim, PlateBuild build) {
    return stack.force(deflection(shim)) * torquePerForce(build);
  }

  /** Returns how much the preload rises per shim thickness (N·m/m). */
  public double preloadRate(double shim, PlateBuild build) {
    double deflection = deflection(shim);
    return deflection == 0 ? 0 : stack.rate(deflection) * torquePerForce(build);
  }

  /** Returns whether the springs can give a build its preload by adding shims. */
  public boolean gives(PlateBuild build) {
    double most = stack.force(stack.risingDeflection());
    double least = stack.force(deflection(0));
    return build.preloadForce() >= least && build.preloadForce() <= most;
  }

  /**
   * Returns the thickness of the shims (m) on each side that gives a build its preload.
   *
   * @throws InvalidInput when the springs cannot give it, or give more without any shim
   */
  public double shim(PlateBuild build) {
    double shim = stack.deflection(build.preloadForce()) + room - stack.freeHeight();
    if (shim < 0) {
      throw InvalidInput.value(
          "preload (whole torque difference)",
          build.preload(),
          "N·m",
          String.format(
              Locale.ROOT, "at least the %.1f N·m of the springs without shims", preload(0, build)),
          "fit thinner springs or fewer in parallel");
    }
    return shim;
  }

  /** Returns whether the springs are used only as far as their force follows the formula. */
  public boolean reliable(double shim) {
    return deflection(shim) <= RELIABLE * stack.series() * stack.spring().coneHeight();
  }

  /**
   * Returns by how much the preload (N·m) may be off: each tolerance by itself, added as the root
   * of the sum of squares.
   *
   * @param shim thickness of the shims (m)
   * @param height tolerance of everything that stands in the room together (m)
   * @param force tolerance of the spring force at a given height (-)
   * @param friction tolerance of the plate friction (-)
   */
  public double scatter(
      double shim, PlateBuild build, double height, double force, double friction) {
    double preload = preload(shim, build);
    double fromHeight = preloadRate(shim, build) * height;
    return Math.sqrt(
        fromHeight * fromHeight + preload * preload * (force * force + friction * friction));
  }

  /** Torque difference per spring force (m): {@code 2 N mu r_m}. */
  private static double torquePerForce(PlateBuild build) {
    return 2
        * build.facesPerSide()
        * build.hardware().plateFriction()
        * build.hardware().effectiveRadius();
  }
}
