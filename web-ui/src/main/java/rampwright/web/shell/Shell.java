package rampwright.web.shell;

import com.vaadin.flow.component.HasElement;
import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.dependency.JsModule;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Header;
import com.vaadin.flow.component.html.Main;
import com.vaadin.flow.component.html.Nav;
import com.vaadin.flow.component.html.Span;
import com.vaadin.flow.router.AfterNavigationEvent;
import com.vaadin.flow.router.AfterNavigationObserver;
import com.vaadin.flow.router.HighlightConditions;
import com.vaadin.flow.router.Layout;
import com.vaadin.flow.router.RouterLayout;
import com.vaadin.flow.router.RouterLink;
import com.vaadin.flow.server.menu.MenuConfiguration;
import com.vaadin.flow.server.menu.MenuEntry;
import rampwright.web.store.EventStore;

/** The frame around every area; an area joins the way through the job by its {@code @Menu}. */
@Layout
@JsModule("context://rampwright/theme.js")
class Shell extends Div implements RouterLayout, AfterNavigationObserver {
  private static final long serialVersionUID = 1L;

  private final Main content = new Main();
  private final Span eventName = new Span();
  private final transient EventStore events;

  Shell(EventStore events) {
    this.events = events;
    addClassName("rw-shell");
    Span name = new Span("Rampwright");
    name.addClassName("rw-name");
    eventName.addClassName("rw-event-name");
    Button shade = new Button("Light or dark");
    shade.addClassName("rw-shade");
    shade.getElement().executeJs("this.addEventListener('click', () => window.rampwrightShade())");
    Header header = new Header(name, areas(), eventName, shade);
    header.addClassName("rw-header");
    add(header, content);
  }

  @Override
  public void showRouterLayoutContent(HasElement view) {
    content.getElement().removeAllChildren();
    content.getElement().appendChild(view.getElement());
  }

  @Override
  public void afterNavigation(AfterNavigationEvent event) {
    eventName.setText(events.open().event().name());
  }

  private static Nav areas() {
    Nav nav = new Nav();
    nav.addClassName("rw-areas");
    nav.getElement().setAttribute("aria-label", "Areas");
    for (MenuEntry entry : MenuConfiguration.getMenuEntries()) {
      RouterLink link = new RouterLink(entry.title(), entry.menuClass());
      link.setHighlightCondition(HighlightConditions.sameLocation());
      nav.add(link);
    }
    return nav;
  }
}
