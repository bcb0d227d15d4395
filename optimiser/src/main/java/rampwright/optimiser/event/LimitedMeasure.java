package rampwright.optimiser.event;

import rampwright.vehicle.input.Quantity;

/**
 * A measure that an event may limit. Each has a value that can be computed for a setting, its unit
 * and a scale that makes violations of different measures comparable.
 */
public enum LimitedMeasure {
  /** Mean understeer angle on exits less that of the current setting. */
  EXIT_UNDERSTEER_CHANGE(
      Quantity.degrees("max_exit_understeer_change_deg", "exit understeer change", -20, 20, ""),
      false,
      Math.PI / 180),
  /** Largest slide growth rate in braking and entry. */
  ENTRY_GROWTH(
      Quantity.si("max_entry_growth_1ps", "slide growth rate on entry", "1/s", -20, 50, ""),
      false,
      1),
  /** Largest slide growth rate in apex and exit. */
  EXIT_GROWTH(
      Quantity.si("max_exit_growth_1ps", "slide growth rate on exit", "1/s", -20, 50, ""),
      false,
      1),
  /** Largest slip of the inner driven wheel on exits. */
  INNER_SLIP(
      Quantity.si("max_inner_slip", "inner wheel slip", "", 0, 10, "it was given in percent"),
      false,
      0.1),
  /** Largest sliding power per friction area of the plates. */
  PLATE_POWER(
      new Quantity("max_plate_power_wpmm2", "plate power per area", "W/mm²", 1e6, 0, 100, ""),
      false,
      1e6),
  /** Energy turned into heat in the unit over a lap. */
  PLATE_ENERGY(
      new Quantity("max_plate_energy_kj", "plate energy per lap", "kJ", 1e3, 0, 1e6, ""),
      false,
      1e3),
  /** Smallest preload allowed. */
  PRELOAD_MIN(Quantity.si("min_preload_nm", "preload", "N·m", 0, 5000, ""), true, 10),
  /** Largest preload allowed. */
  PRELOAD_MAX(Quantity.si("max_preload_nm", "preload", "N·m", 0, 5000, ""), false, 10),
  /** Largest drive locking share of the ramps allowed. */
  DRIVE_SHARE_MAX(
      Quantity.si("max_drive_share", "drive locking share", "", 0, 100, ""), false, 0.1),
  /** Largest coast locking share of the ramps allowed. */
  COAST_SHARE_MAX(
      Quantity.si("max_coast_share", "coast locking share", "", 0, 100, ""), false, 0.1);

  private final Quantity quantity;
  private final boolean lower;
  private final double scale;

  LimitedMeasure(Quantity quantity, boolean lower, double scale) {
    this.quantity = quantity;
    this.lower = lower;
    this.scale = scale;
  }

  /** Returns the quantity of the limit's value: file key, label, shown unit, range. */
  public Quantity quantity() {
    return quantity;
  }

  /** Returns whether the limit is the smallest allowed value; else it is the largest. */
  public boolean lower() {
    return lower;
  }

  /** Returns the excess over the limit (-), in the measure's own scale; zero when it is met. */
  public double violation(double value, double limit) {
    return Math.max(0, lower ? limit - value : value - limit) / scale;
  }
}
