package rampwright.web.search;

import com.vaadin.flow.component.UI;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.BeforeEnterObserver;
import com.vaadin.flow.router.Menu;
import com.vaadin.flow.router.PageTitle;
import com.vaadin.flow.router.QueryParameters;
import com.vaadin.flow.router.Route;
import java.util.List;
import java.util.Optional;
import rampwright.optimiser.search.SearchRequest;
import rampwright.web.store.EventStore;
import rampwright.web.store.RunStore;
import rampwright.web.store.RunSummary;
import rampwright.web.store.StoredEvent;
import rampwright.web.store.StoredRun;
import rampwright.web.widget.Notice;

/** Starts a search, watches it, shows its answer and reopens earlier ones. */
@Route("search")
@PageTitle("Search · Rampwright")
@Menu(title = "Search", order = 3)
class SearchView extends Div implements BeforeEnterObserver {
  private static final long serialVersionUID = 1L;
  private static final String RUN = "run";

  private final transient EventStore events;
  private final transient RunStore runs;
  private final transient SearchJobs jobs;

  SearchView(EventStore events, RunStore runs, SearchJobs jobs) {
    this.events = events;
    this.runs = runs;
    this.jobs = jobs;
    addClassName("rw-view");
  }

  @Override
  public void beforeEnter(BeforeEnterEvent enter) {
    Optional<Long> wanted =
        enter.getLocation().getQueryParameters().getSingleParameter(RUN).map(SearchView::number);
    show(wanted);
  }

  private void show(Optional<Long> wanted) {
    removeAll();
    Div head = new Div(new H1("Search"));
    head.addClassName("rw-head");
    StoredEvent stored = events.open();
    List<RunSummary> known = runs.list();
    Optional<StoredRun> run =
        wanted.or(() -> known.stream().findFirst().map(RunSummary::id)).flatMap(runs::find);
    Div parts = new Div(new StartPanel(stored.event(), this::start));
    parts.addClassNames("rw-sections", "rw-side-and-main");
    run.ifPresentOrElse(
        found -> parts.add(new RunPanel(found, jobs, events, this::open, this::repeat)),
        () ->
            parts.add(
                Notice.empty(
                    wanted.isPresent()
                        ? "There is no search of this number; the ones that are kept stand below."
                        : "No search yet. Start one: it goes on when you leave this page.")));
    if (!known.isEmpty()) {
      parts.add(new RunsTable(known, this::open));
    }
    add(head, parts);
  }

  private void start(SearchRequest request) {
    open(jobs.start(Optional.of(events.open().id()), request));
  }

  /** Runs an earlier search again with its own inputs and seed: the answer is the same. */
  private void repeat(StoredRun run) {
    open(jobs.start(run.eventId(), run.request()));
  }

  private void open(long id) {
    UI.getCurrent().navigate(SearchView.class, QueryParameters.of(RUN, String.valueOf(id)));
  }

  private static long number(String text) {
    return text.matches("\\d{1,18}") ? Long.parseLong(text) : -1;
  }
}
