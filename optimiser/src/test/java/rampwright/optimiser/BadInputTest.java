package rampwright.optimiser;

import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.optimiser.event.EventFile;
import rampwright.samples.BadInput;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.circuit.survey.CircuitImport;
import rampwright.vehicle.circuit.survey.ImportOptions;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.input.InvalidInput;

/** Every bad input among the samples, through the reader that a user's file goes through. */
class BadInputTest {
  private static final FileSource SAMPLES =
      FileSource.classPath(SampleFiles.class.getClassLoader(), SampleFiles.BASE);

  static List<BadInput> badInputs() {
    return SampleFiles.badInputs();
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("badInputs")
  void aBadInputGivesItsMessage(BadInput bad) {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> read(bad.path()))
        .withMessage(bad.message());
  }

  private static void read(String path) throws IOException {
    if (path.endsWith(".yaml")) {
      EventFile.read(SAMPLES, path);
      return;
    }
    try (InputStream in = SAMPLES.open(path)) {
      CircuitImport.read(path, in, ImportOptions.defaults());
    }
  }
}
