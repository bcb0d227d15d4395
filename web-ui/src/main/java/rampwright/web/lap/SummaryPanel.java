package rampwright.web.lap;

import com.vaadin.flow.component.grid.Grid;
import java.util.List;
import java.util.function.ToDoubleFunction;
import rampwright.vehicle.balance.LapReport;
import rampwright.web.widget.Section;
import rampwright.web.widget.Shown;
import rampwright.web.widget.Tables;
import rampwright.web.work.LapStudy;

/** The lap in a few numbers, at the driver's and at the car's limits. */
final class SummaryPanel extends Section {
  private static final long serialVersionUID = 1L;

  private record Row(String name, String unit, int decimals, ToDoubleFunction<LapReport> value) {}

  private static final List<Row> ROWS =
      List.of(
          new Row("Lap time", "s", 3, LapReport::lapTime),
          new Row("Top speed", "km/h", 1, report -> 3.6 * report.topSpeed()),
          new Row(
              "Understeer angle, mean over exits",
              "°",
              2,
              report -> Math.toDegrees(report.exitUndersteerAngle())),
          new Row("Largest slide growth rate, entries", "1/s", 2, LapReport::peakSigmaEntry),
          new Row("Largest slide growth rate, exits", "1/s", 2, LapReport::peakSigmaExit),
          new Row(
              "Largest inner wheel slip, exits", "%", 1, report -> 100 * report.peakInnerSlip()),
          new Row("Heat in the plates over the lap", "kJ", 1, report -> report.plateEnergy() / 1e3),
          new Row("Largest plate power", "kW", 2, report -> report.peakPlatePower() / 1e3),
          new Row("Sliding work of front tyres", "kJ", 0, report -> report.tyreWorkFront() / 1e3),
          new Row("Sliding work of rear tyres", "kJ", 0, report -> report.tyreWorkRear() / 1e3));

  SummaryPanel(LapStudy driver, LapStudy car) {
    super("The lap of " + driver.setting().name());
    Grid<Row> table = Tables.dense();
    table
        .addColumn(row -> row.name() + " (" + row.unit() + ")")
        .setHeader("")
        .setAutoWidth(true)
        .setFlexGrow(2);
    Tables.number(table, "Driver's limits", row -> shown(row, driver.report()));
    Tables.number(table, "Car's limits", row -> shown(row, car.report()));
    table.setItems(ROWS);
    table.setAllRowsVisible(true);
    add(table);
  }

  private static String shown(Row row, LapReport report) {
    return Shown.bare(row.value().applyAsDouble(report), row.decimals());
  }
}
