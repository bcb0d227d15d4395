package rampwright.web.store;

/**
 * What a search run is doing. A run starts as {@link #WAITING} and goes on to {@link #RUNNING} when
 * the runs before it have ended. From either it ends once and for all as {@link #DONE} (its budget
 * is spent or every setting computed), {@link #CANCELLED} (a person ended it; from {@code RUNNING}
 * it keeps the best so far), {@link #FAILED} (it threw; the message says why) or {@link
 * #INTERRUPTED} (the program ended under it, by itself or by a kill).
 */
public enum RunState {
  WAITING("waiting"),
  RUNNING("running"),
  DONE("done"),
  CANCELLED("cancelled"),
  FAILED("failed"),
  INTERRUPTED("interrupted");

  private final String label;

  RunState(String label) {
    this.label = label;
  }

  /** Returns the words for people. */
  public String label() {
    return label;
  }

  /** Returns whether the run is over. */
  public boolean ended() {
    return this != WAITING && this != RUNNING;
  }
}
