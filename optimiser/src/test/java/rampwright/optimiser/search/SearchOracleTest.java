package rampwright.optimiser.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The search against full enumeration, where the shape of the problem is that of real laps. */
class SearchOracleTest {
  private static final int SEEDS = 20;

  private static LapTable table;

  @BeforeAll
  static void computeTheLaps() {
    table = LapTable.ofTheShortRing();
  }

  private static void checkAllSeeds(SearchProblem problem) {
    int all = problem.space().size();
    assertThat(all).isGreaterThan(2000);
    SearchResult truth = SettingSearch.run(problem, 0, 1, all, SearchMonitor.NONE);
    assertThat(truth.method()).isEqualTo(SearchMethod.ENUMERATED);
    assertThat(truth.feasible()).isTrue();
    for (long seed = 1; seed <= SEEDS; seed++) {
      SearchResult found = SettingSearch.run(problem, seed, 1, all / 5, SearchMonitor.NONE);
      assertThat(found.method()).isEqualTo(SearchMethod.GENETIC);
      assertThat(found.evaluations()).isLessThanOrEqualTo(all / 5);
      assertThat(found.feasible()).isTrue();
      assertThat(found.best().lapTime())
          .as("seed %d", seed)
          .isCloseTo(truth.best().lapTime(), within(1e-3));
    }
  }

  @Test
  void theTableHasTheShapeOfTheLaps() {
    assertThat(table.explained()).isGreaterThan(0.9);
  }

  @Test
  void withoutLimitsEverySeedFindsTheBestSetting() {
    checkAllSeeds(SearchProblems.of(table::lapTime, law -> 0));
  }

  /** The share is that of all settings that meet the limit. */
  @ParameterizedTest
  @ValueSource(doubles = {0.05, 0.1, 0.2})
  void withAnActiveLimitEverySeedFindsTheBestSetting(double share) {
    SettingSpace space = SettingSpace.of(SearchProblems.KIT);
    SearchProblem free = SearchProblems.of(table::lapTime, law -> 0);
    double[] sorted =
        IntStream.range(0, space.size())
            .mapToDouble(i -> table.understeerChange(space.law(i)))
            .sorted()
            .toArray();
    double limit = sorted[(int) (share * space.size())];
    double degree = Math.PI / 180;
    SearchProblem limited =
        SearchProblems.of(
            table::lapTime, law -> Math.max(0, table.understeerChange(law) - limit) / degree);
    int all = space.size();
    EvaluatedSetting fastest = SettingSearch.run(free, 0, 1, all, SearchMonitor.NONE).best();
    assertThat(table.understeerChange(fastest.law()))
        .as("the limit is active")
        .isGreaterThan(limit);
    checkAllSeeds(limited);
  }
}
