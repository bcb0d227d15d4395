package rampwright.optimiser.search;

import java.util.ArrayList;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.PlateHardware;
import rampwright.vehicle.input.InvalidInput;

/**
 * The lap time that a setting gains over the current one, and how far that number can be trusted:
 * the gain is computed again with the plate friction 15 % lower and higher, with the grip 3 % lower
 * and higher, and with the preload of either setting one step lower and higher, where the kit has
 * such a step. The larger change of each pair counts, and the pairs are taken as independent, so
 * that their squares add up. Plate friction changes the locking shares of both settings; the
 * preload stays, because the bench sets it as a torque.
 *
 * <p>The widths are common practice, no source. What the model leaves out is not in the band.
 *
 * @param gain lap time of the current setting less that of the other (s), weighted over the
 *     circuits; positive is faster
 * @param halfWidth half the width of the band around it (s)
 * @param measurable least difference (s) that a test day can show
 * @param shares what the band is made of
 */
public record GainBand(double gain, double halfWidth, double measurable, List<Share> shares) {
  /** Relative scatter of the plate friction (-). */
  public static final double FRICTION_SCATTER = 0.15;

  /** Relative scatter of the grip (-). */
  public static final double GRIP_SCATTER = 0.03;

  /**
   * One source of uncertainty.
   *
   * @param source what is uncertain, in words
   * @param seconds how far it moves the gain (s)
   */
  public record Share(String source, double seconds) {}

  /** What a test day will say. */
  public enum Verdict {
    FASTER("faster"),
    SLOWER("slower"),
    NOT_MEASURABLE("no difference that you could measure");

    private final String label;

    Verdict(String label) {
      this.label = label;
    }

    /** Returns the words for people. */
    public String label() {
      return label;
    }
  }

  /** Copies the list. */
  public GainBand {
    shares = List.copyOf(shares);
  }

  /** Returns the gain at the low end of the band (s). */
  public double low() {
    return gain - halfWidth;
  }

  /** Returns the gain at the high end of the band (s). */
  public double high() {
    return gain + halfWidth;
  }

  /**
   * Returns faster or slower only if the whole band says so and the gain itself can be measured.
   */
  public Verdict verdict() {
    if (gain >= measurable && low() > 0) {
      return Verdict.FASTER;
    }
    return gain <= -measurable && high() < 0 ? Verdict.SLOWER : Verdict.NOT_MEASURABLE;
  }

  /**
   * Computes the band of a setting: up to fourteen laps per circuit.
   *
   * @throws InvalidInput when the kit cannot build the setting or the car cannot follow a circuit
   */
  public static GainBand of(Event event, KitSetting setting) {
    SettingEvaluator evaluator = SettingEvaluator.of(event);
    double before = evaluator.lapTime(event.current());
    double after = evaluator.lapTime(event.built("proposed", setting));
    double gain = before - after;
    List<Share> shares = new ArrayList<>();
    shares.add(
        share(
            "plate friction ±15 %",
            gain(withFriction(event, 1 - FRICTION_SCATTER), setting) - gain,
            gain(withFriction(event, 1 + FRICTION_SCATTER), setting) - gain));
    shares.add(
        share(
            "grip ±3 %",
            gain(withGrip(event, 1 - GRIP_SCATTER), setting) - gain,
            gain(withGrip(event, 1 + GRIP_SCATTER), setting) - gain));
    shares.add(preloadShare("preload of the proposed setting", evaluator, event, setting, after));
    event
        .current()
        .kitSetting()
        .ifPresent(
            current ->
                shares.add(
                    preloadShare(
                        "preload of the current setting", evaluator, event, current, before)));
    double squares = shares.stream().mapToDouble(s -> s.seconds() * s.seconds()).sum();
    return new GainBand(gain, Math.sqrt(squares), SearchProblem.measurable(event), shares);
  }

  private static Share share(String source, double... changes) {
    double largest = 0;
    for (double change : changes) {
      largest = Math.max(largest, Math.abs(change));
    }
    return new Share(source, largest);
  }

  private static double gain(Event event, KitSetting setting) {
    SettingEvaluator evaluator = SettingEvaluator.of(event);
    return evaluator.lapTime(event.current()) - evaluator.lapTime(event.built("proposed", setting));
  }

  /** Neighbouring shims stand for what a build of the same shim scatters by. */
  private static Share preloadShare(
      String source, SettingEvaluator evaluator, Event event, KitSetting setting, double lapTime) {
    PartsKit.PreloadRange range = event.kit().preload();
    double[] changes = new double[2];
    for (int side = 0; side < 2; side++) {
      double preload = setting.preload() + (side == 0 ? -range.step() : range.step());
      if (preload >= range.min() - 1e-9 && preload <= range.max() + 1e-9) {
        KitSetting moved =
            new KitSetting(setting.ringSet(), setting.turned(), setting.facesPerSide(), preload);
        changes[side] = evaluator.lapTime(event.built("moved", moved)) - lapTime;
      }
    }
    return share(source + " ±" + format(range.step()) + " N·m", changes);
  }

  private static String format(double step) {
    return step == Math.rint(step) ? Long.toString((long) step) : Double.toString(step);
  }

  private static Event withGrip(Event event, double factor) {
    Conditions conditions = event.conditions();
    double grip = Math.min(Conditions.GRIP.max(), conditions.grip() * factor);
    return with(event, event.kit(), conditions.withGrip(grip), event.settings());
  }

  private static Event withFriction(Event event, double factor) {
    PlateHardware unit = event.kit().hardware();
    double friction =
        Math.max(
            PlateHardware.PLATE_FRICTION.min(),
            Math.min(PlateHardware.PLATE_FRICTION.max(), unit.plateFriction() * factor));
    PartsKit kit = event.kit().withPlateFriction(friction);
    Event withKit = with(event, kit, event.conditions(), event.settings());
    List<NamedSetting> rebuilt =
        event.settings().stream()
            .map(
                setting ->
                    setting
                        .kitSetting()
                        .map(choice -> withKit.built(setting.name(), choice))
                        .orElse(setting))
            .toList();
    return with(withKit, kit, event.conditions(), rebuilt);
  }

  private static Event with(
      Event event, PartsKit kit, Conditions conditions, List<NamedSetting> settings) {
    return new Event(
        event.name(),
        event.car(),
        event.circuits(),
        kit,
        conditions,
        event.driver(),
        event.limits(),
        settings,
        event.currentSetting(),
        event.spacing());
  }
}
