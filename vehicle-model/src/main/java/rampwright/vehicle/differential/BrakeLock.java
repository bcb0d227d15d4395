package rampwright.vehicle.differential;

import rampwright.vehicle.input.Quantity;

/**
 * Open differential whose control brakes a wheel that spins forward more than the other:
 *
 * <pre>
 *   T_brake = min(limit, gain * max(0, min(s - s_other - threshold, s)))
 * </pre>
 *
 * on the wheel with the larger slip {@code s}; the outputs get equal torques, so that the other
 * wheel gains what the brake takes. The energy is lost as heat in the brake, not moved: the engine
 * must deliver {@code T_brake} more. Slip, not wheel speed, because the control allows for the
 * speeds that a turn asks of the wheels; nothing is braked on overrun or under the service brakes,
 * where slips are negative.
 *
 * <p>The law is a steady idealisation of ours; real control pulses and fades with heat.
 *
 * @param threshold slip difference from which the brake comes on (-)
 * @param gain brake torque per slip difference beyond it (N·m)
 * @param limit largest brake torque on the wheel (N·m)
 */
public record BrakeLock(double threshold, double gain, double limit) implements Differential {
  public static final Quantity THRESHOLD =
      Quantity.si(
          "slip_threshold",
          "slip difference at first braking",
          "",
          0,
          1,
          "it was given in percent");
  public static final Quantity GAIN =
      Quantity.si("gain_nm", "brake torque per slip difference", "N·m", 0, 1e6, "");
  public static final Quantity LIMIT =
      Quantity.si("brake_limit_nm", "largest brake torque on one wheel", "N·m", 0, 20000, "");

  /** Checks every value. */
  public BrakeLock {
    THRESHOLD.check(threshold);
    GAIN.check(gain);
    LIMIT.check(limit);
  }

  @Override
  public double capacity(double cageTorque) {
    return 0;
  }

  @Override
  public double capacitySlope(double cageTorque) {
    return 0;
  }

  @Override
  public double wheelBrakeTorque(double slip, double otherSlip) {
    double excess = Math.min(slip - otherSlip - threshold, slip);
    return Math.min(limit, gain * Math.max(0, excess));
  }

  @Override
  public double wheelBrakeBySlip(double slip, double otherSlip) {
    return proportional(slip, otherSlip) ? gain : 0;
  }

  @Override
  public double wheelBrakeByOtherSlip(double slip, double otherSlip) {
    boolean ownSlipDecides = otherSlip + threshold < 0;
    return proportional(slip, otherSlip) && !ownSlipDecides ? -gain : 0;
  }

  private boolean proportional(double slip, double otherSlip) {
    double torque = wheelBrakeTorque(slip, otherSlip);
    return torque > 0 && torque < limit;
  }
}
