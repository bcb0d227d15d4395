package rampwright.vehicle.lap;

/** What holds the car back at a station. The ordinal is the value of {@link Channel#LIMIT}. */
public enum LapLimit {
  /** Full throttle: the engine has no more. */
  POWER("power"),
  /** The driven tyres have no more. */
  TRACTION("traction"),
  /** On power, a slide would grow faster than the driver masters. */
  SLIDE_ON_POWER("slide on power"),
  /** The path: the cornering limit at constant speed. */
  CORNERING("cornering"),
  /** The tyres have no more braking, or the brakes have none. */
  BRAKING("braking"),
  /** Braking, a slide would grow faster than the driver masters. */
  SLIDE_ON_BRAKES("slide on brakes"),
  /** A gear change: no drive torque. */
  SHIFT("gear change");

  private final String label;

  LapLimit(String label) {
    this.label = label;
  }

  /** Returns the words for people. */
  public String label() {
    return label;
  }
}
