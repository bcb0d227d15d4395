package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Worked examples of IOGP Publication 373-7-2, <i>Geomatics Guidance Note 7, part 2</i>: WGS 84,
 * latitude 53°48'33.820"N, longitude 2°07'46.380"E, ellipsoidal height 73.0 m. Printed values
 * entered from memory; formulas and values agree to all printed digits.
 */
@Tag("validation")
class LocalFrameTest {
  private static final LocalFrame.Geocentric PLACE =
      LocalFrame.geocentric(degrees(53, 48, 33.820), degrees(2, 7, 46.380), 73);

  private static double degrees(int degrees, int minutes, double seconds) {
    return Math.toRadians(degrees + minutes / 60.0 + seconds / 3600);
  }

  /** Method 9602, geographic to geocentric. */
  @Test
  void geocentricCoordinatesAreThoseOfTheGuidanceNote() {
    assertThat(PLACE.x()).isCloseTo(3771793.968, within(0.0006));
    assertThat(PLACE.y()).isCloseTo(140253.342, within(0.0006));
    assertThat(PLACE.z()).isCloseTo(5124304.349, within(0.0006));
  }

  /** Method 9837, geographic to topocentric, origin 55°N 5°E at 200 m. */
  @Test
  void topocentricCoordinatesAreThoseOfTheGuidanceNote() {
    LocalFrame frame = new LocalFrame(Math.toRadians(55), Math.toRadians(5), 200);
    assertThat(frame.east(PLACE)).isCloseTo(-189013.869, within(0.0006));
    assertThat(frame.north(PLACE)).isCloseTo(-128642.040, within(0.0006));
    assertThat(frame.up(PLACE)).isCloseTo(-4220.171, within(0.0006));
  }

  /**
   * Meridian radius of curvature, Rapp, <i>Geometric Geodesy</i>, 1991: a(1-e²)/(1-e² sin²)^1.5.
   */
  @Test
  void aSecondOfLatitudeIsAsLongAsTheMeridianSays() {
    double latitude = Math.toRadians(45);
    LocalFrame frame = new LocalFrame(latitude, 0, 0);
    double second = Math.toRadians(1 / 3600.0);
    double e2 = 0.00669437999014;
    double radius = 6378137 * (1 - e2) / Math.pow(1 - e2 / 2, 1.5);
    assertThat(frame.north(LocalFrame.geocentric(latitude + second, 0, 0)))
        .isCloseTo(radius * second, within(1e-4));
    assertThat(frame.east(LocalFrame.geocentric(latitude + second, 0, 0))).isZero();
  }
}
