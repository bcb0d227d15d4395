package rampwright.vehicle.trim;

/**
 * Looks along a branch of trims for the one at which some quantity is zero: an acceleration or a
 * speed that is extreme, a fold, the driver's growth rate. States are placed by their distance
 * along an {@link Arc}, which does not fold where the quantity does.
 *
 * <p>A workspace, one instance per thread.
 */
final class ArcSearch {
  private static final int MOST_NARROWINGS = 50;
  private static final int MOST_STEPS = 8;

  /** Arc length within which a jump of the quantity is located. */
  private static final double NARROW = 1e-9;

  /** Arc length for a first difference quotient. */
  private static final double PROBE = 0.01;

  /** Largest arc length between the answers of neighbouring points of the road. */
  private static final double FAR = 1.5;

  private final Equilibrium equilibrium;
  private final Arc arc;
  private final TrimState low = new TrimState();
  private final TrimState trial = new TrimState();

  /** Quotient of miss and distance of the last {@link #follow}; NaN when unknown. */
  double slope = Double.NaN;

  /** What shall be zero. */
  interface Miss {
    /** Returns the miss at a state that was solved this very moment. */
    double of(TrimState state);
  }

  ArcSearch(Equilibrium equilibrium, Arc arc) {
    this.equilibrium = equilibrium;
    this.arc = arc;
  }

  /**
   * Narrows down between two states with a miss of opposite sign (Illinois method). Where the miss
   * jumps, the answer is the near side of the jump.
   *
   * @param near first state on the branch
   * @param missNear its miss
   * @param far second state; may be {@code out}
   * @param missFar its miss
   * @param tolerance size of a miss that counts as none
   * @param out receives the answer; on failure the state nearest to the zero on the near side
   */
  void narrow(
      TrimState near,
      double missNear,
      TrimState far,
      double missFar,
      Miss miss,
      double tolerance,
      TrimState out) {
    low.copyFrom(near);
    double a = 0;
    double missA = missNear;
    double b = arc.pointTo(near, far);
    double missB = missFar;
    arc.startAt(near);
    int side = 0;
    for (int k = 0; k < MOST_NARROWINGS && b - a > NARROW; k++) {
      double at = k % 5 == 4 ? (a + b) / 2 : a + (b - a) * missA / (missA - missB);
      trial.copyFrom(low);
      arc.move(trial, at - a);
      if (!equilibrium.alongArc(trial, arc, at)) {
        break;
      }
      double found = miss.of(trial);
      boolean nearSide = found * missNear > 0;
      if (nearSide) {
        a = at;
        missA = found;
        missB *= side == 1 ? 0.5 : 1;
        side = 1;
        low.copyFrom(trial);
      } else {
        b = at;
        missB = found;
        missA *= side == -1 ? 0.5 : 1;
        side = -1;
      }
      if (Math.abs(found) < tolerance) {
        low.copyFrom(trial);
        break;
      }
    }
    out.copyFrom(low);
  }

  /**
   * Secant search for the zero next to a guess, along the arc's direction.
   *
   * @param state the guess; receives the answer
   * @return whether it was found
   */
  boolean follow(TrimState state, Miss miss, double tolerance) {
    double distance = 0;
    double previous = Double.NaN;
    double missBefore = Double.NaN;
    arc.startAt(state);
    for (int k = 0; k < MOST_STEPS; k++) {
      if (!equilibrium.alongArc(state, arc, distance)) {
        return false;
      }
      double found = miss.of(state);
      if (Math.abs(found) < tolerance) {
        return true;
      }
      if (!Double.isNaN(previous)) {
        slope = (found - missBefore) / (distance - previous);
      }
      previous = distance;
      missBefore = found;
      distance += Double.isNaN(slope) ? PROBE : -found / slope;
      if (!(Math.abs(distance) < FAR)) {
        return false;
      }
      arc.move(state, distance - previous);
    }
    return false;
  }
}
