package rampwright.web.search;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.grid.Grid;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H3;
import java.util.List;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.search.AlikeGroup;
import rampwright.optimiser.search.EvaluatedSetting;
import rampwright.optimiser.search.LimitCheck;
import rampwright.optimiser.search.SearchResult;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.web.store.EventStore;
import rampwright.web.store.StoredRun;
import rampwright.web.widget.LimitWords;
import rampwright.web.widget.Notice;
import rampwright.web.widget.SettingWords;
import rampwright.web.widget.Shown;
import rampwright.web.widget.Tables;

/** The answer of a search: the best setting, its limits, and what drives alike. */
final class ResultPanel extends Div {
  private static final long serialVersionUID = 1L;

  ResultPanel(StoredRun run, SearchResult result, EventStore events) {
    EvaluatedSetting best = result.best();
    Div line = new Div(SettingWords.whole(best.setting()));
    line.addClassName("rw-big");
    add(new H3(result.feasible() ? "Best setting" : "Nearest to the limits"), line);
    if (!result.feasible()) {
      add(
          Notice.error(
              "No setting that was computed meets all limits; this one breaks them least. Maybe a"
                  + " limit can give way on the Event page."));
    }
    add(
        new Div(
            "Lap time "
                + Shown.of(best.lapTime(), 3, "s")
                + today(run, best)
                + " · "
                + result.method().label()
                + " · "
                + result.evaluations()
                + " evaluations · seed "
                + result.seed()
                + (result.unsolved().isEmpty()
                    ? ""
                    : " · " + result.unsolved().size() + " laps could not be solved")
                + (result.cancelled() ? " · ended early: the best so far" : "")),
        new SettingActions(run, best.setting(), events),
        limits(best.limits()));
    if (!result.alike().isEmpty()) {
      add(
          new H3("Settings that a stopwatch could not tell from the best, cheapest change first"),
          alike(run, result.alike(), events));
    }
  }

  /** The first setting that a search computes is the one that is in the car, if it may be. */
  private static String today(StoredRun run, EvaluatedSetting best) {
    if (run.progress().isEmpty()) {
      return "";
    }
    double first = run.progress().get(0).bestLapTime();
    return " (" + Shown.signed(best.lapTime() - first, 3, "s") + " to the first that was computed)";
  }

  private static Grid<LimitCheck> limits(List<LimitCheck> checks) {
    Grid<LimitCheck> table = Tables.dense();
    table
        .addColumn(check -> LimitWords.of(check.limit().measure()))
        .setHeader("Limit")
        .setFlexGrow(3);
    Tables.number(
        table, "Value", check -> LimitWords.value(check.limit().measure(), check.value()));
    Tables.number(table, "Allowed", check -> LimitWords.allowed(check.limit()));
    table.addColumn(check -> LimitWords.met(check.met())).setHeader("").setAutoWidth(true);
    table.setItems(checks);
    table.setAllRowsVisible(true);
    return table;
  }

  private static Grid<AlikeGroup> alike(StoredRun run, List<AlikeGroup> groups, EventStore events) {
    Grid<AlikeGroup> table = Tables.dense();
    table
        .addColumn(group -> SettingWords.parts(group.setting().setting()))
        .setHeader("Parts")
        .setFlexGrow(3);
    Tables.number(table, "Preload (N·m)", ResultPanel::preload);
    Tables.number(table, "Lap time (s)", group -> Shown.bare(group.setting().lapTime(), 3));
    Tables.number(table, "Change (min)", group -> Shown.bare(group.changeTime() / 60, 0));
    Tables.number(table, "Settings", group -> String.valueOf(group.settings()));
    table
        .addComponentColumn(
            group -> {
              KitSetting setting = group.setting().setting();
              return new Button(
                  "Add to settings", click -> SettingActions.add(run, setting, events));
            })
        .setAutoWidth(true);
    table.setItems(groups);
    table.setAllRowsVisible(true);
    return table;
  }

  private static String preload(AlikeGroup group) {
    String low = Shown.bare(PlateDifferential.PRELOAD, group.lowestPreload());
    String high = Shown.bare(PlateDifferential.PRELOAD, group.highestPreload());
    return low.equals(high) ? low : low + " to " + high;
  }
}
