package rampwright.optimiser.search;

import io.jenetics.DoubleChromosome;
import io.jenetics.DoubleGene;
import io.jenetics.Genotype;
import io.jenetics.Optimize;
import io.jenetics.Phenotype;
import io.jenetics.UniformCrossover;
import io.jenetics.engine.Engine;
import io.jenetics.engine.EvolutionResult;
import io.jenetics.ext.moea.MOEA;
import io.jenetics.ext.moea.NSGA2Selector;
import io.jenetics.ext.moea.UFTournamentSelector;
import io.jenetics.ext.moea.Vec;
import io.jenetics.util.ISeq;
import io.jenetics.util.IntRange;
import io.jenetics.util.RandomRegistry;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Function;
import java.util.random.RandomGeneratorFactory;
import rampwright.optimiser.search.LibrarySearch.DifferenceCrossover;
import rampwright.optimiser.search.LibrarySearch.Range;
import rampwright.optimiser.search.LibrarySearch.ScaleMutator;

/** The search library on published problems of two objectives, both to become small. */
final class LibraryFront {
  private static final int POPULATION = 100;

  private LibraryFront() {}

  /**
   * One point of a front.
   *
   * @param first first objective
   * @param second second objective
   */
  record Point(double first, double second) {}

  /**
   * Searches for the front. A point that breaks constraints is given objectives that every allowed
   * point beats, the larger the more it breaks them.
   */
  static List<Point> front(
      List<Range> ranges, Function<double[], Point> objectives, long seed, int generations) {
    Engine<DoubleGene, Vec<double[]>> engine =
        Engine.builder(
                (Genotype<DoubleGene> genes) -> {
                  Point point = objectives.apply(LibrarySearch.point(genes, ranges));
                  return Vec.of(point.first(), point.second());
                },
                Genotype.of(DoubleChromosome.of(0, 1, ranges.size())))
            .populationSize(POPULATION)
            .offspringFraction(0.5)
            .maximalPhenotypeAge(Long.MAX_VALUE)
            .optimize(Optimize.MINIMUM)
            .survivorsSelector(NSGA2Selector.ofVec())
            .offspringSelector(UFTournamentSelector.ofVec())
            .alterers(
                new UniformCrossover<>(0.5),
                new DifferenceCrossover<>(0.2),
                new ScaleMutator<>(1.5 / ranges.size()))
            .interceptor(EvolutionResult.toUniquePopulation())
            .executor(Runnable::run)
            .build();
    ISeq<Phenotype<DoubleGene, Vec<double[]>>> front =
        RandomRegistry.with(
            RandomGeneratorFactory.of("L64X128MixRandom").create(seed),
            random ->
                engine.stream()
                    .limit(generations)
                    .collect(MOEA.toParetoSet(IntRange.of(POPULATION, 2 * POPULATION))));
    return front.stream()
        .map(p -> new Point(p.fitness().data()[0], p.fitness().data()[1]))
        .toList();
  }

  /** Returns the area that a front covers up to a reference point. */
  static double area(List<Point> front, Point reference) {
    List<Point> sorted = new ArrayList<>(front);
    sorted.removeIf(p -> p.first() > reference.first() || p.second() > reference.second());
    sorted.sort(Comparator.comparingDouble(Point::first));
    double area = 0;
    double height = reference.second();
    for (Point point : sorted) {
      if (point.second() < height) {
        area += (reference.first() - point.first()) * (height - point.second());
        height = point.second();
      }
    }
    return area;
  }
}
