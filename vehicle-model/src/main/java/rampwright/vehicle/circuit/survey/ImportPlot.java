package rampwright.vehicle.circuit.survey;

import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import rampwright.vehicle.circuit.Station;

/**
 * An imported circuit as a picture to judge it by: map with the measured positions, logged speed,
 * and curvature before and after smoothing over distance.
 */
public final class ImportPlot {
  private static final double WIDTH = 960;
  private static final double LEFT = 70;
  private static final double RIGHT = 24;
  private static final double MAP_TOP = 52;
  private static final double MAP_HEIGHT = 420;
  private static final double CHART_HEIGHT = 170;
  private static final double CHART_STEP = 250;

  private ImportPlot() {}

  /** Returns the picture as a complete SVG document. */
  public static String svg(ImportedCircuit imported) {
    Optional<Curve> speed = imported.curves().speed();
    double firstChart = MAP_TOP + MAP_HEIGHT + 60;
    int charts = speed.isPresent() ? 2 : 1;
    double height = firstChart + charts * CHART_STEP - 24;
    StringBuilder out = new StringBuilder(head(imported, height));
    map(out, imported);
    speed.ifPresent(curve -> speed(out, curve, firstChart));
    curvature(out, imported, firstChart + (charts - 1) * CHART_STEP);
    return out.append("</svg>\n").toString();
  }

  private static String head(ImportedCircuit imported, double height) {
    String title = "Circuit " + imported.circuit().name();
    return Svg.format(
            "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 %.0f %.0f\" role=\"img\""
                + " font-family=\"system-ui, sans-serif\" font-size=\"13\" fill=\"%s\">\n",
            WIDTH, height, Svg.INK)
        + Svg.format("<title>%s</title>\n", Svg.escaped(title))
        + Svg.format("<desc>%s</desc>\n", Svg.escaped(imported.report().text().strip()))
        + Svg.format("<rect width=\"%.0f\" height=\"%.0f\" fill=\"#fbfcfc\"/>\n", WIDTH, height)
        + Svg.format(
            "<text x=\"%.0f\" y=\"30\" font-size=\"18\" font-weight=\"600\">%s</text>\n",
            LEFT, Svg.escaped(title + ", " + lengthAndTurn(imported)));
  }

  private static String lengthAndTurn(ImportedCircuit imported) {
    return Figure.LENGTH.shown(imported.circuit().length())
        + (imported.circuit().closed() ? ", closed" : ", open run")
        + " (from "
        + imported.report().source()
        + ")";
  }

  private static void map(StringBuilder out, ImportedCircuit imported) {
    List<Station> stations = imported.circuit().stations();
    Curve line = column(stations, Station::x, Station::y, imported.circuit().closed());
    Optional<Curve> positions = imported.curves().positions();
    double width = WIDTH - LEFT - RIGHT;
    MapPanel map = new MapPanel(out, LEFT, MAP_TOP, width, MAP_HEIGHT, line);
    map.draw(line, Svg.FIRST, 3.2);
    positions.ifPresent(measured -> map.draw(measured, Svg.SECOND, 1));
    Station a = stations.get(0);
    Station b = stations.get(1);
    map.start(a.x(), a.y(), Math.atan2(b.y() - a.y(), b.x() - a.x()), "start");
    String key = positions.isPresent() ? "thin: measured positions, thick: circuit" : "";
    out.append(Svg.text(WIDTH - RIGHT, MAP_TOP + MAP_HEIGHT, "end", key));
  }

  private static void speed(StringBuilder out, Curve speed, double top) {
    double most = 0;
    for (int i = 0; i < speed.size(); i++) {
      most = Math.max(most, 3.6 * speed.y(i));
    }
    double length = speed.x(speed.size() - 1);
    ChartPanel panel = panel(out, top, "logged speed (km/h)", length, 0, most);
    panel.draw(speed.scaled(1, 3.6), Svg.SECOND, 1.6);
  }

  private static void curvature(StringBuilder out, ImportedCircuit imported, double top) {
    Curve raw = imported.curves().rawCurvature();
    Curve smooth =
        column(imported.circuit().stations(), Station::distance, Station::curvature, false);
    double low = 0;
    double high = 0;
    for (int i = 0; i < smooth.size(); i++) {
      low = Math.min(low, 1.15 * smooth.y(i));
      high = Math.max(high, 1.15 * smooth.y(i));
    }
    String title =
        "curvature (1/m), left positive; thin: as measured, thick: smoothed over "
            + Svg.number(imported.report().get(Figure.SMOOTHING_LENGTH).orElse(0))
            + " m"
            + (imported.circuit().closed() ? " and closed" : "");
    ChartPanel panel = panel(out, top, title, imported.circuit().length(), low, high);
    panel.draw(smooth, Svg.FIRST, 3);
    panel.draw(clipped(raw, low, high), Svg.SECOND, 0.9);
  }

  private static ChartPanel panel(
      StringBuilder out, double top, String title, double length, double low, double high) {
    double width = WIDTH - LEFT - RIGHT;
    return new ChartPanel(out, LEFT, top, width, CHART_HEIGHT, title, length, low, high);
  }

  private static Curve column(
      List<Station> stations,
      ToDoubleFunction<Station> x,
      ToDoubleFunction<Station> y,
      boolean closed) {
    int n = stations.size();
    double[] columnX = new double[n + (closed ? 1 : 0)];
    double[] columnY = new double[columnX.length];
    for (int i = 0; i < columnX.length; i++) {
      columnX[i] = x.applyAsDouble(stations.get(i % n));
      columnY[i] = y.applyAsDouble(stations.get(i % n));
    }
    return Curve.of(columnX, columnY);
  }

  private static Curve clipped(Curve curve, double low, double high) {
    double[] x = new double[curve.size()];
    double[] y = new double[curve.size()];
    for (int i = 0; i < x.length; i++) {
      x[i] = curve.x(i);
      y[i] = Math.max(low, Math.min(high, curve.y(i)));
    }
    return Curve.of(x, y);
  }
}
