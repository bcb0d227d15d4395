package rampwright.optimiser.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import rampwright.vehicle.input.InvalidInput;

/** Files that a user names. */
final class UserFile {
  private UserFile() {}

  /**
   * Returns the path of a text.
   *
   * @throws InvalidInput when this system has no such paths
   */
  static Path path(String text) {
    try {
      return Path.of(text);
    } catch (InvalidPathException e) {
      throw InvalidInput.of("file", text, "a path of this system", "");
    }
  }

  /** Writes a file as a whole: what stood there before stays until the new content is complete. */
  static void write(Path file, byte[] content) throws IOException {
    Path folder = file.toAbsolutePath().getParent();
    Files.createDirectories(folder);
    // no temporary file of the system's: those are readable for their owner only
    Path part = folder.resolve("." + file.getFileName() + ".part");
    try {
      Files.write(part, content);
      Files.move(part, file, StandardCopyOption.REPLACE_EXISTING);
    } finally {
      Files.deleteIfExists(part);
    }
  }
}
