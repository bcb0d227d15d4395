package rampwright.vehicle.circuit.survey;

/** What kind of quantity a column holds. */
enum Dimension {
  TIME,
  LENGTH,
  SPEED,
  ACCELERATION,
  ANGLE,
  ANGULAR_RATE,
  CURVATURE,
  NUMBER
}
