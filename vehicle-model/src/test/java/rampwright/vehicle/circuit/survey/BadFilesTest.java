package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.io.IOException;
import java.io.InputStream;
import java.util.Arrays;
import java.util.Map;
import org.junit.jupiter.api.Test;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.input.InvalidInput;

class BadFilesTest {
  @Test
  void theFilesAmongTheSamplesAreThoseThatAreMadeHere() throws IOException {
    for (Map.Entry<String, byte[]> file : BadFiles.files().entrySet()) {
      try (InputStream in = SampleFiles.open(SampleFiles.FAILURES + file.getKey())) {
        assertThat(in.readAllBytes()).as(file.getKey()).isEqualTo(file.getValue());
      }
    }
  }

  @Test
  void aFileWithoutEndIsRefusedAtTheLimit() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> CircuitImport.read("huge.csv", new Endless(), ImportOptions.defaults()))
        .withMessage(
            "huge.csv: The size of the file (more than 100 MB) must be at most 100 MB. Maybe export"
                + " one lap and only the columns that are needed.");
  }

  /** A log of comment lines that never ends and costs no memory. */
  private static final class Endless extends InputStream {
    private static final int LINE = 100;

    private int at;

    @Override
    public int read() {
      at = (at + 1) % LINE;
      return at == 0 ? '\n' : '#';
    }

    @Override
    public int read(byte[] buffer, int offset, int length) {
      Arrays.fill(buffer, offset, offset + length, (byte) '#');
      for (int i = LINE - at; i < length; i += LINE) {
        buffer[offset + i] = '\n';
      }
      at = (at + length) % LINE;
      return length;
    }
  }
}
