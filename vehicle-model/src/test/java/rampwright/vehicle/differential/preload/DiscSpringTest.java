package rampwright.vehicle.differential.preload;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rampwright.vehicle.differential.preload.DiscSpring.Edge;
import rampwright.vehicle.input.InvalidInput;

class DiscSpringTest {
  private static final DiscSpring SOFT = mm(50, 25.4, 1.25, 1.6);
  private static final DiscSpring STIFF = mm(50, 25.4, 3, 1.1);

  private static DiscSpring mm(double outer, double inner, double thickness, double cone) {
    return new DiscSpring(outer / 1e3, inner / 1e3, thickness / 1e3, cone / 1e3);
  }

  /**
   * Forces at 0.75 h0 as DIN 2093 lists them. A8 and A20 read on a web page that quotes the
   * standard, the others from memory. The standard rounds to two or three digits, so 1 %.
   */
  @Tag("validation")
  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "A50,   50,   25.4, 3,    1.1,  12000",
    "B50,   50,   25.4, 2,    1.4,  4760",
    "C50,   50,   25.4, 1.25, 1.6,  1550",
    "A8,    8,    4.2,  0.4,  0.2,  210",
    "A20,   20,   10.2, 1.1,  0.45, 1530",
    "A25,   25,   12.2, 1.5,  0.55, 2910",
    "A31.5, 31.5, 16.3, 1.75, 0.7,  3900",
    "A40,   40,   20.4, 2.25, 0.9,  6540",
    "B25,   25,   12.2, 0.9,  0.7,  868",
    "C25,   25,   12.2, 0.7,  0.9,  601"
  })
  void forcesOfTheStandardsSprings(
      String name, double outer, double inner, double thickness, double cone, double force) {
    DiscSpring spring = mm(outer, inner, thickness, cone);
    assertThat(spring.force(0.75 * cone / 1e3)).isCloseTo(force, withinPercentage(1));
  }

  /** DIN EN 16984, table of factors for a diameter ratio of 2, two decimals; from memory. */
  @Tag("validation")
  @Test
  void shapeFactorsOfTheStandard() {
    DiscSpring spring = mm(40, 20, 2, 1);
    assertThat(spring.k1()).isCloseTo(0.69, within(0.005));
    assertThat(spring.k2()).isCloseTo(1.22, within(0.005));
    assertThat(spring.k3()).isCloseTo(1.38, within(0.005));
  }

  /**
   * Almen and Laszlo's assumption taken by itself: the cross-section turns rigidly about a circle,
   * hoop strain is change of radius over radius, and the force is the slope of the strain energy.
   * The energy is summed over the cross-section, so that none of the closed forms is used. The
   * standard's single factor is low by (ln De/Di)²/60 in the part that bending of the thickness
   * gives.
   */
  @Tag("validation")
  @Test
  void theForceIsTheSlopeOfTheStrainEnergy() {
    for (DiscSpring spring : new DiscSpring[] {SOFT, STIFF, mm(28, 10.2, 0.8, 0.75)}) {
      for (double share : new double[] {0.1, 0.4, 0.75, 1}) {
        assertThat(spring.force(share * spring.coneHeight()))
            .isCloseTo(slope(spring, share), withinPercentage(1.05 * shortfall(spring)));
      }
    }
  }

  @Tag("validation")
  @Test
  void inAThinHighConeTheForceIsExactlyThatSlope() {
    DiscSpring thin = mm(50, 25.4, 0.1, 2);
    assertThat(thin.force(0.4 * thin.coneHeight()))
        .isCloseTo(slope(thin, 0.4), withinPercentage(0.01));
  }

  private static double shortfall(DiscSpring spring) {
    double log = Math.log(spring.outerDiameter() / spring.innerDiameter());
    return 100 * log * log / 60;
  }

  private static double slope(DiscSpring spring, double share) {
    double s = share * spring.coneHeight();
    double step = 1e-4 * spring.coneHeight();
    return (energy(spring, s + step) - energy(spring, s - step)) / (2 * step);
  }

  @Tag("validation")
  @Test
  void theStressesAreThoseOfTheStrainAtTheEdges() {
    double s = 0.6 * SOFT.coneHeight();
    double half = SOFT.thickness() / 2;
    double inner = SOFT.innerDiameter() / 2 - neutralRadius(SOFT);
    double outer = SOFT.outerDiameter() / 2 - neutralRadius(SOFT);
    assertThat(SOFT.stress(Edge.UPPER_INNER, s))
        .isCloseTo(hoopStress(SOFT, s, inner, half), withinPercentage(1));
    assertThat(SOFT.stress(Edge.LOWER_INNER, s))
        .isCloseTo(hoopStress(SOFT, s, inner, -half), withinPercentage(1));
    assertThat(SOFT.stress(Edge.LOWER_OUTER, s))
        .isCloseTo(hoopStress(SOFT, s, outer, -half), withinPercentage(1));
    assertThat(SOFT.stress(Edge.UPPER_OUTER, s))
        .isCloseTo(hoopStress(SOFT, s, outer, half), withinPercentage(1));
    assertThat(SOFT.stress(Edge.UPPER_INNER, s)).isNegative();
    assertThat(SOFT.stress(Edge.LOWER_OUTER, s)).isPositive();
  }

  private static double energy(DiscSpring spring, double s) {
    double inner = spring.innerDiameter() / 2;
    double outer = spring.outerDiameter() / 2;
    int n = 2000;
    double dr = (outer - inner) / n;
    double sum = 0;
    // two-point Gauss rule across the thickness is exact for the square of a linear strain
    double y = spring.thickness() / 2 / Math.sqrt(3);
    for (int i = 0; i < n; i++) {
      double r = inner + (i + 0.5) * dr;
      double x = r - neutralRadius(spring);
      for (double side : new double[] {-y, y}) {
        double stress = hoopStress(spring, s, x, side);
        sum += stress * stress * r * dr * spring.thickness() / 2;
      }
    }
    return Math.PI * (1 - 0.09) / 206e9 * sum;
  }

  private static double neutralRadius(DiscSpring spring) {
    double inner = spring.innerDiameter() / 2;
    double outer = spring.outerDiameter() / 2;
    return (outer - inner) / Math.log(outer / inner);
  }

  /** Stress at {@code x} outside the neutral circle and {@code y} above the middle. */
  private static double hoopStress(DiscSpring spring, double s, double x, double y) {
    double width = (spring.outerDiameter() - spring.innerDiameter()) / 2;
    double turn = s / width;
    double cone = spring.coneHeight() / width;
    double strain = turn * (x * (cone - turn / 2) - y) / (neutralRadius(spring) + x);
    return 206e9 / (1 - 0.09) * strain;
  }

  @Test
  void theRateIsTheSlopeOfTheForce() {
    for (double share : new double[] {0, 0.3, 0.75, 1.1}) {
      double s = share * SOFT.coneHeight();
      double step = 1e-6 * SOFT.coneHeight();
      double slope = (SOFT.force(s + step) - SOFT.force(s - step)) / (2 * step);
      assertThat(SOFT.rate(s)).isCloseTo(slope, within(1e-5 * SOFT.rate(0)));
    }
  }

  @Test
  void theDeflectionGivesTheForceBack() {
    for (DiscSpring spring : new DiscSpring[] {SOFT, STIFF}) {
      for (double share : new double[] {0, 0.2, 0.6, 1}) {
        double s = share * spring.risingDeflection();
        double found = spring.deflection(spring.force(s));
        assertThat(spring.force(found))
            .isCloseTo(spring.force(s), within(1e-9 * spring.flatForce()));
      }
    }
  }

  @Test
  void aSpringWithAHighConeGivesWayBeforeItIsFlat() {
    DiscSpring high = mm(50, 25.4, 1, 1.8);
    double top = high.risingDeflection();
    assertThat(top).isLessThan(high.coneHeight());
    assertThat(high.rate(top)).isCloseTo(0, within(1e-9 * high.rate(0)));
    assertThat(high.force(top)).isGreaterThan(high.flatForce());
    // at h0/t = sqrt(2) the force is level exactly where the spring is flat
    DiscSpring level = mm(50, 25.4, 1, Math.sqrt(2));
    assertThat(level.rate(level.coneHeight())).isCloseTo(0, within(1e-9 * level.rate(0)));
    assertThat(STIFF.risingDeflection()).isEqualTo(STIFF.coneHeight());
  }

  @Test
  void aForceThatItCannotGiveIsRejected() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> STIFF.deflection(20_000))
        .withMessage(
            "The force on a disc spring (20000 N) must be between 0 and 15640.1 N. Maybe stack more"
                + " springs in parallel.");
  }

  @Test
  void swappedDiametersAreRejected() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> mm(25.4, 50, 2, 1))
        .withMessage(
            "The disc inner diameter (50 mm) must be at most 0.9 of the outer diameter of 25.40 mm."
                + " Maybe the two were swapped.");
  }
}
