package rampwright.vehicle.tyre;

import rampwright.vehicle.input.Quantity;

/**
 * Shape of a force over normalised slip {@code rho}: {@code sin(Q atan(S rho))}, 1 at its peak.
 *
 * @param shape {@code Q}, how much force is left far beyond the peak (-); above 1 and below 2
 * @param scale {@code S}, how early the peak comes (-)
 */
public record SlipCurve(double shape, double scale) {
  public static final Quantity SHAPE =
      Quantity.si("shape", "slip curve shape factor", "", 1.01, 1.99, "");
  public static final Quantity SCALE =
      Quantity.si("scale", "slip curve scale factor", "", 0.01, 100, "");

  /** Checks both factors. */
  public SlipCurve {
    SHAPE.check(shape);
    SCALE.check(scale);
  }

  /** Returns the curve whose peak lies at {@code rho = 1} exactly: {@code S = tan(pi/(2Q))}. */
  public static SlipCurve peakAtOne(double shape) {
    SHAPE.check(shape);
    return new SlipCurve(shape, Math.tan(Math.PI / (2 * shape)));
  }

  /** Returns the value (-) at a normalised slip (-). */
  public double value(double rho) {
    return Math.sin(shape * Math.atan(scale * rho));
  }

  /** Returns the normalised slip at the peak (-). */
  public double peak() {
    return Math.tan(Math.PI / (2 * shape)) / scale;
  }
}
