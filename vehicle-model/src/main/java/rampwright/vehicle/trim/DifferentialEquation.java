package rampwright.vehicle.trim;

import rampwright.vehicle.differential.Differential;

/**
 * The law of one differential as an equation of the trim. Torque difference, speed difference and
 * cage torque are linear in the results of {@link ForceBalance} and, with the brakes on, in the
 * input torque.
 *
 * <p>Sticking or sliding is decided exactly: with the friction torque difference {@code Df}, the
 * capacity {@code C}, the speed difference {@code dw} and a speed scale {@code w},
 *
 * <pre>
 *   z = Df + max(C, C0) dw/w      |z| &lt;= C g: dw = 0      otherwise: Df = C g sign(z)
 * </pre>
 *
 * with {@code g(dw)} the sliding factor, 1 at {@code dw = 0}. It is the semi-smooth form of the
 * law: any solution has {@code |Df| <= C} and slides in the direction of its friction, whatever
 * weight the speed difference has. With a weight that vanished with the capacity, Newton's method
 * would take every small error of the torques for sticking or sliding the other way; so the weight
 * stays of the order of what the tyres' stiffness gives. The row's sign is chosen so that it rises
 * with the speed of the left output whether sticking or sliding.
 */
final class DifferentialEquation {
  /** How the outputs stand to each other. */
  enum State {
    STICKING,
    LEFT_FASTER,
    RIGHT_FASTER,
    /** No friction: only the torque difference of viscous shear, or none. */
    FRICTIONLESS
  }

  /** Least weight of the speed difference in the choice of state, as a share of weight x radius. */
  private static final double LEAST_WEIGHT = 0.15;

  /** Distance from the edge, over the capacity, within which a correction may change the state. */
  private static final double EDGE = 1e-4;

  /** Speed difference (rad/s) that counts as none where sticking turns into sliding. */
  private static final double BARELY = 1e-6;

  private final Differential law;
  private final LinearForm differenceOf;
  private final LinearForm speedOf;
  private final LinearForm cageOf;
  private final double differenceByInput;
  private final double cageByInput;

  /** Torque of the right output minus the left (N·m). */
  double torqueDifference;

  /** Speed of the left output minus the right (rad/s). */
  double speedDifference;

  /** Torque into the case (N·m). */
  double cageTorque;

  /** Largest friction torque difference (N·m). */
  double capacity;

  /** Friction torque difference while sliding (N·m). */
  private double sliding;

  private double slidingByCage;
  private double slidingBySpeed;
  private double viscousSlope;

  /** Whether sticking is about to turn into sliding, or the reverse. */
  boolean atEdge;

  /** Sticking or sliding at the last evaluation. */
  State state;

  /** Scaled residual of the law at the last evaluation. */
  double residual;

  DifferentialEquation(
      Differential law,
      double[] differenceOf,
      double differenceByInput,
      double[] speedOf,
      double[] cageOf,
      double cageByInput) {
    this.law = law;
    this.differenceOf = LinearForm.of(differenceOf);
    this.differenceByInput = differenceByInput;
    this.speedOf = LinearForm.of(speedOf);
    this.cageOf = LinearForm.of(cageOf);
    this.cageByInput = cageByInput;
  }

  /**
   * Evaluates the law.
   *
   * @param value results of the force balance
   * @param input given cage torque of the whole car (N·m), used with the brakes on
   * @param speedScale {@code w} (rad/s)
   * @param torqueScale torque that counts as one in the residual (N·m)
   */
  void evaluate(double[] value, double input, double speedScale, double torqueScale) {
    torqueDifference = differenceOf.apply(value) + differenceByInput * input;
    speedDifference = speedOf.apply(value);
    cageTorque = cageOf.apply(value) + cageByInput * input;
    capacity = law.capacity(cageTorque);
    double factor = law.slidingFactor(speedDifference);
    sliding = capacity * factor;
    slidingByCage = law.capacitySlope(cageTorque) * factor;
    slidingBySpeed = capacity * law.slidingFactorSlope(speedDifference);
    viscousSlope = law.viscousSlope(speedDifference);
    double friction = torqueDifference - law.viscousTorque(speedDifference);
    atEdge = false;
    if (capacity == Double.POSITIVE_INFINITY) {
      state = State.STICKING;
    } else if (capacity <= 1e-12 * torqueScale) {
      state = State.FRICTIONLESS;
    } else {
      double weight = Math.max(capacity, LEAST_WEIGHT * torqueScale);
      double z = friction + weight * speedDifference / speedScale;
      atEdge = Math.abs(Math.abs(z) - sliding) < EDGE * weight;
      state = z > sliding ? State.LEFT_FASTER : z < -sliding ? State.RIGHT_FASTER : State.STICKING;
    }
    residual =
        switch (state) {
          case STICKING -> speedDifference / speedScale;
          case LEFT_FASTER -> (sliding - friction) / torqueScale;
          case RIGHT_FASTER -> (-sliding - friction) / torqueScale;
          case FRICTIONLESS -> -friction / torqueScale;
        };
  }

  /** Returns the change of the residual for a change of the force balance, state held. */
  double change(double[] change, double speedScale, double torqueScale) {
    double dSpeed = speedOf.apply(change);
    if (state == State.STICKING) {
      return dSpeed / speedScale;
    }
    double dFriction = differenceOf.apply(change) - viscousSlope * dSpeed;
    if (state == State.FRICTIONLESS) {
      return -dFriction / torqueScale;
    }
    double dSliding = slidingByCage * cageOf.apply(change) + slidingBySpeed * dSpeed;
    return (state == State.LEFT_FASTER ? dSliding - dFriction : -dSliding - dFriction)
        / torqueScale;
  }

  /**
   * Returns a copy of the state.
   *
   * @param wheelBrakeTorque torque with which the unit brakes wheels (N·m)
   */
  DifferentialState snapshot(double wheelBrakeTorque) {
    return new DifferentialState(
        cageTorque,
        Math.abs(torqueDifference),
        Math.abs(speedDifference),
        capacity,
        state == State.STICKING
            || state != State.FRICTIONLESS && Math.abs(speedDifference) < BARELY,
        wheelBrakeTorque);
  }
}
