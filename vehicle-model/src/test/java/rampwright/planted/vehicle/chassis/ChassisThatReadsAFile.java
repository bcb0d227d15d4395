package rampwright.planted.vehicle.chassis;

import java.nio.file.Path;

/** Knows a file on purpose. */
public final class ChassisThatReadsAFile {
  final Path file = Path.of("car.yaml");
}
