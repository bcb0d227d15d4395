package rampwright.vehicle.trim;

/** Why a limit lies where it lies. */
public enum TrimLimit {
  /** The engine's full-load torque, or the largest brake torque, is reached. */
  TORQUE,
  /** The tyres have no more: the extreme of the acceleration along the branch. */
  TYRES,
  /** Beyond it a slide would grow faster than the driver masters. */
  DRIVER
}
