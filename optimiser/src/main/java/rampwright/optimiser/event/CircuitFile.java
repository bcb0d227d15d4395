package rampwright.optimiser.event;

import java.io.IOException;
import java.io.InputStream;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.survey.StationCsv;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.input.InvalidInput;

/** The circuits that an event names: CSV with one row per station. */
public final class CircuitFile {
  private CircuitFile() {}

  /**
   * Reads a circuit file.
   *
   * @throws InvalidInput when it is missing, cannot be read or breaks a rule
   */
  public static Circuit read(FileSource source, String path) {
    try (InputStream in = source.open(path)) {
      return StationCsv.read(source.describe(path), in);
    } catch (IOException e) {
      throw FileSource.unreadable(source.describe(path));
    }
  }
}
