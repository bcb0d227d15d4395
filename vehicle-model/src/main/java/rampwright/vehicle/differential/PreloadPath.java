package rampwright.vehicle.differential;

/** How preload springs and ramps clamp the same plates. */
public enum PreloadPath {
  /** The springs press beside the ramps: both clamp together. */
  PARALLEL,
  /** The springs lie in the stack and the ramps work only beyond them: the larger one clamps. */
  SERIES
}
