package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SearchCommandTest {
  @TempDir private Path folder;
  private String event;

  @BeforeEach
  void copySamples() throws IOException {
    event = Samples.coarse(folder);
  }

  private CommandRun search(String... more) {
    String[] all = new String[more.length + 2];
    all[0] = "search";
    all[1] = event;
    System.arraycopy(more, 0, all, 2, more.length);
    return CommandRun.of(all);
  }

  /** Puts other limits into the event. */
  private void limits(String text) throws IOException {
    Path file = Path.of(event);
    String changed =
        Files.readString(file).replaceFirst("(?s)\nlimits:\n.*?\n\n", "\nlimits: " + text + "\n\n");
    Files.writeString(file, changed);
  }

  @Test
  void theBestMeetsTheLimitsIsNotSlowerThanTheCurrentAndIsTheSameOnTwoThreads() throws IOException {
    limits("{min_preload_nm: 20, max_drive_share: 0.6}");
    CommandRun run = search("--evaluations", "6", "--seed", "7", "--threads", "1", "--json");
    assertThat(run.code()).isZero();
    JsonNode search = run.json().get("search");
    assertThat(search.get("seed").intValue()).isEqualTo(7);
    assertThat(search.get("evaluations").intValue()).isBetween(2, 6);
    assertThat(search.get("settingsOfTheKit").intValue()).isGreaterThanOrEqualTo(2000);
    JsonNode best = search.get("best");
    assertThat(best.get("lapTimeS").doubleValue())
        .isLessThanOrEqualTo(search.get("current").get("lapTimeS").doubleValue());
    assertThat(best.get("ringSet").textValue()).isNotBlank();
    assertThat(best.get("driveAngleDeg").doubleValue()).isBetween(15.0, 90.0);
    assertThat(best.get("coastAngleDeg").doubleValue()).isBetween(15.0, 90.0);
    assertThat(best.get("facesPerSide").intValue()).isPositive();
    assertThat(best.get("preloadNm").doubleValue()).isGreaterThanOrEqualTo(20);
    assertThat(best.get("limits"))
        .extracting(limit -> limit.get("name").textValue())
        .containsExactly("min_preload_nm", "max_drive_share");
    assertThat(best.get("limits")).allMatch(limit -> limit.get("met").booleanValue());
    assertThat(best.get("limits").get(1).get("value").doubleValue())
        .isCloseTo(best.get("driveShare").doubleValue(), within(1e-12));
    JsonNode gain = search.get("gain");
    assertThat(gain.get("gainS").doubleValue())
        .isCloseTo(
            search.get("current").get("lapTimeS").doubleValue()
                - best.get("lapTimeS").doubleValue(),
            within(1e-9));
    assertThat(gain.get("lowS").doubleValue()).isLessThan(gain.get("gainS").doubleValue());
    assertThat(gain.get("shares"))
        .extracting(share -> share.get("source").textValue())
        .contains("plate friction ±15 %", "grip ±3 %");
    CommandRun again = search("--evaluations", "6", "--seed", "7", "--threads", "2", "--json");
    assertThat(again.out()).isEqualTo(run.out());
  }

  @Test
  void whenNothingMeetsTheLimitsTheNearestIsToldWithExitCode3() throws IOException {
    limits("{max_preload_nm: 50, min_preload_nm: 60}");
    CommandRun run = search("--evaluations", "2", "--json");
    assertThat(run.code()).isEqualTo(3);
    assertThat(run.err())
        .matches(
            "No setting meets the limits\\. The nearest breaks: m(ax|in)_preload_nm.*\\. Maybe relax"
                + " one of them in the event\\.\\R");
    JsonNode search = new CommandRun(3, run.out(), "").json().get("search");
    assertThat(search.get("meetsLimits").booleanValue()).isFalse();
    assertThat(search.get("gain").isNull()).isTrue();
    assertThat(search.get("best").get("limits"))
        .anyMatch(limit -> !limit.get("met").booleanValue());
  }

  @Test
  void peopleGetTheBestBesideTheCurrentAndProgressOnStandardError() throws IOException {
    limits("{min_preload_nm: 20}");
    CommandRun run = search("--evaluations", "3");
    assertThat(run.code()).isZero();
    assertThat(run.err()).contains("of at most 3 evaluations, best ");
    assertThat(run.out())
        .contains("evaluations, seed 1\n")
        .containsPattern("(?m)^current: ring set 55/75, 4 faces per side, .* s +meets the limits$")
        .containsPattern("(?m)^best: ring set .* s +meets the limits$")
        .containsPattern("(?m)^gain over the current setting \\+?\\d\\.\\d{3} s, between .* s: ")
        .containsPattern("(?m)^  grip ±3 % +±\\d\\.\\d{3} +s$")
        .containsPattern("(?m)^  preload +[\\d.]+ +at least +20\\.000 +N·m +met$");
  }

  @Test
  void badNumbersAreBadInput() {
    search("--threads", "0").isBadInput("The number of threads (0) must be between 1 and 256.");
    search("--evaluations", "0", "--json")
        .isBadInput("The number of evaluations (0) must be between 1 and 1000000.");
    CommandRun word = search("--seed", "lucky");
    assertThat(word.code()).isEqualTo(2);
    assertThat(word.err()).contains("--seed", "lucky").contains("See: rampwright search --help");
  }
}
