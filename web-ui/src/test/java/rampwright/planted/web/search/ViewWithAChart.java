package rampwright.planted.web.search;

import rampwright.planted.web.chart.ChartThatKnowsAView;

/** The other half of a circle between charts and an area. */
public final class ViewWithAChart {
  final ChartThatKnowsAView chart;

  /**
   * Joins the view to its chart.
   *
   * @param chart the chart that knows the view in turn
   */
  public ViewWithAChart(ChartThatKnowsAView chart) {
    this.chart = chart;
  }
}
