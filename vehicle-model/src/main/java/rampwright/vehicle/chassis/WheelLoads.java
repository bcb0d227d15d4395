package rampwright.vehicle.chassis;

/**
 * Vertical loads of the four wheels from the specific forces that the road supplies, with partials.
 * A workspace: {@link #update} overwrites the last result; one instance per thread.
 *
 * <pre>
 *   front axle  m (fz b - fx h)/L + downforce      rear axle  m (fz a + fx h)/L + downforce
 *   front transfer  m fy/tf ((b/L) hf + lambda (h - hra))        hra = (b hf + a hr)/L
 *   rear transfer   m fy/tr ((a/L) hr + (1 - lambda) (h - hra))
 * </pre>
 *
 * {@code fx}, {@code fy}, {@code fz} are the specific forces (m/s²) in body axes: what an
 * accelerometer at the centre of gravity reads plus what drag asks of the tyres, since drag acts at
 * the height of the centre of gravity and so loads the rear axle as inertia does. A wheel that
 * would go below zero load lifts: it carries nothing and the other axle takes the rest of the roll
 * moment; likewise an axle. The change is rounded over a small load so that its slope is
 * continuous; away from it the formulas hold exactly.
 *
 * <p>Steady roll only: no dampers, no roll or pitch motion, no jacking, wheels do not camber.
 * Source: the classical load-transfer formula, for example Milliken and Milliken, <i>Race Car
 * Vehicle Dynamics</i>, 1995, ch. 18.
 */
public final class WheelLoads {
  /** Standard acceleration of gravity (m/s²). */
  public static final double GRAVITY = 9.80665;

  /** Share of the car's weight over which lifting is rounded. */
  private static final double ROUNDING = 0.005;

  private final double mass;
  private final double frontShare;
  private final double pitch;
  private final double frontTransfer;
  private final double rearTransfer;
  private final double trackRatio;
  private final double rounding;

  private final double[] load = new double[4];
  private final double[] byFx = new double[4];
  private final double[] byFy = new double[4];
  private final double[] bySpeed = new double[4];
  private double posSlope;

  /** Prepares the formulas for a chassis. */
  public WheelLoads(Chassis chassis) {
    double wheelbase = chassis.wheelbase();
    double a = chassis.cgToFrontAxle();
    double b = chassis.cgToRearAxle();
    double rollAxis = (b * chassis.rollCentreFront() + a * chassis.rollCentreRear()) / wheelbase;
    double arm = chassis.cgHeight() - rollAxis;
    this.mass = chassis.mass();
    this.frontShare = b / wheelbase;
    this.pitch = mass * chassis.cgHeight() / wheelbase;
    this.frontTransfer =
        mass
            / chassis.trackFront()
            * (b / wheelbase * chassis.rollCentreFront() + chassis.frontRollShare() * arm);
    this.rearTransfer =
        mass
            / chassis.trackRear()
            * (a / wheelbase * chassis.rollCentreRear() + (1 - chassis.frontRollShare()) * arm);
    this.trackRatio = chassis.trackFront() / chassis.trackRear();
    this.rounding = ROUNDING * mass * GRAVITY;
  }

  /**
   * Computes loads and partials.
   *
   * @param fx longitudinal specific force (m/s²)
   * @param fy lateral specific force (m/s²)
   * @param fz vertical specific force (m/s²), gravity on a level road at rest
   * @param fzSpeed its derivative with speed (1/s)
   * @param downFront downforce at the front axle (N)
   * @param downFrontSpeed its derivative with speed (N·s/m)
   * @param downRear downforce at the rear axle (N)
   * @param downRearSpeed its derivative with speed (N·s/m)
   */
  public void update(
      double fx,
      double fy,
      double fz,
      double fzSpeed,
      double downFront,
      double downFrontSpeed,
      double downRear,
      double downRearSpeed) {
    double front = mass * fz * frontShare - pitch * fx + downFront;
    double rear = mass * fz * (1 - frontShare) + pitch * fx + downRear;
    double frontBySpeed = mass * fzSpeed * frontShare + downFrontSpeed;
    double rearBySpeed = mass * fzSpeed * (1 - frontShare) + downRearSpeed;
    double tf = frontTransfer * fy;
    double tr = rearTransfer * fy;
    boolean grounded = front / 2 - Math.abs(tf) > rounding && rear / 2 - Math.abs(tr) > rounding;
    if (grounded) {
      axle(0, front, -pitch, frontBySpeed, tf, 0, frontTransfer, 0);
      axle(2, rear, pitch, rearBySpeed, tr, 0, rearTransfer, 0);
    } else {
      lifted(front, rear, frontBySpeed, rearBySpeed, tf, tr);
    }
  }

