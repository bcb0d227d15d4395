package rampwright.vehicle.differential;

/** Locked: both outputs always turn at the same speed, whatever torque difference that takes. */
public record Spool() implements Differential {
  @Override
  public double capacity(double cageTorque) {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public double capacitySlope(double cageTorque) {
    return 0;
  }
}
