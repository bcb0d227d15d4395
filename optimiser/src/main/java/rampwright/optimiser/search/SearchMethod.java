package rampwright.optimiser.search;

/** How a search found its answer. */
public enum SearchMethod {
  /** Every setting that may be proposed was computed: the answer is the best there is. */
  ENUMERATED("every setting was computed"),
  /**
   * A sample, a genetic search and a local search at its end: the best of those that were computed.
   */
  GENETIC("genetic search");

  private final String label;

  SearchMethod(String label) {
    this.label = label;
  }

  /** Returns the words for people. */
  public String label() {
    return label;
  }
}
