package rampwright.vehicle.manoeuvre;

import java.util.function.ToDoubleFunction;
import rampwright.vehicle.trim.Trim;

/**
 * How the car answers a disturbance in a turn.
 *
 * <p>The yaw rate is compared with the one that would keep the car on its circle at the speed of
 * that moment, {@code v(t)/R}: positive when the car turns in, negative when it runs wide. The
 * change of sideslip is positive when the tail goes out.
 *
 * @param manoeuvre the disturbance
 * @param before the steady turn
 * @param motion what followed, from the first change of throttle or brake on
 */
public record TurnResponse(TurnManoeuvre manoeuvre, Trim before, Motion motion) {
  /** Moment (s) at which both standards read the response. */
  public static final double READING = 1;

  /**
   * Returns the deviation of the yaw rate (rad/s) after one second, or when the motion ended
   * before.
   */
  public double yawRateDeviation() {
    return deviation(reading());
  }

  /** Returns the deviation of the yaw rate (rad/s) of largest size. */
  public double peakYawRateDeviation() {
    return peak(this::deviation);
  }

  /** Returns the change of sideslip (rad) after one second, or when the motion ended before. */
  public double sideslipChange() {
    return tailOut(reading());
  }

  /** Returns the change of sideslip (rad) of largest size. */
  public double peakSideslipChange() {
    return peak(this::tailOut);
  }

  private MotionSample reading() {
    MotionSample found = motion.samples().get(0);
    for (MotionSample sample : motion.samples()) {
      if (sample.time() <= READING + 1e-9) {
        found = sample;
      }
    }
    return found;
  }

  private double deviation(MotionSample sample) {
    return sample.state().yawRate() - sample.state().speed() * before.curvature();
  }

  /** In a left turn a tail that goes out turns the velocity to the right of the body. */
  private double tailOut(MotionSample sample) {
    return before.sideslip() - sample.state().sideslip();
  }

  private double peak(ToDoubleFunction<MotionSample> measure) {
    double peak = 0;
    for (MotionSample sample : motion.samples()) {
      double value = measure.applyAsDouble(sample);
      if (Math.abs(value) > Math.abs(peak)) {
        peak = value;
      }
    }
    return peak;
  }
}
