package rampwright.planted.vehicle.circuit;

import rampwright.planted.vehicle.tyre.TyreThatKnowsTheOptimiser;

/** Lets the road know a part of the car on purpose. */
public final class CircuitThatKnowsATyre {
  TyreThatKnowsTheOptimiser tyre() {
    return new TyreThatKnowsTheOptimiser();
  }
}
