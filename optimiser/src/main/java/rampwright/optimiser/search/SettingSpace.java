package rampwright.optimiser.search;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.input.InvalidInput;

/**
 * Every setting that a parts kit can build, numbered from 0: ring set as fitted (turned too where
 * the set can be turned), then faces per side, then preload step, the last counting fastest.
 */
public final class SettingSpace {
  private static final int MOST_SETTINGS = 1_000_000;

  private final PartsKit kit;
  private final List<Fitting> fittings;

  /** Law of each stack (fitting and faces) at the lowest preload. */
  private final List<PlateDifferential> stackLaws;

  /** For each stack (fitting and faces) the first stack with the same locking shares. */
  private final int[] firstAlike;

  /**
   * A ring set as it is fitted.
   *
   * @param ringSet the set
   * @param turned whether it is turned round
   */
  public record Fitting(RingSet ringSet, boolean turned) {}

  private SettingSpace(PartsKit kit, List<Fitting> fittings) {
    this.kit = kit;
    this.fittings = List.copyOf(fittings);
    this.stackLaws = stackLaws(kit, fittings);
    this.firstAlike = new int[stackLaws.size()];
    Map<List<Double>, Integer> seen = new HashMap<>();
    for (int stack = 0; stack < firstAlike.length; stack++) {
      PlateDifferential law = stackLaws.get(stack);
      Integer first = seen.putIfAbsent(List.of(law.driveShare(), law.coastShare()), stack);
      firstAlike[stack] = first == null ? stack : first;
    }
  }

  private static List<PlateDifferential> stackLaws(PartsKit kit, List<Fitting> fittings) {
    List<PlateDifferential> laws = new ArrayList<>();
    for (Fitting fitting : fittings) {
      for (int faces : kit.facesPerSide()) {
        PlateBuild build =
            new PlateBuild(
                kit.hardware(), fitting.ringSet(), fitting.turned(), faces, kit.preload().min());
        laws.add(build.law());
      }
    }
    return List.copyOf(laws);
  }

  /**
   * Returns the space of a kit.
   *
   * @throws InvalidInput when it has more than a million settings
   */
  public static SettingSpace of(PartsKit kit) {
    List<Fitting> fittings = new ArrayList<>();
    for (RingSet set : kit.ringSets()) {
      fittings.add(new Fitting(set, false));
      if (set.reversible()) {
        fittings.add(new Fitting(set, true));
      }
    }
    long size = (long) fittings.size() * kit.facesPerSide().size() * kit.preload().count();
    if (size > MOST_SETTINGS) {
      throw InvalidInput.value(
          "number of settings of the kit",
          size,
          "",
          "at most " + MOST_SETTINGS,
          "use a larger preload step");
    }
    return new SettingSpace(kit, fittings);
  }

  /** Returns the kit. */
  public PartsKit kit() {
    return kit;
  }

  /** Returns the number of settings. */
  public int size() {
    return firstAlike.length * steps();
  }

  /** Returns the ring sets as they can be fitted, in the order of the kit. */
  public List<Fitting> fittings() {
    return fittings;
  }

  /** Returns the number of preload steps. */
  public int steps() {
    return kit.preload().count();
  }

  /** Returns the number of a setting from its three choices, each counted from 0. */
  public int index(int fitting, int faces, int step) {
    return (fitting * kit.facesPerSide().size() + faces) * steps() + step;
  }

  /** Returns which fitting a setting has. */
  public int fitting(int index) {
    return index / steps() / kit.facesPerSide().size();
  }

  /** Returns which number of faces a setting has. */
  public int faces(int index) {
    return index / steps() % kit.facesPerSide().size();
  }

  /** Returns which preload step a setting has. */
  public int step(int index) {
    return index % steps();
  }

  /** Returns the setting of a number. */
  public KitSetting setting(int index) {
    Fitting fitting = fittings.get(fitting(index));
    return new KitSetting(
        fitting.ringSet().name(),
        fitting.turned(),
        kit.facesPerSide().get(faces(index)),
        kit.preload().preload(step(index)));
  }

  /**
   * Returns the number of a setting.
   *
   * @throws InvalidInput when the kit cannot build it
   */
  public int index(KitSetting setting) {
    kit.build(setting);
    Fitting fitting = new Fitting(kit.ringSet(setting.ringSet()), setting.turned());
    long step = Math.round((setting.preload() - kit.preload().min()) / kit.preload().step());
    return index(
        fittings.indexOf(fitting),
        kit.facesPerSide().indexOf(setting.facesPerSide()),
        Math.toIntExact(step));
  }

  /** Returns the law of a setting. */
  public PlateDifferential law(int index) {
    PlateDifferential stack = stackLaws.get(index / steps());
    return new PlateDifferential(
        kit.preload().preload(step(index)), stack.driveShare(), stack.coastShare());
  }

  /** Returns the first setting with exactly the law of a setting: it may be the setting itself. */
  public int firstAlike(int index) {
    return firstAlike[index / steps()] * steps() + step(index);
  }

  /** Returns every setting with exactly the law of a setting, itself included. */
  public List<Integer> alike(int index) {
    int first = firstAlike[index / steps()];
    List<Integer> alike = new ArrayList<>();
    for (int stack = first; stack < firstAlike.length; stack++) {
      if (firstAlike[stack] == first) {
        alike.add(stack * steps() + step(index));
      }
    }
    return alike;
  }
}
