package rampwright.web.event;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.checkbox.Checkbox;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H3;
import com.vaadin.flow.component.select.Select;
import com.vaadin.flow.component.textfield.TextField;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.store.EventChange;
import rampwright.web.widget.Notice;
import rampwright.web.widget.QuantityField;

/** One setting from the kit, to be changed or added. */
final class SettingForm extends Div {
  private static final long serialVersionUID = 1L;

  private final transient PartsKit kit;
  private final transient Consumer<UnaryOperator<Event>> save;
  private final TextField name = new TextField("Name");
  private final Select<String> ringSet = new Select<>();
  private final Checkbox turned = new Checkbox("Turned round");
  private final Select<Integer> faces = new Select<>();
  private final QuantityField preload =
      new QuantityField("Preload, propshaft locked", PlateDifferential.PRELOAD);
  private final Div answer = new Div();

  SettingForm(Event event, Consumer<UnaryOperator<Event>> save) {
    this.kit = event.kit();
    this.save = save;
    addClassName("rw-form");
    ringSet.setLabel("Ring set");
    ringSet.setItems(kit.ringSets().stream().map(RingSet::name).toList());
    faces.setLabel("Faces per side");
    faces.setItems(kit.facesPerSide());
    faces.addClassName("rw-number");
    ringSet.addClassName("rw-number");
    Div fields = new Div(name, ringSet, turned, faces, preload);
    fields.addClassName("rw-fields");
    add(
        new H3("Change a setting, or add one under a new name"),
        fields,
        new Button("Save setting", click -> save()),
        answer);
    show(event.current());
  }

  void show(NamedSetting setting) {
    name.setValue(setting.name());
    setting
        .kitSetting()
        .ifPresent(
            fitted -> {
              ringSet.setValue(fitted.ringSet());
              turned.setValue(fitted.turned());
              faces.setValue(fitted.facesPerSide());
              preload.show(fitted.preload());
            });
  }

  private void save() {
    answer.removeAll();
    try {
      NamedSetting setting = NamedSetting.of(named(), kit, fitted());
      save.accept(event -> EventChange.setting(event, setting));
    } catch (InvalidInput e) {
      answer.add(Notice.error(e.getMessage()));
    }
  }

  private String named() {
    String text = name.getValue().strip();
    if (text.isEmpty()) {
      throw InvalidInput.of("name of the setting", "empty", "some text", "");
    }
    return text;
  }

  private KitSetting fitted() {
    if (ringSet.isEmpty() || faces.isEmpty()) {
      throw InvalidInput.of(
          "setting", "incomplete", "given by a ring set and a number of faces", "");
    }
    return new KitSetting(ringSet.getValue(), turned.getValue(), faces.getValue(), preload.need());
  }
}
