package rampwright.vehicle.benchmark;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.trim.GeneralPurposeLimit;
import rampwright.vehicle.trim.Trims;

/** The same drive limit by our solver, from straight running, and by a general-purpose library. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 3, time = 2)
@Fork(1)
public class DriveLimitBenchmark {
  private static final double SPEED = 12;
  private static final double CURVATURE = 9 / (SPEED * SPEED);

  private final Car car = new CarBuilder().build();
  private final Trims trims =
      new Trims(car, Conditions.STANDARD, DifferentialSet.rear(OpenDifferential.IDEAL));

  /** Finds the limit with our solver. */
  @Benchmark
  public double ours() {
    return trims
        .driveLimit(SPEED, CURVATURE, 0, Double.POSITIVE_INFINITY)
        .orElseThrow()
        .trim()
        .ax();
  }

  /** Finds it with Commons Math. */
  @Benchmark
  public double generalPurpose() {
    return new GeneralPurposeLimit(car, Conditions.STANDARD, SPEED, CURVATURE)
        .largestAcceleration();
  }
}
