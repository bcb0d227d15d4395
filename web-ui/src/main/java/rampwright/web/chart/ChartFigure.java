package rampwright.web.chart;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.HtmlContainer;
import com.vaadin.flow.component.Tag;
import com.vaadin.flow.component.html.ListItem;
import com.vaadin.flow.component.html.NativeDetails;
import com.vaadin.flow.component.html.Span;
import com.vaadin.flow.component.html.UnorderedList;
import java.util.List;

/** A chart with its title and, below it, the same in words. */
@Tag("figure")
public final class ChartFigure extends HtmlContainer {
  private static final long serialVersionUID = 1L;

  private final String title;
  private final ChartElement element = new ChartElement();
  private final UnorderedList list = new UnorderedList();

  ChartFigure(String title, ChartSpec spec, List<String> words) {
    this.title = title;
    addClassName("rw-figure");
    Span caption = new Span(title);
    caption.addClassName("rw-figure-title");
    NativeDetails inWords = new NativeDetails("In words", list);
    inWords.addClassName("rw-in-words");
    Component[] parts =
        title.isEmpty()
            ? new Component[] {element, inWords}
            : new Component[] {caption, element, inWords};
    add(parts);
    element.show(spec);
    words(words);
  }

  /** Sets the height of the drawing, for example {@code 14rem}. */
  public ChartFigure height(String height) {
    element.setHeight(height);
    return this;
  }

  /** Adds points to one of its lines; the others are not sent again. */
  public void add(int series, double[] xs, double[] ys) {
    element.add(series, Points.of(xs, ys));
  }

  /** Says anew what it shows. */
  public void words(List<String> words) {
    list.removeAll();
    words.forEach(line -> list.add(new ListItem(line)));
    element.words(title + ". " + String.join("; ", words));
  }
}
