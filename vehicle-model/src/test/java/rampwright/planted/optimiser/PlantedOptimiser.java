package rampwright.planted.optimiser;

/** Stands for the module above the vehicle model. */
public final class PlantedOptimiser {}
