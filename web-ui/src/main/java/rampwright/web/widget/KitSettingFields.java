package rampwright.web.widget;

import com.vaadin.flow.component.checkbox.Checkbox;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.select.Select;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.input.InvalidInput;

/** Fields for one choice from the parts kit of an event. */
public final class KitSettingFields extends Div {
  private static final long serialVersionUID = 1L;

  private final transient Event event;
  private final Select<String> ringSet = new Select<>();
  private final Checkbox turned = new Checkbox("Turned round");
  private final Select<Integer> faces = new Select<>();
  private final QuantityField preload =
      new QuantityField("Preload, whole difference", PlateDifferential.PRELOAD);

  /** Makes empty fields. */
  public KitSettingFields(Event event) {
    this.event = event;
    addClassName("rw-fields");
    PartsKit kit = event.kit();
    ringSet.setLabel("Ring set");
    ringSet.setItems(kit.ringSets().stream().map(RingSet::name).toList());
    faces.setLabel("Faces per side");
    faces.setItems(kit.facesPerSide());
    add(ringSet, turned, faces, preload);
  }

  /** Shows a choice. */
  public void show(KitSetting setting) {
    ringSet.setValue(setting.ringSet());
    turned.setValue(setting.turned());
    faces.setValue(setting.facesPerSide());
    preload.show(setting.preload());
  }

  /**
   * Returns the choice as a setting of the event.
   *
   * @param name the setting's name
   * @throws InvalidInput when the kit cannot build it
   */
  public NamedSetting read(String name) {
    if (ringSet.isEmpty() || faces.isEmpty()) {
      throw InvalidInput.of(
          "setting", "incomplete", "given by a ring set and a number of faces", "");
    }
    return event.built(
        name,
        new KitSetting(ringSet.getValue(), turned.getValue(), faces.getValue(), preload.need()));
  }
}
