package rampwright.web.compare;

import com.vaadin.flow.component.html.Span;
import rampwright.web.widget.Shown;

/** A difference of times, marked by sign, colour and an arrow where it is worth a look. */
final class Difference {
  /** Below this a difference is within what plate friction and driving do to a lap (s). */
  private static final double WORTH_A_LOOK = 0.005;

  private Difference() {}

  /** Returns a difference (s); negative is faster. */
  static Span of(double seconds) {
    Span span = new Span(Shown.signed(seconds, 3, ""));
    if (seconds <= -WORTH_A_LOOK) {
      span.setText("▲ " + span.getText());
      span.addClassName("rw-faster");
    } else if (seconds >= WORTH_A_LOOK) {
      span.setText("▼ " + span.getText());
      span.addClassName("rw-slower");
    }
    return span;
  }
}
