package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.samples.BadInput;
import rampwright.samples.SampleFiles;

/** Every bad input gives its message on standard error, exit code 2, and nothing else. */
class BadInputCommandTest {
  @TempDir private static Path folder;

  @BeforeAll
  static void copyAll() throws IOException {
    Samples.copy(folder);
    for (BadInput bad : badInputs()) {
      Samples.copy(bad.path(), folder);
    }
    for (String part : List.of("car_mass_in_grams.yaml", "kit_plates_inside_out.yaml")) {
      Samples.copy(SampleFiles.FAILURES + "parts/" + part, folder);
    }
  }

  static List<BadInput> badInputs() {
    return SampleFiles.badInputs();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("badInputs")
  void theMessageIsAllThatIsSaid(BadInput bad) {
    Path file = folder.resolve(bad.path());
    Path out = folder.resolve("out.csv");
    CommandRun run =
        bad.path().endsWith(".yaml")
            ? CommandRun.of("lap", file.toString(), "--json")
            : CommandRun.of("circuit", file.toString(), "--out", out.toString(), "--json");
    // the samples know themselves by their path below the folder
    String said = run.err().replace(folder + File.separator, "");
    new CommandRun(run.code(), run.out(), said).isBadInput(bad.message());
    assertThat(out).doesNotExist();
  }
}
