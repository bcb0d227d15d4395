package rampwright.planted.web.compare;

import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.router.Route;

/** Is visible to every package on purpose. */
@Route(value = "planted-public-view", registerAtStartup = false)
public final class PublicView extends Div {
  private static final long serialVersionUID = 1L;
}
