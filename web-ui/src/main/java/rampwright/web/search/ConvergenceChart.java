package rampwright.web.search;

import com.vaadin.flow.component.html.Div;
import java.util.List;
import java.util.Locale;
import rampwright.optimiser.search.SearchProgress;
import rampwright.web.chart.Axis;
import rampwright.web.chart.ChartFigure;
import rampwright.web.chart.LineChart;

/** Best lap time against evaluations; grows while the search runs. */
final class ConvergenceChart extends Div {
  private static final long serialVersionUID = 1L;
  private static final int MET = 0;
  private static final int BROKEN = 1;

  private final ChartFigure figure;
  private int shown;

  ConvergenceChart(List<SearchProgress> progress) {
    shown = progress.size();
    figure =
        new LineChart(
                "Best lap time so far",
                Axis.of("evaluations", ""),
                Axis.of("lap time, times weights", "s"))
            .steps("all limits met", MET, places(progress), values(progress, true))
            .steps("a limit broken", BROKEN, places(progress), values(progress, false))
            .figure()
            .height("14rem");
    figure.words(words(progress));
    add(figure);
  }

  /** Adds what is new; earlier points are never changed. */
  void show(List<SearchProgress> progress) {
    if (progress.size() <= shown) {
      return;
    }
    List<SearchProgress> fresh = progress.subList(shown, progress.size());
    figure.add(MET, places(fresh), values(fresh, true));
    figure.add(BROKEN, places(fresh), values(fresh, false));
    figure.words(words(progress));
    shown = progress.size();
  }

  private static double[] places(List<SearchProgress> progress) {
    return progress.stream().mapToDouble(SearchProgress::evaluations).toArray();
  }

  private static double[] values(List<SearchProgress> progress, boolean met) {
    return progress.stream()
        .mapToDouble(p -> p.bestFeasible() == met ? p.bestLapTime() : Double.NaN)
        .toArray();
  }

  private static List<String> words(List<SearchProgress> progress) {
    if (progress.isEmpty()) {
      return List.of("no evaluation yet");
    }
    SearchProgress first = progress.get(0);
    SearchProgress last = progress.get(progress.size() - 1);
    return List.of(
        String.format(
            Locale.ROOT,
            "from %.3f s after %d evaluations to %.3f s after %d, %s",
            first.bestLapTime(),
            first.evaluations(),
            last.bestLapTime(),
            last.evaluations(),
            last.bestFeasible() ? "all limits met" : "a limit broken"));
  }
}
