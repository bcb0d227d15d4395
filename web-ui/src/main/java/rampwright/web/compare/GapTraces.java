package rampwright.web.compare;

import java.util.function.Function;
import rampwright.vehicle.balance.CornerReport;
import rampwright.web.chart.Axis;
import rampwright.web.chart.LineChart;
import rampwright.web.widget.Notice;
import rampwright.web.widget.Section;
import rampwright.web.work.LapStudy;
import rampwright.web.work.LapTrace;

/** Speed, gap and what the differential does, over the distance; cursors linked. */
final class GapTraces extends Section {
  private static final long serialVersionUID = 1L;

  /** Group of the charts and the map whose cursors move together. */
  static final String GROUP = "compare";

  private static final Axis GROWTH = new Axis("growth rate", "1/s", -10.0, 10.0);

  private final transient Comparison comparison;

  GapTraces(Comparison comparison) {
    super("Over the distance");
    this.comparison = comparison;
    add(
        Notice.hint(
            "Dotted lines: slowest points of the corners. The wheel with Ctrl zooms all charts; the"
                + " ring on the map is where the cursor is."));
    chart("Speed", Axis.of("speed", "km/h"), LapTrace::speed);
    add(gap().figure().height("12rem"));
    chart(
        "Torque difference, slower minus faster wheel",
        Axis.of("torque difference", "N·m"),
        LapTrace::torqueDifference);
    chart("Slip of the inner wheel of the driven axle", Axis.of("slip", "%"), LapTrace::innerSlip);
    chart("Slide growth rate, from −10 to 10 1/s", GROWTH, LapTrace::growth);
  }

  private void chart(String title, Axis axis, Function<LapTrace, double[]> value) {
    LineChart chart = new LineChart(title, Axis.DISTANCE, axis).group(GROUP);
    for (int i = 0; i < comparison.studies().size(); i++) {
      LapStudy study = comparison.studies().get(i);
      LapTrace trace = new LapTrace(study.lap());
      chart.line(study.setting().name(), i, trace.distance(), value.apply(trace));
    }
    add(marked(chart).figure().height("12rem"));
  }

  private LineChart gap() {
    String reference = comparison.reference().setting().name();
    double[] distance = new LapTrace(comparison.reference().lap()).distance();
    LineChart chart =
        new LineChart(
                "Gap to " + reference + ": falling gains time, rising loses it",
                Axis.DISTANCE,
                Axis.of("gap", "s"))
            .group(GROUP)
            .line(reference, 0, distance, new double[distance.length]);
    for (int i = 0; i < comparison.splits().size(); i++) {
      String name = comparison.studies().get(i + 1).setting().name();
      chart.line(name, i + 1, distance, comparison.splits().get(i).gap());
    }
    return marked(chart);
  }

  private LineChart marked(LineChart chart) {
    for (CornerReport corner : comparison.corners()) {
      chart.mark(corner.apexDistance(), String.valueOf(corner.number()));
    }
    return chart;
  }
}
