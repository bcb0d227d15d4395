package rampwright.web.compare;

import com.vaadin.flow.component.grid.ColumnTextAlign;
import com.vaadin.flow.component.grid.Grid;
import com.vaadin.flow.component.grid.GridVariant;
import com.vaadin.flow.component.html.Span;
import java.util.stream.IntStream;
import rampwright.vehicle.balance.GapSplit;
import rampwright.vehicle.balance.GapSplit.Cause;
import rampwright.web.chart.Palette;
import rampwright.web.widget.SettingWords;
import rampwright.web.widget.Shown;

/** One row per setting: lap time, gap to the reference and what causes it. */
final class GapTable extends Grid<Integer> {
  private static final long serialVersionUID = 1L;

  private final transient Comparison comparison;

  GapTable(Comparison comparison) {
    this.comparison = comparison;
    addThemeVariants(
        GridVariant.LUMO_COMPACT, GridVariant.LUMO_NO_BORDER, GridVariant.LUMO_WRAP_CELL_CONTENT);
    addClassName("rw-table");
    setSelectionMode(SelectionMode.NONE);
    addComponentColumn(this::name).setHeader("Setting").setFlexGrow(2);
    addColumn(i -> SettingWords.parts(comparison.studies().get(i).setting()))
        .setHeader("Parts")
        .setFlexGrow(3);
    addColumn(i -> Shown.bare(comparison.studies().get(i).lap().time(), 3))
        .setHeader("Lap time (s)")
        .setTextAlign(ColumnTextAlign.END);
    addComponentColumn(i -> i == 0 ? new Span("reference") : Difference.of(split(i).total()))
        .setHeader("Gap (s)")
        .setTextAlign(ColumnTextAlign.END);
    for (Cause cause : Cause.values()) {
      addComponentColumn(i -> i == 0 ? new Span() : Difference.of(split(i).seconds(cause)))
          .setHeader("of it " + cause.label() + " (s)")
          .setTextAlign(ColumnTextAlign.END);
    }
    setItems(IntStream.range(0, comparison.studies().size()).boxed().toList());
    setAllRowsVisible(true);
  }

  private GapSplit split(int setting) {
    return comparison.splits().get(setting - 1);
  }

  private Span name(int setting) {
    Span swatch = new Span();
    swatch.addClassName("rw-swatch");
    swatch.getStyle().set("color", "var(" + Palette.colour(setting) + ")");
    swatch.getStyle().set("border-top-style", Palette.cssDash(setting));
    return new Span(swatch, new Span(comparison.studies().get(setting).setting().name()));
  }
}
