package rampwright.optimiser.event;

import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.input.Quantity;

/**
 * A circuit of the event and how much its lap time counts.
 *
 * @param circuit the line
 * @param weight factor on its lap time in the objective (-)
 */
public record WeightedCircuit(Circuit circuit, double weight) {
  public static final Quantity WEIGHT =
      Quantity.si("weight", "weight of a circuit", "", 0, 1000, "");

  /** Checks the weight. */
  public WeightedCircuit {
    WEIGHT.check(weight);
  }
}
