package rampwright.vehicle.benchmark;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapRequest;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

/** A lap of the 4 km sample on one core, for each layout and kind of differential. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 3)
@Measurement(iterations = 3, time = 3)
@Fork(1)
public class LapBenchmark {
  @Param({"touring_car", "front_drive_saloon", "all_wheel_drive_rally"})
  String car;

  @Param({"open", "plate", "spool"})
  String kind;

  @Param({"2", "4"})
  double spacing;

  private LapRequest request;

  /** Reads the car. */
  @Setup
  public void prepare() {
    Differential law =
        switch (kind) {
          case "open" -> OpenDifferential.IDEAL;
          case "plate" -> new PlateDifferential(60, 0.3, 0.2);
          default -> new Spool();
        };
    Circuit circuit = SampleCircuits.fast();
    request =
        new LapRequest(
            CarFile.read(
                FileSource.classPath(LapBenchmark.class.getClassLoader(), "rampwright/samples/"),
                "cars/" + car + ".yaml"),
            new DifferentialSet(law, law, law),
            Conditions.STANDARD,
            Driver.QUICK,
            LimitForm.DRIVER,
            circuit,
            spacing);
  }

  /** Solves the lap. */
  @Benchmark
  public Lap lap() {
    return LapSolver.solve(request);
  }
}
