package rampwright.planted.vehicle.trim;

/** Keeps a static count on purpose. */
public final class TrimThatCountsItsCalls {
  static int calls;

  private TrimThatCountsItsCalls() {}
}
