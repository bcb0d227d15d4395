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

  /** Share of half an axle's load over which the lifting of a wheel is rounded. */
  private static final double ROLL_ROUNDING = 0.02;

  /** Share of half the car's load over which the lifting of an axle is rounded. */
  private static final double PITCH_ROUNDING = 0.01;

  private final double mass;
  private final double frontShare;
  private final double pitch;
  private final double frontTransfer;
  private final double rearTransfer;
  private final double trackRatio;

  private final double[] load = new double[4];
  private final double[] byFx = new double[4];
  private final double[] byFy = new double[4];
  private final double[] bySpeed = new double[4];

  // value, partials with fx, fy and speed
  private final double[] front = new double[4];
  private final double[] rear = new double[4];
  private final double[] tf = new double[4];
  private final double[] tr = new double[4];
  private final double[] rest = new double[4];
  private final double[] demand = new double[4];
  private final double[] limit = new double[4];

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
    double frontLoad = mass * fz * frontShare - pitch * fx + downFront;
    double rearLoad = mass * fz * (1 - frontShare) + pitch * fx + downRear;
    double frontBySpeed = mass * fzSpeed * frontShare + downFrontSpeed;
    double rearBySpeed = mass * fzSpeed * (1 - frontShare) + downRearSpeed;
    double frontMoment = frontTransfer * fy;
    double rearMoment = rearTransfer * fy;
    double least = PITCH_ROUNDING * (frontLoad + rearLoad) / 2;
    boolean level = frontLoad > least && rearLoad > least;
    if (level && !lifts(frontLoad, frontMoment) && !lifts(rearLoad, rearMoment)) {
      axle(0, frontLoad, -pitch, frontBySpeed, frontMoment, 0, frontTransfer, 0);
      axle(2, rearLoad, pitch, rearBySpeed, rearMoment, 0, rearTransfer, 0);
    } else {
      lifted(frontLoad, rearLoad, frontBySpeed, rearBySpeed, frontMoment, rearMoment);
    }
  }

  private static boolean lifts(double axleLoad, double transfer) {
    return Math.abs(transfer) >= (1 - ROLL_ROUNDING) * axleLoad / 2;
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

  /** Loads when an axle or a wheel is near or beyond lifting. */
  private void lifted(
      double frontLoad,
      double rearLoad,
      double frontBySpeed,
      double rearBySpeed,
      double frontMoment,
      double rearMoment) {
    boolean onGround = frontLoad + rearLoad > 0;
    double half = onGround ? (frontLoad + rearLoad) / 2 : 0;
    double halfBySpeed = onGround ? (frontBySpeed + rearBySpeed) / 2 : 0;
    // an axle that would be pulled off the ground leaves its load to the other
    set(limit, half, 0, 0, halfBySpeed);
    set(demand, frontLoad - half, -pitch, 0, frontBySpeed - halfBySpeed);
    within(demand, limit, PITCH_ROUNDING, front);
    for (int k = 0; k < 4; k++) {
      double share = front[k];
      front[k] = (limit[k] + share) / 2;
      rear[k] = (limit[k] - share) / 2;
    }
    // from here on front and rear are the most that an axle can shift from side to side
    set(demand, frontMoment, 0, frontTransfer, 0);
    within(demand, front, ROLL_ROUNDING, tf);
    for (int k = 0; k < 4; k++) {
      demand[k] = (demand[k] - tf[k]) * trackRatio;
    }
    demand[0] += rearMoment;
    demand[2] += rearTransfer;
    within(demand, rear, ROLL_ROUNDING, tr);
    // with both inner wheels in the air the car can carry no more moment
    double side = demand[0] >= tr[0] ? 1 : -1;
    for (int k = 0; k < 4; k++) {
      demand[k] = (demand[k] - tr[k]) / trackRatio;
      limit[k] = front[k] - side * tf[k];
    }
    within(demand, limit, ROLL_ROUNDING, rest);
    for (int k = 0; k < 4; k++) {
      tf[k] += rest[k];
    }
    axle(0, 2 * front[0], 2 * front[1], 2 * front[3], tf[0], tf[1], tf[2], tf[3]);
    axle(2, 2 * rear[0], 2 * rear[1], 2 * rear[3], tr[0], tr[1], tr[2], tr[3]);
  }

  private static void set(double[] out, double value, double byFx, double byFy, double bySpeed) {
    out[0] = value;
    out[1] = byFx;
    out[2] = byFy;
    out[3] = bySpeed;
  }

  /**
   * Keeps a demand between minus and plus a limit, rounded where it meets the limit over a share of
   * the limit: so the result never exceeds it, however small it is. Each array holds a value and
   * its three partials.
   */
  private static void within(double[] demand, double[] limit, double rounding, double[] out) {
    double size = Math.abs(demand[0]);
    double sign = demand[0] >= 0 ? 1 : -1;
    double most = Math.max(limit[0], 0);
    double width = rounding * most;
    double byDemand;
    double byLimit;
    if (size < most - width) {
      out[0] = demand[0];
      byDemand = 1;
      byLimit = 0;
    } else if (size >= most + width) {
      out[0] = sign * most;
      byDemand = 0;
      byLimit = sign;
    } else {
      double q = (size - most + width) / (2 * width);
      out[0] = sign * (size - width * q * q);
      byDemand = 1 - q;
      byLimit = sign * (q - rounding * (q - q * q));
    }
    for (int k = 1; k < 4; k++) {
      out[k] = byDemand * demand[k] + byLimit * limit[k];
    }
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
