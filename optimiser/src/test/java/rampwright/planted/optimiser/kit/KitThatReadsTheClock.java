package rampwright.planted.optimiser.kit;

/** Reads a clock on purpose. */
public final class KitThatReadsTheClock {
  final long countedAt = System.nanoTime();
}
