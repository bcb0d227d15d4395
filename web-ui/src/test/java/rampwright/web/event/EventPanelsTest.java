package rampwright.web.event;

import static com.github.mvysny.kaributesting.v10.LocatorJ._click;
import static com.github.mvysny.kaributesting.v10.LocatorJ._find;
import static com.github.mvysny.kaributesting.v10.LocatorJ._get;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import com.github.mvysny.kaributesting.v10.MockVaadin;
import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.UI;
import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.textfield.TextField;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.event.SettingLimit;
import rampwright.vehicle.Driver;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.store.EventChange;
import rampwright.web.store.EventStore;
import rampwright.web.store.TestStores;
import rampwright.web.widget.Notice;
import rampwright.web.widget.QuantityField;

class EventPanelsTest {
  private EventStore events;
  private Event before;

  @BeforeEach
  void openPage() {
    MockVaadin.setup();
    events = TestStores.inMemory("panels" + System.identityHashCode(this)).events();
    before = events.open().event();
  }

  @AfterEach
  void closePage() {
    MockVaadin.tearDown();
  }

  private static void show(Component panel) {
    UI.getCurrent().add(panel);
  }

  private static QuantityField field(String label) {
    return _get(QuantityField.class, spec -> spec.withLabel(label));
  }

  private static void press(String text) {
    _click(_get(Button.class, spec -> spec.withText(text)));
  }

  private static String message() {
    return _get(Notice.class, spec -> spec.withClasses("rw-notice-error"))
        .getElement()
        .getTextRecursively();
  }

  @Test
  void aLimitIsStoredInSiAndAnEmptyFieldIsNone() {
    show(new LimitsPanel(before, events::change));
    field("Most plate power per area").setValue("0.7");
    field("Most inner wheel slip").setValue("");
    press("Save limits");
    assertThat(events.open().event().limits())
        .contains(new SettingLimit(LimitedMeasure.PLATE_POWER, 0.7e6))
        .noneMatch(limit -> limit.measure() == LimitedMeasure.INNER_SLIP);
  }

  @Test
  void aLimitOutOfRangeGivesOneMessageAndStoresNothing() {
    show(new LimitsPanel(before, events::change));
    field("Most plate power per area").setValue("0.7");
    field("Most inner wheel slip").setValue("30");
    press("Save limits");
    assertThat(message())
        .isEqualTo(
            "The inner wheel slip (30) must be between 0 and 10. Maybe it was given in percent.");
    assertThat(events.open().event()).isEqualTo(before);
  }

  @Test
  void theUsualDriversFillTheFieldsAndAreStoredOnlyWhenSaved() {
    show(new DriverPanel(before, events::change));
    press("expert");
    assertThat(events.open().event().driver()).isEqualTo(before.driver());
    press("Save driver");
    assertThat(events.open().event().driver()).isEqualTo(Driver.EXPERT);
  }

  @Test
  void aSettingThatTheKitCannotBuildIsToldAndNotStored() {
    show(new SettingsPanel(before, events::change));
    _get(TextField.class, spec -> spec.withLabel("Name")).setValue("soft");
    field("Preload, whole difference").setValue("41");
    press("Save setting");
    assertThat(message()).contains("(41 N·m)").contains("in steps of 5");
    assertThat(events.open().event()).isEqualTo(before);

    field("Preload, whole difference").setValue("45");
    press("Save setting");
    assertThat(events.open().event().setting("soft").kitSetting().orElseThrow().preload())
        .isEqualTo(45);
    assertThat(_find(Notice.class, spec -> spec.withClasses("rw-notice-error"))).isEmpty();
  }

  @Test
  void theSettingInTheCarCannotBeTakenAway() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> events.change(e -> EventChange.withoutSetting(e, e.currentSetting())))
        .withMessageContaining("current setting");
    assertThat(events.open().event()).isEqualTo(before);
  }
}
