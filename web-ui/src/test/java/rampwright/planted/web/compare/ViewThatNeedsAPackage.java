package rampwright.planted.web.compare;

import com.vaadin.flow.component.dependency.NpmPackage;
import com.vaadin.flow.component.html.Div;

/** Asks for an npm package on purpose. */
@NpmPackage(value = "planted", version = "1.0.0")
public final class ViewThatNeedsAPackage extends Div {
  private static final long serialVersionUID = 1L;
}
