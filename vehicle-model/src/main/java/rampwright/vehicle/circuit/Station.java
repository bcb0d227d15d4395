package rampwright.vehicle.circuit;

import rampwright.vehicle.input.Quantity;

/**
 * One station of a circuit.
 *
 * @param distance distance along the line (m)
 * @param curvature path curvature (1/m), positive to the left
 * @param x position (m)
 * @param y position (m)
 * @param grade slope along the path (rad), positive uphill
 * @param bank cross slope (rad), positive when it helps a left turn: the right edge is the higher
 * @param gripLeft factor on the grip of the left wheels (-)
 * @param gripRight factor on the grip of the right wheels (-)
 */
public record Station(
    double distance,
    double curvature,
    double x,
    double y,
    double grade,
    double bank,
    double gripLeft,
    double gripRight) {
  public static final Quantity DISTANCE = Quantity.si("distance_m", "distance", "m", 0, 1e6, "");
  public static final Quantity CURVATURE =
      Quantity.si(
          "curvature_1pm", "curvature", "1/m", -0.5, 0.5, "the column holds radii in metres");
  public static final Quantity POSITION = Quantity.si("x_m", "position", "m", -1e7, 1e7, "");
  public static final Quantity GRADE = Quantity.degrees("grade_deg", "grade", -30, 30, "");
  public static final Quantity BANK = Quantity.degrees("bank_deg", "bank", -50, 50, "");
  public static final Quantity GRIP = Quantity.si("grip_factor", "grip factor", "", 0.05, 2, "");

  /** Checks every value. */
  public Station {
    DISTANCE.check(distance);
    CURVATURE.check(curvature);
    POSITION.check(x);
    POSITION.check(y);
    GRADE.check(grade);
    BANK.check(bank);
    GRIP.check(gripLeft);
    GRIP.check(gripRight);
  }

  /** Returns a station of a flat road with even grip. */
  public static Station flat(double distance, double curvature, double x, double y) {
    return new Station(distance, curvature, x, y, 0, 0, 1, 1);
  }
}
