package rampwright.optimiser.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.optimiser.sheet.SetupSheet.CornerEffect;
import rampwright.optimiser.sheet.SetupSheet.ExpectedLap;
import rampwright.vehicle.balance.LapAnalysis;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

class SetupSheetsTest {
  private static final Event EVENT = SampleSheets.event();
  private static final SetupSheet SHEET = SampleSheets.sheet();

  // the sample kit by hand: 8 faces, friction 0.11, mean radius (52 + 36)/2 = 44 mm, ramps at 34 mm
  private static final double PACK = 8 * 0.11 * 0.044;
  private static final double K_DRIVE = share(40);
  private static final double K_COAST = share(80);

  private static double share(double degrees) {
    return PACK / 0.034 / Math.tan(Math.toRadians(degrees) + Math.atan(0.08));
  }

  @Test
  void forcesAndSharesFollowFromTheParts() {
    assertThat(SHEET.build().preloadForce()).isCloseTo(80 / (2 * PACK), within(1e-9));
    assertThat(SHEET.build().law().driveShare()).isCloseTo(K_DRIVE, within(1e-12));
    assertThat(SHEET.build().law().coastShare()).isCloseTo(K_COAST, within(1e-12));
  }

  @Test
  void halfThePreloadShowsWithTheOtherWheelHeldAndThePropshaftFree() {
    assertThat(SHEET.bench().springsAlone().value()).isEqualTo(80);
    assertThat(SHEET.bench().wheelHeld().value()).isEqualTo(40);
    assertThat(SHEET.bench().wheelHeld().low()).isCloseTo(34, within(1e-12));
    assertThat(SHEET.bench().wheelHeld().high()).isCloseTo(46, within(1e-12));
  }

  @Test
  void aLockedPropshaftLoadsTheRampsThatItsReactionPressesOn() {
    assertThat(SHEET.bench().lockedForwards().value()).isCloseTo(80 / (1 - K_COAST), within(1e-9));
    // 8 faces at 40 degrees give a drive share above one: the harder one turns, the harder it holds
    assertThat(K_DRIVE).isGreaterThan(1);
    assertThat(SHEET.bench().lockedBackwards().breaksAway()).isFalse();
  }

  @Test
  void everyChangeIsListedWithTheLongestTime() {
    assertThat(SHEET.change().from()).isEqualTo("as raced");
    assertThat(SHEET.change().steps())
        .containsExactly(
            "Ring set: take out 45/60, fit 40/80 not turned.",
            "Plates: restack both sides from 6 to 8 faces per side, order as drawn.",
            "Preload: from 60 to 80\u00a0N·m, shims on each side stay at 0.69\u00a0mm, then check on"
                + " the bench.");
    assertThat(SHEET.change().time()).isEqualTo(OptionalDouble.of(3600));
  }

  @Test
  void withoutKnownSpringsTheBenchDecidesTheShims() {
    Event event = SampleSheets.eventWithoutSprings();
    SetupSheet sheet = SetupSheets.of(event, event.setting("harder"));
    assertThat(sheet.shims()).isEmpty();
    assertThat(sheet.change().steps())
        .last()
        .isEqualTo(
            "Preload: from 60 to 80\u00a0N·m, another number of faces needs another spring force:"
                + " shim to the bench.");
  }

  @Test
  void theShimsPressTheSpringsWithTheForceOfThePreload() {
    Shims shims = SHEET.shims().orElseThrow();
    assertThat(shims.stack().force(shims.deflection())).isCloseTo(80 / (2 * PACK), within(1e-6));
    // sample springs: twice 3.0 + 1.8 mm free height in a room of 10.0 mm
    assertThat(shims.thickness()).isCloseTo(shims.deflection() + 0.4e-3, within(1e-12));
    assertThat(shims.rate()).isGreaterThan(0);
    assertThat(shims.reliable()).isTrue();
  }

  @Test
  void theSettingInTheCarNeedsNoChangeAndGainsNothing() {
    Event event = SampleSheets.event();
    SetupSheet sheet = SetupSheets.of(event, event.current());
    assertThat(sheet.change().steps()).isEmpty();
    assertThat(sheet.change().time()).isEqualTo(OptionalDouble.of(0));
    assertThat(sheet.laps().get(0).difference()).isZero();
  }

