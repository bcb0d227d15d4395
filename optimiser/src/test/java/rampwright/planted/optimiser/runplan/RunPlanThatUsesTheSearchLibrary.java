package rampwright.planted.optimiser.runplan;

import io.jenetics.IntegerGene;

/** Uses the search library on purpose. */
public final class RunPlanThatUsesTheSearchLibrary {
  final IntegerGene gene = IntegerGene.of(0, 1);
}
