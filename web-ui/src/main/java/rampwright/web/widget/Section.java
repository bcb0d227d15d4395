package rampwright.web.widget;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.HtmlContainer;
import com.vaadin.flow.component.Tag;
import com.vaadin.flow.component.html.H2;

/** A titled part of a page. */
@Tag("section")
public class Section extends HtmlContainer {
  private static final long serialVersionUID = 1L;

  /**
   * Makes a part of a page.
   *
   * @param title its heading
   * @param content what it holds
   */
  public Section(String title, Component... content) {
    addClassName("rw-section");
    add(new H2(title));
    add(content);
  }

  /** Takes the whole width of the page. */
  public Section wide() {
    addClassName("rw-wide");
    return this;
  }
}
