package rampwright.optimiser.search;

import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import rampwright.optimiser.kit.PartsKit.PreloadRange;
import rampwright.vehicle.differential.PlateDifferential;

/**
 * The settings of a space that may be proposed: those that meet the limits on the parts themselves,
 * which need no lap; all when none does. Builds of exactly one law stand for each other, the first
 * speaks for them. Distances are between laws, because the laws are all that the lap sees.
 */
final class Candidates {
  /** Locking share (-) below which a change of share matters little. */
  private static final double SMALL_SHARE = 0.1;

  private static final int NEAREST_STACKS = 6;

  private final SettingSpace space;
  private final boolean[] allowed;
  private final int[] laws;

  /** First setting of each stack (fitting and faces) that is the first of its locking shares. */
  private final int[] stacks;

  /** The stacks next to each stack, as far as they were asked for. */
  private final Map<Integer, List<Integer>> nearestStacks = new HashMap<>();

  private final double driveRange;
  private final double coastRange;

  private Candidates(SettingSpace space, boolean[] allowed) {
    this.space = space;
    this.allowed = allowed;
    this.laws =
        IntStream.range(0, space.size())
            .filter(i -> allowed[i] && space.firstAlike(i) == i)
            .toArray();
    this.stacks =
        IntStream.range(0, space.size() / space.steps())
            .map(stack -> stack * space.steps())
            .filter(i -> space.firstAlike(i) == i)
            .toArray();
    this.driveRange = range(PlateDifferential::driveShare);
    this.coastRange = range(PlateDifferential::coastShare);
  }

  static Candidates of(SearchProblem problem) {
    SettingSpace space = problem.space();
    double[] violation =
        IntStream.range(0, space.size())
            .mapToDouble(i -> problem.partViolation().applyAsDouble(space.law(i)))
            .toArray();
    boolean none = IntStream.range(0, space.size()).noneMatch(i -> violation[i] == 0);
    boolean[] allowed = new boolean[space.size()];
    for (int i = 0; i < allowed.length; i++) {
      allowed[i] = none || violation[i] == 0;
    }
    return new Candidates(space, allowed);
  }

  /** Returns the first setting of every law that may be proposed. */
  int[] laws() {
    return laws.clone();
  }

  boolean allowed(int index) {
    return allowed[index];
  }

  /** Returns the setting itself when it may be proposed, else the nearest that may. */
  int repaired(int index) {
    if (allowed[index]) {
      return index;
    }
    int nearest = laws[0];
    for (int law : laws) {
      if (distance(law, index) < distance(nearest, index)) {
        nearest = law;
      }
    }
    return nearest;
  }

  /** Returns the settings of each stack (fitting and faces) that may be proposed, by preload. */
  List<List<Integer>> byStack() {
    return List.copyOf(
        IntStream.of(laws)
            .boxed()
            .collect(
                Collectors.groupingBy(
                    i -> i / space.steps(), TreeMap::new, Collectors.<Integer>toList()))
            .values());
  }

  /** Returns the settings of the same stack at higher (1) or lower (-1) preload, nearest first. */
  IntStream line(int index, int direction) {
    int own = space.firstAlike(index);
    int step = space.step(own);
    int more = direction > 0 ? space.steps() - 1 - step : step;
    return IntStream.rangeClosed(1, more)
        .map(change -> own + direction * change)
        .filter(other -> allowed[other]);
  }

  /** Returns the stacks with the nearest locking shares, at the preload of a setting. */
  List<Integer> similar(int index) {
    int own = space.firstAlike(index);
    int step = space.step(own);
    return nearestStacks.computeIfAbsent(own - step, this::nearestTo).stream()
        .map(stack -> stack + step)
        .filter(other -> allowed[other])
        .toList();
  }

  private List<Integer> nearestTo(int stack) {
    return IntStream.of(stacks)
        .filter(other -> other != stack)
        .boxed()
        .sorted(
            Comparator.<Integer>comparingDouble(other -> distance(stack, other))
                .thenComparing(Comparator.naturalOrder()))
        .limit(NEAREST_STACKS)
        .toList();
  }

  /** Returns how far apart two laws are (-), each of its three numbers over its range. */
  private double distance(int a, int b) {
    PlateDifferential one = space.law(a);
    PlateDifferential other = space.law(b);
    PreloadRange preload = space.kit().preload();
    double preloadRange = Math.max(preload.step(), preload.max() - preload.min());
    return Math.abs(one.preload() - other.preload()) / preloadRange
        + Math.abs(scaled(one.driveShare()) - scaled(other.driveShare())) / driveRange
        + Math.abs(scaled(one.coastShare()) - scaled(other.coastShare())) / coastRange;
  }

  private double range(ToDoubleFunction<PlateDifferential> share) {
    var values =
        IntStream.of(stacks)
            .mapToDouble(i -> scaled(share.applyAsDouble(space.law(i))))
            .summaryStatistics();
    double range = values.getMax() - values.getMin();
    return range > 0 ? range : 1;
  }

  /** A large share locks the axle whatever it is exactly, so it counts by its logarithm. */
  private static double scaled(double share) {
    return Math.log1p(share / SMALL_SHARE);
  }
}
