package rampwright.optimiser.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.balance.GapSplit.Cause;

/** Settings side by side as tables for people. */
final class CompareText {
  private CompareText() {}

  static String of(Event event, Map<WeightedCircuit, List<ComparedLap>> all) {
    StringBuilder out = new StringBuilder();
    for (ComparedLap lap : all.values().iterator().next()) {
      out.append(lap.setting().name()).append(": ");
      out.append(SettingWords.text(event, lap.setting())).append('\n');
    }
    all.forEach((circuit, laps) -> out.append('\n').append(circuit(circuit, laps)));
    return out.toString();
  }

  private static TextTable circuit(WeightedCircuit circuit, List<ComparedLap> laps) {
    TextTable table = new TextTable();
    line(table, circuit.circuit().name(), "", laps, lap -> lap.setting().name());
    line(table, "lap time", "s", laps, lap -> Shown.number(lap.report().lapTime(), 3));
    List<ComparedLap> others = laps.subList(1, laps.size());
    gap(table, "gap to " + laps.get(0).setting().name(), others, lap -> lap.gap().total());
    for (Cause cause : Cause.values()) {
      gap(table, "  " + cause.label(), others, lap -> lap.gap().seconds(cause));
    }
    for (CornerReport corner : laps.get(0).report().corners()) {
      String label = "  corner " + corner.number() + (corner.left() ? " left" : " right");
      gap(table, label, others, lap -> lap.gap().seconds(corner.number()));
    }
    measures(table, laps);
    return table;
  }

  private static void measures(TextTable table, List<ComparedLap> laps) {
    for (LapMeasure measure : LapMeasure.values()) {
      if (measure != LapMeasure.LAP_TIME) {
        line(table, measure.label(), measure.unit(), laps, lap -> measure.shown(lap.report()));
      }
    }
  }

  private static void gap(
      TextTable table, String label, List<ComparedLap> others, Function<ComparedLap, Double> gap) {
    List<String> cells = new ArrayList<>(List.of(label, ""));
    others.forEach(lap -> cells.add(Shown.signed(gap.apply(lap), 3)));
    cells.add("s");
    table.row(cells);
  }

  private static void line(
      TextTable table,
      String label,
      String unit,
      List<ComparedLap> laps,
      Function<ComparedLap, String> value) {
    List<String> cells = new ArrayList<>(List.of(label));
    laps.forEach(lap -> cells.add(value.apply(lap)));
    cells.add(unit);
    table.row(cells);
  }
}
