package rampwright.vehicle.circuit.survey;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import rampwright.vehicle.input.InvalidInput;

/**
 * The rows of one lap in a log.
 *
 * @param from first row
 * @param to last row
 * @param joined whether the last row is already the first of the next lap, so that the rows span
 *     the lap exactly
 */
record LapRows(int from, int to, boolean joined) {
  /** A lap that is much shorter than the longest was not driven to its end. */
  private static final double WHOLE = 0.9;

  /** Rows with one lap number. */
  private record Run(int number, int from, int to, double time, double distance) {}

  static LapRows of(CsvTable table, ImportOptions options, ImportReport.Draft report) {
    if (!table.has(Column.LAP)) {
      if (options.lap().isPresent()) {
        table.require(Column.LAP);
      }
      return new LapRows(0, table.rows() - 1, false);
    }
    List<Run> runs = runs(table);
    if (runs.isEmpty()) {
      return new LapRows(0, table.rows() - 1, false);
    }
    Run run = options.lap().isPresent() ? named(table, runs, options) : fastest(runs, report);
    report.set(Figure.LAP, run.number);
    boolean joined = run.to + 1 < table.rows();
    return new LapRows(run.from, joined ? run.to + 1 : run.to, joined);
  }

  private static List<Run> runs(CsvTable table) {
    List<Run> runs = new ArrayList<>();
    int from = 0;
    for (int row = 1; row <= table.rows(); row++) {
      boolean ends = row == table.rows() || lap(table, row) != lap(table, from);
      if (ends) {
        runs.add(run(table, from, row - 1));
        from = row;
      }
    }
    return runs;
  }

  private static int lap(CsvTable table, int row) {
    try {
      return (int) table.value(Column.LAP, row, 0);
    } catch (InvalidInput e) {
      throw e.at(table.place(row));
    }
  }

  private static Run run(CsvTable table, int from, int to) {
    Series time = table.get(Column.TIME);
    Series speed = table.get(Column.SPEED);
    double distance = 0;
    for (int row = from + 1; row <= to; row++) {
      double step = speed.get(row) * (time.get(row) - time.get(row - 1));
      distance += Double.isNaN(step) ? 0 : step;
    }
    return new Run(lap(table, from), from, to, time.get(to) - time.get(from), distance);
  }

  private static Run named(CsvTable table, List<Run> runs, ImportOptions options) {
    int wanted = options.lap().orElseThrow();
    return runs.stream()
        .filter(run -> run.number == wanted)
        .findFirst()
        .orElseThrow(
            () ->
                InvalidInput.of(
                        "number of the lap",
                        Integer.toString(wanted),
                        "one of the file's: "
                            + String.join(
                                ", ",
                                runs.stream().map(run -> Integer.toString(run.number)).toList()),
                        "")
                    .at(table.file()));
  }

  private static Run fastest(List<Run> runs, ImportReport.Draft report) {
    double longest = runs.stream().mapToDouble(Run::distance).max().orElseThrow();
    List<Run> whole = runs.stream().filter(run -> run.distance >= WHOLE * longest).toList();
    Run best = whole.get(0);
    for (Run run : whole) {
      best = run.time < best.time ? run : best;
    }
    report.note(
        String.format(
            Locale.ROOT,
            "The file holds %d laps, %d of them whole; the fastest was taken.",
            runs.size(),
            whole.size()));
    return best;
  }
}
