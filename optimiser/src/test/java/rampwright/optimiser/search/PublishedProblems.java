package rampwright.optimiser.search;

import static java.lang.Math.PI;
import static java.lang.Math.cos;
import static java.lang.Math.exp;
import static java.lang.Math.pow;
import static java.lang.Math.sin;
import static java.lang.Math.sqrt;

import java.util.Collections;
import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import rampwright.optimiser.search.LibrarySearch.Range;

/**
 * Problems of design optimisation and test functions of the literature. The optima of the
 * constrained ones stand digit for digit in many public transcriptions that cite the publication;
 * each is recomputed at its published point.
 */
final class PublishedProblems {
  private PublishedProblems() {}

  /** E. Sandgren 1990, B. Kannan, S. Kramer 1994; optimum proven by X.-S. Yang et al. 2013. */
  static PublishedProblem pressureVessel() {
    return new PublishedProblem(
        "pressure vessel with plates in steps of 1/16 inch",
        List.of(new Range(0, 99), new Range(0, 99), new Range(10, 200), new Range(10, 200)),
        x -> {
          double shell = plate(x[0]);
          double head = plate(x[1]);
          return 0.6224 * shell * x[2] * x[3]
              + 1.7781 * head * x[2] * x[2]
              + 3.1661 * shell * shell * x[3]
              + 19.84 * shell * shell * x[2];
        },
        List.of(
            x -> 0.0193 * x[2] - plate(x[0]),
            x -> 0.00954 * x[2] - plate(x[1]),
            x -> 1 - (PI * x[2] * x[2] * x[3] + 4.0 / 3.0 * PI * pow(x[2], 3)) / 1_296_000,
            x -> x[3] - 240),
        6059.714335048,
        5e-9,
        List.of(12.0, 6.0, 42.0984455958549, 176.6365958424394),
        1e-4);
  }

  /** Thickness (inch) of the plate that a share of the range stands for: 1/16 to 99/16. */
  private static double plate(double x) {
    return 0.0625 * Math.min(99, 1 + Math.floor(x));
  }

  /** C. A. Coello Coello 2000, seven constraints. */
  static PublishedProblem weldedBeam() {
    double load = 6000;
    double length = 14;
    double elasticity = 30e6;
    double shear = 12e6;
    return new PublishedProblem(
        "welded beam, seven constraints",
        List.of(new Range(0.1, 2), new Range(0.1, 10), new Range(0.1, 10), new Range(0.1, 2)),
        x -> 1.10471 * x[0] * x[0] * x[1] + 0.04811 * x[2] * x[3] * (14 + x[1]),
        List.of(
            x -> weldStress(x, load, length) / 13_600 - 1,
            x -> 6 * load * length / (x[3] * x[2] * x[2]) / 30_000 - 1,
            x -> x[0] - x[3],
            x -> 0.10471 * x[0] * x[0] + 0.04811 * x[2] * x[3] * (14 + x[1]) - 5,
            x -> 0.125 - x[0],
            x -> 4 * load * pow(length, 3) / (elasticity * pow(x[2], 3) * x[3]) / 0.25 - 1,
            x ->
                1
                    - 4.013
                        * elasticity
                        * sqrt(x[2] * x[2] * pow(x[3], 6) / 36)
                        / (length * length)
                        * (1 - x[2] / (2 * length) * sqrt(elasticity / (4 * shear)))
                        / load),
        1.724852,
        5e-6, // the published point has six digits, which moves the value by 4e-6
        List.of(0.205730, 3.470489, 9.036624, 0.205730),
        1e-3);
  }

  private static double weldStress(double[] x, double load, double length) {
    double direct = load / (sqrt(2) * x[0] * x[1]);
    double moment = load * (length + x[1] / 2);
    double half = (x[0] + x[2]) / 2;
    double radius = sqrt(x[1] * x[1] / 4 + half * half);
    double polar = 2 * sqrt(2) * x[0] * x[1] * (x[1] * x[1] / 12 + half * half);
    double bending = moment * radius / polar;
    return sqrt(direct * direct + direct * bending * x[1] / radius + bending * bending);
  }

