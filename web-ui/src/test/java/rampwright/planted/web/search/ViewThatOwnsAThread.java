package rampwright.planted.web.search;

import com.vaadin.flow.component.html.Div;

/** Starts work that would die with the view on purpose. */
public final class ViewThatOwnsAThread extends Div {
  private static final long serialVersionUID = 1L;

  void start() {
    new Thread(() -> setText("done")).start();
  }
}
