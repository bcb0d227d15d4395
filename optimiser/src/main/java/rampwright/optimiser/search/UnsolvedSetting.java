package rampwright.optimiser.search;

import rampwright.optimiser.kit.KitSetting;

/**
 * A setting whose lap could not be computed. It ranks behind all others.
 *
 * @param setting what the crew would fit
 * @param reason why, in words
 */
public record UnsolvedSetting(KitSetting setting, String reason) {}
