package rampwright.optimiser.search;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.Tag;
import rampwright.optimiser.kit.PartsKit;
import rampwright.optimiser.kit.PartsKit.PreloadRange;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.RingSet;

/** What holds for the settings of any kit, and for a search in any kit. */
@Tag("property")
class RandomKitsTest {
  private record Rings(double drive, double coast, boolean reversible) {}

  @Provide
  Arbitrary<PartsKit> kits() {
    Arbitrary<Double> angle = Arbitraries.integers().between(3, 18).map(a -> Math.toRadians(5 * a));
    Arbitrary<Rings> rings =
        Combinators.combine(angle, angle, Arbitraries.of(true, false)).as(Rings::new);
    Arbitrary<List<Integer>> faces =
        Arbitraries.integers()
            .between(1, 12)
            .set()
            .ofMinSize(1)
            .ofMaxSize(4)
            .map(set -> set.stream().sorted().toList());
    Arbitrary<PreloadRange> preload =
        Combinators.combine(
                Arbitraries.integers().between(0, 40),
                Arbitraries.integers().between(0, 200),
                Arbitraries.of(2.5, 5.0, 7.0, 0.7))
            .as((min, more, step) -> new PreloadRange(min, min + more, step));
    return Combinators.combine(rings.list().ofMinSize(1).ofMaxSize(4), faces, preload)
        .as(RandomKitsTest::kit);
  }

  private static PartsKit kit(List<Rings> rings, List<Integer> faces, PreloadRange preload) {
    List<RingSet> sets = new ArrayList<>();
    for (int i = 0; i < rings.size(); i++) {
      Rings r = rings.get(i);
      sets.add(new RingSet("set " + i, r.drive(), r.coast(), r.reversible()));
    }
    PartsKit sample = SearchProblems.KIT;
    return new PartsKit(
        "random", sample.hardware(), sets, faces, preload, sample.changeTimes(), Optional.empty());
  }

  @Property(tries = 100)
  void everyNumberIsOneSettingThatCanBeBuilt(@ForAll("kits") PartsKit kit) {
    SettingSpace space = SettingSpace.of(kit);
    for (int i = 0; i < space.size(); i++) {
      assertThat(space.index(space.setting(i))).isEqualTo(i);
      assertThat(kit.build(space.setting(i)).law()).isEqualTo(space.law(i));
    }
  }

  @Property(tries = 100)
  void settingsThatDriveAlikeHaveTheSameLawAndTheSameFirst(@ForAll("kits") PartsKit kit) {
    SettingSpace space = SettingSpace.of(kit);
    for (int i = 0; i < space.size(); i += 7) {
      int first = space.firstAlike(i);
      assertThat(space.alike(i)).contains(i).startsWith(first);
      for (int other : space.alike(i)) {
        assertThat(space.law(other)).isEqualTo(space.law(i));
        assertThat(space.firstAlike(other)).isEqualTo(first);
      }
    }
  }

  /** Distance from a law that no kit has; a limit on the preload of at most 60 N·m. */
  private static SearchProblem problem(PartsKit kit) {
    SettingSpace space = SettingSpace.of(kit);
    return new SearchProblem(
        space,
        setting -> {
          PlateDifferential law = kit.build(setting).law();
          double time =
              70
                  + Math.abs(law.preload() - 47) / 100
                  + Math.abs(law.driveShare() - 0.3)
                  + Math.abs(law.coastShare() - 0.2);
          return new EvaluatedSetting(setting, law, time, Map.of(), List.of(), partViolation(law));
        },
        RandomKitsTest::partViolation,
        SearchProblem.MEASURABLE,
        Optional.empty());
  }

  private static double partViolation(PlateDifferential law) {
    return Math.max(0, law.preload() - 60) / 10;
  }

  @Property(tries = 30)
  void whatASearchProposesCanBeBuiltAndKeepsTheBudget(
      @ForAll("kits") PartsKit kit, @ForAll long seed) {
    int budget = 40;
    SearchResult result = SettingSearch.run(problem(kit), seed, 1, budget, SearchMonitor.NONE);
    assertThat(result.evaluations()).isLessThanOrEqualTo(budget);
    // the smallest preload of every kit is at most 40 N·m, so the limit can always be met
    assertThat(result.feasible()).isTrue();
    assertThat(result.alternatives()).isNotEmpty();
    for (EvaluatedSetting setting : result.alternatives()) {
      assertThat(kit.build(setting.setting()).law()).isEqualTo(setting.law());
      assertThat(setting.law().preload()).isLessThanOrEqualTo(60);
    }
  }
}
