package rampwright.vehicle.manoeuvre;

import java.util.List;

/**
 * A solved motion.
 *
 * @param samples moments at even spacing from the start on
 * @param ending why it ended
 */
public record Motion(List<MotionSample> samples, Ending ending) {
  /** Why a motion ended. */
  public enum Ending {
    /** The time was over. */
    COMPLETE,
    /** A wheel came to a stop under its brake; the model does not go beyond that. */
    WHEEL_LOCKED,
    /** The sideslip angle passed 60 degrees. */
    SPUN,
    /** The car was slower than 3 m/s. */
    SLOW
  }

  /** Copies the list. */
  public Motion {
    samples = List.copyOf(samples);
  }

  /** Returns the last moment. */
  public MotionSample last() {
    return samples.get(samples.size() - 1);
  }
}
