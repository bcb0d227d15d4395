package rampwright.optimiser.cli;

import java.util.function.ToDoubleFunction;
import rampwright.vehicle.balance.LapReport;

/** What tables say of a whole lap. */
enum LapMeasure {
  LAP_TIME("lap time", "s", 3, LapReport::lapTime),
  TOP_SPEED("top speed", "km/h", 1, report -> report.topSpeed() * 3.6),
  EXIT_UNDERSTEER(
      "understeer angle on exits",
      "deg",
      2,
      report -> Math.toDegrees(report.exitUndersteerAngle())),
  ENTRY_SIGMA("slide growth rate on entry", "1/s", 2, LapReport::peakSigmaEntry),
  EXIT_SIGMA("slide growth rate on exit", "1/s", 2, LapReport::peakSigmaExit),
  INNER_SLIP("slip of the inner wheel", "", 3, LapReport::peakInnerSlip),
  PLATE_ENERGY("plate energy", "kJ", 1, report -> report.plateEnergy() / 1e3),
  PLATE_POWER("largest plate power", "kW", 2, report -> report.peakPlatePower() / 1e3),
  TYRE_WORK_FRONT("tyre work front", "kJ", 0, report -> report.tyreWorkFront() / 1e3),
  TYRE_WORK_REAR("tyre work rear", "kJ", 0, report -> report.tyreWorkRear() / 1e3);

  private final String label;
  private final String unit;
  private final int decimals;
  private final ToDoubleFunction<LapReport> value;

  LapMeasure(String label, String unit, int decimals, ToDoubleFunction<LapReport> value) {
    this.label = label;
    this.unit = unit;
    this.decimals = decimals;
    this.value = value;
  }

  String label() {
    return label;
  }

  /** Returns the unit in which the value is shown. */
  String unit() {
    return unit;
  }

  String shown(LapReport report) {
    return Shown.number(value.applyAsDouble(report), decimals);
  }
}
