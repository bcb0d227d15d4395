package rampwright.vehicle.lap;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.chassis.WheelLoads;
import rampwright.vehicle.circuit.Circuit;

/**
 * The real solver with {@link PointMass} against the classical closed forms of a point mass. Each
 * test first puts g = 9.81 into the closed form and demands the figure computed apart from this
 * project, then puts our gravity into it and demands the solver's. Cars and tracks: Lenzo and
 * Rossi, <i>A simple mono-dimensional approach for lap time optimisation</i>, Applied Sciences
 * 10(4):1498, 2020.
 */
@Tag("validation")
class ClosedFormLapTest {
  private static final double BOOK_GRAVITY = 9.81;

  private static double get(Lap lap, Channel channel, int station) {
    return lap.trace().get(channel, station);
  }

  private static double onCircle(double gravity, double radius) {
    return Math.sqrt(1.5 * 620 * gravity * radius / (620 - 1.5 * 2.15 * radius));
  }

  /** Flat circle with downforce, {@code v² = mu m g R/(m - mu kz R)}: within 0.03 %. */
  @ParameterizedTest(name = "radius {0} m")
  @CsvSource({"50, 31.534", "100, 55.377", "150, 100.220"})
  void aCircleIsDrivenAtTheSpeedOfThePointMass(double radius, double printed) {
    assertThat(onCircle(BOOK_GRAVITY, radius)).isCloseTo(printed, within(1e-3));
    Car car = PointMass.parts(620, 1.5, 5e6, 0, 2.15).build();
    double length = 2 * Math.PI * radius;
    Lap lap = PointMass.lap(car, PointMass.line(true, length, 5, s -> 1 / radius), 4);
    double v = onCircle(WheelLoads.GRAVITY, radius);
    assertThat(lap.time()).isCloseTo(length / v, within(3e-4 * length / v));
  }

  /**
   * Friction circle on a constant radius with unlimited power, {@code v²/(a R) = sin(2s/R + phi)}:
   * every speed within 0.05 m/s up to the limit speed, which is then held.
   */
  @Test
  void theFrictionCircleIsFollowedOnAConstantRadius() {
    double radius = 100;
    double grip = 1.2 * WheelLoads.GRAVITY;
    Car car = PointMass.parts(620, 1.2, 3e6, 0, 0).build();
    Lap lap = PointMass.lap(car, PointMass.slowStart(100, 1, 1 / radius), 0.5);
    double spacing = lap.road().spacing();
    int first = (int) Math.round(6 / spacing);
    double phase = Math.asin(Math.pow(get(lap, Channel.SPEED, first), 2) / (grip * radius));
    for (int i = first; i < lap.road().size(); i++) {
      double angle = Math.min(Math.PI / 2, 2 * (i - first) * spacing / radius + phase);
      double v = Math.sqrt(grip * radius * Math.sin(angle));
      assertThat(get(lap, Channel.SPEED, i)).as("station %d", i).isCloseTo(v, within(0.05));
    }
  }

  private static double ovalTime(double gravity, double friction, double radius, double straight) {
    double slow = Math.sqrt(friction * gravity * radius);
    double fast = Math.sqrt(slow * slow + friction * gravity * straight);
    return 2 * Math.PI * radius / slow + 4 * (fast - slow) / (friction * gravity);
  }

  /**
   * Two straights and two half circles, {@code T = 2 pi R/vc + 4 (vp - vc)/(mu g)}: within 0.05 %
   * at stations of 0.3 to 0.5 m, over one of which the curvature begins and ends.
   */
  @ParameterizedTest(name = "friction {0}, radius {1} m, straights {2} m")
  @CsvSource({"1, 100, 500, 38.57213", "1.5, 60, 300, 24.39515"})
  void theOvalTakesTheTimeOfThePointMass(
      double friction, double radius, double straight, double printed) {
    assertThat(ovalTime(BOOK_GRAVITY, friction, radius, straight)).isCloseTo(printed, within(1e-5));
    Car car = PointMass.parts(620, friction, 3e6, 0, 0).build();
    Circuit oval = PointMass.oval(radius, straight, 3200);
    Lap lap = PointMass.lap(car, oval, oval.length() / 3200);
    double time = ovalTime(WheelLoads.GRAVITY, friction, radius, straight);
    assertThat(lap.time()).isCloseTo(time, within(5e-4 * time));
  }

