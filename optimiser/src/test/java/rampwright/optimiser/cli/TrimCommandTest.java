package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class TrimCommandTest {
  private static CommandRun trim(String... more) {
    List<String> all =
        new ArrayList<>(List.of("trim", "sample:kestrelwick", "--setting", "as raced"));
    all.addAll(List.of(more));
    return CommandRun.of(all.toArray(String[]::new));
  }

  @Test
  void theDocumentCarriesUnitsInItsNamesAndBalances() {
    CommandRun run =
        trim("--speed-mps", "20", "--curvature-1pm", "0.02", "--cage-torque-nm", "600", "--json");
    assertThat(run.code()).isZero();
    JsonNode trim = run.json().get("trim");
    assertThat(trim.get("speedMps").doubleValue()).isEqualTo(20);
    assertThat(trim.get("ayMps2").doubleValue()).isCloseTo(8, within(1e-12));
    assertThat(trim.get("cageTorqueNm").doubleValue()).isCloseTo(600, within(1e-6));
    for (String name :
        List.of(
            "sideslipRad",
            "steerRad",
            "axMps2",
            "torqueDifferenceNm",
            "outputSpeedDifferenceRadps",
            "yawMomentDifferentialNm",
            "sigmaPerS")) {
      assertThat(trim.get(name)).as(name).isNotNull();
      assertThat(trim.get(name).isNumber()).as(name).isTrue();
    }
    assertThat(trim.get("limit").isNull()).isTrue();
    assertThat(trim.get("wheels"))
        .extracting(w -> w.get("name").textValue())
        .containsExactly("FL", "FR", "RL", "RR");
    // the two rear wheels share the cage torque; the difference is what the unit moves
    double left = trim.get("wheels").get(2).get("fxN").doubleValue() * 0.318;
    double right = trim.get("wheels").get(3).get("fxN").doubleValue() * 0.318;
    assertThat(left + right).isCloseTo(600, within(1e-6));
    assertThat(Math.abs(left - right))
        .isCloseTo(trim.get("torqueDifferenceNm").doubleValue(), within(1e-6));
    JsonNode rear = trim.get("differentials").get("rear");
    assertThat(rear.get("torqueDifferenceNm")).isEqualTo(trim.get("torqueDifferenceNm"));
    assertThat(trim.get("differentials")).hasSize(1);
  }

  @Test
  void theDriversLimitHasTheGrowthThatWasGivenAndTheCarsIsFurtherOut() {
    String[] where = {"--speed-mps", "30", "--curvature-1pm", "0.013", "--limit", "drive"};
    JsonNode car = trim(with(where, "--json")).json().get("trim");
    JsonNode driver = trim(with(where, "--sigma-max", "0.5", "--json")).json().get("trim");
    assertThat(driver.get("limit").textValue()).isEqualTo("driver");
    assertThat(driver.get("sigmaPerS").doubleValue()).isCloseTo(0.5, within(1e-3));
    assertThat(car.get("axMps2").doubleValue()).isGreaterThan(driver.get("axMps2").doubleValue());
    assertThat(car.get("sigmaPerS").doubleValue()).isGreaterThan(0.5);
  }

  @Test
  void brakingAndCorneringLimitsAreFound() {
    JsonNode brake =
        trim("--speed-mps", "30", "--curvature-1pm", "0.005", "--limit", "brake", "--json")
            .json()
            .get("trim");
    assertThat(brake.get("axMps2").doubleValue()).isLessThan(-8);
    assertThat(brake.get("brakeTorqueNm").doubleValue()).isPositive();
    JsonNode corner =
        trim("--curvature-1pm", "-0.02", "--limit", "corner", "--json").json().get("trim");
    assertThat(corner.get("axMps2").doubleValue()).isCloseTo(0, within(1e-6));
    assertThat(corner.get("ayMps2").doubleValue()).isLessThan(-10);
    assertThat(corner.get("limit").textValue()).isEqualTo("tyres");
  }

  @Test
  void peopleGetATableWithUnits() {
    CommandRun run = trim("--speed-mps", "20", "--curvature-1pm", "0.02", "--limit", "drive");
    assertThat(run.err()).isEmpty();
    assertThat(run.out())
        .startsWith("Corvane T4, as raced, limited by ")
        .containsPattern("(?m)^lateral acceleration +8\\.000 +m/s²$")
        .containsPattern("(?m)^rear +[\\d.]+ +[\\d.]+ +[\\d.]+ +[\\d.]+ +(sliding|together)$")
        .containsPattern("(?m)^FL +0 ");
  }

  @Test
  void aQuestionThatIsIncompleteOrContradictsItselfIsBadInput() {
    String[] where = {"--speed-mps", "20", "--curvature-1pm", "0.02"};
    trim(where).isBadInput("The question (neither) must be one of --cage-torque-nm and --limit.");
    trim(with(where, "--limit", "drive", "--cage-torque-nm", "3"))
        .isBadInput("The question (both) must be one of --cage-torque-nm and --limit.");
    trim(with(where, "--cage-torque-nm", "3", "--sigma-max", "1"))
        .isBadInput("The option (--sigma-max) must be used together with --limit.");
    trim("--curvature-1pm", "0.02", "--limit", "drive")
        .isBadInput("The speed (missing) must be given with --speed-mps.");
    trim("--curvature-1pm", "0", "--limit", "corner", "--json")
        .isBadInput("The curvature (0 1/m) must be large enough to limit the speed.");
  }

  @Test
  void aTrimThatDoesNotExistIsBadInput() {
    trim("--speed-mps", "60", "--curvature-1pm", "0.02", "--limit", "drive")
        .isBadInput(
            "The curvature (0.02 1/m) must be small enough that the car can follow the path at"
                + " this speed.");
    trim("--speed-mps", "20", "--curvature-1pm", "0.02", "--cage-torque-nm", "9000")
        .isBadInput(
            "The cage torque (9000 N·m) must be one with which the car can follow this path at"
                + " this speed. Maybe look for the limit first with --limit.");
    trim("--speed-mps", "NaN", "--curvature-1pm", "0.02", "--cage-torque-nm", "0")
        .isBadInput("The speed (NaN m/s) must be between 0.5 and 150 m/s.");
  }

  private static String[] with(String[] arguments, String... more) {
    List<String> all = new ArrayList<>(List.of(arguments));
    all.addAll(List.of(more));
    return all.toArray(String[]::new);
  }
}
