package rampwright.web.compare;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import rampwright.optimiser.event.Event;
import rampwright.vehicle.balance.CornerReport;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.lap.LimitForm;
import rampwright.web.store.SmallEvent;
import rampwright.web.work.Desk;
import rampwright.web.work.LapStudy;

class ComparisonTest {
  private static final Event EVENT = SmallEvent.event();
  private static final Circuit CIRCUIT = EVENT.circuits().get(0).circuit();
  private static final Desk DESK = new Desk();

  private static LapStudy study(String setting) {
    return DESK.study(EVENT, EVENT.setting(setting), CIRCUIT, LimitForm.DRIVER);
  }

  @Test
  void theLossesOfAllPhasesAddUpToTheGapOfTheLap() {
    Comparison comparison = Comparison.of(List.of(study("as raced"), study("firm"), study("open")));
    for (int other = 0; other < 2; other++) {
      double sum = 0;
      for (CornerReport corner : comparison.corners()) {
        sum += comparison.loss(other, corner);
      }
      double gap =
          comparison.studies().get(other + 1).lap().time() - comparison.reference().lap().time();
      assertThat(sum).isCloseTo(gap, within(1e-9));
    }
    assertThat(comparison.splits().get(1).total()).isNotZero();
  }

  @Test
  void aSettingGainsNothingOnItself() {
    Comparison comparison = Comparison.of(List.of(study("firm"), study("firm")));
    assertThat(comparison.corners()).allMatch(corner -> comparison.loss(0, corner) == 0);
  }

  @Test
  void differencesWorthALookAreMarkedWithMoreThanColour() {
    assertThat(Difference.of(-0.0312).getText()).isEqualTo("▲ −0.031");
    assertThat(Difference.of(0.0312).getText()).isEqualTo("▼ +0.031");
    assertThat(Difference.of(0.0012).getText()).isEqualTo("+0.001");
    assertThat(Difference.of(0.00001).getText()).isEqualTo("0.000");
  }
}
