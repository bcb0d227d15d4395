package rampwright.planted.web.compare;

import com.vaadin.flow.component.dependency.CssImport;
import com.vaadin.flow.component.html.Div;

/** Imports a style file into the bundle on purpose. */
@CssImport("./planted.css")
public final class ViewThatImportsStyles extends Div {
  private static final long serialVersionUID = 1L;
}
