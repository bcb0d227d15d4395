package rampwright.web.event;

import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.component.orderedlayout.VerticalLayout;
import com.vaadin.flow.router.PageTitle;
import com.vaadin.flow.router.Route;

/** The first page of the job: what is raced, where and with which parts. */
@Route("")
@PageTitle("Event · Rampwright")
class EventView extends VerticalLayout {
  private static final long serialVersionUID = 1L;

  EventView() {
    add(new H1("Event"));
  }
}
