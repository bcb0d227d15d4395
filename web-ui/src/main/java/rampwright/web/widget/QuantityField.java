package rampwright.web.widget;

import com.vaadin.flow.component.html.Span;
import com.vaadin.flow.component.textfield.TextField;
import java.util.OptionalDouble;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * A field for one quantity: its words, its unit and its range. It takes text, so that a bad value
 * is answered by the one message of the quantity and not swallowed by the browser.
 */
public final class QuantityField extends TextField {
  private static final long serialVersionUID = 1L;

  private final transient Quantity quantity;

  /**
   * Makes an empty field.
   *
   * @param label its words
   * @param quantity what is entered
   */
  public QuantityField(String label, Quantity quantity) {
    super(label);
    this.quantity = quantity;
    addClassName("rw-number");
    if (!quantity.unit().isEmpty()) {
      setSuffixComponent(new Span(Shown.unit(quantity.unit())));
    }
    setTitle(quantity.rule());
    addValueChangeListener(event -> setInvalid(false));
  }

  /** Shows a value (SI). */
  public void show(double si) {
    setValue(Shown.bare(quantity, si));
  }

  /**
   * Returns the value (SI); empty for an empty field.
   *
   * @throws InvalidInput when it is no number or out of range; the field is then marked
   */
  public OptionalDouble read() {
    String text = getValue().strip();
    if (text.isEmpty()) {
      return OptionalDouble.empty();
    }
    try {
      double value = quantity.check(number(text) * quantity.siPerUnit());
      return OptionalDouble.of(value);
    } catch (InvalidInput e) {
      setInvalid(true);
      throw e;
    }
  }

  /**
   * Returns the value (SI) of a field that must not be empty.
   *
   * @throws InvalidInput when it is
   */
  public double need() {
    return read()
        .orElseThrow(
            () -> {
              setInvalid(true);
              return InvalidInput.of(quantity.label(), "empty", quantity.rule(), "");
            });
  }

  private double number(String text) {
    try {
      return Double.parseDouble(text.replace('−', '-'));
    } catch (NumberFormatException e) {
      String advice = text.contains(",") ? "write a point instead of the comma" : "";
      throw InvalidInput.of(quantity.label(), text, "a number, " + quantity.rule(), advice);
    }
  }
}
