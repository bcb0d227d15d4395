package rampwright.optimiser.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rampwright.optimiser.kit.PartsKit;
import rampwright.optimiser.sheet.PlateStack.Plate;

class PlateStackTest {
  private static PartsKit kitUpTo(int most) {
    List<Integer> faces = new ArrayList<>();
    for (int i = 1; i <= most; i++) {
      faces.add(i);
    }
    PartsKit sample = SampleSheets.event().kit();
    return new PartsKit(
        "kit", sample.hardware(), sample.ringSets(), faces, sample.preload(), sample.changeTimes());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "10; 10; 5 × (C G), C",
        "8; 10; 3 × (C G), C, 2 G, 2 C",
        "6; 10; 2 × (C G), C, 3 G, 3 C",
        "2; 10; C, 5 G, 5 C",
        "2; 2; C G, C",
        "5; 5; 3 × (C G)",
        "4; 5; C G, C, 2 G, C",
        "1; 1; C G",
        "1; 4; 3 C, 2 G"
      })
  void theOrderInWords(int faces, int most, String order) {
    assertThat(PlateStack.of(kitUpTo(most), faces).order()).isEqualTo(order);
  }

  @Test
  void everyStackHasItsFacesAndThePlatesOfTheLargest() {
    for (int most = 1; most <= 20; most++) {
      PartsKit kit = kitUpTo(most);
      for (int faces = 1; faces <= most; faces++) {
        PlateStack stack = PlateStack.of(kit, faces);
        assertThat(stack.faces()).isEqualTo(faces);
        assertThat(stack.plates()).hasSize(most + 1).startsWith(Plate.CASE);
        assertThat(stack.count(Plate.CASE)).isEqualTo((most + 2) / 2);
      }
    }
  }
}
