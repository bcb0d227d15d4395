package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class LapCommandTest {
  private static final String EVENT = "sample:kestrelwick";

  @Test
  void theTimesOfCornersAndPhasesAddUpAndTheCarIsNotSlowerThanTheDriver(@TempDir Path folder)
      throws IOException {
    String event = Samples.coarse(folder);
    CommandRun run =
        CommandRun.of("lap", event, "--setting", "open", "--setting", "firm", "--json");
    assertThat(run.code()).isZero();
    JsonNode laps = run.json().get("laps");
    assertThat(laps)
        .extracting(lap -> lap.get("setting").textValue())
        .containsExactly("open", "firm");
    for (JsonNode lap : laps) {
      addsUp(lap);
      addsUp(lap.get("carLimits"));
      assertThat(lap.get("carLimits").get("lapTimeS").doubleValue())
          .isLessThan(lap.get("lapTimeS").doubleValue());
      assertThat(lap.get("circuit").textValue()).isEqualTo("Kestrelwick");
    }
    assertThat(laps.get(0).has("kitSetting")).isFalse();
    JsonNode firm = laps.get(1).get("kitSetting");
    assertThat(firm.get("ringSet").textValue()).isEqualTo("45/60");
    assertThat(firm.get("driveAngleDeg").doubleValue()).isCloseTo(45, within(1e-9));
    assertThat(firm.get("coastAngleDeg").doubleValue()).isCloseTo(60, within(1e-9));
    assertThat(firm.get("facesPerSide").intValue()).isEqualTo(6);
    assertThat(firm.get("preloadNm").doubleValue()).isEqualTo(80);
  }

  private static void addsUp(JsonNode lap) {
    double corners = 0;
    for (JsonNode corner : lap.get("corners")) {
      double phases =
          StreamSupport.stream(corner.get("phases").spliterator(), false)
              .mapToDouble(phase -> phase.get("timeS").doubleValue())
              .sum();
      assertThat(phases).isCloseTo(corner.get("timeS").doubleValue(), within(1e-9));
      corners += phases;
    }
    assertThat(corners).isCloseTo(lap.get("lapTimeS").doubleValue(), within(1e-9));
  }

  @Test
  void aTraceHasEveryStationAndItsUnits(@TempDir Path folder) throws IOException {
    Path traces = folder.resolve("new/traces");
    String event = Samples.coarse(folder);
    CommandRun run = CommandRun.of("lap", event, "--trace", traces.toString(), "--json");
    JsonNode lap = run.json().get("laps").get(0);
    assertThat(lap.get("setting").textValue()).isEqualTo("as raced");
    Path file = Path.of(lap.get("traceFile").textValue());
    assertThat(file).isEqualTo(traces.resolve("Kestrelwick_as-raced_driver.csv"));
    assertThat(Path.of(lap.get("carLimitsTraceFile").textValue())).exists();
    List<String> lines = Files.readAllLines(file);
    assertThat(lines).hasSize(1 + 2300 / 5);
    assertThat(lines.get(0))
        .startsWith("distance_m,time_s,speed_mps,curvature_1pm,curvature_gradient_1pm2,ax_mps2,ay_")
        .contains("cage_torque_nm", "sigma_1ps", "fx_fl_n", "slip_angle_rr_rad", "rear_capacity_nm")
        .endsWith("wheel_speed_rr_radps");
    int columns = lines.get(0).split(",").length;
    assertThat(lines).allMatch(line -> line.split(",", -1).length == columns);
    double last = Double.parseDouble(lines.get(lines.size() - 1).split(",")[1]);
    assertThat(last)
        .isBetween(0.99 * lap.get("lapTimeS").doubleValue(), lap.get("lapTimeS").doubleValue());
  }

  @Test
  void peopleGetTablesWithUnits() {
    CommandRun run = CommandRun.of("lap", EVENT);
    assertThat(run.err()).isEmpty();
    assertThat(run.out())
        .startsWith("Kestrelwick, as raced: ring set 55/75, 4 faces per side, preload 40 N·m")
        .containsPattern("(?m)^lap time +\\d\\d\\.\\d{3} +\\d\\d\\.\\d{3} +s$")
        .containsPattern("(?m)^corner +at m +km/h +braking s +entry s +apex s +exit s +straight s")
        .containsPattern("(?m)^1 left +\\d+ ");
  }

  @Test
  void anUnknownSettingIsBadInputEvenForJson() {
    CommandRun.of("lap", EVENT, "--setting", "opne", "--json")
        .isBadInput(
            "The setting (opne) must be one of the event's: [as raced, more preload, firm, open,"
                + " spool]. Maybe you meant open.");
  }

  @Test
  void aFolderThatCannotBeMadeIsTold(@TempDir Path folder) throws IOException {
    Path taken = Files.writeString(folder.resolve("taken"), "");
    CommandRun.of("lap", Samples.coarse(folder), "--trace", taken.toString())
        .isBadInput("A file could not be written: " + taken + ".");
  }
}
