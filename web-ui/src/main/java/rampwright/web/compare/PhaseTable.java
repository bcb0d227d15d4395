package rampwright.web.compare;

import com.vaadin.flow.component.grid.ColumnTextAlign;
import com.vaadin.flow.component.grid.GridVariant;
import com.vaadin.flow.component.treegrid.TreeGrid;
import com.vaadin.flow.function.ValueProvider;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.balance.GapSplit;
import rampwright.vehicle.balance.PhaseReport;
import rampwright.web.widget.Shown;

/** Every corner of the reference and below it its phases, with what the other settings do there. */
final class PhaseTable extends TreeGrid<PhaseTable.Row> {
  private static final long serialVersionUID = 1L;

  private final transient Comparison comparison;

  /** A corner, or one of its phases. */
  record Row(CornerReport corner, PhaseReport phase) {
    boolean whole() {
      return phase == null;
    }
  }

  PhaseTable(Comparison comparison) {
    this.comparison = comparison;
    addThemeVariants(
        GridVariant.LUMO_COMPACT, GridVariant.LUMO_NO_BORDER, GridVariant.LUMO_WRAP_CELL_CONTENT);
    addClassName("rw-table");
    setSelectionMode(SelectionMode.NONE);
    addHierarchyColumn(PhaseTable::name)
        .setHeader("Corner, phase")
        .setWidth("9rem")
        .setFlexGrow(0)
        .setFrozen(true);
    number("At (m)", row -> Shown.bare(at(row), 0));
    number("Slowest (km/h)", row -> row.whole() ? speed(row.corner()) : "");
    number(comparison.reference().setting().name() + " (s)", row -> Shown.bare(time(row), 3));
    for (int i = 0; i < comparison.splits().size(); i++) {
      int other = i;
      String name = comparison.studies().get(i + 1).setting().name();
      addComponentColumn(row -> Difference.of(loss(other, row)))
          .setHeader(name + " (s)")
          .setTextAlign(ColumnTextAlign.END)
          .setWidth("7rem");
      addColumn(row -> row.whole() ? cause(other, row.corner()) : "")
          .setHeader("mostly by")
          .setWidth("11rem");
    }
    setItems(
        comparison.corners().stream().map(corner -> new Row(corner, null)).toList(),
        row -> row.whole() ? phases(row.corner()) : List.of());
    setAllRowsVisible(true);
  }

  private static List<Row> phases(CornerReport corner) {
    return corner.phases().stream().map(phase -> new Row(corner, phase)).toList();
  }

  private static String name(Row row) {
    return row.whole()
        ? row.corner().number() + (row.corner().left() ? " left" : " right")
        : row.phase().phase().label();
  }

  private static double at(Row row) {
    return row.whole() ? row.corner().apexDistance() : row.phase().start();
  }

  private static String speed(CornerReport corner) {
    return Shown.bare(3.6 * corner.slowestSpeed(), 1);
  }

  private static double time(Row row) {
    return row.whole() ? row.corner().time() : row.phase().time();
  }

  private double loss(int other, Row row) {
    return row.whole() ? comparison.loss(other, row.corner()) : comparison.loss(other, row.phase());
  }

  private String cause(int other, CornerReport corner) {
    Optional<GapSplit.Part> largest =
        comparison.splits().get(other).parts().stream()
            .filter(part -> part.corner() == corner.number())
            .max(Comparator.comparingDouble(part -> Math.abs(part.seconds())));
    return largest
        .map(part -> part.cause().label() + " " + Shown.signed(part.seconds(), 3, "s"))
        .orElse("");
  }

  private void number(String header, ValueProvider<Row, String> value) {
    addColumn(value).setHeader(header).setTextAlign(ColumnTextAlign.END).setWidth("6rem");
  }
}
