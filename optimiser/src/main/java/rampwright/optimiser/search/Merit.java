package rampwright.optimiser.search;

import java.util.Comparator;

/**
 * How good a setting is, smaller being better: a setting that meets all limits is better than one
 * that does not, of two that meet them the faster is better, and of two that do not the one that
 * violates them less. Source: K. Deb, <i>An efficient constraint handling method for genetic
 * algorithms</i>, Computer Methods in Applied Mechanics and Engineering 186, 2000.
 *
 * @param violation sum of the violations (-), zero when all limits are met
 * @param objective what is to become small; the lap time (s)
 */
record Merit(double violation, double objective) implements Comparable<Merit> {
  /** Of a setting that could not be computed. */
  static final Merit WORST = new Merit(Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY);

  private static final Comparator<Merit> ORDER =
      Comparator.comparingDouble(Merit::violation).thenComparingDouble(Merit::objective);

  /** Rejects values that have no order. */
  Merit {
    if (!(violation >= 0) || Double.isNaN(objective)) {
      throw new IllegalArgumentException("no order: violation " + violation + ", " + objective);
    }
  }

  static Merit of(EvaluatedSetting setting) {
    return new Merit(setting.violation(), setting.lapTime());
  }

  @Override
  public int compareTo(Merit other) {
    return ORDER.compare(this, other);
  }
}
