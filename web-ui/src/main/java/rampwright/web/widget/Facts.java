package rampwright.web.widget;

import com.vaadin.flow.component.html.DescriptionList;

/** A dense list of names and values. */
public final class Facts extends DescriptionList {
  private static final long serialVersionUID = 1L;

  /** Starts an empty list. */
  public Facts() {
    addClassName("rw-facts");
  }

  /** Adds one fact. */
  public Facts with(String name, String value) {
    add(new Term(name), new Description(value));
    return this;
  }
}
