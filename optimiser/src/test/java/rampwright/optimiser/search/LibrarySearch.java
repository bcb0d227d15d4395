package rampwright.optimiser.search;

import io.jenetics.Chromosome;
import io.jenetics.DoubleChromosome;
import io.jenetics.DoubleGene;
import io.jenetics.EliteSelector;
import io.jenetics.Genotype;
import io.jenetics.Mutator;
import io.jenetics.Optimize;
import io.jenetics.Phenotype;
import io.jenetics.Recombinator;
import io.jenetics.TournamentSelector;
import io.jenetics.engine.Engine;
import io.jenetics.engine.EvolutionResult;
import io.jenetics.util.MSeq;
import io.jenetics.util.RandomRegistry;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

/**
 * The search library on published problems over real numbers, with the selectors, the order and the
 * seeding of our own search. The library's simulated binary crossover is left out: in version 7.2.0
 * it spreads the children around half the difference of the parents, not around their mean.
 */
final class LibrarySearch {
  private static final int POPULATION = 100;
  private static final double MUTATION = 0.1;
  private static final double CROSSOVER = 0.6;

  private LibrarySearch() {}

  /**
   * An answer.
   *
   * @param point where it was found
   * @param merit how good it is
   */
  record Found(List<Double> point, Merit merit) {}

  /**
   * Range of one variable.
   *
   * @param from smallest value
   * @param to largest value
   */
  record Range(double from, double to) {
    double at(double share) {
      return from + share * (to - from);
    }
  }

  /**
   * Moves a number between 0 and 1 by a normally distributed step, as often a large as a tiny one.
   */
  static final class ScaleMutator<C extends Comparable<? super C>> extends Mutator<DoubleGene, C> {
    private static final double FINEST = 1e-7;

    ScaleMutator(double probability) {
      super(probability);
    }

    @Override
    protected DoubleGene mutate(DoubleGene gene, RandomGenerator random) {
      double scale = 0.3 * Math.pow(FINEST, random.nextDouble());
      double moved = gene.allele() + scale * random.nextGaussian();
      return gene.newInstance(Math.max(0, Math.min(Math.nextDown(1.0), moved)));
    }
  }

  /**
   * Moves an individual along the difference of two others, so that steps suit the lie of the
   * population: R. Storn, K. Price, <i>Differential evolution</i>, Journal of Global Optimization
   * 11, 1997.
   */
  static final class DifferenceCrossover<C extends Comparable<? super C>>
      extends Recombinator<DoubleGene, C> {
    private static final double PER_GENE = 0.9;

    DifferenceCrossover(double probability) {
      super(probability, 3);
    }

    @Override
    protected int recombine(
        MSeq<Phenotype<DoubleGene, C>> population, int[] individuals, long generation) {
      RandomGenerator random = RandomRegistry.random();
      double factor = random.nextDouble(0.3, 1);
      List<Chromosome<DoubleGene>> parents =
          Arrays.stream(individuals)
              .mapToObj(i -> population.get(i).genotype().chromosome())
              .toList();
      MSeq<DoubleGene> genes = MSeq.of(parents.get(0));
      for (int i = 0; i < genes.length(); i++) {
        double change = parents.get(1).get(i).allele() - parents.get(2).get(i).allele();
        double moved = genes.get(i).allele() + factor * change;
        // a step out of the range leaves the gene as it is
        if (random.nextDouble() < PER_GENE && moved >= 0 && moved < 1) {
          genes.set(i, genes.get(i).newInstance(moved));
        }
      }
      Genotype<DoubleGene> child = Genotype.of(parents.get(0).newInstance(genes.toISeq()));
      population.set(individuals[0], Phenotype.of(child, generation));
      return 1;
    }
  }

  /** Returns the point of a genotype of shares between 0 and 1. */
  static double[] point(Genotype<DoubleGene> genes, List<Range> ranges) {
    double[] x = new double[ranges.size()];
    for (int i = 0; i < x.length; i++) {
      x[i] = ranges.get(i).at(genes.get(0).get(i).allele());
    }
    return x;
  }

  /** Searches over real numbers. */
  static Found minimum(
      List<Range> ranges, Function<double[], Merit> merit, long seed, int generations) {
    Engine<DoubleGene, Merit> engine =
        Engine.builder(
                (Genotype<DoubleGene> genes) -> merit.apply(point(genes, ranges)),
                Genotype.of(DoubleChromosome.of(0, 1, ranges.size())))
            .populationSize(POPULATION)
            .maximalPhenotypeAge(Long.MAX_VALUE)
            .optimize(Optimize.MINIMUM)
            .survivorsSelector(new EliteSelector<>(2))
            .offspringSelector(new TournamentSelector<>(2))
            .alterers(new DifferenceCrossover<>(CROSSOVER), new ScaleMutator<>(MUTATION))
            .executor(Runnable::run)
            .build();
    Phenotype<DoubleGene, Merit> best =
        RandomRegistry.with(
            RandomGeneratorFactory.of("L64X128MixRandom").create(seed),
            random ->
                engine.stream().limit(generations).collect(EvolutionResult.toBestPhenotype()));
    return new Found(
        Arrays.stream(point(best.genotype(), ranges)).boxed().toList(), best.fitness());
  }
}
