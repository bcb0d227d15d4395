package rampwright.optimiser.search;

import io.jenetics.EliteSelector;
import io.jenetics.Genotype;
import io.jenetics.IntegerChromosome;
import io.jenetics.IntegerGene;
import io.jenetics.Optimize;
import io.jenetics.Phenotype;
import io.jenetics.TournamentSelector;
import io.jenetics.UniformCrossover;
import io.jenetics.engine.Engine;
import io.jenetics.engine.EvolutionResult;
import io.jenetics.util.ISeq;
import io.jenetics.util.RandomRegistry;
import io.jenetics.util.Seq;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.random.RandomGeneratorFactory;
import java.util.stream.Stream;

/**
 * The genetic search over three whole numbers: ring set as fitted, faces per side, preload step. A
 * whole generation is evaluated at once; everything else is done by the calling thread with one
 * random generator, so that the answer depends on the seed alone.
 */
final class GeneticSearch {
  private static final String RANDOM = "L64X128MixRandom";
  private static final int POPULATION = 24;
  private static final int ELITE = 2;
  private static final double CROSSOVER = 0.6;
  private static final double MUTATION = 0.35;

  /** Generations without any new setting after which the population has nothing more to say. */
  private static final int MOST_IDLE_GENERATIONS = 10;

  private final SearchProblem problem;
  private final Candidates candidates;
  private final EvaluationLedger ledger;

  GeneticSearch(SearchProblem problem, Candidates candidates, EvaluationLedger ledger) {
    this.problem = problem;
    this.candidates = candidates;
    this.ledger = ledger;
  }

  /** Runs until so many laws are known, nothing new comes up, or the monitor cancels. */
  void run(long seed, int mostEvaluations) {
    RandomRegistry.using(
        RandomGeneratorFactory.of(RANDOM).create(seed), random -> evolve(mostEvaluations));
  }

  private void evolve(int mostEvaluations) {
    Engine<IntegerGene, Merit> engine =
        new Engine.Builder<IntegerGene, Merit>(this::evaluated, this::randomGenes)
            .populationSize(POPULATION)
            .maximalPhenotypeAge(Long.MAX_VALUE)
            .optimize(Optimize.MINIMUM)
            .survivorsSelector(new EliteSelector<>(ELITE))
            .offspringSelector(new TournamentSelector<>(2))
            .alterers(new UniformCrossover<>(CROSSOVER), new StepMutator(MUTATION))
            .interceptor(EvolutionResult.toUniquePopulation(this::randomGenes))
            .executor(Runnable::run)
            .build();
    List<Genotype<IntegerGene>> first = bestOfStacks().map(this::genes).toList();
    Patience patience = new Patience(mostEvaluations);
    engine.stream(first).limit(patience::goOn).forEach(result -> {});
  }

  /** Returns the best known setting of each of the best stacks. */
  private Stream<Integer> bestOfStacks() {
    Set<Integer> seen = new HashSet<>();
    return ledger.ranked().stream()
        .filter(index -> seen.add(index / problem.space().steps()))
        .limit(POPULATION / 2);
  }

  /** Closes each generation and decides whether there is another. */
  private final class Patience {
    private final int mostEvaluations;
    private int before;
    private int idle;

    Patience(int mostEvaluations) {
      this.mostEvaluations = mostEvaluations;
    }

    boolean goOn(EvolutionResult<IntegerGene, Merit> result) {
      ledger.closeGeneration();
      idle = ledger.used() > before ? 0 : idle + 1;
      before = ledger.used();
      return ledger.open() && before < mostEvaluations && idle < MOST_IDLE_GENERATIONS;
    }
  }

  private ISeq<Phenotype<IntegerGene, Merit>> evaluated(
      Seq<Phenotype<IntegerGene, Merit>> population) {
    ledger.evaluate(population.map(individual -> index(individual.genotype())));
    return population
        .map(
            individual ->
                individual.isEvaluated()
                    ? individual
                    : individual.withFitness(ledger.merit(index(individual.genotype()))))
        .asISeq();
  }

  private Genotype<IntegerGene> randomGenes() {
    SettingSpace space = problem.space();
    return Genotype.of(
        IntegerChromosome.of(0, space.fittings().size()),
        IntegerChromosome.of(0, space.kit().facesPerSide().size()),
        IntegerChromosome.of(0, space.steps()));
  }

  private Genotype<IntegerGene> genes(int index) {
    SettingSpace space = problem.space();
    return Genotype.of(
        chromosome(space.fitting(index), space.fittings().size()),
        chromosome(space.faces(index), space.kit().facesPerSide().size()),
        chromosome(space.step(index), space.steps()));
  }

  private static IntegerChromosome chromosome(int choice, int choices) {
    return IntegerChromosome.of(IntegerGene.of(choice, 0, choices));
  }

  /** Returns the setting of a genotype, repaired to one that may be proposed. */
  private int index(Genotype<IntegerGene> genes) {
    return candidates.repaired(
        problem
            .space()
            .index(
                genes.get(0).gene().allele(),
                genes.get(1).gene().allele(),
                genes.get(2).gene().allele()));
  }
}
