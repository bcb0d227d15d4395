package rampwright.optimiser.search;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.input.InvalidInput;

class SettingSpaceTest {
  private static final SettingSpace SPACE = SettingSpace.of(SearchProblems.KIT);

  private static PartsKit kit(List<RingSet> sets, double step) {
    PartsKit kit = SearchProblems.KIT;
    return new PartsKit(
        kit.name(),
        kit.hardware(),
        sets,
        kit.facesPerSide(),
        new PartsKit.PreloadRange(0, 5000, step),
        kit.changeTimes());
  }

  @Test
  void theSampleKitHasEveryCombinationOnce() {
    // ten ring sets of which seven turn, five numbers of faces, 10 to 150 N·m in steps of 5
    assertThat(SPACE.size()).isEqualTo((10 + 7) * 5 * 29);
    Set<KitSetting> seen = new HashSet<>();
    for (int i = 0; i < SPACE.size(); i++) {
      KitSetting setting = SPACE.setting(i);
      PlateBuild build = SearchProblems.KIT.build(setting);
      assertThat(build.law()).isEqualTo(SPACE.law(i));
      assertThat(SPACE.index(setting)).isEqualTo(i);
      assertThat(SPACE.index(SPACE.fitting(i), SPACE.faces(i), SPACE.step(i))).isEqualTo(i);
      seen.add(setting);
    }
    assertThat(seen).hasSize(SPACE.size());
  }

  @Test
  void whatTheKitCannotBuildHasNoNumber() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> SPACE.index(new KitSetting("45/45", true, 4, 40)))
        .withMessageContaining("cannot be turned round");
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> SPACE.index(new KitSetting("45/60", true, 3, 40)));
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> SPACE.index(new KitSetting("45/60", true, 4, 42)));
  }

  @Test
  void aSetWithEqualAnglesDrivesTheSameTurnedRound() {
    RingSet set = new RingSet("A", Math.toRadians(45), Math.toRadians(45), true);
    RingSet twin = new RingSet("B", Math.toRadians(45), Math.toRadians(45), false);
    SettingSpace space = SettingSpace.of(kit(List.of(set, twin), 100));
    int normal = space.index(new KitSetting("A", false, 4, 300));
    int turned = space.index(new KitSetting("A", true, 4, 300));
    int other = space.index(new KitSetting("B", false, 4, 300));
    assertThat(space.alike(other)).containsExactly(normal, turned, other);
    assertThat(space.firstAlike(turned)).isEqualTo(normal);
    assertThat(space.firstAlike(other)).isEqualTo(normal);
  }

  @Test
  void aKitWithTooManySettingsIsRefused() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> SettingSpace.of(kit(SearchProblems.KIT.ringSets(), 0.1)))
        .withMessage(
            "The number of settings of the kit (4250085) must be at most 1000000. Maybe use a"
                + " larger preload step.");
  }
}
