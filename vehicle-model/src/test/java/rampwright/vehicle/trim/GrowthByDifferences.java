package rampwright.vehicle.trim;

import java.util.Arrays;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;

/**
 * Growth rate of a slide by disturbing {@link PlanarCar}: sideslip and yaw rate are moved by small
 * amounts, wheel loads and the slips of the driven rear wheels (all wheels with the brakes on)
 * settle again at held cage and brake torque, and the eigenvalues follow from differences.
 */
final class GrowthByDifferences {
  private static final double STEP = 1e-5;

  private final PlanarCar planar;
  private final Trim trim;
  private final boolean sticks;
  private final double share;
  private final double[] heldTorque;

  private GrowthByDifferences(Car car, Conditions conditions, Trim trim, double capacityShare) {
    this.planar = new PlanarCar(car, conditions);
    this.trim = trim;
    this.sticks = trim.axles().get(1).sticking();
    this.share = capacityShare;
    this.heldTorque = new double[4];
    for (int i = 0; i < 4; i++) {
      heldTorque[i] = trim.wheels().get(i).fx() * planar.radius(i);
    }
  }

  /**
   * Returns the largest real part (1/s) for a rear-wheel-drive car.
   *
   * @param capacityShare change of the friction torque difference with cage torque while sliding
   */
  static double of(Car car, Conditions conditions, Trim trim, double capacityShare) {
    return new GrowthByDifferences(car, conditions, trim, capacityShare).growth();
  }

  private double growth() {
    double[] base = {trim.sideslip(), trim.speed() * trim.curvature()};
    double[] step = {STEP, STEP * 10};
    RealMatrix a = MatrixUtils.createRealMatrix(2, 2);
    for (int j = 0; j < 2; j++) {
      double[] up = base.clone();
      double[] down = base.clone();
      up[j] += step[j];
      down[j] -= step[j];
      double[] above = rates(up[0], up[1]);
      double[] below = rates(down[0], down[1]);
      for (int i = 0; i < 2; i++) {
        a.setEntry(i, j, (above[i] - below[i]) / (2 * step[j]));
      }
    }
    return Arrays.stream(new EigenDecomposition(a).getRealEigenvalues()).max().orElseThrow();
  }

  /** Rates of sideslip and yaw rate after loads and wheel speeds have settled. */
  private double[] rates(double sideslip, double yawRate) {
    double[] unknown = start();
    for (int k = 0; k < 12; k++) {
      double[] miss = misses(sideslip, yawRate, unknown);
      RealMatrix jacobian = MatrixUtils.createRealMatrix(6, 6);
      for (int j = 0; j < 6; j++) {
        double h = j < 2 ? 1e-5 : 1e-7;
        double[] up = unknown.clone();
        double[] down = unknown.clone();
        up[j] += h;
        down[j] -= h;
        double[] above = misses(sideslip, yawRate, up);
        double[] below = misses(sideslip, yawRate, down);
        for (int i = 0; i < 6; i++) {
          jacobian.setEntry(i, j, (above[i] - below[i]) / (2 * h));
        }
      }
      double[] correction =
          new LUDecomposition(jacobian).getSolver().solve(new ArrayRealVector(miss)).toArray();
      for (int j = 0; j < 6; j++) {
        unknown[j] -= correction[j];
      }
    }
    PlanarCar.Motion now = at(sideslip, yawRate, unknown);
    double normal = -now.forceX * Math.sin(sideslip) + now.forceY * Math.cos(sideslip);
    return new double[] {
      normal / (planar.mass * trim.speed()) - yawRate, now.yawMoment / planar.inertia
    };
  }

  /** Specific forces of the trim and its four slips. */
  private double[] start() {
    double along = trim.ax() + planar.drag(trim.speed()) / planar.mass;
    double c = Math.cos(trim.sideslip());
    double s = Math.sin(trim.sideslip());
    double[] unknown = new double[6];
    unknown[0] = along * c - trim.ay() * s;
    unknown[1] = along * s + trim.ay() * c;
    for (int i = 0; i < 4; i++) {
      unknown[2 + i] = trim.wheels().get(i).slip();
    }
    return unknown;
  }

  private PlanarCar.Motion at(double sideslip, double yawRate, double[] unknown) {
    return planar.at(
        trim.speed(),
        sideslip,
        yawRate,
        trim.steer(),
        unknown[0],
        unknown[1],
        Arrays.copyOfRange(unknown, 2, 6));
  }

  private double[] misses(double sideslip, double yawRate, double[] unknown) {
    PlanarCar.Motion m = at(sideslip, yawRate, unknown);
    double[] miss = new double[6];
    miss[0] = m.forceX / planar.mass - unknown[0];
    miss[1] = m.forceY / planar.mass - unknown[1];
    miss[2] = (m.torque[0] - heldTorque[0]) / 1000;
    miss[3] = (m.torque[1] - heldTorque[1]) / 1000;
    double change = m.torque[2] + m.torque[3] - heldTorque[2] - heldTorque[3];
    miss[4] = change / 1000;
    if (sticks) {
      miss[5] = (m.wheelSpeed[2] - m.wheelSpeed[3]) / 10;
    } else {
      double before = heldTorque[3] - heldTorque[2];
      double friction = Math.signum(m.wheelSpeed[2] - m.wheelSpeed[3]) * share * change;
      miss[5] = (m.torque[3] - m.torque[2] - before - friction) / 1000;
    }
    return miss;
  }

  /** Returns the larger real part of the roots of {@code x² - trace x + determinant}. */
  static double largestRealPart(double trace, double determinant) {
    return new Complex(trace * trace / 4 - determinant, 0).sqrt().getReal() + trace / 2;
  }
}
