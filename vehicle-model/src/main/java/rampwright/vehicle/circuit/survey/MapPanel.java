package rampwright.vehicle.circuit.survey;

import java.util.Arrays;

/** A map: equal scale both ways, north or y up, with a bar for the scale. */
final class MapPanel {
  private static final double MARGIN = 24;
  private static final double BAR_SHARE = 0.12;

  private final StringBuilder out;
  private final double left;
  private final double bottom;
  private final double scale;
  private final double lowX;
  private final double lowY;

  /**
   * Finds the scale at which all points fit.
   *
   * @param points all that must be seen (m)
   */
  MapPanel(StringBuilder out, double left, double top, double width, double height, Curve points) {
    double[] x = new double[points.size()];
    double[] y = new double[points.size()];
    Arrays.setAll(x, points::x);
    Arrays.setAll(y, points::y);
    this.lowX = Arrays.stream(x).min().orElseThrow();
    this.lowY = Arrays.stream(y).min().orElseThrow();
    double wide = Math.max(1, Arrays.stream(x).max().orElseThrow() - lowX);
    double high = Math.max(1, Arrays.stream(y).max().orElseThrow() - lowY);
    this.out = out;
    this.scale = Math.min((width - 2 * MARGIN) / wide, (height - 2 * MARGIN) / high);
    this.left = left + (width - scale * wide) / 2;
    this.bottom = top + height - (height - scale * high) / 2;
    double bar = Svg.niceStep(BAR_SHARE * width / scale, 1);
    double barY = top + height;
    out.append(Svg.line(left, barY, left + bar * scale, barY, Svg.INK, 2.5));
    out.append(Svg.text(left, barY - 7, "start", Svg.number(bar) + " m"));
  }

  void draw(Curve line, String colour, double lineWidth) {
    double[] x = new double[line.size()];
    double[] y = new double[line.size()];
    for (int i = 0; i < x.length; i++) {
      x[i] = x(line.x(i));
      y[i] = y(line.y(i));
    }
    out.append(Svg.path(Curve.of(x, y), colour, lineWidth));
  }

  /** Draws an arrow head at a place (m) in a direction (rad), with a word. */
  void start(double placeX, double placeY, double direction, String word) {
    out.append(
        Svg.format(
            "<path d=\"M11 0 L-7 7 L-7 -7 Z\" fill=\"%s\""
                + " transform=\"translate(%.1f %.1f) rotate(%.1f)\"/>\n",
            Svg.INK, x(placeX), y(placeY), -Math.toDegrees(direction)));
    out.append(Svg.text(x(placeX) + 12, y(placeY) - 10, "start", word));
  }

  private double x(double metres) {
    return left + scale * (metres - lowX);
  }

  private double y(double metres) {
    return bottom - scale * (metres - lowY);
  }
}
