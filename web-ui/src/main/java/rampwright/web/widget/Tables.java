package rampwright.web.widget;

import com.vaadin.flow.component.grid.ColumnTextAlign;
import com.vaadin.flow.component.grid.Grid;
import com.vaadin.flow.component.grid.GridVariant;
import com.vaadin.flow.function.ValueProvider;

/** Tables in one look: dense rows, numbers to the right. */
public final class Tables {
  private Tables() {}

  /** Returns a table without columns that cannot be selected. */
  public static <T> Grid<T> dense() {
    Grid<T> grid = new Grid<>();
    grid.addThemeVariants(
        GridVariant.LUMO_COMPACT, GridVariant.LUMO_NO_BORDER, GridVariant.LUMO_WRAP_CELL_CONTENT);
    grid.addClassName("rw-table");
    grid.setSelectionMode(Grid.SelectionMode.NONE);
    return grid;
  }

  /** Adds a column of numbers; the header names the unit. */
  public static <T> Grid.Column<T> number(
      Grid<T> grid, String header, ValueProvider<T, String> value) {
    return grid.addColumn(value)
        .setHeader(header)
        .setTextAlign(ColumnTextAlign.END)
        .setAutoWidth(true);
  }
}
