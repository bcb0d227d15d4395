package rampwright.web.widget;

import com.vaadin.flow.component.ItemLabelGenerator;
import com.vaadin.flow.component.select.Select;
import java.util.List;

/** A field in which one of a few things is chosen; one always is. */
public final class Choice {
  private Choice() {}

  /**
   * Returns a field.
   *
   * @param label its words
   * @param items at least one
   * @param first the one that is chosen at first
   * @param words what each item is called
   * @param changed what happens when another is chosen
   */
  public static <T> Select<T> of(
      String label, List<T> items, T first, ItemLabelGenerator<T> words, Runnable changed) {
    Select<T> select = new Select<>();
    select.setLabel(label);
    select.setItemLabelGenerator(words);
    select.setItems(items);
    select.setValue(first);
    select.setEmptySelectionAllowed(false);
    select.addValueChangeListener(
        change -> {
          if (change.getValue() != null) {
            changed.run();
          }
        });
    return select;
  }
}
