package rampwright.optimiser.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import rampwright.optimiser.event.Event;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.balance.LapReport;
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
    line(table, laps, "lap time", "s", 3, LapReport::lapTime);
    line(table, laps, "top speed", "km/h", 1, report -> report.topSpeed() * 3.6);
    line(
        table,
        laps,
        "understeer angle on exits",
        "deg",
        2,
        report -> Math.toDegrees(report.exitUndersteerAngle()));
    line(table, laps, "slide growth rate on entry", "1/s", 2, LapReport::peakSigmaEntry);
    line(table, laps, "slide growth rate on exit", "1/s", 2, LapReport::peakSigmaExit);
    line(table, laps, "slip of the inner wheel", "", 3, LapReport::peakInnerSlip);
    line(table, laps, "plate energy", "kJ", 1, report -> report.plateEnergy() / 1e3);
    line(table, laps, "largest plate power", "kW", 2, report -> report.peakPlatePower() / 1e3);
    line(table, laps, "tyre work front", "kJ", 0, report -> report.tyreWorkFront() / 1e3);
    line(table, laps, "tyre work rear", "kJ", 0, report -> report.tyreWorkRear() / 1e3);
    return table;
  }

  private static void line(
      TextTable table,
      SolvedLaps laps,
      String label,
      String unit,
      int decimals,
      ToDoubleFunction<LapReport> value) {
    table.row(
        label,
        Shown.number(value.applyAsDouble(laps.driverReport()), decimals),
        Shown.number(value.applyAsDouble(laps.carReport()), decimals),
        unit);
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
