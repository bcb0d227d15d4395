package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Cars that drive the front or all four wheels show each of their differentials. */
class LayoutCommandTest {
  private static JsonNode trim(String event, String setting) {
    return CommandRun.of(
            "trim",
            event,
            "--setting",
            setting,
            "--speed-mps",
            "18",
            "--curvature-1pm",
            "0.015",
            "--cage-torque-nm",
            "700",
            "--json")
        .json()
        .get("trim");
  }

  @Test
  void aFrontWheelDriveCarHasTheKitInFront() {
    JsonNode trim = trim("sample:front_drive_sprint", "as raced");
    JsonNode units = trim.get("differentials");
    assertThat(units.fieldNames()).toIterable().containsExactly("front");
    assertThat(units.get("front").get("cageTorqueNm").doubleValue()).isCloseTo(700, within(1e-6));
    assertThat(trim.get("torqueDifferenceNm"))
        .isEqualTo(units.get("front").get("torqueDifferenceNm"));
    assertThat(trim.get("torqueDifferenceNm").doubleValue()).isPositive();
  }

  @Test
  void aFourWheelDriveCarHasThreeThatShareTheTorque() {
    JsonNode trim = trim("sample:all_wheel_drive_rally", "as rallied");
    JsonNode units = trim.get("differentials");
    assertThat(units.fieldNames()).toIterable().isEqualTo(List.of("front", "centre", "rear"));
    double front = units.get("front").get("cageTorqueNm").doubleValue();
    double rear = units.get("rear").get("cageTorqueNm").doubleValue();
    assertThat(units.get("centre").get("cageTorqueNm").doubleValue()).isCloseTo(700, within(1e-6));
    assertThat(front + rear).isCloseTo(700, within(1e-6));
    assertThat(trim.get("torqueDifferenceNm"))
        .isEqualTo(units.get("rear").get("torqueDifferenceNm"));
  }

  @Test
  void peopleReadEachLaw() {
    CommandRun run =
        CommandRun.of(
            "trim",
            "sample:all_wheel_drive_rally",
            "--setting",
            "spool",
            "--speed-mps",
            "18",
            "--curvature-1pm",
            "0.015",
            "--cage-torque-nm",
            "700");
    assertThat(run.out())
        .containsPattern("(?m)^front +[-\\d.]+ +[\\d.]+ +- +0\\.000 +together$")
        .containsPattern("(?m)^centre +700\\.0 +[\\d.]+ +- +0\\.000 +together$")
        .containsPattern("(?m)^rear +[-\\d.]+ +[\\d.]+ +- +0\\.000 +together$");
  }
}
