package rampwright.optimiser.cli;

import java.util.ArrayList;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.balance.Phase;
import rampwright.vehicle.balance.PhaseReport;

/** Laps as tables for people. */
final class LapText {
  private LapText() {}

  static String of(Event event, List<SolvedLaps> laps) {
    return String.join("\n", laps.stream().map(each -> laps(event, each)).toList());
  }

  private static String laps(Event event, SolvedLaps laps) {
    return laps.circuit().name()
        + ", "
        + laps.setting().name()
        + ": "
        + SettingWords.text(event, laps.setting())
        + "\n\n"
        + summary(laps)
        + "\n"
        + corners(laps);
  }

  private static TextTable summary(SolvedLaps laps) {
    TextTable table = new TextTable().row("limits of the", "driver", "car", "");
    for (LapMeasure measure : LapMeasure.values()) {
      String driver = measure.shown(laps.driverReport());
      table.row(measure.label(), driver, measure.shown(laps.carReport()), measure.unit());
    }
    return table;
  }

  private static TextTable corners(SolvedLaps laps) {
    TextTable table = new TextTable();
    List<String> head = new ArrayList<>(List.of("corner", "at m", "km/h"));
    for (Phase phase : Phase.values()) {
      head.add(phase.label() + " s");
    }
    head.addAll(List.of("all s", "car all s"));
    table.row(head);
    List<CornerReport> corners = laps.driverReport().corners();
    for (int i = 0; i < corners.size(); i++) {
      table.row(corner(corners.get(i), laps.carReport().corners().get(i)));
    }
    return table;
  }

  private static List<String> corner(CornerReport driver, CornerReport car) {
    List<String> cells = new ArrayList<>();
    cells.add(driver.number() + (driver.left() ? " left" : " right"));
    cells.add(Shown.number(driver.apexDistance(), 0));
    cells.add(Shown.kmh(driver.slowestSpeed()));
    for (Phase phase : Phase.values()) {
      double time =
          driver.phases().stream()
              .filter(part -> part.phase() == phase)
              .mapToDouble(PhaseReport::time)
              .sum();
      cells.add(time == 0 ? "" : Shown.number(time, 3));
    }
    cells.add(Shown.number(driver.time(), 3));
    cells.add(Shown.number(car.time(), 3));
    return cells;
  }
}
