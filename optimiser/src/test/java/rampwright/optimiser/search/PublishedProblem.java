package rampwright.optimiser.search;

import java.util.List;
import java.util.function.ToDoubleFunction;
import rampwright.optimiser.search.LibrarySearch.Range;

/**
 * An optimisation problem from the literature with its known optimum.
 *
 * @param name its name and source
 * @param ranges range of each variable
 * @param objective what is to become small
 * @param constraints each is met when it is at most zero
 * @param optimum the published least value
 * @param digits half a unit of the last published digit of the optimum
 * @param at a point where it is reached, as published
 * @param reach largest relative excess over the optimum (absolute where that is zero) that a search
 *     may end with
 */
record PublishedProblem(
    String name,
    List<Range> ranges,
    ToDoubleFunction<double[]> objective,
    List<ToDoubleFunction<double[]>> constraints,
    double optimum,
    double digits,
    List<Double> at,
    double reach) {

  Merit merit(double[] x) {
    double violation = constraints.stream().mapToDouble(g -> Math.max(0, g.applyAsDouble(x))).sum();
    return new Merit(violation, objective.applyAsDouble(x));
  }

  @Override
  public String toString() {
    return name;
  }
}
