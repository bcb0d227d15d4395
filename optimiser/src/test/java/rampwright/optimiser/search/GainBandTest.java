package rampwright.optimiser.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.search.GainBand.Share;
import rampwright.optimiser.search.GainBand.Verdict;

class GainBandTest {
  private static final KitSetting FIRM = new KitSetting("45/60", false, 6, 80);

  private static GainBand band(double gain, double halfWidth) {
    return new GainBand(gain, halfWidth, 0.03, List.of());
  }

  @Test
  void onlyAWholeBandOnOneSideAndAGainThatCanBeMeasuredCount() {
    assertThat(band(0.2, 0.1).verdict()).isEqualTo(Verdict.FASTER);
    assertThat(band(-0.2, 0.1).verdict()).isEqualTo(Verdict.SLOWER);
    assertThat(band(0.2, 0.3).verdict()).isEqualTo(Verdict.NOT_MEASURABLE);
    assertThat(band(-0.2, 0.3).verdict()).isEqualTo(Verdict.NOT_MEASURABLE);
    assertThat(band(0.02, 0.001).verdict()).isEqualTo(Verdict.NOT_MEASURABLE);
    assertThat(Verdict.NOT_MEASURABLE.label()).isEqualTo("no difference that you could measure");
  }

  @Test
  void theCurrentSettingGainsNothing() {
    Event event = ShortEvent.free();
    GainBand band = GainBand.of(event, event.current().kitSetting().orElseThrow());
    assertThat(band.gain()).isZero();
    assertThat(band.verdict()).isEqualTo(Verdict.NOT_MEASURABLE);
    // friction and grip move both laps alike; only the preloads are independent
    assertThat(band.shares().get(0).seconds()).isZero();
    assertThat(band.shares().get(1).seconds()).isZero();
    assertThat(band.shares().get(2).seconds())
        .isPositive()
        .isEqualTo(band.shares().get(3).seconds());
  }

  @Test
  void theBandIsMadeOfItsShares() {
    Event event = ShortEvent.free();
    GainBand band = GainBand.of(event, FIRM);
    SettingEvaluator evaluator = SettingEvaluator.of(event);
    KitSetting current = event.current().kitSetting().orElseThrow();
    double before = evaluator.evaluate(current).lapTime();
    assertThat(band.gain()).isEqualTo(before - evaluator.evaluate(FIRM).lapTime());
    assertThat(band.shares())
        .extracting(Share::source)
        .containsExactly(
            "plate friction ±15 %",
            "grip ±3 %",
            "preload of the proposed setting ±5 N·m",
            "preload of the current setting ±5 N·m");
    double squares = band.shares().stream().mapToDouble(s -> s.seconds() * s.seconds()).sum();
    assertThat(band.halfWidth()).isCloseTo(Math.sqrt(squares), within(1e-12));
    double lower = evaluator.evaluate(new KitSetting("45/60", false, 6, 75)).lapTime();
    double higher = evaluator.evaluate(new KitSetting("45/60", false, 6, 85)).lapTime();
    double firm = evaluator.evaluate(FIRM).lapTime();
    assertThat(band.shares().get(2).seconds())
        .isEqualTo(Math.max(Math.abs(lower - firm), Math.abs(higher - firm)));
  }

  @Test
  void plateFrictionChangesTheSharesButNotThePreload() {
    var law = SearchProblems.KIT.build(FIRM).law();
    var slippery = SearchProblems.KIT.withPlateFriction(0.85 * 0.11).build(FIRM).law();
    assertThat(slippery.preload()).isEqualTo(law.preload());
    assertThat(slippery.driveShare()).isCloseTo(0.85 * law.driveShare(), within(1e-12));
    assertThat(slippery.coastShare()).isCloseTo(0.85 * law.coastShare(), within(1e-12));
  }
}
