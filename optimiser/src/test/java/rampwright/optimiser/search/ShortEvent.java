package rampwright.optimiser.search;

import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.EventFile;
import rampwright.optimiser.event.LimitedMeasure;
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

  private static final Circuit CIRCUIT =
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

  private ShortEvent() {}

  /** Returns the event without any limit. */
  static Event free() {
    return with(List.of());
  }

  /** Returns the event with limits that rule out the fastest settings. */
  static Event limited() {
    return with(
        List.of(
            new SettingLimit(LimitedMeasure.PLATE_ENERGY, 2500),
            new SettingLimit(LimitedMeasure.PRELOAD_MIN, 30)));
  }

  static Event with(List<SettingLimit> limits) {
    return new Event(
        SAMPLE.name(),
        SAMPLE.car(),
        List.of(new WeightedCircuit(CIRCUIT, 1)),
        SAMPLE.kit(),
        SAMPLE.conditions(),
        SAMPLE.driver(),
        limits,
        SAMPLE.settings(),
        SAMPLE.currentSetting(),
        SPACING);
  }
}
