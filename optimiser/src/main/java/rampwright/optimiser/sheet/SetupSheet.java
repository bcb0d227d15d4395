package rampwright.optimiser.sheet;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import rampwright.optimiser.event.SettingLimit;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.differential.PlateBuild;

/**
 * Everything that stands on a setup sheet, in SI units.
 *
 * @param event name of the event
 * @param setting name of the setting to be built
 * @param car name of the car
 * @param axle where the unit sits: {@code front axle} or {@code rear axle}
 * @param conditions for which the effect was computed
 * @param driver whose limits the laps keep
 * @param kit name of the parts kit
 * @param build the unit as built
 * @param stack order of the plates on each side
 * @param bench what the bench must show
 * @param springsKnown whether the kit says which springs it has
 * @param shims shims by those springs; empty when they are unknown or cannot give the preload
 * @param change what is to be changed from the setting that is in the car
 * @param laps expected effect, one for each circuit of the event, in its order
 * @param limits the event's limits and the values of this setting
 * @param cautions what the crew must not forget
 */
public record SetupSheet(
    String event,
    String setting,
    String car,
    String axle,
    Conditions conditions,
    Driver driver,
    String kit,
    PlateBuild build,
    PlateStack stack,
    BenchCheck bench,
    boolean springsKnown,
    Optional<Shims> shims,
    SettingChange change,
    List<ExpectedLap> laps,
    List<LimitLine> limits,
    List<String> cautions) {
  /** Copies the lists. */
  public SetupSheet {
    laps = List.copyOf(laps);
    limits = List.copyOf(limits);
    cautions = List.copyOf(cautions);
  }

  /** Returns the labels of the limits that this setting breaks. */
  public List<String> brokenLimits() {
    return limits.stream()
        .filter(line -> line.met().equals(Optional.of(false)))
        .map(line -> line.limit().measure().quantity().label())
        .distinct()
        .toList();
  }

  /**
   * What a circuit answers to the setting.
   *
   * @param circuit name of the circuit
   * @param weight how much its lap time counts (-)
   * @param lapTime lap time of this setting (s)
   * @param currentLapTime lap time of the setting that is in the car (s)
   * @param weakPlates difference of the lap times (s) when the plates of both settings grip {@link
   *     BenchCheck#FRICTION_SCATTER} less than the kit says, preload as the bench shows it
   * @param strongPlates the same when they grip more
   * @param corners difference by corner in driving order; with {@code outside} they add up to the
   *     difference of the lap times
   * @param outside difference outside corners (s)
   */
  public record ExpectedLap(
      String circuit,
      double weight,
      double lapTime,
      double currentLapTime,
      double weakPlates,
      double strongPlates,
      List<CornerEffect> corners,
      double outside) {
    /** Copies the corners. */
    public ExpectedLap {
      corners = List.copyOf(corners);
    }

    /** Returns the smallest of the three differences (s). */
    public double lowest() {
      return Math.min(difference(), Math.min(weakPlates, strongPlates));
    }

    /** Returns the largest of the three differences (s). */
    public double highest() {
      return Math.max(difference(), Math.max(weakPlates, strongPlates));
    }

    /** Returns this setting's lap time less the current one's (s); negative is faster. */
    public double difference() {
      return lapTime - currentLapTime;
    }
  }

  /**
   * Effect in one corner.
   *
   * @param number 1 for the first after the start line
   * @param distance distance of its slowest point (m)
   * @param slowestSpeed speed there with the current setting (m/s)
   * @param difference time of this setting less the current one's (s); negative is faster
   * @param cause the largest cause in words, empty when nothing differs
   */
  public record CornerEffect(
      int number, double distance, double slowestSpeed, double difference, String cause) {}

  /**
   * A limit of the event.
   *
   * @param limit measure and limit (SI)
   * @param value the setting's value (SI); empty where it is not known
   */
  public record LimitLine(SettingLimit limit, OptionalDouble value) {
    /** Returns whether the limit is met; empty where the value is not known. */
    public Optional<Boolean> met() {
      if (value.isEmpty()) {
        return Optional.empty();
      }
      return Optional.of(limit.measure().violation(value.getAsDouble(), limit.value()) == 0);
    }
  }
}
