package rampwright.optimiser.sheet;

import java.util.List;
import rampwright.optimiser.sheet.PlateStack.Plate;

/**
 * Half section of one side of the unit: cross pin, pressure ring, plates in their order, shim, disc
 * spring and cover. Plates that turn with the case are white and reach out to it; those that turn
 * with the side gear are dark and reach in to its hub. Only the order is to scale.
 */
final class StackDrawing {
  private static final double WIDTH = 122;
  private static final double HEIGHT = 48;
  private static final double CASE = 8;
  private static final double HUB = 31;
  private static final double AXIS = 45.5;
  private static final double MARKS = 39.4;
  private static final double FIRST = 27;
  private static final double LAST = 82;
  private static final double WIDEST_PLATE = 5;

  /** Above this number of plates only every fifth is numbered. */
  private static final int MOST_NUMBERED = 24;

  private final Drawing drawing = new Drawing(WIDTH, HEIGHT);

  private StackDrawing() {}

  /** Returns the drawing as SVG. */
  static String of(PlateStack stack, double scale) {
    StackDrawing drawing = new StackDrawing();
    double end = drawing.plates(stack.plates());
    drawing.row(end, 38, "plate");
    drawing.row(end, MARKS + 1.8, "friction face, " + stack.faces() + " on each side");
    drawing.innerParts();
    drawing.outerParts(end);
    return drawing.drawing.svg(scale);
  }

  private void row(double end, double y, String words) {
    drawing.words(end + 2.5, y, 2.3, "start", false, words);
  }

  private void innerParts() {
    drawing.box(4, 11, 5, 32, Drawing.PART);
    drawing.cut(9, 10, FIRST - 9, 19);
    drawing.line(6.5, 2, 6.5, 47, Drawing.CHAIN);
    drawing.words(6.5, 7, 2.3, "middle", false, "cross pin");
    drawing.box(10.5, 17.4, 15, 3.6, "fill='#fff' stroke='none'");
    drawing.words(18, 20.1, 2.3, "middle", false, "press. ring");
  }

  /** Draws the plates and returns where they end (mm). */
  private double plates(List<Plate> plates) {
    int count = plates.size();
    double pitch = Math.min(WIDEST_PLATE, (LAST - FIRST) / count);
    for (int i = 0; i < count; i++) {
      double x = FIRST + i * pitch;
      boolean outer = plates.get(i) == Plate.CASE;
      double top = outer ? CASE : CASE + 2.5;
      double bottom = outer ? HUB - 2.5 : HUB;
      drawing.box(
          x + 0.06 * pitch, top, 0.88 * pitch, bottom - top, outer ? Drawing.PART : Drawing.DARK);
      if (count <= MOST_NUMBERED || i == 0 || (i + 1) % 5 == 0) {
        drawing.words(x + pitch / 2, 38, 2.3, "middle", false, Integer.toString(i + 1));
      }
      if (i > 0 && plates.get(i) != plates.get(i - 1)) {
        face(x);
      }
    }
    return FIRST + count * pitch;
  }

  /** Marks a friction face. */
  private void face(double x) {
    drawing.polygon("fill='#000'", x - 0.8, MARKS + 1.6, x + 0.8, MARKS + 1.6, x, MARKS);
  }

  private void outerParts(double end) {
    double shim = end + 0.3;
    double spring = shim + 1.4;
    double cover = spring + 4.6;
    drawing.box(shim, CASE + 1, 1, HUB - CASE - 3, "fill='#000'");
    drawing.polygon(
        Drawing.PART, spring, 10, spring + 1.2, 9.6, cover, HUB - 3.4, cover - 1.2, HUB - 3);
    drawing.cut(cover, 4, 5, HUB - 4);
    drawing.cut(2, 4, cover - 2, CASE - 4);
    drawing.box(FIRST, HUB, cover + 8 - FIRST, 4, Drawing.PART);
    drawing.words((FIRST + cover) / 2, HUB + 3, 2.3, "middle", false, "hub of the side gear");
    drawing.line(0, AXIS, cover + 10, AXIS, Drawing.CHAIN);
    labels(shim, spring, cover);
  }

  private void labels(double shim, double spring, double cover) {
    double x = cover + 7;
    label(x, 8, cover + 3, 6, "case and cover");
    label(x, 15, spring + 3.4, 18, "disc spring");
    label(x, 22, shim + 0.5, 25, "shim");
    drawing.words((FIRST + shim) / 2, 2.6, 2.3, "middle", false, "pressure ring → cover");
  }

  private void label(double x, double y, double toX, double toY, String words) {
    drawing.line(x - 0.5, y - 0.8, toX, toY, Drawing.HAIR);
    drawing.circle(toX, toY, 0.35, "fill='#000'");
    drawing.words(x, y, 2.3, "start", false, words);
  }
}
