package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CompareCommandTest {
  @TempDir private static Path folder;
  private static String event;

  @BeforeAll
  static void copySamples() throws IOException {
    event = Samples.coarse(folder);
  }

  @Test
  void theGapIsTheDifferenceOfTheLapTimesAndTheSumOfCausesAndOfCorners() {
    CommandRun run =
        CommandRun.of("compare", event, "--setting", "as raced", "--setting", "spool", "--json");
    assertThat(run.code()).isZero();
    JsonNode document = run.json();
    assertThat(document.get("reference").textValue()).isEqualTo("as raced");
    JsonNode settings = document.get("circuits").get(0).get("settings");
    assertThat(settings)
        .extracting(s -> s.get("setting").textValue())
        .containsExactly("as raced", "spool");
    assertThat(settings.get(0).get("gapS").doubleValue()).isZero();
    JsonNode spool = settings.get(1);
    double gap = number(spool, "lapTimeS") - number(settings.get(0), "lapTimeS");
    assertThat(gap).isNotZero();
    assertThat(number(spool, "gapS")).isCloseTo(gap, within(1e-9));
    assertThat(sum(spool.get("causes"))).isCloseTo(gap, within(1e-9));
    double corners = 0;
    for (JsonNode corner : spool.get("corners")) {
      assertThat(sum(corner.get("causes"))).isCloseTo(number(corner, "gapS"), within(1e-9));
      corners += number(corner, "gapS");
    }
    assertThat(corners).isCloseTo(gap, within(1e-9));
  }

  private static double number(JsonNode node, String name) {
    return node.get(name).doubleValue();
  }

  private static double sum(JsonNode causes) {
    assertThat(causes.fieldNames())
        .toIterable()
        .isEqualTo(List.of("tractionS", "corneringSpeedS", "brakingS", "gearChangesS", "otherS"));
    return StreamSupport.stream(causes.spliterator(), false)
        .mapToDouble(JsonNode::doubleValue)
        .sum();
  }

  @Test
  void peopleGetOneColumnPerSetting() {
    CommandRun run = CommandRun.of("compare", event, "--setting", "firm", "--setting", "open");
    assertThat(run.err()).isEmpty();
    assertThat(run.out())
        .startsWith("firm: ring set 45/60, 6 faces per side, preload 80 N·m\nopen: rear open\n\n")
        .containsPattern("(?m)^Kestrelwick +firm +open$")
        .containsPattern("(?m)^gap to firm +[+-]\\d\\.\\d{3} +s$")
        .containsPattern("(?m)^  traction +[+-]?\\d\\.\\d{3} +s$")
        .containsPattern("(?m)^  corner 1 left +[+-]?\\d\\.\\d{3} +s$");
  }

  @Test
  void oneSettingIsNothingToCompare() {
    CommandRun.of("compare", event, "--setting", "open", "--setting", "open")
        .isBadInput("The list of settings (open, open) must be two different ones or more.");
  }
}
