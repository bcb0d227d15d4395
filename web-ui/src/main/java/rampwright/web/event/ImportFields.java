package rampwright.web.event;

import com.vaadin.flow.component.checkbox.Checkbox;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.textfield.TextField;
import rampwright.vehicle.circuit.survey.ImportOptions;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;
import rampwright.web.widget.QuantityField;

/** How a file is read: columns and units, smoothing, spacing, whether the lap closes. */
final class ImportFields extends Div {
  private static final long serialVersionUID = 1L;

  private static final Quantity LAP =
      Quantity.si("lap", "number of the lap", "", 0, 100000, "leave it empty for the fastest lap");

  private final TextField columns = new TextField("Columns and units, empty to guess");
  private final QuantityField smoothing =
      new QuantityField("Smoothing length", ImportOptions.SMOOTHING);
  private final QuantityField spacing =
      new QuantityField("Distance between stations", ImportOptions.SPACING);
  private final QuantityField dropout =
      new QuantityField("Longest dropout bridged", ImportOptions.LONGEST_DROPOUT);
  private final QuantityField lap = new QuantityField("Lap, empty for the fastest", LAP);
  private final Checkbox closed = new Checkbox("The end joins the start");

  ImportFields() {
    addClassName("rw-fields");
    columns.setPlaceholder("time=t[s], speed=v[km/h], lateral=ay[g]");
    columns.addClassName("rw-wide");
    ImportOptions usual = ImportOptions.defaults();
    smoothing.show(usual.smoothing());
    spacing.show(usual.spacing());
    dropout.show(usual.longestDropout());
    closed.setValue(usual.closed());
    add(columns, smoothing, spacing, dropout, lap, closed);
  }

  /**
   * Returns what the fields say.
   *
   * @throws InvalidInput when one of them breaks a rule
   */
  ImportOptions options() {
    ImportOptions options =
        ImportOptions.defaults()
            .withColumns(columns.getValue())
            .withSmoothing(smoothing.need())
            .withSpacing(spacing.need())
            .withLongestDropout(dropout.need())
            .withClosed(closed.getValue());
    return lap.read().isPresent() ? options.withLap((int) lap.need()) : options;
  }
}