  @Test
  void aUnitOfAnotherKindIsTakenOutWhole() {
    Event event = SampleSheets.eventWithCurrent("open");
    SettingChange change = SetupSheets.of(event, event.setting("harder")).change();
    assertThat(change.time()).isEmpty();
    assertThat(change.steps())
        .containsExactly(
            "Take out the differential that is in the car; fit the kit's unit as drawn.");
  }

  @Test
  void lapTimesAreThoseOfTheSolver() {
    ExpectedLap lap = SHEET.laps().get(0);
    assertThat(lap.lapTime()).isEqualTo(lap("harder", EVENT.circuits().get(0)).time());
    assertThat(lap.currentLapTime()).isEqualTo(lap("as raced", EVENT.circuits().get(0)).time());
    assertThat(lap.weight()).isEqualTo(2);
  }

  @Test
  void cornersAndTheRestAddUpToTheDifference() {
    ExpectedLap lap = SHEET.laps().get(1);
    assertThat(lap.difference()).isNotZero();
    assertThat(lap.corners()).extracting(CornerEffect::number).containsExactly(1, 2);
    double corners = lap.corners().stream().mapToDouble(CornerEffect::difference).sum();
    assertThat(corners + lap.outside()).isCloseTo(lap.difference(), within(1e-9));
    // the slowest point of a hairpin of 20 m radius at 0.95 of the tyre's friction of about 1.5
    assertThat(lap.corners().get(0).slowestSpeed()).isBetween(14.0, 19.0);
    assertThat(lap.corners().get(0).cause()).isNotEmpty();
  }

  @Test
  void theBandHoldsTheDifferencesOfWeakerAndStrongerPlates() {
    ExpectedLap lap = SHEET.laps().get(1);
    assertThat(lap.weakPlates()).isCloseTo(difference(0.85 * 0.11), within(1e-12));
    assertThat(lap.strongPlates()).isCloseTo(difference(1.15 * 0.11), within(1e-12));
    assertThat(lap.lowest()).isLessThan(lap.highest());
    assertThat(lap.difference()).isBetween(lap.lowest(), lap.highest());
  }

  /** The laws by hand: the preload stays, the shares go with the friction. */
  private static double difference(double friction) {
    PlateDifferential harder =
        new PlateDifferential(80, K_DRIVE * friction / 0.11, K_COAST * friction / 0.11);
    double pack = 6 * friction * 0.044 / 0.034;
    PlateDifferential raced =
        new PlateDifferential(
            60,
            pack / Math.tan(Math.toRadians(60) + Math.atan(0.08)),
            pack / Math.tan(Math.toRadians(45) + Math.atan(0.08)));
    return time(harder) - time(raced);
  }

  private static double time(PlateDifferential law) {
    NamedSetting setting = new NamedSetting("law", Optional.empty(), DifferentialSet.rear(law));
    return LapSolver.solve(
            EVENT.lapRequest(setting, EVENT.circuits().get(1).circuit(), LimitForm.DRIVER))
        .time();
  }

  private static Lap lap(String setting, WeightedCircuit circuit) {
    return LapSolver.solve(
        EVENT.lapRequest(EVENT.setting(setting), circuit.circuit(), LimitForm.DRIVER));
  }

  @Test
  void limitsOfPartsAndLapsAreJudged() {
    assertThat(SHEET.limits())
        .extracting(line -> line.limit().measure().name() + " " + line.met())
        .containsExactly(
            "PRELOAD_MIN " + Optional.of(false),
            "DRIVE_SHARE_MAX " + Optional.of(false),
            "COAST_SHARE_MAX " + Optional.of(true),
            "PLATE_ENERGY " + Optional.of(true));
    assertThat(SHEET.limits().get(1).value().orElseThrow()).isCloseTo(K_DRIVE, within(1e-12));
    double energy = 0;
    for (WeightedCircuit circuit : EVENT.circuits()) {
      energy = Math.max(energy, LapAnalysis.report(lap("harder", circuit)).plateEnergy());
    }
    assertThat(SHEET.limits().get(3).value().orElseThrow()).isEqualTo(energy).isPositive();
  }

  @Test
  void aDifferentialThatTheKitCannotBuildHasNoSheet() {
    Event event = SampleSheets.event();
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> SetupSheets.of(event, event.setting("open")))
        .withMessage(
            "The setting of a setup sheet (open) must be built from the parts kit; a differential"
                + " that is only compared with has no parts to fit. Maybe use one of: [as raced,"
                + " harder].");
  }
}
