package rampwright.vehicle.balance;

import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.lap.Channel;

/** Where in the car a differential sits. */
public enum UnitPosition {
  FRONT("front axle", Channel.FRONT_TORQUE_DIFFERENCE, Channel.FRONT_SPEED_DIFFERENCE),
  CENTRE("centre", Channel.CENTRE_TORQUE_DIFFERENCE, Channel.CENTRE_SPEED_DIFFERENCE),
  REAR("rear axle", Channel.REAR_TORQUE_DIFFERENCE, Channel.REAR_SPEED_DIFFERENCE);

  private final String label;
  private final Channel torqueDifference;
  private final Channel speedDifference;

  UnitPosition(String label, Channel torqueDifference, Channel speedDifference) {
    this.label = label;
    this.torqueDifference = torqueDifference;
    this.speedDifference = speedDifference;
  }

  /** Returns the words for people. */
  public String label() {
    return label;
  }

  /** Returns the differential in this position. */
  public Differential of(DifferentialSet set) {
    return switch (this) {
      case FRONT -> set.front();
      case CENTRE -> set.centre();
      case REAR -> set.rear();
    };
  }

  /** Returns a set with another differential in this position. */
  public DifferentialSet with(DifferentialSet set, Differential other) {
    return switch (this) {
      case FRONT -> new DifferentialSet(other, set.centre(), set.rear());
      case CENTRE -> new DifferentialSet(set.front(), other, set.rear());
      case REAR -> new DifferentialSet(set.front(), set.centre(), other);
    };
  }

  Channel torqueDifference() {
    return torqueDifference;
  }

  Channel speedDifference() {
    return speedDifference;
  }
}
