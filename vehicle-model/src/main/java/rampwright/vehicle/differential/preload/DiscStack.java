package rampwright.vehicle.differential.preload;

import rampwright.vehicle.input.Quantity;

/**
 * Equal disc springs on one axis: groups of {@code parallel} springs laid the same way, {@code
 * series} such groups laid against each other. Forces add up within a group, deflections over the
 * groups. Friction between the springs of a group is left out; it raises the force on the way in
 * and lowers it on the way out by 2 to 3 % for each spring beyond the first (common practice, no
 * source).
 *
 * @param spring one spring
 * @param parallel springs in a group
 * @param series groups
 */
public record DiscStack(DiscSpring spring, int parallel, int series) {
  public static final Quantity PARALLEL =
      Quantity.si("discs_parallel", "disc springs in parallel", "", 1, 10, "");
  public static final Quantity SERIES =
      Quantity.si("discs_series", "disc spring groups in series", "", 1, 50, "");

  /** Checks both numbers. */
  public DiscStack {
    PARALLEL.check(parallel);
    SERIES.check(series);
  }

  /** Returns the free height (m). */
  public double freeHeight() {
    return series * (spring.coneHeight() + parallel * spring.thickness());
  }

  /** Returns the force (N) at a deflection of the whole stack (m). */
  public double force(double deflection) {
    return parallel * spring.force(deflection / series);
  }

  /** Returns the rate (N/m) at a deflection of the whole stack (m). */
  public double rate(double deflection) {
    return parallel * spring.rate(deflection / series) / series;
  }

  /** Returns the deflection (m) up to which the force rises. */
  public double risingDeflection() {
    return series * spring.risingDeflection();
  }

  /**
   * Returns the deflection of the whole stack (m) at a force (N).
   *
   * @throws rampwright.vehicle.input.InvalidInput when the stack cannot give the force
   */
  public double deflection(double force) {
    return series * spring.deflection(force / parallel);
  }
}
