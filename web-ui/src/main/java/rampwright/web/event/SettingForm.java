package rampwright.web.event;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H3;
import com.vaadin.flow.component.textfield.TextField;
import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.store.EventChange;
import rampwright.web.widget.KitSettingFields;
import rampwright.web.widget.Notice;

/** One setting from the kit, to be changed or added. */
final class SettingForm extends Div {
  private static final long serialVersionUID = 1L;

  private final transient Consumer<UnaryOperator<Event>> save;
  private final TextField name = new TextField("Name");
  private final KitSettingFields fields;
  private final Div answer = new Div();

  SettingForm(Event event, Consumer<UnaryOperator<Event>> save) {
    this.save = save;
    addClassName("rw-form");
    fields = new KitSettingFields(event);
    fields.addComponentAsFirst(name);
    add(
        new H3("Change a setting, or add one under a new name"),
        fields,
        new Button("Save setting", click -> save()),
        answer);
    show(event.current());
  }

  void show(NamedSetting setting) {
    name.setValue(setting.name());
    setting.kitSetting().ifPresent(fields::show);
  }

  private void save() {
    answer.removeAll();
    try {
      NamedSetting setting = fields.read(named());
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
}
