package rampwright.optimiser.search;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.event.SettingLimit;
import rampwright.optimiser.kit.KitSetting;

/** The search over real laps of a short circuit. */
class EventSearchTest {
  private static final int BUDGET = 30;

  @Test
  void theAnswerIsTheSameOnAnyNumberOfThreads() {
    Event event = ShortEvent.with(List.of(new SettingLimit(LimitedMeasure.PLATE_ENERGY, 1500)));
    SearchResult one =
        SettingSearch.run(new SearchRequest(event, 5, 1, BUDGET), SearchMonitor.NONE);
    for (int threads : List.of(2, 4)) {
      assertThat(
              SettingSearch.run(new SearchRequest(event, 5, threads, BUDGET), SearchMonitor.NONE))
          .isEqualTo(one);
    }
    assertThat(one.method()).isEqualTo(SearchMethod.GENETIC);
    assertThat(one.evaluations()).isEqualTo(BUDGET);
    KitSetting current = event.current().kitSetting().orElseThrow();
    assertThat(Merit.of(one.best()))
        .isLessThanOrEqualTo(Merit.of(SettingEvaluator.of(event).evaluate(current)));
  }

  @Test
  void everyProposedSettingCanBeBuiltAndMeetsTheLimitsOnParts() {
    List<SettingLimit> limits =
        List.of(
            new SettingLimit(LimitedMeasure.PRELOAD_MIN, 60),
            new SettingLimit(LimitedMeasure.DRIVE_SHARE_MAX, 0.3));
    Event event = ShortEvent.with(limits);
    SearchResult result =
        SettingSearch.run(new SearchRequest(event, 2, 2, BUDGET), SearchMonitor.NONE);
    assertThat(result.feasible()).isTrue();
    assertThat(result.alternatives()).isNotEmpty();
    for (EvaluatedSetting setting : result.alternatives()) {
      assertThat(event.kit().build(setting.setting()).law()).isEqualTo(setting.law());
      assertThat(setting.law().preload()).isGreaterThanOrEqualTo(60);
      assertThat(setting.law().driveShare()).isLessThanOrEqualTo(0.3);
    }
  }

  @Test
  void anEventThatNoSettingMeetsGetsTheLeastViolation() {
    Event event = ShortEvent.with(List.of(new SettingLimit(LimitedMeasure.EXIT_GROWTH, -20)));
    SearchResult result = SettingSearch.run(new SearchRequest(event, 1, 2, 25), SearchMonitor.NONE);
    assertThat(result.feasible()).isFalse();
    assertThat(result.best().limits().get(0).met()).isFalse();
    assertThat(result.alternatives()).isEmpty();
  }

  @Test
  void anEvaluatorThatKnowsTheLapsGivesTheSameAnswer() {
    Event event = ShortEvent.free();
    SearchRequest request = new SearchRequest(event, 9, 2, 30);
    SettingEvaluator evaluator = SettingEvaluator.of(event);
    SearchResult first = SettingSearch.run(request, evaluator, SearchMonitor.NONE);
    assertThat(SettingSearch.run(request, evaluator, SearchMonitor.NONE)).isEqualTo(first);
  }
}
