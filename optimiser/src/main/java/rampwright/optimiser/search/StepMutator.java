package rampwright.optimiser.search;

import io.jenetics.IntegerGene;
import io.jenetics.Mutator;
import java.util.random.RandomGenerator;

/**
 * Changes a whole number: as often to any of its choices as by a few steps, so that the search both
 * jumps between ring sets and follows the preload.
 */
final class StepMutator extends Mutator<IntegerGene, Merit> {
  /** Share of all choices over which a small change spreads (standard deviation). */
  private static final double SPREAD = 0.1;

  StepMutator(double probability) {
    super(probability);
  }

  @Override
  protected IntegerGene mutate(IntegerGene gene, RandomGenerator random) {
    int choices = gene.max() - gene.min();
    if (random.nextBoolean()) {
      return gene.newInstance(gene.min() + random.nextInt(choices));
    }
    double change = random.nextGaussian() * SPREAD * choices;
    int step = (int) (Math.signum(change) * Math.ceil(Math.abs(change)));
    int moved = Math.max(gene.min(), Math.min(gene.max() - 1, gene.allele() + step));
    return gene.newInstance(moved);
  }
}
