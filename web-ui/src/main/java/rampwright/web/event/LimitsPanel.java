package rampwright.web.event;

import java.util.ArrayList;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.event.SettingLimit;
import rampwright.web.store.EventChange;
import rampwright.web.widget.LimitWords;
import rampwright.web.widget.Notice;
import rampwright.web.widget.QuantityForm;
import rampwright.web.widget.Section;

/** What every proposed setting must meet; an empty field is no limit. */
final class LimitsPanel extends Section {
  private static final long serialVersionUID = 1L;

  LimitsPanel(Event event, EventEditor editor) {
    super("Limits on a proposed setting");
    QuantityForm form = new QuantityForm("Save limits", values -> save(values, editor));
    for (LimitedMeasure measure : LimitedMeasure.values()) {
      double value =
          event.limits().stream()
              .filter(limit -> limit.measure() == measure)
              .mapToDouble(SettingLimit::value)
              .findFirst()
              .orElse(Double.NaN);
      form.with(LimitWords.of(measure), measure.quantity(), value);
    }
    add(Notice.hint("An empty field sets no limit."), form);
  }

  private static void save(QuantityForm.Values values, EventEditor editor) {
    List<SettingLimit> limits = new ArrayList<>();
    for (LimitedMeasure measure : LimitedMeasure.values()) {
      values
          .find(measure.quantity())
          .ifPresent(value -> limits.add(new SettingLimit(measure, value)));
    }
    editor.change(event -> EventChange.limits(event, limits));
  }
}
