package rampwright.vehicle.balance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.input.InvalidInput;

class PlateCoolingTest {
  private static final double NEARLY_NONE = 1e-6;
  private static final double NEARLY_ENDLESS = 1e12;

  /** One lump: oil that keeps the temperature of the air. */
  private static PlateCooling lump(double mass, double specificHeat, double flow) {
    return new PlateCooling(mass, specificHeat, flow, NEARLY_ENDLESS, NEARLY_ENDLESS, 20);
  }

  private static PlateTemperature cold() {
    return new PlateTemperature(20, 20);
  }

  /** Closed form: adiabatic {@code dT = E/(m c)}. */
  @Test
  @Tag("validation")
  void withoutCoolingAllEnergyStaysInThePlates() {
    PlateCooling cooling = lump(1.6, 460, NEARLY_NONE);
    double rise = cooling.after(cold(), 2000, 10).plates() - 20;
    assertThat(rise).isCloseTo(20000 / (1.6 * 460), within(1e-5));
  }

  /** Closed forms of one lump: {@code T_inf = T0 + P/(hA)}, {@code tau = m c/(hA)}. */
  @Test
  @Tag("validation")
  void aLumpReachesSixtyThreePercentAfterItsTimeConstant() {
    PlateCooling cooling = lump(1.6, 460, 50);
    double tau = 1.6 * 460 / 50;
    assertThat(cooling.settled(1000).plates()).isCloseTo(40, within(1e-6));
    double after = cooling.after(cold(), 1000, tau).plates();
    assertThat(after).isCloseTo(20 + 20 * (1 - Math.exp(-1)), within(1e-6));
    assertThat(after).isCloseTo(20 + 0.632 * 20, within(0.01));
  }

  @Test
  void theStepMayBeCutAnywhere() {
    PlateCooling cooling = PlateCooling.TYPICAL;
    PlateTemperature whole = cooling.after(cold(), 800, 40);
    PlateTemperature cut = cold();
    for (int k = 0; k < 400; k++) {
      cut = cooling.after(cut, 800, 0.1);
    }
    assertThat(cut.plates()).isCloseTo(whole.plates(), within(1e-9));
    assertThat(cut.oil()).isCloseTo(whole.oil(), within(1e-9));
  }

  @Test
  void theStepSolvesBothEquations() {
    PlateCooling c = PlateCooling.TYPICAL;
    PlateTemperature now = new PlateTemperature(120, 80);
    double dt = 1e-4;
    PlateTemperature next = c.after(now, 500, dt);
    double plates = (500 - c.plateToOil() * 40) / c.plateCapacity();
    double oil = (c.plateToOil() * 40 - c.oilToAir() * (80 - 25)) / c.oilCapacity();
    assertThat((next.plates() - 120) / dt).isCloseTo(plates, within(1e-3));
    assertThat((next.oil() - 80) / dt).isCloseTo(oil, within(1e-3));
  }

  @Test
  void aLongTimeLeadsToTheSettledTemperatures() {
    PlateTemperature end = PlateCooling.TYPICAL.after(cold(), 300, 1e5);
    assertThat(end.oil()).isCloseTo(25 + 300 / 15.0, within(1e-9));
    assertThat(end.plates()).isCloseTo(25 + 300 / 15.0 + 300 / 60.0, within(1e-9));
  }

  @Test
  void impossibleHeatFlowIsRefused() {
    assertThatThrownBy(() -> new PlateCooling(1.6, 460, 0, 5000, 15, 25))
        .isInstanceOf(InvalidInput.class)
        .hasMessageContaining("heat flow from plates to oil (0 W/K) must be between");
    assertThatThrownBy(() -> new PlateCooling(Double.NaN, 460, 60, 5000, 15, 25))
        .isInstanceOf(InvalidInput.class)
        .hasMessageContaining("mass of the plates (NaN kg)");
  }
}
