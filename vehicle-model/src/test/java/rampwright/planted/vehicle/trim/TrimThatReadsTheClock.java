package rampwright.planted.vehicle.trim;

import java.time.Instant;

/** Reads the time of day on purpose. */
public final class TrimThatReadsTheClock {
  final Instant solvedAt = Instant.now();
}
