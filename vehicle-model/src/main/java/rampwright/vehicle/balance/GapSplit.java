package rampwright.vehicle.balance;

import java.util.List;
import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;

/**
 * Where the time between two laps of the same line comes from, by corner and by cause. The parts
 * add up to the difference of the lap times.
 *
 * <p>Time is lost where the car is slower, but the reason mostly lies further back (a poor exit
 * costs time along the whole straight) or ahead (a slow corner is braked for early). So the
 * difference {@code e} of the kinetic energies per mass is followed to where it came from, and each
 * interval's difference of time is shared out as {@code e} is:
 *
 * <ul>
 *   <li>Where both laps brake, speed follows from what is ahead: {@code e} at the end of the
 *       braking is {@link Cause#CORNERING_SPEED} of that corner, what is added on the way back from
 *       there is its {@link Cause#BRAKING}.
 *   <li>Where both laps are at the cornering limit, all of {@code e} is {@link
 *       Cause#CORNERING_SPEED}.
 *   <li>Elsewhere speed follows from what is behind: {@code e} is carried on, and each interval
 *       adds its change of {@code e} to one cause, the first that applies: {@link Cause#BRAKING}
 *       when one of the laps brakes (of the corner ahead), {@link Cause#GEAR_CHANGES} when one of
 *       them changes gear or the gears differ, {@link Cause#CORNERING_SPEED} when one is at the
 *       cornering limit, {@link Cause#TRACTION} when tyres or driver limit the drive of one of
 *       them. With both at full power in the same gear the carried difference decays as drag and
 *       torque curve make it (a faster car gains less), and the rest is {@link Cause#OTHER}: power,
 *       drag, rolling with more slip, heat in the plates.
 * </ul>
 *
 * What the time integration within an interval leaves over goes to that interval's own cause.
 * Corners are those of {@link CornerReport} of the reference lap. The rules are ours; another split
 * with the same sum is possible.
 */
public final class GapSplit {
  /** Why time is gained or lost. */
  public enum Cause {
    TRACTION("traction"),
    CORNERING_SPEED("cornering speed"),
    BRAKING("braking"),
    GEAR_CHANGES("gear changes"),
    OTHER("power, drag and losses");

    private final String label;

    Cause(String label) {
      this.label = label;
    }

    /** Returns the words for people. */
    public String label() {
      return label;
    }
  }

  /**
   * Time by one cause in one corner.
   *
   * @param corner number of the corner, 0 on a road without corners
   * @param cause why
   * @param seconds time of the other lap minus the reference (s), positive where the other loses
   */
  public record Part(int corner, Cause cause, double seconds) {}

  private final double total;
  private final List<Part> parts;
  private final double[] gap;

  private GapSplit(double total, List<Part> parts, double[] gap) {
    this.total = total;
    this.parts = List.copyOf(parts);
    this.gap = gap;
  }

  /**
   * Splits the gap between two laps.
   *
   * @throws InvalidInput when they were not driven on the same line with the same stations
   */
  public static GapSplit between(Lap reference, Lap other) {
    Road road = reference.road();
    Road otherRoad = other.road();
    if (otherRoad.size() != road.size()
        || otherRoad.closed() != road.closed()
        || Math.abs(otherRoad.length() - road.length()) > 1e-9 * road.length()) {
      throw InvalidInput.of(
          "lap to compare with",
          name(other) + ", " + otherRoad.size() + " stations",
          "on the same line as the reference (" + name(reference) + ", " + road.size() + ")",
          "the circuit or the station spacing was changed in between");
    }
    double[] gap = new double[road.size()];
    for (int i = 0; i < gap.length; i++) {
      gap[i] = other.trace().get(Channel.TIME, i) - reference.trace().get(Channel.TIME, i);
    }
    List<Part> parts = new GapAttribution(reference, other).parts();
    return new GapSplit(other.time() - reference.time(), parts, gap);
  }

  private static String name(Lap lap) {
    return lap.request().circuit().name();
  }

  /** Returns the lap time of the other lap minus that of the reference (s). */
  public double total() {
    return total;
  }

  /** Returns the parts that are not zero, by corner and then by cause; they add up to the total. */
  public List<Part> parts() {
    return parts;
  }

  /** Returns the sum of the parts of one cause (s). */
  public double seconds(Cause cause) {
    return parts.stream().filter(p -> p.cause() == cause).mapToDouble(Part::seconds).sum();
  }

  /** Returns the sum of the parts of one corner (s). */
  public double seconds(int corner) {
    return parts.stream().filter(p -> p.corner() == corner).mapToDouble(Part::seconds).sum();
  }

  /** Returns the time of the other lap minus that of the reference (s) at each station. */
  public double[] gap() {
    return gap.clone();
  }
}
