package rampwright.planted.optimiser.search;

import rampwright.planted.optimiser.cli.PlantedCommand;

/** Knows the command line on purpose. */
public final class SearchThatKnowsTheCommandLine {
  final PlantedCommand command = new PlantedCommand();
}
