package rampwright.vehicle.trim;

/**
 * Stability and control of a trim: sideslip and yaw rate are linearised with steer, cage torque and
 * brake torques held, while wheel speeds and wheel loads re-balance at once and each friction unit
 * keeps sticking or keeps sliding.
 *
 * <pre>
 *   d(beta)/dt = Y/(m v) - r      d(r)/dt = N/Izz
 * </pre>
 *
 * with Y the force normal to the path's tangent and N the yaw moment. A growth rate of zero is
 * where the stability index of Milliken's moment method changes sign. Must be called right after
 * the {@link Equilibrium} that found the trim; uses its evaluation.
 */
final class Stability {
  private static final int BETA = 0;
  private static final int YAW = 1;
  private static final int STEER = 2;

  private final SmallSystem system = new SmallSystem(6, 3);
  private final double[] normalForce = new double[3];
  private final double[] yawMoment = new double[3];

  /** Largest real part of the two eigenvalues (1/s). */
  double sigma;

  /** Yaw moment gained per steer angle over m g L, yaw rate following the lateral force (-). */
  double control;

  void evaluate(ForceBalance forces, DrivelineEquations driveline, double v, double beta) {
    int active = driveline.activeWheels.length;
    int n = 2 + active;
    double radius = forces.radius(driveline.activeWheels[active - 1]);
    double speedScale = 0.05 * v / radius;
    double torqueScale = forces.weight * radius;
    forces.direction(0, 0, 0, 1, 0, 0);
    store(forces, driveline, 0, -1, 0, speedScale, torqueScale, 1);
    forces.direction(0, 0, 0, 0, 1, 0);
    store(forces, driveline, 1, 0, -1, speedScale, torqueScale, 1);
    for (int j = 0; j < active; j++) {
      forces.slipDirection(driveline.activeWheels[j]);
      store(forces, driveline, 2 + j, 0, 0, speedScale, torqueScale, 1);
    }
    int side = system.rightHandSide(0, 0);
    forces.direction(1, 0, 0, 0, 0, 0);
    store(forces, driveline, side + BETA, 0, 0, speedScale, torqueScale, -1);
    yawMoment[BETA] = forces.change[ForceBalance.M];
    forces.direction(0, 1, 0, 0, 0, 0);
    store(forces, driveline, side + YAW, 0, 0, speedScale, torqueScale, -1);
    yawMoment[YAW] = forces.change[ForceBalance.M];
    forces.direction(0, 0, 1, 0, 0, 0);
    store(forces, driveline, side + STEER, 0, 0, speedScale, torqueScale, -1);
    yawMoment[STEER] = forces.change[ForceBalance.M];
    if (!system.solve(n, 3)) {
      sigma = Double.POSITIVE_INFINITY;
      control = 0;
      return;
    }
    double cosBeta = Math.cos(beta);
    double sinBeta = Math.sin(beta);
    for (int k = 0; k < 3; k++) {
      double dFx = system.a[system.rightHandSide(0, k)];
      double dFy = system.a[system.rightHandSide(1, k)];
      normalForce[k] = forces.mass * (dFy * cosBeta - dFx * sinBeta);
      forces.direction(0, 0, 0, dFx, dFy, 0);
      yawMoment[k] += forces.change[ForceBalance.M];
      for (int j = 0; j < active; j++) {
        forces.slipDirection(driveline.activeWheels[j]);
        yawMoment[k] += forces.change[ForceBalance.M] * system.a[system.rightHandSide(2 + j, k)];
      }
    }
    // the normal itself turns with the sideslip
    normalForce[BETA] -=
        forces.value[ForceBalance.X] * cosBeta + forces.value[ForceBalance.Y] * sinBeta;
    eigenvalue(forces, v);
  }

  private void eigenvalue(ForceBalance forces, double v) {
    double momentum = forces.mass * v;
    double yBeta = normalForce[BETA];
    double yYaw = normalForce[YAW] / v;
    double nBeta = yawMoment[BETA];
    double nYaw = yawMoment[YAW] / v;
    double a11 = yBeta / momentum;
    double a12 = yYaw / momentum - 1;
    double a21 = nBeta / forces.yawInertia;
    double a22 = nYaw / forces.yawInertia;
    double half = (a11 + a22) / 2;
    double discriminant = half * half - (a11 * a22 - a12 * a21);
    sigma = discriminant > 0 ? half + Math.sqrt(discriminant) : half;
    control =
        (yawMoment[STEER] + nYaw * normalForce[STEER] / (momentum - yYaw))
            / (forces.weight * forces.wheelbase);
  }

  private void store(
      ForceBalance forces,
      DrivelineEquations driveline,
      int column,
      double dFx,
      double dFy,
      double speedScale,
      double torqueScale,
      int sign) {
    double[] a = system.a;
    double[] change = forces.change;
    a[system.at(0, column)] = sign * (change[ForceBalance.X] / forces.mass + dFx);
    a[system.at(1, column)] = sign * (change[ForceBalance.Y] / forces.mass + dFy);
    int row = 2;
    for (DifferentialEquation differential : driveline.differentials) {
      a[system.at(row++, column)] = sign * differential.change(change, speedScale, torqueScale);
    }
    if (driveline.undrivenCageOf != null) {
      a[system.at(row++, column)] = sign * driveline.undrivenCageOf.apply(change) / torqueScale;
    }
    a[system.at(row, column)] = sign * driveline.totalTorqueOf.apply(change) / torqueScale;
  }
}
