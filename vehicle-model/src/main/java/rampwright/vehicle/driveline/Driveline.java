package rampwright.vehicle.driveline;

import java.util.List;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * From crankshaft to the case of the (centre) differential.
 *
 * @param engine the engine
 * @param gearRatios engine speed over gearbox output speed, first gear first, falling
 * @param finalDrive gearbox output speed over cage speed (-)
 * @param efficiency share of torque that arrives when driving (-); overrun torque is divided by it
 * @param shiftTime time without drive torque at each upshift (s)
 * @param layout driven axles
 * @param frontTorqueShare nominal front share of the centre differential, used by {@link
 *     DriveLayout#ALL} only (-)
 */
public record Driveline(
    Engine engine,
    List<Double> gearRatios,
    double finalDrive,
    double efficiency,
    double shiftTime,
    DriveLayout layout,
    double frontTorqueShare) {
  public static final Quantity GEAR_RATIO =
      Quantity.si("gear_ratios", "gear ratio", "", 0.1, 30, "");
  public static final Quantity FINAL_DRIVE =
      Quantity.si("final_drive", "final drive ratio", "", 0.5, 20, "");
  public static final Quantity EFFICIENCY =
      Quantity.si("efficiency", "driveline efficiency", "", 0.3, 1, "it was given in percent");
  public static final Quantity SHIFT_TIME =
      Quantity.si("shift_time_s", "shift time", "s", 0, 2, "the value is in milliseconds");
  public static final Quantity FRONT_TORQUE_SHARE =
      Quantity.si(
          "front_torque_share",
          "front share of the centre differential",
          "",
          0,
          1,
          "it was given in percent");

  /** Checks every value and that the ratios fall from gear to gear. */
  public Driveline {
    gearRatios = List.copyOf(gearRatios);
    if (gearRatios.isEmpty()) {
      throw InvalidInput.of("list of gear ratios", "empty", "at least one ratio", "");
    }
    for (int i = 0; i < gearRatios.size(); i++) {
      GEAR_RATIO.check(gearRatios.get(i));
      if (i > 0 && gearRatios.get(i) >= gearRatios.get(i - 1)) {
        throw InvalidInput.value(
            "ratio of gear " + (i + 1),
            gearRatios.get(i),
            "",
            "below that of the gear before it",
            "list first gear first");
      }
    }
    FINAL_DRIVE.check(finalDrive);
    EFFICIENCY.check(efficiency);
    SHIFT_TIME.check(shiftTime);
    FRONT_TORQUE_SHARE.check(frontTorqueShare);
  }

  /** Returns the number of gears. */
  public int gears() {
    return gearRatios.size();
  }

  /** Returns engine speed over cage speed in a gear (1 is first). */
  public double ratio(int gear) {
    return gearRatios.get(gear - 1) * finalDrive;
  }

  /** Returns the cage torque (N·m) with full throttle in a gear at a cage speed (rad/s). */
  public double fullTorque(int gear, double cageSpeed) {
    double ratio = ratio(gear);
    return engine.fullLoad().torque(cageSpeed * ratio) * ratio * efficiency;
  }

  /** Returns the derivative of the full-throttle cage torque with cage speed (N·m·s/rad). */
  public double fullTorqueSlope(int gear, double cageSpeed) {
    double ratio = ratio(gear);
    return engine.fullLoad().slope(cageSpeed * ratio) * ratio * ratio * efficiency;
  }

  /** Returns the cage torque (N·m, not positive) with closed throttle in a gear. */
  public double overrunTorque(int gear, double cageSpeed) {
    double ratio = ratio(gear);
    return engine.overrun().torque(cageSpeed * ratio) * ratio / efficiency;
  }

  /** Returns the gear with the most cage torque below the rev limit; top gear when none is. */
  public int bestGear(double cageSpeed) {
    int best = gears();
    double most = Double.NEGATIVE_INFINITY;
    for (int gear = 1; gear <= gears(); gear++) {
      boolean allowed = cageSpeed * ratio(gear) <= engine.revLimit();
      double torque = allowed ? fullTorque(gear, cageSpeed) : Double.NEGATIVE_INFINITY;
      if (torque > most) {
        most = torque;
        best = gear;
      }
    }
    return best;
  }
}
