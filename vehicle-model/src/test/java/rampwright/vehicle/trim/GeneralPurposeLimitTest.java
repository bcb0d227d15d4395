package rampwright.vehicle.trim;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rampwright.vehicle.Car;
import rampwright.vehicle.CarBuilder;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;

/**
 * The drive limit against a reference library, Apache Commons Math 3.6.1: Levenberg and Marquardt's
 * method for the trim, Brent's for the largest acceleration.
 */
class GeneralPurposeLimitTest {
  @ParameterizedTest
  @CsvSource({"8, 5", "10, 7", "12, 9", "15, 10"})
  @Tag("validation")
  void bothFindTheSameLargestAcceleration(double speed, double lateral) {
    Car car = new CarBuilder().build();
    double curvature = lateral / (speed * speed);
    Trims trims = new Trims(car, Conditions.STANDARD, DifferentialSet.rear(OpenDifferential.IDEAL));
    Trims.AtLimit ours =
        trims.driveLimit(speed, curvature, 0, Double.POSITIVE_INFINITY).orElseThrow();
    assertThat(ours.reason()).isEqualTo(TrimLimit.TYRES);

    double theirs =
        new GeneralPurposeLimit(car, Conditions.STANDARD, speed, curvature).largestAcceleration();

    assertThat(ours.trim().ax()).isCloseTo(theirs, within(1e-5));
  }
}
