package rampwright.optimiser.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import rampwright.samples.SampleFile;
import rampwright.samples.SampleFiles;

/** The samples as files of a user's. */
final class Samples {
  private Samples() {}

  /** Copies the samples and returns the event on the slow circuit, solved at few stations. */
  static String coarse(Path folder) throws IOException {
    Path event = copy(folder).resolve("events/kestrelwick.yaml");
    Files.writeString(event, "\nstation_spacing_m: 5\n", StandardOpenOption.APPEND);
    return event.toString();
  }

  /** Copies every sample below a folder and returns the folder. */
  static Path copy(Path folder) throws IOException {
    for (SampleFile sample : SampleFiles.list()) {
      copy(sample.path(), folder);
    }
    return folder;
  }

  /** Copies one file below the samples to the same path below a folder. */
  static void copy(String path, Path folder) throws IOException {
    Path to = folder.resolve(path);
    Files.createDirectories(to.getParent());
    try (InputStream in = SampleFiles.open(path)) {
      Files.copy(in, to, StandardCopyOption.REPLACE_EXISTING);
    }
  }
}
