package rampwright.optimiser.search;

import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.EventFile;
import rampwright.optimiser.event.SettingLimit;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Segment.Corner;
import rampwright.vehicle.circuit.Segment.Straight;
import rampwright.vehicle.circuit.SegmentLine;
import rampwright.vehicle.file.FileSource;

/** The sample car and kit on a short circuit with coarse stations, so that laps are cheap. */
final class ShortEvent {
  private static final double SPACING = 8;

  private static final Event SAMPLE =
      EventFile.read(
          FileSource.classPath(ShortEvent.class.getClassLoader(), SampleFiles.BASE),
          SampleFiles.MAIN_EVENT);

  static final Circuit RING =
      SegmentLine.closed(
          "Short ring",
          List.of(
              new Straight(190),
              Corner.degrees(20, 180, 25),
              new Straight(70),
              Corner.degrees(35, -90, 30),
              new Straight(50),
              Corner.degrees(30, 90, 25),
              new Straight(60),
              Corner.degrees(80, 180, 40)),
          900,
          2);

  static final Circuit HAIRPINS =
      SegmentLine.closed(
          "Two hairpins",
          List.of(
              new Straight(120),
              Corner.degrees(20, 180, 25),
              new Straight(120),
              Corner.degrees(20, 180, 25)),
          420,
          2);

  private ShortEvent() {}

  /** Returns the event without any limit. */
  static Event free() {
    return with(List.of());
  }

  /** Returns the event with limits, on the ring alone. */
  static Event with(List<SettingLimit> limits) {
    return event(limits, List.of(new WeightedCircuit(RING, 1)));
  }

  /** Returns the event on both circuits. */
  static Event on(List<SettingLimit> limits, double ring, double hairpins) {
    return event(
        limits, List.of(new WeightedCircuit(RING, ring), new WeightedCircuit(HAIRPINS, hairpins)));
  }

  private static Event event(List<SettingLimit> limits, List<WeightedCircuit> circuits) {
    return new Event(
        SAMPLE.name(),
        SAMPLE.car(),
        circuits,
        SAMPLE.kit(),
        SAMPLE.conditions(),
        SAMPLE.driver(),
        limits,
        SAMPLE.settings(),
        SAMPLE.currentSetting(),
        SPACING);
  }
}
