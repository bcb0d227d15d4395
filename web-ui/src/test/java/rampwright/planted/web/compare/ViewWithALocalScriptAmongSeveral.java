package rampwright.planted.web.compare;

import com.vaadin.flow.component.dependency.JavaScript;
import com.vaadin.flow.component.html.Div;

/** Hides one script of another host among two on purpose. */
@JavaScript("context://planted.js")
@JavaScript("https://planted.example/planted.js")
public final class ViewWithALocalScriptAmongSeveral extends Div {
  private static final long serialVersionUID = 1L;
}
