package rampwright.web.search;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.grid.Grid;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.function.LongConsumer;
import rampwright.web.store.RunSummary;
import rampwright.web.widget.Section;
import rampwright.web.widget.Tables;

/** The searches that are kept. */
final class RunsTable extends Section {
  private static final long serialVersionUID = 1L;
  private static final DateTimeFormatter TIME = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm:ss");

  RunsTable(List<RunSummary> runs, LongConsumer open) {
    super("Searches that are kept");
    addClassName("rw-wide");
    Grid<RunSummary> table = Tables.dense();
    Tables.number(table, "Number", run -> String.valueOf(run.id()));
    table
        .addColumn(run -> run.started().atZoneSameInstant(ZoneId.systemDefault()).format(TIME))
        .setHeader("Started")
        .setAutoWidth(true);
    table.addColumn(RunSummary::eventName).setHeader("Event").setFlexGrow(2);
    table.addColumn(run -> run.state().label()).setHeader("State").setAutoWidth(true);
    Tables.number(table, "Seed", run -> String.valueOf(run.seed()));
    Tables.number(table, "Most evaluations", run -> String.valueOf(run.budget()));
    table.addColumn(RunSummary::version).setHeader("Version").setAutoWidth(true);
    table.addComponentColumn(run -> new Button("Open", click -> open.accept(run.id())));
    table.setItems(runs);
    table.setAllRowsVisible(true);
    add(table);
  }
}
