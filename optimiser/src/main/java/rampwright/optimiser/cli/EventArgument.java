package rampwright.optimiser.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import picocli.CommandLine.Parameters;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.EventFile;
import rampwright.optimiser.event.NamedSetting;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.input.InvalidInput;

/** The event that a command works on: a file of the user's or one of the samples. */
final class EventArgument {
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
    Optional<String> sample = SampleName.find(event, "event");
    if (sample.isPresent()) {
      ClassLoader loader = SampleFiles.class.getClassLoader();
      return EventFile.read(FileSource.classPath(loader, SampleFiles.BASE), sample.get());
    }
    Path path = UserFile.path(event);
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
}
