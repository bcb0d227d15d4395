package rampwright.web.event;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.grid.Grid;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Span;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.store.EventChange;
import rampwright.web.widget.Notice;
import rampwright.web.widget.Section;
import rampwright.web.widget.SettingWords;
import rampwright.web.widget.Shown;
import rampwright.web.widget.Tables;

/** The setting in the car now and the others under discussion. */
final class SettingsPanel extends Section {
  private static final long serialVersionUID = 1L;

  private final transient Event event;
  private final transient EventEditor editor;
  private final Div answer = new Div();

  SettingsPanel(Event event, EventEditor editor) {
    super("Settings");
    this.event = event;
    this.editor = editor;
    addClassName("rw-wide");
    SettingForm form = new SettingForm(event, this::save);
    add(table(form), answer, form);
  }

  private Grid<NamedSetting> table(SettingForm form) {
    Grid<NamedSetting> table = Tables.dense();
    table.addColumn(NamedSetting::name).setHeader("Setting").setAutoWidth(true);
    table.addComponentColumn(this::place).setHeader("In the car").setAutoWidth(true);
    table.addColumn(SettingWords::parts).setHeader("Parts").setAutoWidth(true).setFlexGrow(2);
    Tables.number(
        table,
        "Drive ramp (°)",
        s -> fitted(s, b -> Shown.bare(RingSet.DRIVE_ANGLE, b.driveAngle())));
    Tables.number(
        table,
        "Coast ramp (°)",
        s -> fitted(s, b -> Shown.bare(RingSet.COAST_ANGLE, b.coastAngle())));
    Tables.number(
        table,
        "Preload (N·m)",
        s -> law(s, l -> Shown.bare(PlateDifferential.PRELOAD, l.preload())));
    Tables.number(table, "Drive share (–)", s -> law(s, l -> Shown.bare(l.driveShare(), 3)));
    Tables.number(table, "Coast share (–)", s -> law(s, l -> Shown.bare(l.coastShare(), 3)));
    table.addComponentColumn(setting -> actions(setting, form)).setAutoWidth(true);
    table.setItems(event.settings());
    table.setAllRowsVisible(true);
    return table;
  }

  private Span place(NamedSetting setting) {
    boolean current = setting.name().equals(event.currentSetting());
    Span place = new Span(current ? "now" : "");
    place.addClassName(current ? "rw-now" : "rw-not-now");
    return place;
  }

  private Div actions(NamedSetting setting, SettingForm form) {
    Div actions = new Div();
    actions.addClassName("rw-row");
    if (setting.kitSetting().isPresent()) {
      actions.add(new Button("Edit", click -> form.show(setting)));
    }
    if (!setting.name().equals(event.currentSetting())) {
      actions.add(
          new Button("Is in the car", click -> save(e -> EventChange.current(e, setting.name()))),
          new Button("Remove", click -> save(e -> EventChange.withoutSetting(e, setting.name()))));
    }
    return actions;
  }

  private void save(UnaryOperator<Event> change) {
    answer.removeAll();
    try {
      editor.change(change);
    } catch (InvalidInput e) {
      answer.add(Notice.error(e.getMessage()));
    }
  }

  private String fitted(NamedSetting setting, Function<PlateBuild, String> words) {
    return setting.kitSetting().map(s -> words.apply(event.kit().build(s))).orElse("–");
  }

  private String law(NamedSetting setting, Function<PlateDifferential, String> words) {
    return setting.differentials().rear() instanceof PlateDifferential law ? words.apply(law) : "–";
  }
}
