package rampwright.web.widget;

import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.event.SettingLimit;
import rampwright.vehicle.input.Quantity;

/** Limits in words. */
public final class LimitWords {
  private LimitWords() {}

  /** Returns what a limit is set on. */
  public static String of(LimitedMeasure measure) {
    return (measure.lower() ? "Least " : "Most ") + measure.quantity().label();
  }

  /** Returns what a limit allows. */
  public static String allowed(SettingLimit limit) {
    return (limit.measure().lower() ? "at least " : "at most ")
        + Shown.of(limit.measure().quantity(), limit.value());
  }

  /** Returns a value of a limited measure (SI) in at most three decimals. */
  public static String value(LimitedMeasure measure, double si) {
    Quantity quantity = measure.quantity();
    double shown = Math.rint(si / quantity.siPerUnit() * 1000) / 1000;
    return Shown.of(quantity, shown * quantity.siPerUnit());
  }

  /** Returns whether a limit is met, with a sign that needs no colour. */
  public static String met(boolean met) {
    return met ? "✓ met" : "✗ not met";
  }
}
