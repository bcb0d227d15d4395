package rampwright.planted.optimiser.search;

import rampwright.planted.web.PlantedPage;

/** Breaks the direction between the modules on purpose. */
public final class SearchThatKnowsThePage {
  final PlantedPage page = new PlantedPage();
}
