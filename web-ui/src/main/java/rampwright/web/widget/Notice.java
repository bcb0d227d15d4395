package rampwright.web.widget;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Span;

/** One message in the page: what went wrong, what is missing, or what to mind. */
public final class Notice extends Div {
  private static final long serialVersionUID = 1L;

  private Notice(String kind, String role, String text) {
    addClassNames("rw-notice", "rw-notice-" + kind);
    getElement().setAttribute("role", role);
    add(new Span(text));
  }

  /** Returns the message for bad input or a computation that failed. */
  public static Notice error(String text) {
    return new Notice("error", "alert", text);
  }

  /** Returns what stands where nothing is to show yet, and says what to do. */
  public static Notice empty(String text, Component... ways) {
    Notice notice = new Notice("empty", "status", text);
    notice.add(ways);
    return notice;
  }

  /** Returns a hint. */
  public static Notice hint(String text) {
    return new Notice("hint", "note", text);
  }
}
