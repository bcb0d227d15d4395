package rampwright.web.browser;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** Finds the browser of the machine and says how it is started for a test. */
final class Chromium {
  private static final List<String> NAMES = List.of("chromium", "chromium-browser");

  /**
   * No sandbox because tests may run as root in a container; the others keep it off the network.
   */
  static final List<String> ARGUMENTS =
      List.of(
          "--no-sandbox",
          "--disable-gpu",
          "--disable-quic",
          "--no-first-run",
          "--disable-background-networking",
          "--disable-component-update",
          "--disable-sync");

  private Chromium() {}

  /**
   * The executable on the path.
   *
   * @throws IllegalStateException if there is none: a browser test that is skipped proves nothing
   */
  static Path executable() {
    return Stream.of(System.getenv("PATH").split(File.pathSeparator))
        .flatMap(folder -> NAMES.stream().map(name -> Path.of(folder, name)))
        .filter(Files::isExecutable)
        .findFirst()
        .orElseThrow(
            () ->
                new IllegalStateException(
                    "The browser tests need Chromium on the PATH. Maybe run bash .ci/test,"
                        + " which installs it."));
  }
}