  /** A. D. Belegundu 1982. */
  static PublishedProblem tensionSpring() {
    return new PublishedProblem(
        "tension spring",
        List.of(new Range(0.05, 2), new Range(0.25, 1.3), new Range(2, 15)),
        x -> (x[2] + 2) * x[1] * x[0] * x[0],
        List.of(
            x -> 1 - pow(x[1], 3) * x[2] / (71_785 * pow(x[0], 4)),
            x ->
                (4 * x[1] * x[1] - x[0] * x[1]) / (12_566 * (x[1] * pow(x[0], 3) - pow(x[0], 4)))
                    + 1 / (5108 * x[0] * x[0])
                    - 1,
            x -> 1 - 140.45 * x[0] / (x[1] * x[1] * x[2]),
            x -> (x[0] + x[1]) / 1.5 - 1),
        0.012665233,
        2e-8, // the published point has seven digits
        List.of(0.0516891, 0.3567177, 11.288966),
        1e-3);
  }

  /** The three-bar truss; closed form of the point. */
  static PublishedProblem threeBarTruss() {
    return new PublishedProblem(
        "three-bar truss",
        List.of(new Range(1e-6, 1), new Range(1e-6, 1)),
        x -> 100 * (2 * sqrt(2) * x[0] + x[1]),
        List.of(
            x -> 2 * (sqrt(2) * x[0] + x[1]) / (sqrt(2) * x[0] * x[0] + 2 * x[0] * x[1]) - 2,
            x -> 2 * x[1] / (sqrt(2) * x[0] * x[0] + 2 * x[0] * x[1]) - 2,
            x -> 2 / (sqrt(2) * x[1] + x[0]) - 2),
        263.8958434,
        5e-8,
        List.of((3 + sqrt(3)) / 6, 1 / sqrt(6)),
        1e-5);
  }

  /** C. Fleury, V. Braibant 1986; closed form by Lagrange's method. */
  static PublishedProblem cantilever() {
    return new PublishedProblem(
        "stepped cantilever",
        Collections.nCopies(5, new Range(0.01, 20)),
        x -> 0.0624 * IntStream.range(0, 5).mapToDouble(i -> x[i]).sum(),
        List.of(
            x ->
                61 / pow(x[0], 3)
                    + 37 / pow(x[1], 3)
                    + 19 / pow(x[2], 3)
                    + 7 / pow(x[3], 3)
                    + 1 / pow(x[4], 3)
                    - 1),
        1.339956367,
        1e-6, // the published point has six digits
        List.of(6.01602, 5.30917, 4.49433, 3.50148, 2.15267),
        1e-3);
  }

  /** Problem g06 of the CEC 2006 session on constrained optimisation; optimum from memory. */
  static PublishedProblem narrowCrescent() {
    return new PublishedProblem(
        "g06, a narrow crescent",
        List.of(new Range(13, 100), new Range(0, 100)),
        x -> pow(x[0] - 10, 3) + pow(x[1] - 20, 3),
        List.of(
            x -> 100 - pow(x[0] - 5, 2) - pow(x[1] - 5, 2),
            x -> pow(x[0] - 6, 2) + pow(x[1] - 5, 2) - 82.81),
        -6961.81388,
        0.1, // the published point has five digits and the slope there is above 1000
        List.of(14.095, 0.84296),
        1e-3);
  }

  /** Problem g08 of the same session; optimum from memory. */
  static PublishedProblem manyPeaks() {
    return new PublishedProblem(
        "g08, many peaks",
        List.of(new Range(1e-6, 10), new Range(1e-6, 10)),
        x -> -pow(sin(2 * PI * x[0]), 3) * sin(2 * PI * x[1]) / (pow(x[0], 3) * (x[0] + x[1])),
        List.of(x -> x[0] * x[0] - x[1] + 1, x -> 1 - x[0] + pow(x[1] - 4, 2)),
        -0.0958250414,
        5e-11,
        List.of(1.2279713, 4.2453733),
        1e-6);
  }

