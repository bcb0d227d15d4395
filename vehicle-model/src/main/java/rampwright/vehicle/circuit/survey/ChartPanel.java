package rampwright.vehicle.circuit.survey;

/** One chart over distance: frame, axes with units, and curves. */
final class ChartPanel {
  private static final int STEPS_X = 10;
  private static final int STEPS_Y = 5;

  private final StringBuilder out;
  private final double left;
  private final double top;
  private final double width;
  private final double height;
  private final double length;
  private final double low;
  private final double high;

  /**
   * Draws the frame.
   *
   * @param title name of the quantity with its unit
   * @param length largest distance (m)
   * @param low smallest value that is to be seen
   * @param high largest value that is to be seen
   */
  ChartPanel(
      StringBuilder out,
      double left,
      double top,
      double width,
      double height,
      String title,
      double length,
      double low,
      double high) {
    this.out = out;
    this.left = left;
    this.top = top;
    this.width = width;
    this.height = height;
    this.length = length;
    double step = Svg.niceStep(Math.max(high - low, 1e-6), STEPS_Y);
    this.low = step * Math.floor(low / step);
    this.high = step * Math.ceil(high / step);
    frame(title, step);
  }

  private void frame(String title, double stepY) {
    int lines = (int) Math.round((high - low) / stepY);
    for (int i = 0; i <= lines; i++) {
      double value = low + i * stepY;
      boolean zero = Math.abs(value) < stepY / 2;
      out.append(Svg.line(left, y(value), left + width, y(value), Svg.PALE, zero ? 1.6 : 0.8));
      out.append(Svg.text(left - 6, y(value) + 4, "end", Svg.number(value)));
    }
    double stepX = Svg.niceStep(length, STEPS_X);
    for (double s = 0; s <= length; s += stepX) {
      out.append(Svg.line(x(s), top, x(s), top + height, Svg.PALE, 0.8));
      out.append(Svg.text(x(s), top + height + 16, "middle", Svg.number(s)));
    }
    out.append(Svg.text(left, top - 8, "start", title));
    out.append(Svg.text(left + width, top + height + 32, "end", "distance (m)"));
  }

  /** Draws a curve of values (m, unit of the panel). */
  void draw(Curve curve, String colour, double lineWidth) {
    double[] x = new double[curve.size()];
    double[] y = new double[curve.size()];
    for (int i = 0; i < x.length; i++) {
      x[i] = x(curve.x(i));
      y[i] = y(curve.y(i));
    }
    out.append(Svg.path(Curve.of(x, y), colour, lineWidth));
  }

  private double x(double distance) {
    return left + width * distance / length;
  }

  private double y(double value) {
    return top + height * (high - value) / (high - low);
  }
}
