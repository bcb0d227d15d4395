package rampwright.optimiser.search;

import rampwright.optimiser.event.SettingLimit;

/**
 * One limit of the event held against a setting.
 *
 * @param limit the limit
 * @param value the setting's value of the limited measure (SI); the worst of the event's circuits
 */
public record LimitCheck(SettingLimit limit, double value) {
  /** Returns the excess over the limit (-), in the measure's own scale; zero when it is met. */
  public double violation() {
    return limit.measure().violation(value, limit.value());
  }

  /** Returns whether the limit is met. */
  public boolean met() {
    return violation() == 0;
  }
}
