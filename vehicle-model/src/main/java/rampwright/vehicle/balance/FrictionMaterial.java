package rampwright.vehicle.balance;

/**
 * Friction materials with the limits that a handbook gives for clutches and brakes, dry and in oil.
 *
 * <p>Source: Neale (ed.), <i>The Tribology Handbook</i>, section B7, table 7.4. NaN where the table
 * has no entry. A range in the table is kept as its two ends; limits here use the lower one. The
 * tables speak of materials in general, and its figure 7.20 shows wear that rises steeply above 100
 * °C: the plate maker's figures prevail.
 */
public enum FrictionMaterial {
  WOVEN("woven, dry", 0.35, 0.40, 250, 150, 175, 520, 0.3, 0.6),
  MILL_BOARD("mill board, dry", 0.40, 0.40, 250, 150, 175, 700, 0.3, 0.6),
  WOUND("wound tape or yarn, dry", 0.40, 0.40, 350, 200, 175, 700, 0.3, 1.2),
  MOULDED("moulded, dry", 0.35, 0.35, 350, 200, 175, 700, 0.6, 1.2),
  SINTERED("sintered metal, dry", 0.30, 0.36, 500, 300, 350, 2800, 1.7, 1.7),
  CERMET("cermet buttons, dry", 0.40, 0.40, none(), none(), 700, 1400, 4.0, 4.0),
  PAPER_IN_OIL("paper in oil", 0.11, 0.11, none(), none(), 700, 1750, 2.3, 2.3),
  WOVEN_IN_OIL("woven in oil", 0.08, 0.08, none(), none(), 700, 1750, 1.8, 1.8),
  MOULDED_IN_OIL("moulded in oil", 0.04, 0.04, none(), none(), 700, 1750, 0.6, 0.6),
  MOULDED_GROOVED_IN_OIL(
      "moulded, grooved, in oil", 0.06, 0.06, none(), none(), 700, 1750, 0.6, 0.6),
  SINTERED_IN_OIL("sintered metal in oil", 0.05, 0.10, none(), none(), 700, 4200, 2.3, 2.3),
  SINTERED_GROOVED_IN_OIL(
      "sintered metal, grooved, in oil", 0.06, 0.10, none(), none(), 700, 4200, 2.3, 2.3);

  private final String label;
  private final double leastFriction;
  private final double mostFriction;
  private final double highestTemperature;
  private final double continuousTemperature;
  private final double leastPressure;
  private final double mostPressure;
  private final double leastRating;
  private final double mostRating;

  FrictionMaterial(
      String label,
      double leastFriction,
      double mostFriction,
      double highestTemperature,
      double continuousTemperature,
      double leastKilopascal,
      double mostKilopascal,
      double leastWattPerSquareMillimetre,
      double mostWattPerSquareMillimetre) {
    this.label = label;
    this.leastFriction = leastFriction;
    this.mostFriction = mostFriction;
    this.highestTemperature = highestTemperature;
    this.continuousTemperature = continuousTemperature;
    this.leastPressure = leastKilopascal * 1e3;
    this.mostPressure = mostKilopascal * 1e3;
    this.leastRating = leastWattPerSquareMillimetre * 1e6;
    this.mostRating = mostWattPerSquareMillimetre * 1e6;
  }

  private static double none() {
    return Double.NaN;
  }

  /** Returns the words for people. */
  public String label() {
    return label;
  }

  /** Returns the smallest friction coefficient of the table (-), the dynamic one of two. */
  public double leastFriction() {
    return leastFriction;
  }

  /** Returns the largest friction coefficient of the table (-), the static one of two. */
  public double mostFriction() {
    return mostFriction;
  }

  /** Returns the highest temperature (°C), or NaN. */
  public double highestTemperature() {
    return highestTemperature;
  }

  /** Returns the highest continuous temperature (°C), or NaN. */
  public double continuousTemperature() {
    return continuousTemperature;
  }

  /** Returns the lower end of the working pressure (Pa). */
  public double leastPressure() {
    return leastPressure;
  }

  /** Returns the upper end of the working pressure (Pa). */
  public double mostPressure() {
    return mostPressure;
  }

  /** Returns the lower end of the power rating (W/m²). */
  public double leastRating() {
    return leastRating;
  }

  /** Returns the upper end of the power rating (W/m²). */
  public double mostRating() {
    return mostRating;
  }

  /**
   * Returns the sliding power (W) that a friction area (m²) bears by the lower end of the rating.
   */
  public double powerLimit(double area) {
    return leastRating * area;
  }
}
