package rampwright.vehicle.differential;

/**
 * How the clamping force spreads over an annular friction face. Source: the two classical plate
 * clutch theories, for example Shigley, <i>Mechanical Engineering Design</i>, ch. 16.
 */
public enum FacePressure {
  /** Run-in plates: pressure falls with radius, effective radius is the mean radius. */
  UNIFORM_WEAR {
    @Override
    public double effectiveRadius(double outer, double inner) {
      return (outer + inner) / 2;
    }
  },
  /** New, flat plates: even pressure. */
  UNIFORM_PRESSURE {
    @Override
    public double effectiveRadius(double outer, double inner) {
      return 2.0 / 3.0 * (cube(outer) - cube(inner)) / (outer * outer - inner * inner);
    }
  };

  /** Returns the effective radius (m) of a face between two radii (m). */
  public abstract double effectiveRadius(double outer, double inner);

  private static double cube(double x) {
    return x * x * x;
  }
}
