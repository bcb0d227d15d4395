package rampwright.optimiser.cli;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import rampwright.samples.SampleFile;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.file.Suggestion;
import rampwright.vehicle.input.InvalidInput;

/**
 * A sample instead of a file: {@code sample:} and the name of its file without folder and ending.
 */
final class SampleName {
  private static final String PREFIX = "sample:";

  private SampleName() {}

  /**
   * Returns the path of the sample that is meant, empty when a file of the user's is.
   *
   * @param argument the argument of the command line
   * @param kind what the sample must be, as in {@link SampleFile#kind()}
   * @throws InvalidInput when there is no such sample
   */
  static Optional<String> find(String argument, String kind) {
    if (!argument.startsWith(PREFIX)) {
      return Optional.empty();
    }
    String name = argument.substring(PREFIX.length());
    Map<String, String> samples = new LinkedHashMap<>();
    SampleFiles.list(kind).forEach(sample -> samples.put(stem(sample.path()), sample.path()));
    if (!samples.containsKey(name)) {
      Optional<String> near = Suggestion.nearest(name, samples.keySet());
      String rule = "one of: " + String.join(", ", samples.keySet());
      throw InvalidInput.of("sample", name, rule, near.map(n -> "you meant " + n).orElse(""));
    }
    return Optional.of(samples.get(name));
  }

  private static String stem(String path) {
    return path.substring(path.lastIndexOf('/') + 1, path.lastIndexOf('.'));
  }
}
