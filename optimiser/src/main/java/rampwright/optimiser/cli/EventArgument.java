package rampwright.optimiser.cli;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import picocli.CommandLine.Parameters;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.EventFile;
import rampwright.optimiser.event.NamedSetting;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.file.Suggestion;
import rampwright.vehicle.input.InvalidInput;

/** The event that a command works on: a file of the user's or one of the samples. */
final class EventArgument {
  private static final String SAMPLE = "sample:";
  private static final String ENDING = ".yaml";

  @Parameters(
      paramLabel = "EVENT.yaml",
      description = {
        "Event file; the paths in it count from its folder.",
        "sample:NAME is a sample, for example sample:velmoor."
      })
  private String event;

  /**
   * Reads the event and every file that it names.
   *
   * @throws InvalidInput when one of them breaks a rule
   */
  Event read() {
    if (event.startsWith(SAMPLE)) {
      ClassLoader loader = SampleFiles.class.getClassLoader();
      FileSource samples = FileSource.classPath(loader, SampleFiles.BASE);
      return EventFile.read(samples, sample(event.substring(SAMPLE.length())));
    }
    Path path = path(event);
    // the source starts where the path does, so that .. in an event may leave its folder
    Path start = Optional.ofNullable(path.getRoot()).orElse(Path.of(""));
    String within = start.relativize(path).toString().replace('\\', '/');
    return EventFile.read(FileSource.folder(start), within);
  }

  /** Returns the settings of the given names, or the current one when there are none. */
  static List<NamedSetting> settings(Event event, List<String> names) {
    return names.isEmpty()
        ? List.of(event.current())
        : names.stream().distinct().map(event::setting).toList();
  }

  private static String sample(String name) {
    Map<String, String> samples = new LinkedHashMap<>();
    SampleFiles.list("event").forEach(e -> samples.put(stem(e.path()), e.path()));
    if (!samples.containsKey(name)) {
      String advice =
          Suggestion.nearest(name, samples.keySet()).map(n -> "you meant " + n).orElse("");
      String rule = "one of: " + String.join(", ", samples.keySet());
      throw InvalidInput.of("sample", name, rule, advice);
    }
    return samples.get(name);
  }

  private static String stem(String path) {
    return path.substring(path.lastIndexOf('/') + 1, path.length() - ENDING.length());
  }

  private static Path path(String text) {
    try {
      return Path.of(text);
    } catch (InvalidPathException e) {
      throw InvalidInput.of("file", text, "a path of this system", "");
    }
  }
}
