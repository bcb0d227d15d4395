package rampwright.optimiser.search;

/** Watches a search and may end it. */
public interface SearchMonitor {
  /** A monitor that neither looks nor cancels. */
  SearchMonitor NONE =
      new SearchMonitor() {
        @Override
        public void progress(SearchProgress progress) {}

        @Override
        public boolean cancelled() {
          return false;
        }
      };

  /** Called after each evaluation, by the thread that runs the search. */
  void progress(SearchProgress progress);

  /**
   * Returns whether the search is to end with the best that it has. Once true it stays true. Asked
   * from several threads, often: it only looks at a flag.
   */
  boolean cancelled();
}
