package rampwright.optimiser.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Collections;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.optimiser.search.LibraryFront.Point;
import rampwright.optimiser.search.LibrarySearch.Range;

/**
 * The search library's sorting by dominance on published problems of two objectives: E. Zitzler, K.
 * Deb, L. Thiele 2000 (ZDT); N. Srinivas, K. Deb 1994 (SRN); T. Binh, U. Korn 1997 (BNH), the
 * formulas of the last two from memory. Fronts and areas follow from the formulas.
 */
@Tag("validation")
class PublishedFrontsTest {
  private static final Point REFERENCE = new Point(1.1, 1.1);
  private static final double FORBIDDEN = 1e6;

  private static double sumOfTail(double[] x) {
    return 1 + 9.0 / 29 * IntStream.range(1, 30).mapToDouble(i -> x[i]).sum();
  }

  private static List<Point> zdt(Function<double[], Point> objectives, int generations) {
    return LibraryFront.front(Collections.nCopies(30, new Range(0, 1)), objectives, 1, generations);
  }

  @Test
  void theConvexFrontIsCovered() {
    List<Point> front =
        zdt(
            x -> {
              double g = sumOfTail(x);
              return new Point(x[0], g * (1 - Math.sqrt(x[0] / g)));
            },
            300);
    // 1.1 * 1.1 less the area under 1 - sqrt(f1): 0.876667; a hundred points cover a little less
    double area = LibraryFront.area(front, REFERENCE);
    assertThat(area).isBetween(0.876667 * 0.97, 0.876667);
  }

  @Test
  void theConcaveFrontIsCovered() {
    List<Point> front =
        zdt(
            x -> {
              double g = sumOfTail(x);
              return new Point(x[0], g * (1 - Math.pow(x[0] / g, 2)));
            },
            300);
    double area = LibraryFront.area(front, REFERENCE);
    assertThat(area).isBetween(0.543333 * 0.95, 0.543333);
  }

  /** A curve as many points. */
  private static List<Point> sampled(double from, double to, DoubleFunction<Point> at) {
    int points = 20_000;
    return IntStream.rangeClosed(0, points)
        .mapToObj(i -> at.apply(from + (to - from) * i / points))
        .toList();
  }

  private static Point srinivas(double a, double b) {
    return new Point(2 + Math.pow(a - 2, 2) + Math.pow(b - 1, 2), 9 * a - Math.pow(b - 1, 2));
  }

  private static double srinivasViolation(double a, double b) {
    return Math.max(0, a * a + b * b - 225) + Math.max(0, a - 3 * b + 10);
  }

  /** The front has parts on circle and line beside the one that is usually quoted: a fine grid. */
  private static List<Point> srinivasGrid() {
    int steps = 800;
    return IntStream.range(0, (steps + 1) * (steps + 1))
        .mapToObj(i -> new double[] {i / (steps + 1) * 0.05 - 20, i % (steps + 1) * 0.05 - 20})
        .filter(x -> srinivasViolation(x[0], x[1]) == 0)
        .map(x -> srinivas(x[0], x[1]))
        .toList();
  }

  @Test
  void theFrontBetweenACircleAndALineIsCovered() {
    List<Point> front =
        LibraryFront.front(
            Collections.nCopies(2, new Range(-20, 20)),
            x -> {
              double violation = srinivasViolation(x[0], x[1]);
              double bad = FORBIDDEN + violation;
              return violation > 0 ? new Point(bad, bad) : srinivas(x[0], x[1]);
            },
            1,
            200);
    Point reference = new Point(300, 50);
    assertThat(front).allMatch(point -> point.first() < FORBIDDEN);
    double covered = LibraryFront.area(front, reference);
    double grid = LibraryFront.area(srinivasGrid(), reference);
    assertThat(covered).isBetween(0.97 * grid, 1.005 * grid);
    // the quoted part, a = -2.5 and b from the line to the circle, covers less than all parts
    double circle = Math.sqrt(225 - 2.5 * 2.5);
    double quoted = LibraryFront.area(sampled(2.5, circle, b -> srinivas(-2.5, b)), reference);
    assertThat(quoted).isBetween(0.97 * grid, grid);
  }

  private static Point binh(double a, double b) {
    return new Point(4 * a * a + 4 * b * b, Math.pow(a - 5, 2) + Math.pow(b - 5, 2));
  }

  @Test
  void theFrontWithAKinkIsCovered() {
    List<Point> front =
        LibraryFront.front(
            List.of(new Range(0, 5), new Range(0, 3)),
            x -> {
              double violation =
                  Math.max(0, Math.pow(x[0] - 5, 2) + x[1] * x[1] - 25)
                      + Math.max(0, 7.7 - Math.pow(x[0] - 8, 2) - Math.pow(x[1] + 3, 2));
              double bad = FORBIDDEN + violation;
              return violation > 0 ? new Point(bad, bad) : binh(x[0], x[1]);
            },
            1,
            200);
    Point reference = new Point(150, 55);
    double published = LibraryFront.area(sampled(0, 5, a -> binh(a, Math.min(a, 3))), reference);
    assertThat(LibraryFront.area(front, reference)).isBetween(0.97 * published, published * 1.001);
  }

  @Test
  void theAreaOfTwoPointsIsThatOfTheirRectangles() {
    List<Point> front = List.of(new Point(0.5, 0.2), new Point(0.2, 0.6), new Point(2, 0));
    assertThat(LibraryFront.area(front, new Point(1, 1))).isCloseTo(0.52, within(1e-12));
  }
}
