package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.survey.StationCsv;

class CircuitCommandTest {
  private static final String LOG = "sample:velmoor_lap";

  @TempDir private Path folder;

  private static Circuit read(Path file) throws IOException {
    try (InputStream in = Files.newInputStream(file)) {
      return StationCsv.read(file.toString(), in);
    }
  }

  @Test
  void aLoggedLapBecomesACircuitThatTheOtherCommandsRead() throws IOException {
    Path out = folder.resolve("c.csv");
    Path plot = folder.resolve("c.svg");
    CommandRun run =
        CommandRun.of("circuit", LOG, "--out", out.toString(), "--plot", plot.toString(), "--json");
    assertThat(run.code()).isZero();
    JsonNode document = run.json();
    Circuit circuit = read(out);
    assertThat(document.get("lengthM").doubleValue()).isEqualTo(circuit.length());
    assertThat(document.get("stations").intValue()).isEqualTo(circuit.stations().size());
    assertThat(document.get("closed").booleanValue()).isTrue();
    assertThat(document.get("source").textValue()).isEqualTo("logged lap");
    assertThat(document.get("figures").get("lengthM").doubleValue()).isCloseTo(4000, within(20.0));
    assertThat(document.get("figures").get("turningAfterDeg").doubleValue())
        .isCloseTo(-360, within(1e-6));
    assertThat(document.get("notes")).isNotEmpty();
    assertThat(plot).content().startsWith("<svg");
  }

  @Test
  void optionsReachTheImport() throws IOException {
    Path out = folder.resolve("c.csv");
    JsonNode figures =
        CommandRun.of(
                "circuit",
                LOG,
                "--out",
                out.toString(),
                "--smoothing-m",
                "30",
                "--spacing-m",
                "5",
                "--json")
            .json()
            .get("figures");
    assertThat(figures.get("smoothingLengthM").doubleValue()).isEqualTo(30);
    assertThat(figures.get("spacingM").doubleValue()).isCloseTo(5, within(0.01));
  }

  @Test
  void peopleGetTheReport() {
    CommandRun run = CommandRun.of("circuit", LOG, "--out", folder.resolve("c.csv").toString());
    assertThat(run.err()).isEmpty();
    assertThat(run.out())
        .startsWith("logs/velmoor_lap.csv: logged lap\n")
        .contains("\nsmoothing length: 15.0 m\n")
        .endsWith("\nWritten: " + folder.resolve("c.csv") + "\n");
  }

  @Test
  void badInputLeavesWhatWasThere() throws IOException {
    Path out = Files.writeString(folder.resolve("c.csv"), "earlier");
    CommandRun.of("circuit", LOG, "--out", out.toString(), "--columns", "speed=Spd[mph]")
        .isBadInput(
            "logs/velmoor_lap.csv:3: The column Spd of the mapping (missing) must be in the header."
                + " Maybe use one of: Time [s], Speed [km/h], LatAcc [g], LongAcc [g], Yaw rate"
                + " [deg/s], Latitude [deg], Longitude [deg].");
    assertThat(out).hasContent("earlier");
    CommandRun.of("circuit", folder.resolve("lost.csv").toString(), "--out", out.toString())
        .isBadInput(
            "The file ("
                + folder.resolve("lost.csv")
                + ") must be a file that can be read. Maybe the path is wrong.");
    assertThat(out).hasContent("earlier");
  }
}
