package rampwright.optimiser.cli;

import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.balance.GapSplit;
import rampwright.vehicle.balance.GapSplit.Cause;

/** Settings side by side as a JSON document. */
final class CompareDocument {
  private CompareDocument() {}

  static Map<String, Object> of(Event event, Map<WeightedCircuit, List<ComparedLap>> all) {
    return new JsonMap()
        .put("event", event.name())
        .put("version", ProgramVersion.text())
        .put("reference", all.values().iterator().next().get(0).setting().name())
        .put("circuits", all.entrySet().stream().map(e -> circuit(event, e)).toList())
        .map();
  }

  private static Map<String, Object> circuit(
      Event event, Map.Entry<WeightedCircuit, List<ComparedLap>> entry) {
    return new JsonMap()
        .put("circuit", entry.getKey().circuit().name())
        .put("weight", entry.getKey().weight())
        .put("settings", entry.getValue().stream().map(lap -> setting(event, lap)).toList())
        .map();
  }

  private static Map<String, Object> setting(Event event, ComparedLap lap) {
    JsonMap out = new JsonMap();
    SettingWords.put(out, event, lap.setting());
    out.putAll(LapDocument.measures(event, lap.setting(), lap.report()).map());
    out.put("gapS", lap.gap().total());
    out.put("causes", causes(lap.gap()::seconds));
    out.put("corners", lap.report().corners().stream().map(c -> corner(c, lap.gap())).toList());
    return out.map();
  }

  private static Map<String, Object> corner(CornerReport corner, GapSplit gap) {
    int number = corner.number();
    return new JsonMap()
        .put("number", number)
        .put("turns", corner.left() ? "left" : "right")
        .put("slowestDistanceM", corner.apexDistance())
        .put("slowestSpeedMps", corner.slowestSpeed())
        .put("timeS", corner.time())
        .put("gapS", gap.seconds(number))
        .put("causes", causes(cause -> seconds(gap, number, cause)))
        .map();
  }

  private static double seconds(GapSplit gap, int corner, Cause cause) {
    return gap.parts().stream()
        .filter(part -> part.corner() == corner && part.cause() == cause)
        .mapToDouble(GapSplit.Part::seconds)
        .sum();
  }

  private static Map<String, Object> causes(ToDoubleFunction<Cause> seconds) {
    JsonMap out = new JsonMap();
    for (Cause cause : Cause.values()) {
      out.put(name(cause), seconds.applyAsDouble(cause));
    }
    return out.map();
  }

  private static String name(Cause cause) {
    return switch (cause) {
      case TRACTION -> "tractionS";
      case CORNERING_SPEED -> "corneringSpeedS";
      case BRAKING -> "brakingS";
      case GEAR_CHANGES -> "gearChangesS";
      case OTHER -> "otherS";
    };
  }
}
