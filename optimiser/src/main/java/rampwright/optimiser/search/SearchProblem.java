package rampwright.optimiser.search;

import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.differential.PlateDifferential;

/**
 * What is searched.
 *
 * @param space the settings
 * @param evaluate lap time and limits of a setting; may be called by several threads at once
 * @param partViolation violation (-) of the limits that need no lap
 * @param measurable difference of lap time (s) that a test day can show
 * @param current the setting that is in the car now, when it is from the kit
 */
record SearchProblem(
    SettingSpace space,
    Function<KitSetting, EvaluatedSetting> evaluate,
    ToDoubleFunction<PlateDifferential> partViolation,
    double measurable,
    Optional<KitSetting> current) {
  /**
   * Difference of lap time (s) on one circuit that a test day can show: the mean of ten laps of a
   * driver who repeats a lap to 0.1 s (standard deviation) scatters by 0.1/√10. Common practice, no
   * source.
   */
  static final double MEASURABLE = 0.03;

  static SearchProblem of(Event event, SettingEvaluator evaluator) {
    NamedSetting current = event.current();
    return new SearchProblem(
        SettingSpace.of(event.kit()),
        evaluator::evaluate,
        evaluator::partViolation,
        measurable(event),
        current.kitSetting());
  }

  /** The circuits' scatters are independent: their squares add up. */
  static double measurable(Event event) {
    double squares = event.circuits().stream().mapToDouble(c -> c.weight() * c.weight()).sum();
    return MEASURABLE * Math.sqrt(squares);
  }

  /** Returns the time (s) to change to a setting; from a foreign unit it is that of every job. */
  double changeTime(KitSetting setting) {
    var times = space.kit().changeTimes();
    return current
        .map(from -> times.between(from, setting))
        .orElse(Math.max(times.ringSet(), Math.max(times.faces(), times.preload())));
  }
}
