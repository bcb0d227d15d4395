package rampwright.vehicle.circuit.survey;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The units that a column may have. */
public enum Unit {
  SECOND(Dimension.TIME, "s", 1, "sec", "seconds"),
  MILLISECOND(Dimension.TIME, "ms", 1e-3, "msec"),
  METRE(Dimension.LENGTH, "m", 1, "metres", "meters"),
  KILOMETRE(Dimension.LENGTH, "km", 1000),
  FOOT(Dimension.LENGTH, "ft", 0.3048, "feet"),
  METRE_PER_SECOND(Dimension.SPEED, "m/s", 1, "mps", "ms-1"),
  KILOMETRE_PER_HOUR(Dimension.SPEED, "km/h", 1 / 3.6, "kmh", "kph", "kmph"),
  MILE_PER_HOUR(Dimension.SPEED, "mph", 0.44704),
  METRE_PER_SECOND_SQUARED(Dimension.ACCELERATION, "m/s2", 1, "m/s²", "m/s^2", "mps2", "ms-2"),
  GRAVITY(Dimension.ACCELERATION, "g", 9.80665),
  RADIAN(Dimension.ANGLE, "rad", 1),
  DEGREE(Dimension.ANGLE, "deg", Math.PI / 180, "°", "degrees"),
  RADIAN_PER_SECOND(Dimension.ANGULAR_RATE, "rad/s", 1, "radps", "rads"),
  DEGREE_PER_SECOND(Dimension.ANGULAR_RATE, "deg/s", Math.PI / 180, "degps", "degs", "°/s"),
  PER_METRE(Dimension.CURVATURE, "1/m", 1, "1pm", "m-1"),
  PER_KILOMETRE(Dimension.CURVATURE, "1/km", 1e-3, "1pkm"),
  NONE(Dimension.NUMBER, "-", 1);

  private final Dimension dimension;
  private final String symbol;
  private final double si;
  private final List<String> spellings;

  Unit(Dimension dimension, String symbol, double si, String... spellings) {
    this.dimension = dimension;
    this.symbol = symbol;
    this.si = si;
    this.spellings = List.of(spellings);
  }

  Dimension dimension() {
    return dimension;
  }

  /** Returns how the unit is written. */
  public String symbol() {
    return symbol;
  }

  /** Returns the factor to SI. */
  public double si() {
    return si;
  }

  /** Returns the unit of a spelling, in any case. */
  static Optional<Unit> of(String spelling) {
    String plain = spelling.strip().toLowerCase(Locale.ROOT);
    return Arrays.stream(values())
        .filter(unit -> unit.symbol.equals(plain) || unit.spellings.contains(plain))
        .findFirst();
  }

  /** Returns the symbols of all units of a dimension. */
  static String symbols(Dimension dimension) {
    return String.join(
        ", ",
        Arrays.stream(values()).filter(u -> u.dimension == dimension).map(Unit::symbol).toList());
  }
}
