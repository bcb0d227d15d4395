package rampwright.vehicle.driveline;

/** Which axles the engine drives. */
public enum DriveLayout {
  REAR,
  FRONT,
  ALL
}
