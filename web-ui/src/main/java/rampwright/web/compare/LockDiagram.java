package rampwright.web.compare;

import java.util.Arrays;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.web.chart.Axis;
import rampwright.web.chart.LineChart;
import rampwright.web.widget.Notice;
import rampwright.web.widget.Section;
import rampwright.web.work.LapStudy;
import rampwright.web.work.LapTrace;

/** Torque difference against cage torque: what each unit can hold, and where the lap used it. */
final class LockDiagram extends Section {
  private static final long serialVersionUID = 1L;
  private static final int STEPS = 60;

  LockDiagram(Comparison comparison) {
    super("Torque difference against cage torque");
    double least = 0;
    double most = 0;
    double highest = 0;
    for (LapStudy study : comparison.studies()) {
      LapTrace trace = new LapTrace(study.lap());
      least = Math.min(least, Arrays.stream(trace.cageTorque()).min().orElse(0));
      most = Math.max(most, Arrays.stream(trace.cageTorque()).max().orElse(0));
      highest = Math.max(highest, Arrays.stream(trace.torqueDifference()).max().orElse(0));
    }
    LineChart chart =
        new LineChart(
            "",
            new Axis("cage torque, overrun negative", "N·m", Math.floor(least / 100) * 100, null),
            new Axis("torque difference", "N·m", 0.0, Math.ceil(highest / 100 + 0.5) * 100));
    for (int i = 0; i < comparison.studies().size(); i++) {
      LapStudy study = comparison.studies().get(i);
      LapTrace trace = new LapTrace(study.lap());
      chart.points(
          study.setting().name() + ", lap", i, trace.cageTorque(), trace.torqueDifference());
    }
    for (int i = 0; i < comparison.studies().size(); i++) {
      capacity(chart, comparison.studies().get(i), i, least, most);
    }
    add(
        chart.figure().height("20rem"),
        Notice.hint(
            "Lines: the largest torque difference that friction holds. Points below a line: the"
                + " outputs turn together; points on it: they slide."));
  }

  private static void capacity(
      LineChart chart, LapStudy study, int colour, double least, double most) {
    Differential unit = unit(study);
    double[] torque = new double[STEPS + 1];
    double[] capacity = new double[STEPS + 1];
    for (int i = 0; i <= STEPS; i++) {
      torque[i] = least + (most - least) * i / STEPS;
      capacity[i] = unit.capacity(torque[i]);
    }
    if (Double.isFinite(capacity[0])) {
      chart.line(study.setting().name() + ", capacity", colour, torque, capacity);
    }
  }

  private static Differential unit(LapStudy study) {
    DifferentialSet set = study.setting().differentials();
    DriveLayout layout = study.lap().request().car().driveline().layout();
    return layout == DriveLayout.FRONT ? set.front() : set.rear();
  }
}
