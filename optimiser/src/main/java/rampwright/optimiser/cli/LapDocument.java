package rampwright.optimiser.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.balance.LapReport;
import rampwright.vehicle.balance.PhaseReport;

/** Laps as a JSON document. */
final class LapDocument {
  private LapDocument() {}

  /**
   * Returns the document.
   *
   * @param traces folder of the traces, or null when none were written
   */
  static Map<String, Object> of(Event event, List<SolvedLaps> laps, Path traces) {
    return new JsonMap()
        .put("event", event.name())
        .put("version", ProgramVersion.text())
        .put("laps", laps.stream().map(each -> laps(event, each, traces)).toList())
        .map();
  }

  private static Map<String, Object> laps(Event event, SolvedLaps laps, Path traces) {
    JsonMap out = new JsonMap();
    out.put("circuit", laps.circuit().name());
    SettingWords.put(out, event, laps.setting());
    out.putAll(lap(event, laps, laps.driverReport()));
    out.put("carLimits", lap(event, laps, laps.carReport()));
    if (traces != null) {
      out.put("traceFile", traces.resolve(laps.fileName("driver")).toString());
      out.put("carLimitsTraceFile", traces.resolve(laps.fileName("car")).toString());
    }
    return out.map();
  }

  private static Map<String, Object> lap(Event event, SolvedLaps laps, LapReport report) {
    return measures(event, laps.setting(), report)
        .put("corners", report.corners().stream().map(LapDocument::corner).toList())
        .map();
  }

  /** Returns what is said of a whole lap. */
  static JsonMap measures(Event event, NamedSetting setting, LapReport report) {
    JsonMap out = new JsonMap();
    out.put("lapTimeS", report.lapTime());
    out.put("topSpeedMps", report.topSpeed());
    out.put("exitUndersteerAngleRad", report.exitUndersteerAngle());
    out.put("largestEntrySigmaPerS", report.peakSigmaEntry());
    out.put("largestExitSigmaPerS", report.peakSigmaExit());
    out.put("largestInnerSlip", report.peakInnerSlip());
    out.put("plateEnergyJ", report.plateEnergy());
    out.put("largestPlatePowerW", report.peakPlatePower());
    setting
        .kitSetting()
        .map(fitted -> event.kit().build(fitted).frictionArea() * 1e6)
        .ifPresent(area -> out.put("largestPlatePowerWPerMm2", report.peakPlatePower() / area));
    out.put("tyreWorkFrontJ", report.tyreWorkFront());
    out.put("tyreWorkRearJ", report.tyreWorkRear());
    return out;
  }

  private static Map<String, Object> corner(CornerReport corner) {
    return new JsonMap()
        .put("number", corner.number())
        .put("turns", corner.left() ? "left" : "right")
        .put("slowestDistanceM", corner.apexDistance())
        .put("slowestSpeedMps", corner.slowestSpeed())
        .put("timeS", corner.time())
        .put("fullThrottleAfterM", corner.fullThrottleDistance())
        .put("phases", corner.phases().stream().map(LapDocument::phase).toList())
        .map();
  }

  private static Map<String, Object> phase(PhaseReport phase) {
    return new JsonMap()
        .put("phase", phase.phase().label())
        .put("startM", phase.start())
        .put("lengthM", phase.length())
        .put("timeS", phase.time())
        .put("entrySpeedMps", phase.entrySpeed())
        .put("exitSpeedMps", phase.exitSpeed())
        .put("meanAxMps2", phase.meanAx())
        .put("tractionLimitedShare", phase.tractionLimitedShare())
        .put("largestInnerSlip", phase.peakInnerSlip())
        .put("meanTorqueDifferenceNm", phase.meanTorqueDifference())
        .put("lockedShare", phase.lockedShare())
        .put("meanUndersteerAngleRad", phase.meanUndersteerAngle())
        .put("meanYawMomentDifferentialNm", phase.meanYawMoment())
        .put("largestSigmaPerS", phase.peakSigma())
        .put("largestSigmaDistanceM", phase.peakSigmaDistance())
        .put("leastControl", phase.leastControl())
        .put("plateEnergyJ", phase.plateEnergy())
        .put("largestPlatePowerW", phase.peakPlatePower())
        .put("tyreWorkFrontJ", phase.tyreWorkFront())
        .put("tyreWorkRearJ", phase.tyreWorkRear())
        .map();
  }
}
