package rampwright.web.search;

import java.util.function.Consumer;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.search.SearchRequest;
import rampwright.optimiser.search.SettingSpace;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;
import rampwright.web.widget.Facts;
import rampwright.web.widget.Notice;
import rampwright.web.widget.QuantityForm;
import rampwright.web.widget.Section;

/** What a search needs to be told. */
final class StartPanel extends Section {
  private static final long serialVersionUID = 1L;
  private static final int USUAL_BUDGET = 400;
  private static final Quantity SEED =
      Quantity.si("seed", "seed", "", 0, 1e9, "use a whole number");

  StartPanel(Event event, Consumer<SearchRequest> start) {
    super("New search in " + event.name());
    int processors = Runtime.getRuntime().availableProcessors();
    add(
        Notice.hint(
            "Finds the setting with the least lap time, over all circuits of the event times their"
                + " weight, that meets every limit. The same event, seed and number of evaluations"
                + " give the same answer."),
        new Facts()
            .with("Settings that the kit can build", size(event))
            .with("Limits", event.limits().size() + ", on the Event page"),
        new QuantityForm(
                "Start the search",
                values ->
                    start.accept(
                        new SearchRequest(
                            event,
                            whole(values, SEED),
                            (int) whole(values, SearchRequest.THREADS),
                            (int) whole(values, SearchRequest.MAX_EVALUATIONS))))
            .with("Seed", SEED, 1)
            .with("Most evaluations", SearchRequest.MAX_EVALUATIONS, USUAL_BUDGET)
            .with("Laps computed at a time", SearchRequest.THREADS, processors));
  }

  private static String size(Event event) {
    return String.valueOf(SettingSpace.of(event.kit()).size());
  }

  private static long whole(QuantityForm.Values values, Quantity quantity) {
    double value = values.need(quantity);
    if (value != Math.rint(value)) {
      throw InvalidInput.value(quantity.label(), value, "", "a whole number", "");
    }
    return (long) value;
  }
}
