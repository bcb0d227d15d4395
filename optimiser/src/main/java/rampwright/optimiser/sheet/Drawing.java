package rampwright.optimiser.sheet;

import java.util.Locale;

/** A line drawing as SVG, in millimetres, x to the right and y down; black, white and grey. */
final class Drawing {
  static final String OUTLINE = "fill='none' stroke='#000' stroke-width='0.3'";
  static final String PART = "fill='#fff' stroke='#000' stroke-width='0.3'";
  static final String DARK = "fill='#333' stroke='#000' stroke-width='0.2'";
  static final String HAIR = "fill='none' stroke='#000' stroke-width='0.15'";
  static final String CHAIN =
      "fill='none' stroke='#000' stroke-width='0.15' stroke-dasharray='3,0.8,0.5,0.8'";

  private final double width;
  private final double height;
  private final StringBuilder body = new StringBuilder();

  Drawing(double width, double height) {
    this.width = width;
    this.height = height;
  }

  /** Adds a rectangle. */
  void box(double x, double y, double w, double h, String style) {
    body.append(
        format("<rect x='%.2f' y='%.2f' width='%.2f' height='%.2f' ", x, y, w, h) + style + "/>");
  }

  /** Adds a rectangle of a cut part: outlined and hatched. */
  void cut(double x, double y, double w, double h) {
    box(x, y, w, h, PART);
    double pitch = 1.6;
    for (double c = x - y - h + pitch / 2; c < x + w - y; c += pitch) {
      // the line px - py = c, kept inside the rectangle
      double left = Math.max(x, c + y);
      double right = Math.min(x + w, c + y + h);
      if (right > left) {
        line(left, left - c, right, right - c, HAIR);
      }
    }
  }

  /** Adds a straight line. */
  void line(double x1, double y1, double x2, double y2, String style) {
    body.append(
        format("<line x1='%.2f' y1='%.2f' x2='%.2f' y2='%.2f' ", x1, y1, x2, y2) + style + "/>");
  }

  /** Adds a circle. */
  void circle(double x, double y, double r, String style) {
    body.append(format("<circle cx='%.2f' cy='%.2f' r='%.2f' ", x, y, r) + style + "/>");
  }

  /** Adds a closed polygon of alternating x and y. */
  void polygon(String style, double... points) {
    body.append("<polygon points='");
    for (int i = 0; i < points.length; i += 2) {
      body.append(format("%.2f,%.2f ", points[i], points[i + 1]));
    }
    body.append("' ").append(style).append("/>");
  }

  /** Adds words; {@code anchor} is start, middle or end. */
  void words(double x, double y, double size, String anchor, boolean bold, String words) {
    body.append(
        format("<text x='%.2f' y='%.2f' font-size='%.2f' font-family='DejaVu Sans' ", x, y, size)
            + "text-anchor='"
            + anchor
            + "'"
            + (bold ? " font-weight='bold'" : "")
            + ">"
            + Markup.escaped(words)
            + "</text>");
  }

  /** Returns the element, as large as it was drawn times a scale. */
  String svg(double scale) {
    return format("<svg xmlns='http://www.w3.org/2000/svg' viewBox='0 0 %.1f %.1f' ", width, height)
        + format("style='width:%.1fmm;height:%.1fmm'>", scale * width, scale * height)
        + body
        + "</svg>";
  }

  private static String format(String form, Object... values) {
    return String.format(Locale.ROOT, form, values);
  }
}
