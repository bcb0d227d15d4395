package rampwright.vehicle.chassis;

import rampwright.vehicle.input.Quantity;

/**
 * Aerodynamics as areas (coefficient times reference area). Drag acts against the path at the
 * height of the centre of gravity; downforce acts at the axles.
 *
 * @param dragArea drag coefficient times area (m²)
 * @param downforceAreaFront downforce coefficient times area at the front axle (m²), negative lifts
 * @param downforceAreaRear downforce coefficient times area at the rear axle (m²)
 */
public record Aero(double dragArea, double downforceAreaFront, double downforceAreaRear) {
  public static final Quantity DRAG_AREA =
      Quantity.si("drag_area_m2", "drag area", "m²", 0, 20, "");
  public static final Quantity DOWNFORCE_FRONT =
      Quantity.si("downforce_area_front_m2", "front downforce area", "m²", -5, 20, "");
  public static final Quantity DOWNFORCE_REAR =
      Quantity.si("downforce_area_rear_m2", "rear downforce area", "m²", -5, 20, "");

  /** Checks every value. */
  public Aero {
    DRAG_AREA.check(dragArea);
    DOWNFORCE_FRONT.check(downforceAreaFront);
    DOWNFORCE_REAR.check(downforceAreaRear);
  }
}
