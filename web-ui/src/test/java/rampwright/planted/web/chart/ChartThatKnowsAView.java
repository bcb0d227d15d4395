package rampwright.planted.web.chart;

import rampwright.planted.web.search.ViewWithAChart;

/** Closes a circle between charts and an area of the page on purpose. */
public final class ChartThatKnowsAView {
  ViewWithAChart view() {
    return new ViewWithAChart(this);
  }
}
