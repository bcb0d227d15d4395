package rampwright.optimiser.cli;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Pattern;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.survey.Figure;
import rampwright.vehicle.circuit.survey.ImportReport;
import rampwright.vehicle.circuit.survey.ImportedCircuit;

/** How a circuit came from a file, as a JSON document. */
final class CircuitDocument {
  private static final Pattern NEXT_WORD = Pattern.compile("_([a-z])");

  private CircuitDocument() {}

  /**
   * Returns the document.
   *
   * @param plot file of the plot, or null when none was written
   */
  static Map<String, Object> of(ImportedCircuit imported, Path out, Path plot) {
    Circuit circuit = imported.circuit();
    ImportReport report = imported.report();
    JsonMap figures = new JsonMap();
    report.figures().forEach((figure, value) -> figures.put(name(figure), value.doubleValue()));
    return new JsonMap()
        .put("circuit", circuit.name())
        .put("lengthM", circuit.length())
        .put("closed", circuit.closed())
        .put("stations", circuit.stations().size())
        .put("circuitFile", out.toString())
        .put("plotFile", plot == null ? null : plot.toString())
        .put("source", report.source())
        .put("figures", figures)
        .put("notes", report.notes())
        .put("warnings", report.warnings())
        .map();
  }

  /** Returns the name of a figure with its unit, for example {@code lengthBySpeedM}. */
  private static String name(Figure figure) {
    String words = figure.name().toLowerCase(Locale.ROOT);
    return NEXT_WORD.matcher(words).replaceAll(m -> m.group(1).toUpperCase(Locale.ROOT))
        + UnitName.inJson(figure.unit());
  }
}
