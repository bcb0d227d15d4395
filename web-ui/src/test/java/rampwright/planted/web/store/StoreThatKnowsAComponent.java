package rampwright.planted.web.store;

import com.vaadin.flow.component.html.Div;

/** Lets the storage know a component on purpose. */
public final class StoreThatKnowsAComponent {
  final Div component = new Div();
}
