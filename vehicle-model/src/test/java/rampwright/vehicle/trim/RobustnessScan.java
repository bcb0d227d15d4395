package rampwright.vehicle.trim;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.tyre.PeakAtLoad;
import rampwright.vehicle.tyre.PeakSlipTyre;
import rampwright.vehicle.tyre.SlipCurve;
import rampwright.vehicle.tyre.Tyre;

/**
 * Asks for the limits of random cars with random differentials at random points of the road, and
 * counts what has no answer. Run with a number of cases and a first seed:
 *
 * <pre>java ... rampwright.vehicle.trim.RobustnessScan 10000 1</pre>
 */
public final class RobustnessScan {
  /** What may go wrong with one case. */
  enum Failure {
    CORNER_LIMIT_MISSING,
    DRIVE_LIMIT_MISSING,
    BRAKE_LIMIT_MISSING,
    NOT_FINITE,
    OUT_OF_BALANCE,
    EXCEPTION
  }

  /** Speed (m/s) near the end of the search for the cornering limit. */
  private static final double HIGH_SPEED = 145;

  private final Map<Failure, List<Long>> failures = new EnumMap<>(Failure.class);
  private int cases;

  /** Runs the cases given on the command line and prints what failed. */
  public static void main(String[] arguments) {
    RobustnessScan scan = new RobustnessScan();
    scan.run(Integer.parseInt(arguments[0]), Long.parseLong(arguments[1]));
    System.out.println(scan.summary());
  }

  void run(int count, long firstSeed) {
    for (long seed = firstSeed; seed < firstSeed + count; seed++) {
      cases++;
      Failure failure = ask(seed);
      if (failure != null) {
        failures.computeIfAbsent(failure, f -> new ArrayList<>()).add(seed);
      }
    }
  }

  int failed() {
    return failures.values().stream().mapToInt(List::size).sum();
  }

  int failed(Failure kind) {
    return failures.getOrDefault(kind, List.of()).size();
  }

  String summary() {
    StringBuilder text = new StringBuilder();
    text.append(String.format(Locale.ROOT, "%d cases, %d failed", cases, failed()));
    failures.forEach(
        (kind, seeds) ->
            text.append(
                String.format(
                    Locale.ROOT,
                    "%n%s %d, seeds %s",
                    kind,
                    seeds.size(),
                    seeds.subList(0, Math.min(8, seeds.size())))));
    return text.toString();
  }

  private static Failure ask(long seed) {
    Random random = new Random(seed);
    Car car = car(random);
    DifferentialSet set = differentials(random);
    double curvature = 1 / logarithmic(random, 8, 300);
    double gradient = curvature * between(random, -0.01, 0.01);
    double share = between(random, 0.2, 0.98);
    double growth = random.nextBoolean() ? Double.POSITIVE_INFINITY : between(random, 0, 3);
    try {
      Trims trims = new Trims(car, Conditions.STANDARD, set);
      Optional<Trims.AtLimit> corner =
          trims.cornerLimit(curvature, gradient, Double.POSITIVE_INFINITY);
      if (corner.isEmpty()) {
        // downforce may hold the car on the path at every speed that is looked at
        boolean unlimited = trims.atCageTorque(HIGH_SPEED, curvature, gradient, 0).isPresent();
        return unlimited ? null : Failure.CORNER_LIMIT_MISSING;
      }
      double speed = share * corner.get().trim().speed();
      Optional<Trims.AtLimit> drive = trims.driveLimit(speed, curvature, gradient, growth);
      if (drive.isEmpty()) {
        return Failure.DRIVE_LIMIT_MISSING;
      }
      Optional<Trims.AtLimit> brake = trims.brakeLimit(speed, curvature, gradient, growth);
      if (brake.isEmpty()) {
        return Failure.BRAKE_LIMIT_MISSING;
      }
      TrimCheck check = new TrimCheck(car, Conditions.STANDARD, set);
      return judge(check, List.of(corner.get(), drive.get(), brake.get()));
    } catch (RuntimeException e) {
      return Failure.EXCEPTION;
    }
  }

  private static Failure judge(TrimCheck check, List<Trims.AtLimit> limits) {
    for (Trims.AtLimit limit : limits) {
      Trim t = limit.trim();
      if (!Double.isFinite(t.ax() + t.steer() + t.sideslip() + t.cageTorque() + t.brakeTorque())) {
        return Failure.NOT_FINITE;
      }
      try {
        check.check(t);
      } catch (AssertionError e) {
        return Failure.OUT_OF_BALANCE;
      }
    }
    return null;
  }

  private static Car car(Random random) {
    CarBuilder b = new CarBuilder();
    b.mass = between(random, 500, 2000);
    b.wheelbase = between(random, 1.8, 3.2);
    b.cgToFrontAxle = b.wheelbase * between(random, 0.4, 0.6);
    b.yawInertia = b.mass * b.wheelbase * b.wheelbase * between(random, 0.15, 0.28);
    b.cgHeight = between(random, 0.2, 0.6);
    b.trackFront = between(random, 1.2, 1.8);
    b.trackRear = between(random, 1.2, 1.8);
    b.rollCentreFront = between(random, 0, 0.15);
    b.rollCentreRear = between(random, 0, 0.2);
    b.frontRollShare = between(random, 0.35, 0.7);
    b.dragArea = between(random, 0.3, 1.5);
    b.downforceFront = between(random, -0.1, 1.5);
    b.downforceRear = b.downforceFront + between(random, 0, 0.8);
    b.brakeFrontShare = between(random, 0.5, 0.75);
    b.brakeTorque = 20_000;
    b.layout = DriveLayout.values()[random.nextInt(3)];
    b.frontTorqueShare = between(random, 0.3, 0.6);
    double power = between(random, 60e3, 500e3);
    b.engine = CarBuilder.strongestAt(power, power / 750, 890);
    b.front = tyre(random);
    b.rear = b.front;
    return b.build();
  }

  private static Tyre tyre(Random random) {
    double friction = between(random, 0.7, 1.9);
    double falls = between(random, 0, 0.15);
    double slip = between(random, 0.06, 0.14);
    double angle = Math.toRadians(between(random, 4, 11));
    double across = between(random, 0.9, 1.1);
    return new PeakSlipTyre(
        new PeakAtLoad(1500, friction, friction * across, slip, angle),
        new PeakAtLoad(
            5500, friction - falls, (friction - falls) * across, 1.1 * slip, 1.1 * angle),
        SlipCurve.peakAtOne(between(random, 1.3, 1.8)),
        SlipCurve.peakAtOne(between(random, 1.3, 1.8)));
  }

  private static DifferentialSet differentials(Random random) {
    return new DifferentialSet(law(random), law(random), law(random));
  }

  private static Differential law(Random random) {
    return switch (random.nextInt(5)) {
      case 0 -> OpenDifferential.IDEAL;
      case 1 -> new OpenDifferential(between(random, 0.01, 0.15));
      case 2 -> new Spool();
      default ->
          new PlateDifferential(
              between(random, 0, 200), between(random, 0, 1), between(random, 0, 0.8));
    };
  }

  private static double between(Random random, double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  private static double logarithmic(Random random, double low, double high) {
    return low * Math.pow(high / low, random.nextDouble());
  }
}
