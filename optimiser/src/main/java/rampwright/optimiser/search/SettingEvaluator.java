package rampwright.optimiser.search;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.ConcurrentHashMap;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.balance.LapAnalysis;
import rampwright.vehicle.balance.LapReport;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

/**
 * Lap time and limits of settings of one event. The same setting always has the same answer; laps
 * are kept by law, so that builds that drive alike cost one lap per circuit. May be used by several
 * threads at once.
 */
public final class SettingEvaluator {
  private final Event event;
  private final Map<DifferentialSet, LapFigures> known = new ConcurrentHashMap<>();

  private SettingEvaluator(Event event) {
    this.event = event;
    if (event.circuits().stream().noneMatch(circuit -> circuit.weight() > 0)) {
      throw InvalidInput.value(
          "largest weight of a circuit", 0, "", "above 0", "give one the weight 1");
    }
  }

  /**
   * Returns the evaluator of an event.
   *
   * @throws InvalidInput when no circuit counts
   */
  public static SettingEvaluator of(Event event) {
    return new SettingEvaluator(event);
  }

  /**
   * Evaluates a setting. A measure that no lap has (a growth rate on exits where there is no exit)
   * is left out, and so is a limit on it.
   *
   * @throws InvalidInput when the kit cannot build it or the car cannot follow a circuit with it
   */
  public EvaluatedSetting evaluate(KitSetting setting) {
    PlateBuild build = event.kit().build(setting);
    LapFigures figures = figures(event.built("evaluated", setting).differentials());
    Map<LimitedMeasure, Double> measures = partMeasures(build.law());
    lapMeasures(figures, build)
        .forEach((measure, value) -> value.ifPresent(known -> measures.put(measure, known)));
    List<LimitCheck> limits = checks(measures);
    return new EvaluatedSetting(
        setting, build.law(), figures.lapTime(), measures, limits, violation(limits));
  }

  /** Returns the weighted lap time (s) of any setting. */
  double lapTime(NamedSetting setting) {
    return figures(setting.differentials()).lapTime();
  }

  /** Returns the violation (-) of the limits that stand on the parts alone: it needs no lap. */
  double partViolation(PlateDifferential law) {
    return violation(checks(partMeasures(law)));
  }

  private List<LimitCheck> checks(Map<LimitedMeasure, Double> measures) {
    return event.limits().stream()
        .filter(limit -> measures.containsKey(limit.measure()))
        .map(limit -> new LimitCheck(limit, measures.get(limit.measure())))
        .toList();
  }

  private static double violation(List<LimitCheck> limits) {
    return limits.stream().mapToDouble(LimitCheck::violation).sum();
  }

  private static Map<LimitedMeasure, Double> partMeasures(PlateDifferential law) {
    Map<LimitedMeasure, Double> measures = new EnumMap<>(LimitedMeasure.class);
    measures.put(LimitedMeasure.PRELOAD_MIN, law.preload());
    measures.put(LimitedMeasure.PRELOAD_MAX, law.preload());
    measures.put(LimitedMeasure.DRIVE_SHARE_MAX, law.driveShare());
    measures.put(LimitedMeasure.COAST_SHARE_MAX, law.coastShare());
    return measures;
  }

  private Map<LimitedMeasure, OptionalDouble> lapMeasures(LapFigures figures, PlateBuild build) {
    LapFigures current = figures(event.current().differentials());
    return Map.of(
        LimitedMeasure.EXIT_UNDERSTEER_CHANGE, figures.understeerChange(current),
        LimitedMeasure.ENTRY_GROWTH, figures.worst(LapReport::peakSigmaEntry),
        LimitedMeasure.EXIT_GROWTH, figures.worst(LapReport::peakSigmaExit),
        LimitedMeasure.INNER_SLIP, figures.worst(LapReport::peakInnerSlip),
        LimitedMeasure.PLATE_POWER,
            figures.worst(report -> report.peakPlatePower() / build.frictionArea()),
        LimitedMeasure.PLATE_ENERGY, figures.worst(LapReport::plateEnergy));
  }

  private LapFigures figures(DifferentialSet differentials) {
    LapFigures figures = known.get(differentials);
    if (figures == null) {
      figures = solve(differentials);
      known.put(differentials, figures);
    }
    return figures;
  }

  private LapFigures solve(DifferentialSet differentials) {
    NamedSetting setting = new NamedSetting("evaluated", Optional.empty(), differentials);
    List<LapReport> reports = new ArrayList<>();
    double time = 0;
    for (WeightedCircuit circuit : event.circuits()) {
      Lap lap = LapSolver.solve(event.lapRequest(setting, circuit.circuit(), LimitForm.DRIVER));
      reports.add(LapAnalysis.report(lap));
      time += circuit.weight() * lap.time();
    }
    return new LapFigures(time, reports);
  }
}
