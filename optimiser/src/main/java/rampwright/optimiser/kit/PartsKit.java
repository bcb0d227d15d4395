package rampwright.optimiser.kit;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.PlateHardware;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.differential.preload.PreloadSprings;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * A plate-type unit and the parts that fit it.
 *
 * @param name a name for people
 * @param hardware what does not change from build to build
 * @param ringSets at least one ring set; names are unique
 * @param facesPerSide the numbers of friction faces per side that can be stacked, rising
 * @param preload the preloads that springs and shims give
 * @param changeTimes how long each kind of change takes
 * @param springs the preload springs of each side, where they are known: then the shims can be
 *     computed
 */
public record PartsKit(
    String name,
    PlateHardware hardware,
    List<RingSet> ringSets,
    List<Integer> facesPerSide,
    PreloadRange preload,
    ChangeTimes changeTimes,
    Optional<PreloadSprings> springs) {

  /**
   * Preloads that can be shimmed.
   *
   * @param min smallest whole torque difference (N·m)
   * @param max largest (N·m)
   * @param step change of one shim step (N·m)
   */
  public record PreloadRange(double min, double max, double step) {
    public static final Quantity MIN = preload("preload_min_nm", "smallest preload");
    public static final Quantity MAX = preload("preload_max_nm", "largest preload");
    public static final Quantity STEP =
        Quantity.si("preload_step_nm", "preload step", "N·m", 0.1, 1000, "");

    /** Checks the range. */
    public PreloadRange {
      MIN.check(min);
      MAX.check(max);
      STEP.check(step);
      if (max < min) {
        throw InvalidInput.value(
            MAX.label(),
            max,
            "N·m",
            "at least the smallest preload of " + min + " N·m",
            "the two were swapped");
      }
    }

    private static Quantity preload(String key, String label) {
      Quantity whole = PlateDifferential.PRELOAD;
      return Quantity.si(key, label, whole.unit(), whole.min(), whole.max(), whole.advice());
    }

    /** Returns the number of preloads. */
    public int count() {
      return (int) Math.floor((max - min) / step + 1e-9) + 1;
    }

    /** Returns the preload of one step (N·m); step 0 is the smallest. */
    public double preload(int index) {
      return min + index * step;
    }
  }

  /**
   * Time a crew needs for each kind of change (s).
   *
   * @param preload shims or springs only
   * @param faces plates added, taken out or re-ordered
   * @param ringSet another ring set, or the same one turned round
   */
  public record ChangeTimes(double preload, double faces, double ringSet) {
    public static final Quantity PRELOAD =
        new Quantity("preload_change_min", "time to change the preload", "min", 60, 0, 1440, "");
    public static final Quantity FACES =
        new Quantity("faces_change_min", "time to change the plates", "min", 60, 0, 1440, "");
    public static final Quantity RING_SET =
        new Quantity("ring_set_change_min", "time to change the ring set", "min", 60, 0, 1440, "");

    /** Checks every value. */
    public ChangeTimes {
      PRELOAD.check(preload);
      FACES.check(faces);
      RING_SET.check(ringSet);
    }

    /**
     * Returns the time (s) to change from one setting to another: that of the largest job, because
     * the unit is taken apart once and the larger job includes the smaller.
     */
    public double between(KitSetting from, KitSetting to) {
      double time = from.preload() == to.preload() ? 0 : preload;
      if (from.facesPerSide() != to.facesPerSide()) {
        time = Math.max(time, faces);
      }
      if (!from.ringSet().equals(to.ringSet()) || from.turned() != to.turned()) {
        time = Math.max(time, ringSet);
      }
      return time;
    }
  }

  /** Checks that the kit has parts and that names are unique. */
  public PartsKit {
    ringSets = List.copyOf(ringSets);
    facesPerSide = List.copyOf(facesPerSide);
    if (ringSets.isEmpty()) {
      throw InvalidInput.of("list of ring sets", "empty", "at least one ring set", "");
    }
    Set<String> names = new HashSet<>();
    for (RingSet set : ringSets) {
      if (!names.add(set.name())) {
        throw InvalidInput.of(
            "name of a ring set",
            set.name(),
            "unique in the kit",
            "add a number to one of the two");
      }
    }
    if (facesPerSide.isEmpty()) {
      throw InvalidInput.of("list of faces per side", "empty", "at least one number", "");
    }
    for (int i = 0; i < facesPerSide.size(); i++) {
      PlateBuild.FACES_PER_SIDE.check(facesPerSide.get(i));
      if (i > 0 && facesPerSide.get(i) <= facesPerSide.get(i - 1)) {
        throw InvalidInput.value(
            "number of faces per side",
            facesPerSide.get(i),
            "",
            "above the number before it",
            "sort the list");
      }
    }
  }

  /** Returns a kit whose springs are not known. */
  public PartsKit(
      String name,
      PlateHardware hardware,
      List<RingSet> ringSets,
      List<Integer> facesPerSide,
      PreloadRange preload,
      ChangeTimes changeTimes) {
    this(name, hardware, ringSets, facesPerSide, preload, changeTimes, Optional.empty());
  }

  /** Returns this kit with another plate friction: other oil, other temperature, worn plates. */
  public PartsKit withPlateFriction(double friction) {
    PlateHardware changed =
        new PlateHardware(
            hardware.plateOuterRadius(),
            hardware.plateInnerRadius(),
            friction,
            hardware.rampRadius(),
            hardware.rampFriction(),
            hardware.pressure());
    return new PartsKit(name, changed, ringSets, facesPerSide, preload, changeTimes, springs);
  }

  /**
   * Returns the ring set of a name.
   *
   * @throws InvalidInput when the kit has none
   */
  public RingSet ringSet(String wanted) {
    return ringSets.stream()
        .filter(set -> set.name().equals(wanted))
        .findFirst()
        .orElseThrow(
            () ->
                InvalidInput.of(
                    "ring set",
                    wanted,
                    "one of the kit's: " + ringSets.stream().map(RingSet::name).toList(),
                    ""));
  }

  /**
   * Returns the build of a setting.
   *
   * @throws InvalidInput when the kit cannot build it
   */
  public PlateBuild build(KitSetting setting) {
    if (!facesPerSide.contains(setting.facesPerSide())) {
      throw InvalidInput.value(
          "number of faces per side",
          setting.facesPerSide(),
          "",
          "one of the kit's: " + facesPerSide,
          "");
    }
    double steps = (setting.preload() - preload.min()) / preload.step();
    boolean onStep = Math.abs(steps - Math.rint(steps)) < 1e-6;
    if (!onStep || steps < -1e-6 || Math.rint(steps) >= preload.count()) {
      throw InvalidInput.value(
          PlateDifferential.PRELOAD.label(),
          setting.preload(),
          "N·m",
          "from " + preload.min() + " to " + preload.max() + " in steps of " + preload.step(),
          "");
    }
    return new PlateBuild(
        hardware,
        ringSet(setting.ringSet()),
        setting.turned(),
        setting.facesPerSide(),
        setting.preload());
  }
}
