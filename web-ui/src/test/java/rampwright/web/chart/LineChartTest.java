package rampwright.web.chart;

import static com.github.mvysny.kaributesting.v10.LocatorJ._get;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.github.mvysny.kaributesting.v10.MockVaadin;
import com.vaadin.flow.component.html.ListItem;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class LineChartTest {
  private static final double[] PLACES = {0, 10, 20};

  @BeforeEach
  void openPage() {
    MockVaadin.setup();
  }

  @AfterEach
  void closePage() {
    MockVaadin.tearDown();
  }

  private static ChartFigure figure() {
    return new LineChart("Speed", Axis.DISTANCE, Axis.of("speed", "km/h"))
        .group("lap")
        .line("as raced", 0, PLACES, new double[] {100.123456789, Double.NaN, 80})
        .mark(10, "1")
        .figure();
  }

  @Test
  void theDescriptionHoldsUnitsRoundedPointsAndGaps() throws Exception {
    ChartElement element = _get(figure(), ChartElement.class);
    JsonNode spec = new ObjectMapper().readTree(element.getElement().getProperty("spec"));
    assertThat(spec.at("/kind").asText()).isEqualTo("lines");
    assertThat(spec.at("/y/unit").asText()).isEqualTo("km/h");
    assertThat(spec.at("/series/0/data/0/1").asDouble()).isEqualTo(100.123);
    assertThat(spec.at("/series/0/data/1/1").isNull()).isTrue();
    assertThat(spec.at("/marks/0/label").asText()).isEqualTo("1");
  }

  @Test
  void whatIsDrawnIsAlsoSaid() {
    String words = "as raced: speed between 80.0 km/h at 20.0 m and 100 km/h at 0.00 m";
    assertThat(_get(figure(), ListItem.class).getText()).isEqualTo(words);
    assertThat(_get(figure(), ChartElement.class).getElement().getAttribute("aria-label"))
        .isEqualTo("Speed. " + words);
  }

  @Test
  void placesAndValuesMustGoTogether() {
    LineChart chart = new LineChart("Speed", Axis.DISTANCE, Axis.of("speed", "km/h"));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> chart.line("short", 0, PLACES, new double[2]));
  }
}
