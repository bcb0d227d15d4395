package rampwright.web.widget;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Span;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/** Fields for quantities with one button; a bad value gives one message and saves nothing. */
public final class QuantityForm extends Div {
  private static final long serialVersionUID = 1L;

  private final Div fields = new Div();
  private final Div answer = new Div();
  private final transient Map<Quantity, QuantityField> byQuantity = new LinkedHashMap<>();

  /** Takes what was read. */
  @FunctionalInterface
  public interface Save {
    /**
     * Stores the values.
     *
     * @throws InvalidInput when they do not fit together; nothing is stored then
     */
    void accept(Values values);
  }

  /** What stands in the fields. */
  public interface Values {
    /** Returns a value (SI) that must be there. */
    double need(Quantity quantity);

    /** Returns a value (SI), empty when its field is. */
    OptionalDouble find(Quantity quantity);
  }

  /**
   * Makes a form without fields.
   *
   * @param button words on the button
   * @param save what the button does
   */
  public QuantityForm(String button, Save save) {
    addClassName("rw-form");
    fields.addClassName("rw-fields");
    answer.getElement().setAttribute("aria-live", "polite");
    add(fields, new Button(button, click -> save(save)), answer);
  }

  /**
   * Adds a field.
   *
   * @param label its words
   * @param quantity what is entered
   * @param si what stands in it at first; NaN leaves it empty
   */
  public QuantityForm with(String label, Quantity quantity, double si) {
    QuantityField field = new QuantityField(label, quantity);
    if (!Double.isNaN(si)) {
      field.show(si);
    }
    byQuantity.put(quantity, field);
    fields.add(field);
    return this;
  }

  /** Shows other values (SI). */
  public void show(Map<Quantity, Double> values) {
    values.forEach((quantity, si) -> byQuantity.get(quantity).show(si));
  }

  private void save(Save save) {
    answer.removeAll();
    try {
      save.accept(
          new Values() {
            @Override
            public double need(Quantity quantity) {
              return byQuantity.get(quantity).need();
            }

            @Override
            public OptionalDouble find(Quantity quantity) {
              return byQuantity.get(quantity).read();
            }
          });
      Span saved = new Span("Saved");
      saved.addClassName("rw-saved");
      answer.add(saved);
    } catch (InvalidInput e) {
      answer.add(Notice.error(e.getMessage()));
    }
  }
}