  private void axle(
      int left,
      double total,
      double totalByFx,
      double totalBySpeed,
      double transfer,
      double transferByFx,
      double transferByFy,
      double transferBySpeed) {
    load[left] = total / 2 - transfer;
    load[left + 1] = total / 2 + transfer;
    byFx[left] = totalByFx / 2 - transferByFx;
    byFx[left + 1] = totalByFx / 2 + transferByFx;
    byFy[left] = -transferByFy;
    byFy[left + 1] = transferByFy;
    bySpeed[left] = totalBySpeed / 2 - transferBySpeed;
    bySpeed[left + 1] = totalBySpeed / 2 + transferBySpeed;
  }

  /**
   * Loads when an axle or a wheel is near or beyond lifting; derivatives follow by the chain rule.
   */
  private void lifted(
      double front0,
      double rear0,
      double frontBySpeed0,
      double rearBySpeed0,
      double tf0,
      double tr0) {
    double total = Math.max(front0 + rear0, 0);
    double totalBySpeed = front0 + rear0 > 0 ? frontBySpeed0 + rearBySpeed0 : 0;
    // an axle that would be pulled off the ground leaves its load to the other
    double front = total - positive(total - positive(front0));
    double slopeOuter = posSlope;
    positive(front0);
    double slope = slopeOuter * posSlope;
    double frontByFx = -pitch * slope;
    double frontBySpeed = totalBySpeed * (1 - slopeOuter) + frontBySpeed0 * slope;
    double rear = total - front;
    double rearByFx = -frontByFx;
    double rearBySpeed = totalBySpeed - frontBySpeed;

    double sign = tf0 + tr0 >= 0 ? 1 : -1;
    double tf = sign * tf0;
    double tfByFx = 0;
    double tfByFy = sign * frontTransfer;
    double tfBySpeed = 0;
    double tr = sign * tr0;
    double trByFx = 0;
    double trByFy = sign * rearTransfer;
    double trBySpeed = 0;

    double excess = positive(tf - front / 2);
    double s = posSlope;
    double excessByFx = s * (tfByFx - frontByFx / 2);
    double excessByFy = s * tfByFy;
    double excessBySpeed = s * (tfBySpeed - frontBySpeed / 2);
    tf -= excess;
    tfByFx -= excessByFx;
    tfByFy -= excessByFy;
    tfBySpeed -= excessBySpeed;
    tr += excess * trackRatio;
    trByFx += excessByFx * trackRatio;
    trByFy += excessByFy * trackRatio;
    trBySpeed += excessBySpeed * trackRatio;

    excess = positive(tr - rear / 2);
    s = posSlope;
    excessByFx = s * (trByFx - rearByFx / 2);
    excessByFy = s * trByFy;
    excessBySpeed = s * (trBySpeed - rearBySpeed / 2);
    tr -= excess;
    trByFx -= excessByFx;
    trByFy -= excessByFy;
    trBySpeed -= excessBySpeed;
    tf += excess / trackRatio;
    tfByFx += excessByFx / trackRatio;
    tfByFy += excessByFy / trackRatio;
    tfBySpeed += excessBySpeed / trackRatio;

    // both inner wheels in the air: the car is on two wheels and can carry no more moment
    excess = positive(tf - front / 2);
    s = posSlope;
    tf -= excess;
    tfByFx -= s * (tfByFx - frontByFx / 2);
    tfByFy -= s * tfByFy;
    tfBySpeed -= s * (tfBySpeed - frontBySpeed / 2);

    axle(
        0,
        front,
        frontByFx,
        frontBySpeed,
        sign * tf,
        sign * tfByFx,
        sign * tfByFy,
        sign * tfBySpeed);
    axle(2, rear, rearByFx, rearBySpeed, sign * tr, sign * trByFx, sign * trByFy, sign * trBySpeed);
  }

  /** Positive part of x, rounded between minus and plus the rounding load; leaves its slope. */
  private double positive(double x) {
    if (x >= rounding) {
      posSlope = 1;
      return x;
    }
    if (x <= -rounding) {
      posSlope = 0;
      return 0;
    }
    posSlope = (x + rounding) / (2 * rounding);
    return (x + rounding) * posSlope / 2;
  }

  /** Returns the load of a wheel (N). */
  public double load(int wheel) {
    return load[wheel];
  }

  /** Returns its partial with the longitudinal specific force (kg). */
  public double byFx(int wheel) {
    return byFx[wheel];
  }

  /** Returns its partial with the lateral specific force (kg). */
  public double byFy(int wheel) {
    return byFy[wheel];
  }

  /** Returns its partial with speed at constant specific forces (N·s/m). */
  public double bySpeed(int wheel) {
    return bySpeed[wheel];
  }
}
