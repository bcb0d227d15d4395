package rampwright.web.lap;

import java.util.Arrays;
import java.util.function.Function;
import rampwright.optimiser.event.Event;
import rampwright.vehicle.balance.CornerReport;
import rampwright.web.chart.Axis;
import rampwright.web.chart.LineChart;
import rampwright.web.widget.Notice;
import rampwright.web.widget.Section;
import rampwright.web.work.LapStudy;
import rampwright.web.work.LapTrace;

/** The traces of both laps over the distance, their cursors linked. */
final class TracesPanel extends Section {
  private static final long serialVersionUID = 1L;

  /** Group of the charts whose cursors move together. */
  static final String GROUP = "lap";

  /** A slide that dies away quickly tells no more than one that dies away slowly. */
  private static final Axis GROWTH = new Axis("growth rate", "1/s", -10.0, 10.0);

  private final transient LapStudy driver;
  private final transient LapStudy car;

  TracesPanel(Event event, LapStudy driver, LapStudy car) {
    super("Over the distance");
    this.driver = driver;
    this.car = car;
    add(
        Notice.hint(
            "Dotted lines: slowest points of the corners. The wheel with Ctrl zooms all charts."));
    chart("Speed", Axis.of("speed", "km/h"), LapTrace::speed);
    chart(
        "Torque difference, slower minus faster wheel",
        Axis.of("torque difference", "N·m"),
        LapTrace::torqueDifference);
    chart(
        "Speed difference of the outputs, faster minus slower",
        Axis.of("speed difference", "rad/s"),
        LapTrace::speedDifference);
    chart("Slip of the inner wheel of the driven axle", Axis.of("slip", "%"), LapTrace::innerSlip);
    growth(event);
    chart(
        "Yaw moment of the differential, positive out of the corner",
        Axis.of("yaw moment", "N·m"),
        LapTrace::yawMoment);
  }

  private void chart(String title, Axis axis, Function<LapTrace, double[]> value) {
    add(marked(lines(title, axis, value)).figure().height("12rem"));
  }

  private LineChart lines(String title, Axis axis, Function<LapTrace, double[]> value) {
    LapTrace first = new LapTrace(driver.lap());
    LapTrace second = new LapTrace(car.lap());
    return new LineChart(title, Axis.DISTANCE, axis)
        .group(GROUP)
        .line("driver's limits", 0, first.distance(), value.apply(first))
        .line("car's limits", 1, second.distance(), value.apply(second));
  }

  private void growth(Event event) {
    double[] distance = new LapTrace(driver.lap()).distance();
    double[] limit = new double[distance.length];
    Arrays.fill(limit, event.driver().powerGrowth());
    LineChart chart =
        lines("Slide growth rate, from −10 to 10 1/s", GROWTH, LapTrace::growth)
            .line("driver's limit on power", 3, distance, limit);
    add(marked(chart).figure().height("12rem"));
  }

  private LineChart marked(LineChart chart) {
    for (CornerReport corner : driver.report().corners()) {
      chart.mark(corner.apexDistance(), String.valueOf(corner.number()));
    }
    return chart;
  }
}