  /**
   * Constant power against drag, 40 to 80 m/s: 293.3328 m and 4.48538 s; top speed 91.4134 m/s. The
   * wheels turn up to 0.1 % faster than the car, which loses as much power: hence 0.1 %.
   */
  @Test
  void powerAgainstDragTakesTheDistanceAndTimeOfThePointMass() {
    CarBuilder parts = PointMass.parts(620, 4.9, 550e3, 0.72, 24);
    parts.front = CarBuilder.even(4.9, 0.022, 1.6);
    parts.rear = parts.front;
    Lap lap = PointMass.lap(parts.build(), PointMass.slowStart(2500, 1, 0), 2);
    double[] from = crossing(lap, 40, true);
    double[] to = crossing(lap, 80, true);
    assertThat(to[0] - from[0]).isCloseTo(293.3328, within(0.3));
    assertThat(to[1] - from[1]).isCloseTo(4.48538, within(0.0045));
    assertThat(get(lap, Channel.SPEED, lap.road().size() - 1)).isCloseTo(91.4134, within(0.05));
  }

  private static double[] braking(double gravity) {
    double a = 1.5 * 2.15 + 0.72;
    double b = 1.5 * 620 * gravity;
    double distance = 620 / (2 * a) * Math.log((b + a * 80 * 80) / (b + a * 30 * 30));
    double root = Math.sqrt(a / b);
    double time = 620 / Math.sqrt(a * b) * (Math.atan(80 * root) - Math.atan(30 * root));
    return new double[] {distance, time};
  }

  /** Braking with downforce and drag, 80 to 30 m/s: 78.3986 m and 1.54185 s; within 0.05 %. */
  @Test
  void brakingTakesTheDistanceAndTimeOfThePointMass() {
    assertThat(braking(BOOK_GRAVITY)[0]).isCloseTo(78.3986, within(1e-4));
    assertThat(braking(BOOK_GRAVITY)[1]).isCloseTo(1.54185, within(1e-5));
    Car car = PointMass.parts(620, 1.5, 3e6, 0.72, 2.15).build();
    Lap lap = PointMass.lap(car, PointMass.line(false, 600, 2, s -> s > 590 ? 0.05 : 0), 1);
    double[] from = crossing(lap, 80, false);
    double[] to = crossing(lap, 30, false);
    double[] expected = braking(WheelLoads.GRAVITY);
    assertThat(to[0] - from[0]).isCloseTo(expected[0], within(0.04));
    assertThat(to[1] - from[1]).isCloseTo(expected[1], within(8e-4));
  }

  private static double standingStart(double gravity) {
    double a = 1.4 * gravity;
    double v1 = 60e3 / (300 * a);
    double s1 = v1 * v1 / (2 * a);
    double end = Math.cbrt(v1 * v1 * v1 + 3 * 60e3 * (75 - s1) / 300);
    return v1 / a + 300 * (end * end - v1 * v1) / (2 * 60e3);
  }

  /**
   * 75 m from rest, traction then power: 3.62026 s. The solver's run starts at a few metres per
   * second; the time from rest to there is added at the constant acceleration of the closed form.
   * The driven wheels turn up to 2 % faster than the car: hence 0.2 %.
   */
  @Test
  void seventyFiveMetresFromRestTakeTheTimeOfThePointMass() {
    assertThat(standingStart(BOOK_GRAVITY)).isCloseTo(3.62026, within(1e-5));
    CarBuilder parts = PointMass.parts(300, 1.4, 60e3, 0, 0);
    parts.front = CarBuilder.even(1.4, 0.022, 1.6);
    parts.rear = parts.front;
    Lap lap = PointMass.lap(parts.build(), PointMass.slowStart(90, 1, 0), 0.25);
    int first = (int) Math.round(5 / lap.road().spacing());
    double v = get(lap, Channel.SPEED, first);
    double a = 1.4 * WheelLoads.GRAVITY;
    double end = get(lap, Channel.DISTANCE, first) + 75 - v * v / (2 * a);
    double time = v / a + timeAt(lap, end) - get(lap, Channel.TIME, first);
    double expected = standingStart(WheelLoads.GRAVITY);
    assertThat(time).isCloseTo(expected, within(0.002 * expected));
  }

  /** Distance and time at which the speed first rises, or falls, through a value. */
  private static double[] crossing(Lap lap, double speed, boolean rising) {
    for (int i = 1; i < lap.road().size(); i++) {
      double before = get(lap, Channel.SPEED, i - 1);
      double now = get(lap, Channel.SPEED, i);
      if (rising ? before < speed && now >= speed : before >= speed && now < speed) {
        double share = (speed * speed - before * before) / (now * now - before * before);
        double distance = (i - 1 + share) * lap.road().spacing();
        return new double[] {distance, timeAt(lap, distance)};
      }
    }
    throw new AssertionError("the speed of " + speed + " m/s is never crossed");
  }

  /** Time at a distance, at constant acceleration between stations. */
  private static double timeAt(Lap lap, double distance) {
    int i = (int) (distance / lap.road().spacing());
    double rest = distance - i * lap.road().spacing();
    double v = get(lap, Channel.SPEED, i);
    double next = get(lap, Channel.SPEED, i + 1);
    double share = rest / lap.road().spacing();
    double there = Math.sqrt(v * v + share * (next * next - v * v));
    return get(lap, Channel.TIME, i) + 2 * rest / (v + there);
  }
}
