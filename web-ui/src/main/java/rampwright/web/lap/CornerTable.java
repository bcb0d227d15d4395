package rampwright.web.lap;

import com.vaadin.flow.component.grid.ColumnTextAlign;
import com.vaadin.flow.component.grid.GridVariant;
import com.vaadin.flow.component.treegrid.TreeGrid;
import java.util.List;
import java.util.function.ToDoubleFunction;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.balance.LapReport;
import rampwright.vehicle.balance.PhaseReport;
import rampwright.web.widget.Shown;

/** Every corner, and below it its phases. */
final class CornerTable extends TreeGrid<CornerTable.Row> {
  private static final long serialVersionUID = 1L;

  /** Two laps of one circuit call the same corner what has its slowest point within this (m). */
  private static final double SAME_CORNER = 40;

  private static final ToDoubleFunction<PhaseReport> NOT_OF_A_PHASE = phase -> Double.NaN;
  private static final ToDoubleFunction<Row> NOT_OF_A_CORNER = row -> Double.NaN;

  /** A corner, or one of its phases. */
  record Row(CornerReport corner, PhaseReport phase, double carTime) {
    boolean whole() {
      return phase == null;
    }
  }

  CornerTable(LapReport driver, LapReport car) {
    addThemeVariants(
        GridVariant.LUMO_COMPACT, GridVariant.LUMO_NO_BORDER, GridVariant.LUMO_WRAP_CELL_CONTENT);
    addClassName("rw-table");
    setSelectionMode(SelectionMode.NONE);
    addHierarchyColumn(CornerTable::name)
        .setHeader("Corner, phase")
        .setWidth("8.5rem")
        .setFlexGrow(0)
        .setFrozen(true);
    number("At (m)", row -> row.corner().apexDistance(), PhaseReport::start, 0);
    number("Time (s)", row -> row.corner().time(), PhaseReport::time, 3);
    number("Car's limits (s)", Row::carTime, NOT_OF_A_PHASE, 3);
    number("Slowest (km/h)", row -> 3.6 * row.corner().slowestSpeed(), NOT_OF_A_PHASE, 1);
    number("From (km/h)", NOT_OF_A_CORNER, p -> 3.6 * p.entrySpeed(), 1);
    number("To (km/h)", NOT_OF_A_CORNER, p -> 3.6 * p.exitSpeed(), 1);
    number("Full power after (m)", row -> row.corner().fullThrottleDistance(), NOT_OF_A_PHASE, 0);
    number("Short of traction (%)", NOT_OF_A_CORNER, p -> 100 * p.tractionLimitedShare(), 0);
    number("Inner slip, most (%)", NOT_OF_A_CORNER, p -> 100 * p.peakInnerSlip(), 1);
    number("Torque diff. (N·m)", NOT_OF_A_CORNER, PhaseReport::meanTorqueDifference, 0);
    number("Locked (%)", NOT_OF_A_CORNER, p -> 100 * p.lockedShare(), 0);
    number("Under-steer (°)", NOT_OF_A_CORNER, p -> Math.toDegrees(p.meanUndersteerAngle()), 2);
    number("Yaw moment (N·m)", NOT_OF_A_CORNER, PhaseReport::meanYawMoment, 0);
    number("Slide growth (1/s)", NOT_OF_A_CORNER, PhaseReport::peakSigma, 2);
    number("Plate heat (kJ)", NOT_OF_A_CORNER, p -> p.plateEnergy() / 1e3, 2);
    setItems(
        driver.corners().stream().map(corner -> new Row(corner, null, time(car, corner))).toList(),
        row -> row.whole() ? phases(row) : List.of());
    setAllRowsVisible(true);
  }

  private static List<Row> phases(Row row) {
    return row.corner().phases().stream()
        .map(phase -> new Row(row.corner(), phase, Double.NaN))
        .toList();
  }

  /** The two laps may differ in what is a corner; then there is nothing to set beside. */
  private static double time(LapReport car, CornerReport corner) {
    return car.corners().stream()
        .filter(other -> Math.abs(other.apexDistance() - corner.apexDistance()) < SAME_CORNER)
        .mapToDouble(CornerReport::time)
        .findFirst()
        .orElse(Double.NaN);
  }

  private static String name(Row row) {
    return row.whole()
        ? row.corner().number() + (row.corner().left() ? " left" : " right")
        : row.phase().phase().label();
  }

  private void number(
      String header,
      ToDoubleFunction<Row> corner,
      ToDoubleFunction<PhaseReport> phase,
      int decimals) {
    addColumn(row -> text(row, corner, phase, decimals))
        .setHeader(header)
        .setTextAlign(ColumnTextAlign.END)
        .setWidth("4.95rem")
        .setFlexGrow(1);
  }

  private static String text(
      Row row, ToDoubleFunction<Row> corner, ToDoubleFunction<PhaseReport> phase, int decimals) {
    double value = row.whole() ? corner.applyAsDouble(row) : phase.applyAsDouble(row.phase());
    return Double.isNaN(value) ? "" : Shown.bare(value, decimals);
  }
}
