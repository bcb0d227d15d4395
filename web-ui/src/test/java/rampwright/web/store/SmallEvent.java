package rampwright.web.store;

import java.util.ArrayList;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.EventFile;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.CurvatureLine;
import rampwright.vehicle.circuit.Pose;
import rampwright.vehicle.file.FileSource;

/** A sample event on a circuit so short that its lap takes milliseconds. */
public final class SmallEvent {
  private static final double SPACING = 5;

  private SmallEvent() {}

  /** Returns the event. */
  public static Event event() {
    FileSource samples = FileSource.classPath(SampleFiles.class.getClassLoader(), SampleFiles.BASE);
    Event sample = EventFile.read(samples, "events/kestrelwick.yaml");
    return new Event(
        "Short run",
        sample.car(),
        List.of(new WeightedCircuit(stadium(), 1)),
        sample.kit(),
        sample.conditions(),
        sample.driver(),
        List.of(),
        sample.settings(),
        sample.currentSetting(),
        SPACING);
  }

  /** Two straights joined by two half turns to the left, with spirals between them. */
  static Circuit stadium() {
    List<Double> curvature = new ArrayList<>();
    for (int half = 0; half < 2; half++) {
      add(curvature, 24, 0, 0);
      add(curvature, 6, 0, 1 / 30.0);
      add(curvature, 13, 1 / 30.0, 1 / 30.0);
      add(curvature, 6, 1 / 30.0, 0);
    }
    double[] values = curvature.stream().mapToDouble(Double::doubleValue).toArray();
    return CurvatureLine.of(true, SPACING, values).closedUp(1).circuit("Stadium", Pose.ORIGIN);
  }

  private static void add(List<Double> curvature, int count, double from, double to) {
    for (int i = 0; i < count; i++) {
      curvature.add(from + (to - from) * i / count);
    }
  }
}
