package rampwright.optimiser.event;

/**
 * A limit that every proposed setting must meet.
 *
 * @param measure what is limited
 * @param value the limit (SI)
 */
public record SettingLimit(LimitedMeasure measure, double value) {
  /** Checks the value. */
  public SettingLimit {
    measure.quantity().check(value);
  }
}
