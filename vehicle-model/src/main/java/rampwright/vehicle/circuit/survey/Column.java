package rampwright.vehicle.circuit.survey;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.input.Quantity;

/** What a column of a file can mean; the first alias is the name used in mappings. */
public enum Column {
  TIME(Dimension.TIME, Quantity.si("time_s", "time", "s", -1e9, 1e12, ""), "time", "t", "elapsed"),
  SPEED(
      Dimension.SPEED,
      Quantity.si("speed_mps", "speed", "m/s", -5, 140, "the unit of the column is another"),
      "speed",
      "velocity",
      "v",
      "groundspeed",
      "vehiclespeed",
      "gpsspeed"),
  LATERAL_ACCELERATION(
      Dimension.ACCELERATION,
      Quantity.si(
          "lateral_acceleration_mps2",
          "lateral acceleration",
          "m/s²",
          -80,
          80,
          "the unit of the column is another"),
      "lateral_acceleration",
      "ay",
      "latacc",
      "lateralacc",
      "latg",
      "lateral",
      "accy",
      "accelerationy"),
  LONGITUDINAL_ACCELERATION(
      Dimension.ACCELERATION,
      Quantity.si(
          "longitudinal_acceleration_mps2",
          "longitudinal acceleration",
          "m/s²",
          -80,
          80,
          "the unit of the column is another"),
      "longitudinal_acceleration",
      "ax",
      "longacc",
      "longitudinalacc",
      "longg",
      "longitudinal",
      "accx",
      "accelerationx"),
  YAW_RATE(
      Dimension.ANGULAR_RATE,
      Quantity.si(
          "yaw_rate_radps", "yaw rate", "rad/s", -10, 10, "the unit of the column is another"),
      "yaw_rate",
      "yaw",
      "yawvelocity",
      "gyroz"),
  X(Dimension.LENGTH, Station.POSITION, "x", "east", "easting", "posx"),
  Y(Dimension.LENGTH, Station.POSITION, "y", "north", "northing", "posy"),
  LATITUDE(
      Dimension.ANGLE,
      Quantity.degrees("latitude_deg", "latitude", -85, 85, "latitude and longitude were swapped"),
      "latitude",
      "lat"),
  LONGITUDE(
      Dimension.ANGLE,
      Quantity.degrees("longitude_deg", "longitude", -180, 180, ""),
      "longitude",
      "lon",
      "lng",
      "long"),
  ELEVATION(
      Dimension.LENGTH,
      Quantity.si("elevation_m", "elevation", "m", -500, 6000, ""),
      "elevation",
      "altitude",
      "ele",
      "alt",
      "z"),
  LAP(
      Dimension.NUMBER,
      Quantity.si("lap", "lap number", "", -1, 100_000, ""),
      "lap",
      "lapnumber",
      "lapno"),
  DISTANCE(Dimension.LENGTH, Station.DISTANCE, "distance", "dist", "s", "station", "chainage"),
  CURVATURE(Dimension.CURVATURE, Station.CURVATURE, "curvature", "kappa"),
  GRADE(Dimension.ANGLE, Station.GRADE, "grade", "slope"),
  BANK(Dimension.ANGLE, Station.BANK, "bank", "camber", "crossslope"),
  GRIP_LEFT(Dimension.NUMBER, Station.GRIP, "grip_left"),
  GRIP_RIGHT(Dimension.NUMBER, Station.GRIP, "grip_right");

  private final Dimension dimension;
  private final Quantity quantity;
  private final List<String> aliases;

  Column(Dimension dimension, Quantity quantity, String... aliases) {
    this.dimension = dimension;
    this.quantity = quantity;
    this.aliases = List.of(aliases);
  }

  Dimension dimension() {
    return dimension;
  }

  Quantity quantity() {
    return quantity;
  }

  /** Returns the name used in mappings, for example {@code lateral_acceleration}. */
  public String key() {
    return aliases.get(0);
  }

  /** Returns the words for people. */
  public String label() {
    return switch (this) {
      case X -> "position x";
      case Y -> "position y";
      case GRIP_LEFT -> "grip factor left";
      case GRIP_RIGHT -> "grip factor right";
      default -> quantity.label();
    };
  }

  /** Returns the column that a title stands for. */
  static Optional<Column> of(String title) {
    String plain = Header.plain(title);
    return Arrays.stream(values())
        .filter(c -> c.aliases.stream().anyMatch(alias -> Header.plain(alias).equals(plain)))
        .findFirst();
  }
}