  static PublishedProblem sphere() {
    return free(
        "sphere",
        Collections.nCopies(10, new Range(-5.12, 5.12)),
        x -> IntStream.range(0, x.length).mapToDouble(i -> x[i] * x[i]).sum(),
        Collections.nCopies(10, 0.0),
        1e-6);
  }

  static PublishedProblem rosenbrock() {
    return free(
        "Rosenbrock",
        Collections.nCopies(2, new Range(-2.048, 2.048)),
        x -> 100 * pow(x[1] - x[0] * x[0], 2) + pow(1 - x[0], 2),
        List.of(1.0, 1.0),
        1e-6);
  }

  static PublishedProblem rastrigin() {
    return free(
        "Rastrigin",
        Collections.nCopies(5, new Range(-5.12, 5.12)),
        x ->
            IntStream.range(0, x.length)
                .mapToDouble(i -> 10 + x[i] * x[i] - 10 * cos(2 * PI * x[i]))
                .sum(),
        Collections.nCopies(5, 0.0),
        1e-6);
  }

  static PublishedProblem ackley() {
    return free(
        "Ackley",
        Collections.nCopies(5, new Range(-32, 32)),
        x -> {
          double squares = IntStream.range(0, x.length).mapToDouble(i -> x[i] * x[i]).sum();
          double waves = IntStream.range(0, x.length).mapToDouble(i -> cos(2 * PI * x[i])).sum();
          return 20 + Math.E - 20 * exp(-0.2 * sqrt(squares / x.length)) - exp(waves / x.length);
        },
        Collections.nCopies(5, 0.0),
        1e-6);
  }

  /** One of four equal minima. */
  static PublishedProblem himmelblau() {
    return free(
        "Himmelblau",
        Collections.nCopies(2, new Range(-5, 5)),
        x -> pow(x[0] * x[0] + x[1] - 11, 2) + pow(x[0] + x[1] * x[1] - 7, 2),
        List.of(3.0, 2.0),
        1e-6);
  }

  static PublishedProblem branin() {
    return new PublishedProblem(
        "Branin",
        List.of(new Range(-5, 10), new Range(0, 15)),
        x ->
            pow(x[1] - 5.1 / (4 * PI * PI) * x[0] * x[0] + 5 / PI * x[0] - 6, 2)
                + 10 * (1 - 1 / (8 * PI)) * cos(x[0])
                + 10,
        List.of(),
        0.397887,
        5e-7,
        List.of(PI, 2.275),
        1e-5);
  }

  static PublishedProblem goldsteinPrice() {
    return new PublishedProblem(
        "Goldstein-Price",
        Collections.nCopies(2, new Range(-2, 2)),
        x -> goldsteinPrice(x[0], x[1]),
        List.of(),
        3,
        1e-12,
        List.of(0.0, -1.0),
        1e-6);
  }

  private static double goldsteinPrice(double a, double b) {
    double first =
        1 + pow(a + b + 1, 2) * (19 - 14 * a + 3 * a * a - 14 * b + 6 * a * b + 3 * b * b);
    double second =
        30 + pow(2 * a - 3 * b, 2) * (18 - 32 * a + 12 * a * a + 48 * b - 36 * a * b + 27 * b * b);
    return first * second;
  }

  private static PublishedProblem free(
      String name,
      List<Range> ranges,
      ToDoubleFunction<double[]> objective,
      List<Double> at,
      double reach) {
    return new PublishedProblem(name, ranges, objective, List.of(), 0, 1e-14, at, reach);
  }

  static List<PublishedProblem> all() {
    return List.of(
        pressureVessel(),
        weldedBeam(),
        tensionSpring(),
        threeBarTruss(),
        cantilever(),
        narrowCrescent(),
        manyPeaks(),
        sphere(),
        rosenbrock(),
        rastrigin(),
        ackley(),
        himmelblau(),
        branin(),
        goldsteinPrice());
  }
}
