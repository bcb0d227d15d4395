package rampwright.web.widget;

import static com.github.mvysny.kaributesting.v10.LocatorJ._click;
import static com.github.mvysny.kaributesting.v10.LocatorJ._find;
import static com.github.mvysny.kaributesting.v10.LocatorJ._get;
import static org.assertj.core.api.Assertions.assertThat;

import com.github.mvysny.kaributesting.v10.MockVaadin;
import com.vaadin.flow.component.UI;
import com.vaadin.flow.component.button.Button;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rampwright.vehicle.input.Quantity;

class QuantityFormTest {
  private static final Quantity SLIP =
      Quantity.degrees("max_slip_deg", "slip angle", -5, 20, "it was given in radians");

  private final List<Double> saved = new ArrayList<>();

  @BeforeEach
  void openPage() {
    MockVaadin.setup();
    UI.getCurrent()
        .add(
            new QuantityForm("Save", values -> saved.add(values.need(SLIP)))
                .with("Slip", SLIP, Math.toRadians(3)));
  }

  @AfterEach
  void closePage() {
    MockVaadin.tearDown();
  }

  private static void enter(String text) {
    _get(QuantityField.class).setValue(text);
    _click(_get(Button.class));
  }

  @Test
  void aValueIsShownInItsUnitAndSavedInSi() {
    assertThat(_get(QuantityField.class).getValue()).isEqualTo("3");
    enter("−4.5");
    assertThat(saved).containsExactly(Math.toRadians(-4.5));
    assertThat(_find(Notice.class)).isEmpty();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "25  | The slip angle (25 deg) must be between -5 and 20 deg. Maybe it was given in radians.",
        "NaN | The slip angle (NaN deg) must be between -5 and 20 deg. Maybe it was given in radians.",
        "1,5 | The slip angle (1,5) must be a number, between -5 and 20 deg. Maybe write a point"
            + " instead of the comma.",
        "two | The slip angle (two) must be a number, between -5 and 20 deg.",
        "''  | The slip angle (empty) must be between -5 and 20 deg."
      })
  void aBadValueGivesOneMessageMarksTheFieldAndSavesNothing(String text, String message) {
    enter(text);
    assertThat(saved).isEmpty();
    assertThat(_get(Notice.class).getElement().getTextRecursively()).isEqualTo(message);
    assertThat(_get(QuantityField.class).isInvalid()).isTrue();
    enter("2");
    assertThat(_find(Notice.class)).isEmpty();
    assertThat(_get(QuantityField.class).isInvalid()).isFalse();
  }
}
