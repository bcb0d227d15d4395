package rampwright.planted.web.compare;

import com.vaadin.flow.component.dependency.JsModule;
import com.vaadin.flow.component.html.Div;

/** Asks for a module of a bundle of our own on purpose. */
@JsModule("./planted.js")
public final class ViewWithALocalModule extends Div {
  private static final long serialVersionUID = 1L;
}
