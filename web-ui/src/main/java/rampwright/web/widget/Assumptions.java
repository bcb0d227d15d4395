package rampwright.web.widget;

import com.vaadin.flow.component.html.ListItem;
import com.vaadin.flow.component.html.NativeDetails;
import com.vaadin.flow.component.html.UnorderedList;

/** What a result takes for granted, one click away. */
public final class Assumptions extends NativeDetails {
  private static final long serialVersionUID = 1L;

  /** Lists them, one sentence each. */
  public Assumptions(String... sentences) {
    addClassName("rw-in-words");
    setSummaryText("What this takes for granted");
    UnorderedList list = new UnorderedList();
    for (String sentence : sentences) {
      list.add(new ListItem(sentence));
    }
    setContent(list);
  }
}
