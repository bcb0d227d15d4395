package rampwright.planted.optimiser.search;

import java.util.Random;

/** Draws from an unseeded generator on purpose. */
public final class SearchWithoutSeed {
  final double draw = new Random().nextDouble();
}
