package rampwright.samples;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Stream;

/** The samples, wherever the jar with them is. */
public final class SampleFiles {
  /** Folder of the samples on the class path. */
  public static final String BASE = "rampwright/samples/";

  /** Folder of the bad inputs below it. */
  public static final String FAILURES = "failure/";

  /** The event that stands for the whole job, with which the page starts. */
  public static final String MAIN_EVENT = "events/double_header.yaml";

  private static final String INDEX = "index.csv";

  private SampleFiles() {}

  /** Returns all samples in the order of the index; bad inputs are not among them. */
  public static List<SampleFile> list() {
    return index(INDEX, 3).map(cells -> new SampleFile(cells[0], cells[1], cells[2])).toList();
  }

  /** Returns the bad inputs that a person would open, each with the message that it must give. */
  public static List<BadInput> badInputs() {
    return index(FAILURES + INDEX, 2)
        .map(cells -> new BadInput(FAILURES + cells[0], cells[1]))
        .toList();
  }

  /** Returns the rows of an index; the last cell of a row may hold commas. */
  private static Stream<String[]> index(String path, int columns) {
    try (InputStream in = open(path)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .skip(1)
          .map(line -> line.split(",", columns));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Returns the samples of one kind. */
  public static List<SampleFile> list(String kind) {
    return list().stream().filter(sample -> sample.kind().equals(kind)).toList();
  }

  /**
   * Opens a file below the samples.
   *
   * @param path with forward slashes, for example {@code circuits/velmoor.csv}
   * @throws FileNotFoundException when there is no such file
   */
  public static InputStream open(String path) throws IOException {
    InputStream in = SampleFiles.class.getClassLoader().getResourceAsStream(BASE + path);
    if (in == null) {
      throw new FileNotFoundException(path);
    }
    return in;
  }
}
