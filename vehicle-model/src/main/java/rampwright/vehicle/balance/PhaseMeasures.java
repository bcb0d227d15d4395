package rampwright.vehicle.balance;

import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapLimit;

/** Measures of single stretches of one lap. */
final class PhaseMeasures {
  private final Lap lap;
  private final LapPower power;
  private final int n;
  private final boolean closed;
  private final double wheelbase;
  private final boolean frontDriven;
  private final boolean rearDriven;

  PhaseMeasures(Lap lap) {
    this.lap = lap;
    this.power = new LapPower(lap);
    this.n = lap.road().size();
    this.closed = lap.road().closed();
    this.wheelbase = lap.request().car().chassis().wheelbase();
    DriveLayout layout = lap.request().car().driveline().layout();
    this.frontDriven = layout != DriveLayout.REAR;
    this.rearDriven = layout != DriveLayout.FRONT;
  }

  double topSpeed() {
    double top = 0;
    for (int i = 0; i < n; i++) {
      top = Math.max(top, get(Channel.SPEED, i));
    }
    return top;
  }

  PhaseReport report(Stretch stretch) {
    boolean left = stretch.corner() != null && stretch.corner().left();
    Sums s = new Sums();
    for (int k = 0; k < stretch.count(); k++) {
      add(s, (stretch.first() + k) % n, left);
    }
    double spacing = lap.road().spacing();
    int end = stretch.first() + stretch.count();
    int endStation = closed ? end % n : end;
    int intervals = closed ? stretch.count() : Math.min(stretch.count(), n - 1 - stretch.first());
    double weight = s.time > 0 ? 1 / s.time : 0;
    return new PhaseReport(
        stretch.phase(),
        stretch.first(),
        endStation,
        stretch.first() * spacing,
        intervals * spacing,
        time(stretch.first(), end),
        get(Channel.SPEED, stretch.first()),
        get(Channel.SPEED, closed ? endStation : Math.min(endStation, n - 1)),
        s.ax * weight,
        s.traction * weight,
        s.innerSlip,
        s.torqueDifference * weight,
        s.locked * weight,
        s.understeer * weight,
        s.yawMoment * weight,
        s.sigma,
        s.sigmaAt * spacing,
        s.control,
        s.plateEnergy,
        s.platePower,
        s.tyreFront,
        s.tyreRear);
  }

  /** Time (s) between two stations; the end may lie up to one lap further on. */
  private double time(int first, int end) {
    double start = get(Channel.TIME, first);
    if (end < n) {
      return get(Channel.TIME, end) - start;
    }
    return closed ? lap.time() - start + get(Channel.TIME, end - n) : lap.time() - start;
  }

  private void add(Sums s, int i, boolean left) {
    double dt = power.interval(i);
    s.time += dt;
    s.ax += get(Channel.AX, i) * dt;
    LapLimit limit = lap.limit(i);
    boolean traction = limit == LapLimit.TRACTION || limit == LapLimit.SLIDE_ON_POWER;
    s.traction += traction ? dt : 0;
    s.torqueDifference += torqueDifference(i) * dt;
    s.locked += sticking(i) ? dt : 0;
    double angle = get(Channel.STEER, i) - wheelbase * get(Channel.CURVATURE, i);
    s.understeer += (left ? angle : -angle) * dt;
    s.yawMoment += get(Channel.YAW_MOMENT, i) * dt;
    s.innerSlip = Math.max(s.innerSlip, innerSlip(i, left));
    s.control = Math.min(s.control, get(Channel.CONTROL, i));
    if (get(Channel.SIGMA, i) > s.sigma) {
      s.sigma = get(Channel.SIGMA, i);
      s.sigmaAt = i;
    }
    s.platePower = Math.max(s.platePower, power.plates(i));
    s.plateEnergy += power.energy(i, power::plates);
    s.tyreFront += power.energy(i, power::frontTyres);
    s.tyreRear += power.energy(i, power::rearTyres);
  }

  private double innerSlip(int i, boolean left) {
    double front = get(left ? Channel.SLIP_FL : Channel.SLIP_FR, i);
    double rear = get(left ? Channel.SLIP_RL : Channel.SLIP_RR, i);
    return frontDriven && rearDriven ? Math.max(front, rear) : frontDriven ? front : rear;
  }

  /** Torque difference of the driven axle, of the rear one when both are driven. */
  private double torqueDifference(int i) {
    return get(rearDriven ? Channel.REAR_TORQUE_DIFFERENCE : Channel.FRONT_TORQUE_DIFFERENCE, i);
  }

  private boolean sticking(int i) {
    return rearDriven
        ? power.sticking(i, Channel.REAR_CAPACITY, Channel.REAR_SPEED_DIFFERENCE)
        : power.sticking(i, Channel.FRONT_CAPACITY, Channel.FRONT_SPEED_DIFFERENCE);
  }

  private double get(Channel channel, int i) {
    return lap.trace().get(channel, i);
  }

  /** What is summed up, or largest, over a stretch. */
  private static final class Sums {
    private double time;
    private double ax;
    private double traction;
    private double innerSlip = Double.NEGATIVE_INFINITY;
    private double torqueDifference;
    private double locked;
    private double understeer;
    private double yawMoment;
    private double sigma = Double.NEGATIVE_INFINITY;
    private int sigmaAt;
    private double control = Double.POSITIVE_INFINITY;
    private double plateEnergy;
    private double platePower;
    private double tyreFront;
    private double tyreRear;
  }
}
