package rampwright.web.widget;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.UI;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Span;
import com.vaadin.flow.component.progressbar.ProgressBar;
import java.util.function.Function;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.work.Desk;

/**
 * A place whose content takes time: it says what is being computed until the desk answers. A newer
 * question replaces an older one, whose answer is then thrown away.
 */
public final class Later extends Div {
  private static final long serialVersionUID = 1L;
  private static final Logger LOG = LoggerFactory.getLogger(Later.class);

  private final transient Desk desk;
  private int question;

  /**
   * Makes an empty place.
   *
   * @param desk where the work is done
   */
  public Later(Desk desk) {
    this.desk = desk;
    addClassName("rw-later");
  }

  /**
   * Asks a question and shows its answer when it comes.
   *
   * @param what what is being done, in words
   * @param work what the desk does; must touch no component
   * @param draw turns the answer into what is shown
   */
  public <T> void show(String what, Desk.Work<T> work, Function<T, Component> draw) {
    int asked = ++question;
    UI ui = UI.getCurrent();
    ProgressBar bar = new ProgressBar(0, 1);
    bar.setIndeterminate(true);
    replace(waiting(what, bar));
    desk.run(
        work,
        share -> access(ui, asked, () -> progress(bar, share)),
        answer -> access(ui, asked, () -> replace(drawn(answer, draw))),
        error -> access(ui, asked, () -> replace(failed(error))));
  }

  /** Shows something at once; an answer that is still on its way is thrown away. */
  public void show(Component content) {
    question++;
    replace(content);
  }

  private void access(UI ui, int asked, Runnable change) {
    // a closed page needs no answer
    ui.accessLater(
            () -> {
              if (asked == question) {
                change.run();
              }
            },
            () -> {})
        .run();
  }

  private static void progress(ProgressBar bar, double share) {
    bar.setIndeterminate(false);
    bar.setValue(share);
  }

  private static <T> Component drawn(T answer, Function<T, Component> draw) {
    try {
      return draw.apply(answer);
    } catch (RuntimeException e) {
      return failed(e);
    }
  }

  private void replace(Component content) {
    removeAll();
    add(content);
  }

  private static Component waiting(String what, ProgressBar bar) {
    Div waiting = new Div(new Span(what), bar);
    waiting.addClassName("rw-waiting");
    waiting.getElement().setAttribute("role", "status");
    return waiting;
  }

  private static Component failed(RuntimeException error) {
    if (error instanceof InvalidInput) {
      return Notice.error(error.getMessage());
    }
    LOG.error("A computation for the page failed", error);
    return Notice.error(
        "The computation stopped on a fault of the program ("
            + error.getClass().getSimpleName()
            + "); nothing that was stored has changed. Maybe other limits or another setting"
            + " avoid it; the log of the program has the details.");
  }
}
