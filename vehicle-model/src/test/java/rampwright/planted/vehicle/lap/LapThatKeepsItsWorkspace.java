package rampwright.planted.vehicle.lap;

/** Shares one workspace between all callers on purpose. */
public final class LapThatKeepsItsWorkspace {
  static final double[] WORKSPACE = new double[4];

  private LapThatKeepsItsWorkspace() {}
}
