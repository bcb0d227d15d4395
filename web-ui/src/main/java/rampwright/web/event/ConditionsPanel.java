package rampwright.web.event;

import rampwright.optimiser.event.Event;
import rampwright.vehicle.Conditions;
import rampwright.web.store.EventChange;
import rampwright.web.widget.QuantityForm;
import rampwright.web.widget.Section;

/** Grip, fuel, air and wind. */
final class ConditionsPanel extends Section {
  private static final long serialVersionUID = 1L;

  ConditionsPanel(Event event, EventEditor editor) {
    super("Conditions");
    Conditions now = event.conditions();
    add(
        new QuantityForm("Save conditions", values -> save(values, editor))
            .with("Grip factor (1: as the tyre data)", Conditions.GRIP, now.grip())
            .with("Fuel mass", Conditions.FUEL_MASS, now.fuelMass())
            .with("Air density", Conditions.AIR_DENSITY, now.airDensity())
            .with("Wind speed", Conditions.WIND_SPEED, now.windSpeed())
            .with("Wind from, anticlockwise from x", Conditions.WIND_FROM, now.windFrom()));
  }

  private static void save(QuantityForm.Values values, EventEditor editor) {
    Conditions changed =
        new Conditions(
            values.need(Conditions.GRIP),
            values.need(Conditions.FUEL_MASS),
            values.need(Conditions.AIR_DENSITY),
            values.need(Conditions.WIND_SPEED),
            values.need(Conditions.WIND_FROM));
    editor.change(event -> EventChange.conditions(event, changed));
  }
}
