package rampwright.vehicle.circuit.survey;

import java.io.InputStream;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.input.InvalidInput;

/**
 * Reads a circuit from whatever file holds one. A name that ends in {@code .gpx} means GPX 1.1,
 * {@code .geojson} or {@code .json} GeoJSON; what any other file is follows from its columns:
 *
 * <ul>
 *   <li>distance and curvature: stations, taken as they are ({@link StationCsv});
 *   <li>time, speed, and lateral acceleration or yaw rate, optionally position: a logged lap;
 *   <li>x and y, or latitude and longitude, optionally elevation: a surveyed line.
 * </ul>
 */
public final class CircuitImport {
  /** Missing turning of a closed circuit that is pointed out (turns). */
  private static final double CAUTION = 0.03;

  private CircuitImport() {}

  /**
   * Reads a circuit.
   *
   * @param fileName the file's name, for messages and for the circuit's name
   * @param content the file; read to its end and not closed
   * @param options how
   * @throws InvalidInput when the file or the options break a rule, with file and line
   */
  public static ImportedCircuit read(String fileName, InputStream content, ImportOptions options) {
    InputStream limited = new LimitedStream(fileName, content, LimitedStream.LARGEST_FILE);
    try {
      String name = fileName.toLowerCase(Locale.ROOT);
      if (name.endsWith(".gpx")) {
        ImportReport.Draft report = new ImportReport.Draft(fileName, "GPX track");
        return line(GpxReader.read(fileName, limited, report), options, report);
      }
      if (name.endsWith(".geojson") || name.endsWith(".json")) {
        ImportReport.Draft report = new ImportReport.Draft(fileName, "GeoJSON line");
        return line(GeoJsonReader.read(fileName, limited), options, report);
      }
      return csv(CsvTable.read(fileName, limited, options.columns()), options);
    } catch (InvalidInput e) {
      throw e.where().isEmpty() ? e.at(fileName) : e;
    }
  }

  private static ImportedCircuit csv(CsvTable table, ImportOptions options) {
    if (table.has(Column.SPEED)
        || table.has(Column.LATERAL_ACCELERATION)
        || table.has(Column.YAW_RATE)) {
      ImportReport.Draft report = draft(table, "logged lap");
      Track track = LoggedLap.read(table, options, report);
      return TrackCircuit.of(name(table), track, options, report);
    }
    boolean positions = table.has(Column.X) || table.has(Column.LATITUDE);
    if (positions && !table.has(Column.CURVATURE)) {
      ImportReport.Draft report = draft(table, "surveyed line");
      Track track = SurveyedLine.of(LinePoints.of(table, report), options, report);
      return TrackCircuit.of(name(table), track, options, report);
    }
    return stations(table);
  }

  private static ImportedCircuit line(
      LinePoints.Named line, ImportOptions options, ImportReport.Draft report) {
    String name = line.name().isBlank() ? FileName.stem(report.file()) : line.name();
    Track track = SurveyedLine.of(line.points().projected(report), options, report);
    return TrackCircuit.of(name, track, options, report);
  }

  private static ImportReport.Draft draft(CsvTable table, String source) {
    ImportReport.Draft report = new ImportReport.Draft(table.file(), source);
    report.set(Figure.ROWS, table.rows());
    report.note("Columns: " + MappedColumn.list(table.mapped()) + ".");
    if (!table.ignored().isEmpty()) {
      report.note("Columns that were not used: " + String.join(", ", table.ignored()) + ".");
    }
    if (table.decimalComma()) {
      report.note("Numbers were read with a decimal comma.");
    }
    return report;
  }

  private static String name(CsvTable table) {
    return table.notes().getOrDefault("name", FileName.stem(table.file()));
  }

  /** Stations are a circuit already: nothing is smoothed or closed. */
  private static ImportedCircuit stations(CsvTable table) {
    Circuit circuit = StationCsv.circuit(table);
    ImportReport.Draft report = draft(table, "stations with curvature");
    List<Station> stations = circuit.stations();
    int n = stations.size();
    double[] at = new double[n];
    double[] curvature = new double[n];
    double turning = 0;
    for (int i = 0; i < n; i++) {
      at[i] = stations.get(i).distance();
      curvature[i] = stations.get(i).curvature();
      double next = i + 1 < n ? stations.get(i + 1).distance() : circuit.length();
      double after = stations.get((i + 1) % n).curvature();
      turning += 0.5 * (curvature[i] + after) * (next - at[i]);
    }
    report.set(Figure.STATIONS, n);
    report.set(Figure.LENGTH, circuit.length());
    report.set(Figure.TURNING_AFTER, Math.toDegrees(turning));
    double turns = turning / (2 * Math.PI);
    if (circuit.closed() && Math.abs(turns - Math.rint(turns)) > CAUTION) {
      report.warn("The curvature of this closed circuit does not add up to whole turns.");
    }
    report.note("Stations were taken as they are, neither smoothed nor closed.");
    return new ImportedCircuit(
        circuit,
        report.report(),
        new ImportCurves(Curve.of(at, curvature), Optional.empty(), Optional.empty()));
  }
}
