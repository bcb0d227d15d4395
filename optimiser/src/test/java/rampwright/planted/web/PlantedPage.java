package rampwright.planted.web;

/** Stands for the module above the optimiser. */
public final class PlantedPage {}
