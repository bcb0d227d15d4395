package rampwright.optimiser.search;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import rampwright.optimiser.kit.KitSetting;

/**
 * Settings of one ring set as fitted and one number of faces that a stopwatch could not tell from
 * the best: they differ in preload only. Only settings that the search has computed count.
 *
 * @param setting the one of them that takes the shortest change from the current setting; of those
 *     the fastest
 * @param changeTime time of that change (s)
 * @param lowestPreload lowest preload of the group (N·m)
 * @param highestPreload highest preload of the group (N·m)
 * @param settings number of settings in the group
 */
public record AlikeGroup(
    EvaluatedSetting setting,
    double changeTime,
    double lowestPreload,
    double highestPreload,
    int settings) {

  /** What two settings share when they differ in preload only. */
  private record Stack(String ringSet, boolean turned, int facesPerSide) {
    static Stack of(KitSetting setting) {
      return new Stack(setting.ringSet(), setting.turned(), setting.facesPerSide());
    }
  }

  /**
   * Returns the groups of all settings that meet every limit and are slower than the best by less
   * than can be measured: the cheapest change first, then the fastest. None when the best itself
   * breaks a limit.
   */
  static List<AlikeGroup> of(
      EvaluatedSetting best, List<EvaluatedSetting> settings, SearchProblem problem) {
    Map<Stack, List<EvaluatedSetting>> stacks = new LinkedHashMap<>();
    for (EvaluatedSetting setting : settings) {
      if (setting.feasible() && setting.lapTime() < best.lapTime() + problem.measurable()) {
        stacks.computeIfAbsent(Stack.of(setting.setting()), s -> new ArrayList<>()).add(setting);
      }
    }
    Comparator<EvaluatedSetting> order =
        Comparator.<EvaluatedSetting>comparingDouble(s -> problem.changeTime(s.setting()))
            .thenComparingDouble(EvaluatedSetting::lapTime);
    List<AlikeGroup> groups = new ArrayList<>();
    for (List<EvaluatedSetting> members : stacks.values()) {
      EvaluatedSetting shown = members.stream().min(order).orElseThrow();
      var preloads = members.stream().mapToDouble(s -> s.setting().preload()).summaryStatistics();
      groups.add(
          new AlikeGroup(
              shown,
              problem.changeTime(shown.setting()),
              preloads.getMin(),
              preloads.getMax(),
              members.size()));
    }
    groups.sort(Comparator.comparing(AlikeGroup::setting, order));
    return groups;
  }
}
