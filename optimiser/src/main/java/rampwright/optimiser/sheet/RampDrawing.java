package rampwright.optimiser.sheet;

import rampwright.vehicle.differential.PlateBuild;

/**
 * The two pressure rings around one cross pin, looked at from outside towards the axle. Rings and
 * case turn upwards when the car drives forwards: the flanks below the pin push it on power, those
 * above it on overrun. Angles between flank and plane of rotation (vertical here) are to scale.
 */
final class RampDrawing {
  private static final double WIDTH = 64;
  private static final double HEIGHT = 46;
  private static final double CX = 23;
  private static final double CY = 23;
  private static final double PIN = 7.5;
  private static final double GAP = 2.2;
  private static final double RING = 22;
  private static final double REACH = 17;

  private final Drawing drawing = new Drawing(WIDTH, HEIGHT);

  private RampDrawing() {}

  /** Returns the drawing as SVG. */
  static String of(PlateBuild build, double scale) {
    RampDrawing ramps = new RampDrawing();
    ramps.ring(build, -1);
    ramps.ring(build, 1);
    ramps.drawing.circle(CX, CY, PIN, Drawing.PART);
    ramps.drawing.words(CX, CY + 0.8, 2.3, "middle", false, "pin");
    ramps.labels(build);
    return ramps.drawing.svg(scale);
  }

  /** Draws one ring; {@code side} is -1 for the left one and 1 for the right one. */
  private void ring(PlateBuild build, int side) {
    double drive = build.driveAngle();
    double coast = build.coastAngle();
    double floor = Math.min(PIN + 1, crossing(drive, coast));
    double outer = CX + side * RING;
    double edge = CX + side * GAP;
    double bottom = CX + side * floor;
    drawing.polygon(
        "fill='#ddd' stroke='#000' stroke-width='0.3'",
        outer,
        CY - REACH - 2,
        edge,
        CY - REACH - 2,
        edge,
        CY - height(coast, GAP),
        bottom,
        CY - height(coast, floor),
        bottom,
        CY + height(drive, floor),
        edge,
        CY + height(drive, GAP),
        edge,
        CY + REACH + 2,
        outer,
        CY + REACH + 2);
  }

  /** Height (mm) of a flank that touches the pin, at a distance from the pin's middle. */
  private static double height(double angle, double distance) {
    double height = (PIN - distance * Math.cos(angle)) / Math.sin(angle);
    return Math.min(REACH, height);
  }

  /** Distance (mm) from the pin's middle at which the two flanks would meet. */
  private static double crossing(double drive, double coast) {
    // heights of both flanks add up to zero: PIN (1/sin d + 1/sin c) = x (cot d + cot c)
    double across = 1 / Math.sin(drive) + 1 / Math.sin(coast);
    double slope = 1 / Math.tan(drive) + 1 / Math.tan(coast);
    return slope > 1e-9 ? PIN * across / slope : Double.POSITIVE_INFINITY;
  }

  private void labels(PlateBuild build) {
    double left = CX - RING + 1;
    drawing.words(left, CY - 15, 2.5, "start", true, "COAST");
    drawing.words(left, CY - 11.5, 2.5, "start", true, Shown.degrees(build.coastAngle()));
    drawing.words(left, CY + 14, 2.5, "start", true, "DRIVE");
    drawing.words(left, CY + 17.5, 2.5, "start", true, Shown.degrees(build.driveAngle()));
    double x = CX + RING + 4;
    drawing.line(x, CY + 12, x, CY - 9, "stroke='#000' stroke-width='0.6'");
    drawing.polygon("fill='#000'", x - 1.4, CY - 8.5, x + 1.4, CY - 8.5, x, CY - 13);
    drawing.words(x + 2, CY - 4, 2.3, "start", false, "turns");
    drawing.words(x + 2, CY - 1, 2.3, "start", false, "this way,");
    drawing.words(x + 2, CY + 2, 2.3, "start", false, "car");
    drawing.words(x + 2, CY + 5, 2.3, "start", false, "forwards");
  }
}
