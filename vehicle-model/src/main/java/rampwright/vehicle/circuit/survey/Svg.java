package rampwright.vehicle.circuit.survey;

import java.util.Locale;

/** Pieces of SVG text. */
final class Svg {
  static final String INK = "#24313a";
  static final String PALE = "#d5dce0";
  static final String FIRST = "#0b6e75";
  static final String SECOND = "#d0692a";

  private Svg() {}

  static String format(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }

  /** Returns text in which no character means markup. */
  static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
  }

  /** Returns a text at a place; {@code anchor} is start, middle or end. */
  static String text(double x, double y, String anchor, String text) {
    return format(
        "<text x=\"%.1f\" y=\"%.1f\" text-anchor=\"%s\">%s</text>\n", x, y, anchor, escaped(text));
  }

  static String line(double x1, double y1, double x2, double y2, String colour, double width) {
    return format(
        "<line x1=\"%.1f\" y1=\"%.1f\" x2=\"%.1f\" y2=\"%.1f\" stroke=\"%s\""
            + " stroke-width=\"%.1f\"/>\n",
        x1, y1, x2, y2, colour, width);
  }

  /** Returns a line through points given in the picture's own units. */
  static String path(Curve points, String colour, double width) {
    StringBuilder path = new StringBuilder("<path d=\"M");
    for (int i = 0; i < points.size(); i++) {
      path.append(format(i == 0 ? "%.1f %.1f" : " %.1f %.1f", points.x(i), points.y(i)));
    }
    return path.append(
            format(
                "\" fill=\"none\" stroke=\"%s\" stroke-width=\"%.1f\" stroke-linejoin=\"round\"/>\n",
                colour, width))
        .toString();
  }

  /** Returns 1, 2 or 5 times a power of ten so that a range holds at most so many steps. */
  static double niceStep(double range, int most) {
    double power = Math.pow(10, Math.floor(Math.log10(range / most)));
    for (double step : new double[] {1, 2, 5}) {
      if (range / (step * power) <= most) {
        return step * power;
      }
    }
    return 10 * power;
  }

  /** Returns a number without needless zeros. */
  static String number(double value) {
    double clean = Math.rint(value * 1e6) / 1e6 + 0.0;
    return clean == Math.rint(clean) ? Long.toString((long) clean) : Double.toString(clean);
  }
}
