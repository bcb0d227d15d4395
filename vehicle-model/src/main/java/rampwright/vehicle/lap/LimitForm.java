package rampwright.vehicle.lap;

/** Whose limits a lap is driven at. */
public enum LimitForm {
  /** The driver backs off before a slide grows too fast. */
  DRIVER,
  /** The tyres alone decide. */
  CAR
}
