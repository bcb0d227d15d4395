package rampwright.vehicle.balance;

import rampwright.vehicle.balance.PlateHeat.LapHeat;
import rampwright.vehicle.lap.Lap;

/** Runs the sliding power of one lap through the heat flow of a unit. */
final class HeatedLap {
  private final double spacing;
  private final PlateCooling cooling;
  private final double[] power;
  private final double[] time;
  private final double peakPower;

  HeatedLap(Lap lap, UnitPosition unit, PlateCooling cooling) {
    this.spacing = lap.road().spacing();
    this.cooling = cooling;
    LapPower source = new LapPower(lap);
    int n = lap.road().size();
    this.power = new double[n];
    this.time = new double[n];
    double peak = 0;
    for (int i = 0; i < n; i++) {
      time[i] = source.interval(i);
      power[i] = source.energy(i, k -> source.plates(k, unit)) / time[i];
      peak = Math.max(peak, source.plates(i, unit));
    }
    this.peakPower = peak;
  }

  double energy() {
    double sum = 0;
    for (int i = 0; i < power.length; i++) {
      sum += power[i] * time[i];
    }
    return sum;
  }

  double peakPower() {
    return peakPower;
  }

  LapHeat drive(PlateTemperature start) {
    PlateTemperature now = start;
    double hottest = start.plates();
    double hottestAt = 0;
    double sum = 0;
    double whole = 0;
    for (int i = 0; i < power.length; i++) {
      PlateTemperature next = cooling.after(now, power[i], time[i]);
      sum += (now.plates() + next.plates()) / 2 * time[i];
      whole += time[i];
      if (next.plates() > hottest) {
        hottest = next.plates();
        hottestAt = (i + 1) * spacing;
      }
      now = next;
    }
    return new LapHeat(hottest, hottestAt, sum / whole, now);
  }

  /**
   * Temperatures with which a lap ends as it starts. A lap maps the start to the end linearly,
   * {@code end = M start + b}, so three laps from different starts give {@code (I - M)^-1 b}.
   */
  PlateTemperature settledStart() {
    PlateTemperature zero = drive(new PlateTemperature(0, 0)).end();
    PlateTemperature one = drive(new PlateTemperature(1, 0)).end();
    PlateTemperature two = drive(new PlateTemperature(0, 1)).end();
    double a = 1 - (one.plates() - zero.plates());
    double b = -(two.plates() - zero.plates());
    double c = -(one.oil() - zero.oil());
    double d = 1 - (two.oil() - zero.oil());
    double determinant = a * d - b * c;
    return new PlateTemperature(
        (d * zero.plates() - b * zero.oil()) / determinant,
        (a * zero.oil() - c * zero.plates()) / determinant);
  }
}
