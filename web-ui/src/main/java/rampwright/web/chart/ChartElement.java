package rampwright.web.chart;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.HasSize;
import com.vaadin.flow.component.Tag;
import com.vaadin.flow.component.dependency.JsModule;
import java.util.List;

/**
 * The element in the browser. Its description is a property, so that it survives re-attaching; new
 * points are sent alone.
 */
@Tag("rw-chart")
@JsModule("context://rampwright/chart.js")
final class ChartElement extends Component implements HasSize {
  private static final long serialVersionUID = 1L;
  private static final ObjectMapper JSON = new ObjectMapper();

  ChartElement() {
    getElement().setAttribute("role", "img");
  }

  void show(ChartSpec spec) {
    getElement().setProperty("spec", json(spec));
  }

  void words(String words) {
    getElement().setAttribute("aria-label", words);
  }

  void add(int series, List<List<Double>> points) {
    getElement().callJsFunction("addPoints", series, json(points));
  }

  private static String json(Object plain) {
    try {
      return JSON.writeValueAsString(plain);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("A chart's description is always plain data", e);
    }
  }
}
