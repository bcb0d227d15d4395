package rampwright.vehicle.lap;

import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.trim.TrimSolver;

/**
 * The fastest lap on a given line: cornering-limit speed at every station, then the drive limit
 * forward and the brake limit backward from the slowest station, {@code v dv/ds = ax}. A closed lap
 * starts as fast as it ends; an open run starts at the speed its first station allows.
 *
 * <p>Assumptions: quasi-steady state, the path is followed exactly, the driver changes from one
 * limit to the other at once. Method: Brayshaw and Harrison, <i>A quasi steady state approach to
 * race car lap simulation in order to understand the effects of racing line and centre of gravity
 * location</i>, Proc. IMechE D 219, 2005; optimality of the two passes: Velenis and Tsiotras 2005.
 *
 * <p>Integration is second order in the station spacing: the kinetic energy per mass {@code v²/2}
 * is advanced by the Adams-Bashforth rule, and by the trapezoidal rule after every jump of {@code
 * ax}.
 */
public final class LapSolver {
  private static final int MOST_LAPS = 8;

  private LapSolver() {}

  /**
   * Solves a lap.
   *
   * @throws InvalidInput when the car cannot follow the line at all
   */
  public static Lap solve(LapRequest request) {
    Road road = Road.refined(request.circuit(), request.conditions(), request.spacing());
    TrimSolver solver =
        new TrimSolver(request.car(), request.conditions(), request.differentials());
    double growthMax =
        request.form() == LimitForm.CAR ? Double.POSITIVE_INFINITY : request.driver().powerGrowth();
    SpeedLimits limits = new SpeedLimits(request, road, solver, growthMax);
    limits.compute();
    Gearbox gearbox = new Gearbox(request.car().driveline());
    Profile profile = new Profile(road.size());
    ForwardPass forward = new ForwardPass(road, solver, gearbox, limits, growthMax, profile);
    int start = road.closed() ? limits.slowest() : 0;
    double speed = limits.speed(start);
    double arrival = forward.run(start, speed);
    // a car too slow for the limit of its slowest station starts as fast as it arrives
    for (int lap = 0; road.closed() && arrival < speed - 1e-9 && lap < MOST_LAPS; lap++) {
      speed = arrival;
      arrival = forward.run(start, speed);
    }
    new BackwardPass(road, solver, gearbox, limits, profile, request).run(start);
    TraceWriter writer = new TraceWriter(road, solver, gearbox, request.car().driveline(), profile);
    return new Lap(request, writer.write(), road.stationsOnly(), writer.trace());
  }
}
