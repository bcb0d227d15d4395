package rampwright.planted.vehicle.differential;

import rampwright.planted.vehicle.tyre.TyreThatKnowsTheOptimiser;

/** Breaks the direction between the parts of a car on purpose. */
public final class DifferentialThatKnowsATyre {
  TyreThatKnowsTheOptimiser tyre() {
    return new TyreThatKnowsTheOptimiser();
  }
}
