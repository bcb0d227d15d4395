package rampwright.planted.optimiser.search;

/** Keeps a static count on purpose. */
public final class SearchThatCountsForEveryone {
  static int evaluations;

  private SearchThatCountsForEveryone() {}
}
