package rampwright.optimiser.kit;

/**
 * One choice from a parts kit: what the crew fits.
 *
 * @param ringSet name of the ring set
 * @param turned whether it is fitted turned round
 * @param facesPerSide friction faces on each side
 * @param preload whole torque difference at zero cage torque (N·m)
 */
public record KitSetting(String ringSet, boolean turned, int facesPerSide, double preload) {}
