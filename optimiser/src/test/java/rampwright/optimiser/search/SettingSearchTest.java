package rampwright.optimiser.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.input.InvalidInput;

/** The search on objectives that need no lap. */
class SettingSearchTest {
  private static final int ALL = SettingSpace.of(SearchProblems.KIT).size();

  private static double none(PlateDifferential law) {
    return 0;
  }

  /** Cuts the deepest valley off. */
  private static double shareLimit(PlateDifferential law) {
    return Math.max(0, law.driveShare() - 0.15) / 0.1
        + Math.max(0, 60 - law.preload()) / 10
        + Math.max(0, law.preload() * law.coastShare() - 5);
  }

  private static SearchProblem limited() {
    return SearchProblems.of(SearchProblems::valleys, SettingSearchTest::shareLimit);
  }

  private static SearchProblem free() {
    return SearchProblems.of(SearchProblems::valleys, SettingSearchTest::none);
  }

  private static SearchResult run(SearchProblem problem, long seed, int budget) {
    return SettingSearch.run(problem, seed, 1, budget, SearchMonitor.NONE);
  }

  @Test
  void aBudgetForAllSettingsEnumerates() {
    SearchResult result = run(free(), 1, ALL);
    assertThat(result.method()).isEqualTo(SearchMethod.ENUMERATED);
    assertThat(result.evaluations()).isEqualTo(ALL);
    SettingSpace space = SettingSpace.of(SearchProblems.KIT);
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < ALL; i++) {
      least = Math.min(least, SearchProblems.valleys(space.law(i)));
    }
    assertThat(result.best().lapTime()).isEqualTo(least);
    assertThat(run(free(), 1, ALL - 1).method()).isEqualTo(SearchMethod.GENETIC);
  }

  @ParameterizedTest
  @ValueSource(booleans = {false, true})
  void aFifthOfTheSettingsIsEnoughForEverySeed(boolean limits) {
    SearchProblem problem = limits ? limited() : free();
    double least = run(problem, 0, ALL).best().lapTime();
    for (long seed = 1; seed <= 50; seed++) {
      SearchResult result = run(problem, seed, ALL / 5);
      assertThat(result.evaluations()).isLessThanOrEqualTo(ALL / 5);
      assertThat(result.feasible()).isTrue();
      assertThat(result.best().lapTime()).as("seed %d", seed).isCloseTo(least, within(1e-3));
    }
  }

  @Test
  void theAnswerDoesNotDependOnTheNumberOfThreads() {
    SearchResult one = SettingSearch.run(limited(), 7, 1, 300, SearchMonitor.NONE);
    for (int threads : List.of(1, 2, 4)) {
      assertThat(SettingSearch.run(limited(), 7, threads, 300, SearchMonitor.NONE)).isEqualTo(one);
    }
    assertThat(run(limited(), 8, 300).history()).isNotEqualTo(one.history());
  }

  @Test
  void whereNothingMeetsTheLimitsTheLeastViolationIsTheAnswer() {
    SearchProblem impossible =
        SearchProblems.of(SearchProblems::valleys, law -> 1 + law.preload() / 100);
    SearchResult result = run(impossible, 3, 300);
    assertThat(result.feasible()).isFalse();
    assertThat(result.best().setting().preload()).isEqualTo(10);
    assertThat(result.best().violation()).isEqualTo(1.1);
    assertThat(result.alternatives()).isEmpty();
  }

  /** Cancels after some calls of progress. */
  private static final class Impatient implements SearchMonitor {
    private final int after;
    private final AtomicInteger seen = new AtomicInteger();
    private final List<SearchProgress> progress = new ArrayList<>();

    Impatient(int after) {
      this.after = after;
    }

    @Override
    public void progress(SearchProgress next) {
      seen.incrementAndGet();
      progress.add(next);
    }

    @Override
    public boolean cancelled() {
      return seen.get() >= after;
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {0, 1, 30, 200})
  void aCancelReturnsTheBestSoFar(int after) {
    Impatient monitor = new Impatient(after);
    SearchResult result = SettingSearch.run(free(), 5, 2, 400, monitor);
    assertThat(result.cancelled()).isTrue();
    // what was being computed when the cancel came is still entered
    assertThat(result.evaluations()).isBetween(Math.max(1, after), after + 40);
    SearchProgress last = monitor.progress.get(monitor.progress.size() - 1);
    assertThat(result.best().lapTime()).isEqualTo(last.bestLapTime());
    assertThat(result.evaluations()).isEqualTo(last.evaluations());
  }

  @Test
  void progressCountsUpAndNeverGetsWorse() {
    Impatient monitor = new Impatient(Integer.MAX_VALUE);
    SearchResult result = SettingSearch.run(limited(), 11, 2, 250, monitor);
    assertThat(result.cancelled()).isFalse();
    assertThat(monitor.progress).hasSize(result.evaluations());
    for (int i = 1; i < monitor.progress.size(); i++) {
      SearchProgress before = monitor.progress.get(i - 1);
      SearchProgress now = monitor.progress.get(i);
      assertThat(now.evaluations()).isEqualTo(i + 1);
      assertThat(now.generation()).isGreaterThanOrEqualTo(before.generation());
      assertThat(now.bestFeasible() || !before.bestFeasible()).isTrue();
      if (now.bestFeasible() == before.bestFeasible() && now.bestFeasible()) {
        assertThat(now.bestLapTime()).isLessThanOrEqualTo(before.bestLapTime());
      }
    }
    assertThat(result.history()).isSubsetOf(monitor.progress);
  }

  @Test
  void settingsWhoseLapsCannotBeSolvedRankLastAndAreNamed() {
    SearchProblem problem =
        SearchProblems.of(
            law -> {
              if (law.driveShare() > 0.4) {
                throw InvalidInput.of("curvature", "too tight", "one that the car can follow", "");
              }
              if (law.driveShare() > 0.05) {
                throw new IllegalStateException("no trim at station 3");
              }
              return SearchProblems.valleys(law);
            },
            SettingSearchTest::none);
    SearchResult result = run(problem, 2, 300);
    assertThat(result.best().law().driveShare()).isLessThanOrEqualTo(0.05);
    assertThat(result.unsolved())
        .extracting(UnsolvedSetting::reason)
        .contains(
            "no trim at station 3",
            "The curvature (too tight) must be one that the car can follow.");
    assertThat(result.unsolved())
        .allMatch(u -> SearchProblems.KIT.build(u.setting()).law().driveShare() > 0.05);
  }

  @Test
  void anEventInWhichNoLapCanBeSolvedHasNoAnswer() {
    SearchProblem problem =
        SearchProblems.of(
            law -> {
              throw InvalidInput.of("curvature", "too tight", "one that the car can follow", "");
            },
            SettingSearchTest::none);
    assertThatExceptionOfType(InvalidInput.class).isThrownBy(() -> run(problem, 2, 30));
  }

  @Test
  void settingsAsFastAsTheBestAreGroupedWithTheCheapestChangeFirst() {
    // preload does not matter, nor does the coast side: the shims of the current build are enough
    double share = SearchProblems.KIT.build(SearchProblems.CURRENT).law().driveShare();
    SearchProblem problem =
        SearchProblems.of(
            law -> 70 + Math.abs(law.driveShare() - share) - 1e-6 * law.preload(),
            SettingSearchTest::none);
    SearchResult result = run(problem, 1, ALL);
    AlikeGroup first = result.alike().get(0);
    assertThat(first.setting().setting()).isEqualTo(SearchProblems.CURRENT);
    assertThat(first.changeTime()).isZero();
    assertThat(first.settings()).isEqualTo(29);
    assertThat(first.lowestPreload()).isEqualTo(10);
    assertThat(first.highestPreload()).isEqualTo(150);
    assertThat(result.alike()).extracting(AlikeGroup::changeTime).isSorted();
  }
}
