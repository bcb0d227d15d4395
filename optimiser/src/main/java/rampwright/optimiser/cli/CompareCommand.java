package rampwright.optimiser.cli;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.vehicle.balance.GapSplit;
import rampwright.vehicle.balance.LapAnalysis;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

/** {@code rampwright compare}: settings side by side, by corner and by cause. */
@Command(
    name = "compare",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    customSynopsis = "rampwright compare EVENT.yaml --setting A --setting B ... [--json]",
    description = {
      "Compares settings: lap, balance, heat, and where the gap comes from.",
      "The first setting is the reference; laps are those with the driver's limits."
    })
final class CompareCommand implements Callable<Integer> {
  @Mixin private EventArgument event;
  @Mixin private OutputOption output;

  @Option(
      names = "--setting",
      paramLabel = "NAME",
      required = true,
      description = "Name of one of the event's settings; at least two.")
  private List<String> settings;

  @Override
  public Integer call() {
    Event read = event.read();
    List<NamedSetting> chosen = EventArgument.settings(read, settings);
    if (chosen.size() < 2) {
      throw InvalidInput.of(
          "list of settings", String.join(", ", settings), "two different ones or more", "");
    }
    Map<WeightedCircuit, List<ComparedLap>> all = new LinkedHashMap<>();
    for (WeightedCircuit circuit : read.circuits()) {
      all.put(circuit, laps(read, circuit.circuit(), chosen));
    }
    output.print(() -> CompareText.of(read, all), () -> CompareDocument.of(read, all));
    return 0;
  }

  private static List<ComparedLap> laps(Event event, Circuit circuit, List<NamedSetting> settings) {
    List<ComparedLap> laps = new ArrayList<>();
    for (NamedSetting setting : settings) {
      Lap lap = LapSolver.solve(event.lapRequest(setting, circuit, LimitForm.DRIVER));
      Lap reference = laps.isEmpty() ? lap : laps.get(0).lap();
      GapSplit gap = GapSplit.between(reference, lap);
      laps.add(new ComparedLap(setting, lap, LapAnalysis.report(lap), gap));
    }
    return laps;
  }
}
