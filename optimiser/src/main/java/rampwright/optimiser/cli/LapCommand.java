package rampwright.optimiser.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.WeightedCircuit;

/** {@code rampwright lap}: laps of an event's settings, corner by corner and phase by phase. */
@Command(
    name = "lap",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    customSynopsis = "rampwright lap EVENT.yaml [--setting NAME ...] [--trace DIR] [--json]",
    description = {
      "Shows the lap of a setting on every circuit of the event, corner by corner.",
      "The lap with the driver's limits stands beside the one with the car's limits."
    })
final class LapCommand implements Callable<Integer> {
  @Mixin private EventArgument event;
  @Mixin private OutputOption output;

  @Option(
      names = "--setting",
      paramLabel = "NAME",
      description = "Name of one of the event's settings; may be repeated. Without: the current.")
  private List<String> settings = List.of();

  @Option(
      names = "--trace",
      paramLabel = "DIR",
      description = "Folder for one CSV file per lap with everything at every station.")
  private Path traces;

  @Override
  public Integer call() throws IOException {
    Event read = event.read();
    List<SolvedLaps> laps = new ArrayList<>();
    List<NamedSetting> chosen = EventArgument.settings(read, settings);
    for (WeightedCircuit circuit : read.circuits()) {
      for (NamedSetting setting : chosen) {
        laps.add(SolvedLaps.of(read, circuit.circuit(), setting));
      }
    }
    if (traces != null) {
      for (SolvedLaps each : laps) {
        TraceFile.write(traces, each.fileName("driver"), each.driver());
        TraceFile.write(traces, each.fileName("car"), each.car());
      }
    }
    output.print(() -> LapText.of(read, laps), () -> LapDocument.of(read, laps, traces));
    return 0;
  }
}
