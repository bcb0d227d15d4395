package rampwright.optimiser.sheet;

import java.util.Comparator;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.optimiser.kit.PartsKit;
import rampwright.optimiser.sheet.SetupSheet.CornerEffect;
import rampwright.optimiser.sheet.SetupSheet.ExpectedLap;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.balance.GapSplit;
import rampwright.vehicle.balance.LapAnalysis;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

/** The lap of a setting against that of the setting in the car, both at the driver's limits. */
final class LapComparison {
  /** Differences below this (s) are printed as zero and have no cause worth a word. */
  private static final double NOTHING = 0.0005;

  private LapComparison() {}

  static ExpectedLap of(Event event, NamedSetting setting, WeightedCircuit circuit) {
    Lap current = lap(event, event.current(), circuit);
    boolean same = setting.differentials().equals(event.current().differentials());
    Lap wanted = same ? current : lap(event, setting, circuit);
    GapSplit gap = GapSplit.between(current, wanted);
    List<CornerEffect> corners =
        LapAnalysis.report(current).corners().stream()
            .filter(corner -> corner.number() > 0)
            .map(corner -> effect(corner, gap))
            .toList();
    return new ExpectedLap(
        circuit.circuit().name(),
        circuit.weight(),
        wanted.time(),
        current.time(),
        difference(event, setting, circuit, 1 - BenchCheck.FRICTION_SCATTER),
        difference(event, setting, circuit, 1 + BenchCheck.FRICTION_SCATTER),
        corners,
        gap.seconds(0));
  }

  /** Difference of the lap times (s) with another plate friction in both units. */
  private static double difference(
      Event event, NamedSetting setting, WeightedCircuit circuit, double factor) {
    if (setting.differentials().equals(event.current().differentials())) {
      return 0;
    }
    PartsKit kit = event.kit().withPlateFriction(factor * event.kit().hardware().plateFriction());
    return lap(event, with(event, setting, kit), circuit).time()
        - lap(event, with(event, event.current(), kit), circuit).time();
  }

  /** The setting built from another kit; a setting that is not from the kit stays as it is. */
  private static NamedSetting with(Event event, NamedSetting setting, PartsKit kit) {
    return setting
        .kitSetting()
        .map(
            wanted ->
                NamedSetting.of(
                    setting.name(),
                    kit,
                    wanted,
                    event.car().driveline().layout(),
                    setting.differentials()))
        .orElse(setting);
  }

  private static Lap lap(Event event, NamedSetting setting, WeightedCircuit circuit) {
    return LapSolver.solve(event.lapRequest(setting, circuit.circuit(), LimitForm.DRIVER));
  }

  private static CornerEffect effect(CornerReport corner, GapSplit gap) {
    double difference = gap.seconds(corner.number());
    String cause =
        gap.parts().stream()
            .filter(part -> part.corner() == corner.number())
            .filter(part -> Math.abs(part.seconds()) >= NOTHING)
            .max(Comparator.comparingDouble(part -> Math.abs(part.seconds())))
            .map(part -> part.cause().label())
            .orElse("");
    return new CornerEffect(
        corner.number(), corner.apexDistance(), corner.slowestSpeed(), difference, cause);
  }
}
