package rampwright.web.compare;

import java.util.List;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.balance.GapSplit;
import rampwright.vehicle.balance.PhaseReport;
import rampwright.vehicle.circuit.Circuit;
import rampwright.web.work.LapStudy;

/**
 * Laps of one circuit against the first of them.
 *
 * @param studies the laps, the reference first
 * @param splits the gap of each other lap to the reference, in the same order
 */
record Comparison(List<LapStudy> studies, List<GapSplit> splits) {
  Comparison {
    studies = List.copyOf(studies);
    splits = List.copyOf(splits);
  }

  static Comparison of(List<LapStudy> studies) {
    LapStudy reference = studies.get(0);
    return new Comparison(
        studies,
        studies.stream()
            .skip(1)
            .map(other -> GapSplit.between(reference.lap(), other.lap()))
            .toList());
  }

  LapStudy reference() {
    return studies.get(0);
  }

  List<CornerReport> corners() {
    return reference().report().corners();
  }

  Circuit circuit() {
    return reference().lap().request().circuit();
  }

  /**
   * Returns what another lap loses (s) on the stretch that is a phase of the reference: both laps
   * are timed between the same two stations, whatever phase the other is in there.
   *
   * @param other 0 for the first after the reference
   */
  double loss(int other, PhaseReport phase) {
    GapSplit split = splits.get(other);
    double[] gap = split.gap();
    double from = gap[phase.firstStation()];
    boolean overTheLine = phase.endStation() <= phase.firstStation();
    if (overTheLine) {
      return split.total() - from + gap[phase.endStation()];
    }
    return (phase.endStation() < gap.length ? gap[phase.endStation()] : split.total()) - from;
  }

  /** Returns what another lap loses (s) over all phases of a corner of the reference. */
  double loss(int other, CornerReport corner) {
    return corner.phases().stream().mapToDouble(phase -> loss(other, phase)).sum();
  }
}
