package rampwright.vehicle.chassis;

/** The four wheels in the order in which every array and list of this model holds them. */
public enum Wheel {
  FRONT_LEFT("FL"),
  FRONT_RIGHT("FR"),
  REAR_LEFT("RL"),
  REAR_RIGHT("RR");

  private final String shortName;

  Wheel(String shortName) {
    this.shortName = shortName;
  }

  /** Returns FL, FR, RL or RR. */
  public String shortName() {
    return shortName;
  }
}
