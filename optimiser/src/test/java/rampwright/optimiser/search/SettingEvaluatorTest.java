package rampwright.optimiser.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.event.SettingLimit;
import rampwright.optimiser.kit.KitSetting;
import rampwright.vehicle.balance.LapAnalysis;
import rampwright.vehicle.balance.LapReport;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

class SettingEvaluatorTest {
  private static final KitSetting FIRM = new KitSetting("45/60", false, 6, 80);

  private static LapReport report(Event event, KitSetting setting, Circuit circuit) {
    return LapAnalysis.report(
        LapSolver.solve(
            event.lapRequest(event.built("tested", setting), circuit, LimitForm.DRIVER)));
  }

  @Test
  void theMeasuresAreThoseOfTheLap() {
    Event event = ShortEvent.free();
    EvaluatedSetting firm = SettingEvaluator.of(event).evaluate(FIRM);
    LapReport lap = report(event, FIRM, ShortEvent.RING);
    LapReport before = report(event, event.current().kitSetting().orElseThrow(), ShortEvent.RING);
    assertThat(firm.lapTime()).isEqualTo(lap.lapTime());
    assertThat(firm.measures())
        .containsEntry(
            LimitedMeasure.EXIT_UNDERSTEER_CHANGE,
            lap.exitUndersteerAngle() - before.exitUndersteerAngle())
        .containsEntry(LimitedMeasure.ENTRY_GROWTH, lap.peakSigmaEntry())
        .containsEntry(LimitedMeasure.EXIT_GROWTH, lap.peakSigmaExit())
        .containsEntry(LimitedMeasure.INNER_SLIP, lap.peakInnerSlip())
        .containsEntry(LimitedMeasure.PLATE_ENERGY, lap.plateEnergy())
        .containsEntry(LimitedMeasure.PRELOAD_MIN, 80.0)
        .containsEntry(LimitedMeasure.DRIVE_SHARE_MAX, firm.law().driveShare())
        .containsOnlyKeys(LimitedMeasure.values());
    // 12 faces of radii 52 and 36 mm
    double area = 12 * Math.PI * (0.052 * 0.052 - 0.036 * 0.036);
    assertThat(firm.measures().get(LimitedMeasure.PLATE_POWER))
        .isCloseTo(lap.peakPlatePower() / area, within(1e-6 * lap.peakPlatePower() / area));
    assertThat(firm.limits()).isEmpty();
    assertThat(firm.feasible()).isTrue();
  }

  @Test
  void theCurrentSettingChangesNothing() {
    Event event = ShortEvent.free();
    KitSetting current = event.current().kitSetting().orElseThrow();
    assertThat(SettingEvaluator.of(event).evaluate(current).measures())
        .containsEntry(LimitedMeasure.EXIT_UNDERSTEER_CHANGE, 0.0);
  }

  @Test
  void limitsAreHeldAgainstTheSettingInTheirOrder() {
    List<SettingLimit> limits =
        List.of(
            new SettingLimit(LimitedMeasure.PRELOAD_MIN, 95),
            new SettingLimit(LimitedMeasure.PLATE_ENERGY, 1),
            new SettingLimit(LimitedMeasure.PRELOAD_MAX, 90));
    EvaluatedSetting firm = SettingEvaluator.of(ShortEvent.with(limits)).evaluate(FIRM);
    assertThat(firm.limits()).extracting(LimitCheck::limit).isEqualTo(limits);
    assertThat(firm.limits()).extracting(LimitCheck::met).containsExactly(false, false, true);
    // 15 N·m short in a scale of 10 N·m; the energy over 1 J in a scale of 1 kJ
    double energy = firm.measures().get(LimitedMeasure.PLATE_ENERGY);
    assertThat(firm.violation()).isCloseTo(1.5 + (energy - 1) / 1000, within(1e-12));
    assertThat(firm.feasible()).isFalse();
  }

  @Test
  void severalCircuitsAddUpByWeightAndTheWorstCounts() {
    Event event = ShortEvent.on(List.of(), 2, 0.5);
    EvaluatedSetting firm = SettingEvaluator.of(event).evaluate(FIRM);
    LapReport ring = report(event, FIRM, ShortEvent.RING);
    LapReport hairpins = report(event, FIRM, ShortEvent.HAIRPINS);
    assertThat(firm.lapTime())
        .isCloseTo(2 * ring.lapTime() + 0.5 * hairpins.lapTime(), within(1e-12));
    assertThat(firm.measures())
        .containsEntry(
            LimitedMeasure.PLATE_ENERGY, Math.max(ring.plateEnergy(), hairpins.plateEnergy()))
        .containsEntry(
            LimitedMeasure.INNER_SLIP, Math.max(ring.peakInnerSlip(), hairpins.peakInnerSlip()));
  }

  @Test
  void anEventInWhichNoCircuitCountsIsRefused() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> SettingEvaluator.of(ShortEvent.on(List.of(), 0, 0)))
        .withMessage(
            "The largest weight of a circuit (0) must be above 0. Maybe give one the weight 1.");
  }

  @Test
  void whatTheKitCannotBuildIsNotEvaluated() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(
            () ->
                SettingEvaluator.of(ShortEvent.free())
                    .evaluate(new KitSetting("45/45", true, 4, 40)));
  }
}
