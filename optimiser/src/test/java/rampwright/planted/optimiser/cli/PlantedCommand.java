package rampwright.planted.optimiser.cli;

/** Stands for the command line. */
public final class PlantedCommand {}
