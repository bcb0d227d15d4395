package rampwright.vehicle.differential;

import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * One buildable state of a plate-type unit and the law that follows from its parts.
 *
 * <p>Two pressure rings are each driven by half the cage torque at the ramp radius; each presses on
 * a pack of {@code N} friction faces. With ramp angle {@code a} and {@code phi = atan(ramp
 * friction)}:
 *
 * <pre>
 *   F_ring = T / (2 r_ramp) * cot(a + phi)         (zero once a + phi reaches 90 degrees)
 *   T_side = N mu r_m (F_preload + F_ring)
 *   D_cap  = 2 T_side   =&gt;   k = N mu (r_m / r_ramp) cot(a + phi)
 * </pre>
 *
 * The springs act in parallel with the ramps. Side-gear thrust and the difference between static
 * and sliding friction are left out. Source: statics of the unit, our derivation.
 *
 * @param hardware the unit
 * @param ringSet the pressure rings
 * @param turned whether the ring set is fitted turned round
 * @param facesPerSide friction faces on each side ({@code N})
 * @param preload whole torque difference at zero cage torque (N·m)
 */
public record PlateBuild(
    PlateHardware hardware, RingSet ringSet, boolean turned, int facesPerSide, double preload) {
  public static final Quantity FACES_PER_SIDE =
      Quantity.si("faces_per_side", "friction faces per side", "", 1, 60, "");

  /** Checks every value and that a turned ring set can be turned. */
  public PlateBuild {
    FACES_PER_SIDE.check(facesPerSide);
    PlateDifferential.PRELOAD.check(preload);
    if (turned && !ringSet.reversible()) {
      throw InvalidInput.of(
          "ring set " + ringSet.name(),
          "turned",
          "fitted the normal way, it cannot be turned round",
          "");
    }
  }

  /** Returns the ramp angle on power as fitted (rad). */
  public double driveAngle() {
    return ringSet.driveAngle(turned);
  }

  /** Returns the ramp angle on overrun as fitted (rad). */
  public double coastAngle() {
    return ringSet.coastAngle(turned);
  }

  /** Returns the law of this build. */
  public PlateDifferential law() {
    return new PlateDifferential(preload, share(driveAngle()), share(coastAngle()));
  }

  /** Returns the clamping force of the preload springs on each pack (N). */
  public double preloadForce() {
    return preload / (2 * facesPerSide * hardware.plateFriction() * hardware.effectiveRadius());
  }

  /** Returns the total friction area of both packs (m²). */
  public double frictionArea() {
    return 2 * facesPerSide * hardware.faceArea();
  }

  private double share(double rampAngle) {
    double flank = rampAngle + Math.atan(hardware.rampFriction());
    if (flank >= Math.PI / 2) {
      return 0;
    }
    return facesPerSide
        * hardware.plateFriction()
        * hardware.effectiveRadius()
        / (hardware.rampRadius() * Math.tan(flank));
  }
}
