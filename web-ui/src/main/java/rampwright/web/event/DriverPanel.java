package rampwright.web.event;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Span;
import java.util.Map;
import rampwright.optimiser.event.Event;
import rampwright.vehicle.Driver;
import rampwright.vehicle.input.Quantity;
import rampwright.web.store.EventChange;
import rampwright.web.widget.Notice;
import rampwright.web.widget.QuantityForm;
import rampwright.web.widget.Section;

/** How fast a slide may grow before this driver must back off. */
final class DriverPanel extends Section {
  private static final long serialVersionUID = 1L;

  DriverPanel(Event event, EventEditor editor) {
    super("Driver");
    Driver driver = event.driver();
    QuantityForm form =
        new QuantityForm(
                "Save driver",
                values -> {
                  Driver changed =
                      new Driver(
                          values.need(Driver.POWER_GROWTH), values.need(Driver.BRAKING_GROWTH));
                  editor.change(e -> EventChange.driver(e, changed));
                })
            .with("On power and in steady cornering", Driver.POWER_GROWTH, driver.powerGrowth())
            .with("Braking in a turn", Driver.BRAKING_GROWTH, driver.brakingGrowth());
    Div usual =
        new Div(
            new Span("Usual values:"),
            preset("cautious", Driver.CAUTIOUS, form),
            preset("quick", Driver.QUICK, form),
            preset("expert", Driver.EXPERT, form));
    usual.addClassName("rw-row");
    add(
        Notice.hint(
            "Largest growth rate of a slide that the driver still masters: at 1 1/s a slide grows"
                + " 2.7-fold in a second. There is no published figure; the usual values are ours."),
        usual,
        form);
  }

  private static Button preset(String name, Driver driver, QuantityForm form) {
    Map<Quantity, Double> values =
        Map.of(
            Driver.POWER_GROWTH, driver.powerGrowth(),
            Driver.BRAKING_GROWTH, driver.brakingGrowth());
    return new Button(name, click -> form.show(values));
  }
}
