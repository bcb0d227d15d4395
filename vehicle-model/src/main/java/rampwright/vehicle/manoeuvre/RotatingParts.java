package rampwright.vehicle.manoeuvre;

import rampwright.vehicle.input.Quantity;

/**
 * What turns with the wheels. Engine and gears are left out: in a low gear they add several times
 * as much to the driven wheels, which slows wheel spin and not the car's yaw.
 *
 * @param frontWheel moment of inertia of one front wheel with tyre, disc and hub (kg·m²)
 * @param rearWheel the same at the rear (kg·m²)
 */
public record RotatingParts(double frontWheel, double rearWheel) {
  public static final Quantity WHEEL_INERTIA =
      Quantity.si("wheel_inertia_kgm2", "wheel inertia", "kg·m²", 0.01, 500, "");

  /** Usual for a passenger or touring car's wheel (common practice, no source). */
  public static final RotatingParts USUAL = new RotatingParts(1.1, 1.1);

  /** Checks both values. */
  public RotatingParts {
    WHEEL_INERTIA.check(frontWheel);
    WHEEL_INERTIA.check(rearWheel);
  }
}
