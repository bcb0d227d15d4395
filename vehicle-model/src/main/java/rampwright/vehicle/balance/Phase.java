package rampwright.vehicle.balance;

/** The parts of a corner, in the order in which they are driven, and what lies between corners. */
public enum Phase {
  /** Brakes on before the car is turning in earnest. */
  BRAKING("braking"),
  /** From the release of the brakes, or their use while turning, to the slowest point. */
  ENTRY("entry"),
  /** Around the slowest point, at the cornering limit. */
  APEX("apex"),
  /** From the slowest point to full power or the next braking. */
  EXIT("exit"),
  /** Full power until the next braking. */
  STRAIGHT("straight");

  private final String label;

  Phase(String label) {
    this.label = label;
  }

  /** Returns the words for people. */
  public String label() {
    return label;
  }
}
