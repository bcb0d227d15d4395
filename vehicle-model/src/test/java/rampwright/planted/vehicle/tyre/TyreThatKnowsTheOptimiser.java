package rampwright.planted.vehicle.tyre;

import rampwright.planted.optimiser.PlantedOptimiser;

/** Breaks the direction between the modules on purpose. */
public final class TyreThatKnowsTheOptimiser {
  final PlantedOptimiser optimiser = new PlantedOptimiser();
}
