package rampwright.vehicle.lap;

import rampwright.vehicle.trim.TrimState;

/** Speed, trim, gear and limit of every station while a lap is being solved. */
final class Profile {
  private static final int WIDTH = 9;

  final int size;
  final double[] speed;
  final int[] gear;
  final LapLimit[] limit;
  private final double[] unknowns;
  private final boolean[] braking;

  Profile(int size) {
    this.size = size;
    this.speed = new double[size];
    this.gear = new int[size];
    this.limit = new LapLimit[size];
    this.unknowns = new double[size * WIDTH];
    this.braking = new boolean[size];
  }

  void save(int i, TrimState state, int inGear, LapLimit why) {
    speed[i] = state.speed;
    gear[i] = inGear;
    limit[i] = why;
    braking[i] = state.braking;
    int k = i * WIDTH;
    unknowns[k] = state.sideslip;
    unknowns[k + 1] = state.steer;
    unknowns[k + 2] = state.ax;
    unknowns[k + 3] = state.cageTorque;
    unknowns[k + 4] = state.meanSlip;
    System.arraycopy(state.slip, 0, unknowns, k + 5, 4);
  }

  void load(int i, TrimState state) {
    state.speed = speed[i];
    state.braking = braking[i];
    int k = i * WIDTH;
    state.sideslip = unknowns[k];
    state.steer = unknowns[k + 1];
    state.ax = unknowns[k + 2];
    state.cageTorque = unknowns[k + 3];
    state.meanSlip = unknowns[k + 4];
    System.arraycopy(unknowns, k + 5, state.slip, 0, 4);
  }

  boolean braking(int i) {
    return braking[i];
  }

  double ax(int i) {
    return unknowns[i * WIDTH + 2];
  }
}
