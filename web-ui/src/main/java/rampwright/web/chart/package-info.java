/**
 * Charts: what to show is described in Java, drawn in the browser by our own element on top of
 * Apache ECharts, and told in words for those who do not see it. Knows no area of the page.
 */
package rampwright.web.chart;
