package rampwright.vehicle.trim;

import java.util.Arrays;

/**
 * A straight line in the space of a trim's unknowns along which a branch is followed past its
 * folds: where it starts, its direction, and how the unknowns are scaled. The third unknown is the
 * path acceleration, or the speed at zero acceleration.
 */
final class Arc {
  private static final double ANGLE_SCALE = 0.03;
  private static final double SLIP_SCALE = 0.02;
  private static final double AX_SCALE = 1.0;
  private static final double SPEED_SCALE = 2.0;

  /** Whether the third unknown is the speed. */
  final boolean inSpeed;

  private final int[] wheels;
  private final int size;
  private final double[] origin = new double[7];

  /** Direction that is followed, of unit length in scaled unknowns. */
  final double[] direction = new double[7];

  /** Tangent of the branch where it was solved last, of unit length in scaled unknowns. */
  final double[] tangent = new double[7];

  Arc(boolean inSpeed, int[] activeWheels) {
    this.inSpeed = inSpeed;
    this.wheels = activeWheels;
    this.size = 3 + activeWheels.length;
  }

  double scale(int j) {
    if (j < 2) {
      return ANGLE_SCALE;
    }
    return j > 2 ? SLIP_SCALE : inSpeed ? SPEED_SCALE : AX_SCALE;
  }

  double unknown(TrimState state, int j) {
    return switch (j) {
      case 0 -> state.sideslip;
      case 1 -> state.steer;
      case 2 -> inSpeed ? state.speed : state.ax;
      default -> state.slip[wheels[j - 3]];
    };
  }

  /** Starts at a state. */
  void startAt(TrimState state) {
    for (int j = 0; j < size; j++) {
      origin[j] = unknown(state, j);
    }
  }

  /** Points from one state to another; returns the distance between them. */
  double pointTo(TrimState from, TrimState to) {
    double norm = 0;
    for (int j = 0; j < size; j++) {
      direction[j] = (unknown(to, j) - unknown(from, j)) / scale(j);
      norm += direction[j] * direction[j];
    }
    norm = Math.sqrt(norm);
    for (int j = 0; j < size; j++) {
      direction[j] /= norm;
    }
    return norm;
  }

  /** Points along the third unknown alone: solving at distance zero holds it. */
  void pointAlongThird() {
    Arrays.fill(direction, 0);
    direction[2] = 1;
  }

  /** Points along the branch through a state solved at given acceleration, torque or slip. */
  void pointAlongBranch(TrimState state, int sign) {
    tangent[0] = sign * state.sideslipRate / scale(0);
    tangent[1] = sign * state.steerRate / scale(1);
    tangent[2] = sign * state.axRate / scale(2);
    for (int j = 3; j < size; j++) {
      tangent[j] = sign * state.slipRate[wheels[j - 3]] / scale(j);
    }
    normaliseTangent();
    turn();
  }

  /** Takes the direction that is followed for the tangent again, after a step that was refused. */
  void restoreTangent() {
    System.arraycopy(direction, 0, tangent, 0, size);
  }

  /** Turns into the tangent found last. */
  void turn() {
    System.arraycopy(tangent, 0, direction, 0, size);
  }

  /** Moves the unknowns of a state along the direction. */
  void move(TrimState state, double distance) {
    state.sideslip += distance * direction[0] * scale(0);
    state.steer += distance * direction[1] * scale(1);
    double third = distance * direction[2] * scale(2);
    if (inSpeed) {
      state.speed += third;
    } else {
      state.ax += third;
    }
    for (int j = 3; j < size; j++) {
      state.slip[wheels[j - 3]] += distance * direction[j] * scale(j);
    }
  }

  /** Returns how far a state lies along the direction from the start. */
  double distance(TrimState state) {
    double sum = 0;
    for (int j = 0; j < size; j++) {
      sum += direction[j] * (unknown(state, j) - origin[j]) / scale(j);
    }
    return sum;
  }

  /** Stores the tangent from the change of the unknowns with arc length. */
  void storeTangent(double[] change) {
    for (int j = 0; j < size; j++) {
      tangent[j] = change[j] / scale(j);
    }
    normaliseTangent();
  }

  private void normaliseTangent() {
    double norm = 0;
    for (int j = 0; j < size; j++) {
      norm += tangent[j] * tangent[j];
    }
    norm = Math.sqrt(norm);
    for (int j = 0; j < size; j++) {
      tangent[j] /= norm;
    }
  }

  /** Returns the tangent's part in speed or acceleration, scaled. */
  double thirdPart() {
    return tangent[2];
  }

  /** Returns the tangent's part in mean slip, scaled. */
  double meanSlipPart() {
    double sum = 0;
    for (int j = 3; j < size; j++) {
      sum += tangent[j];
    }
    return sum / wheels.length;
  }
}
