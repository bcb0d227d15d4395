package rampwright.optimiser.sheet;

import java.util.ArrayList;
import java.util.List;
import rampwright.optimiser.kit.PartsKit;

/**
 * Order of the plates of one side, from the pressure ring outwards. The other side is its mirror
 * image.
 *
 * <p>A friction face is a pair of neighbours of which one turns with the case and the other with
 * the side gear, so {@code N} faces need {@code N + 1} changing neighbours, the first of which
 * turns with the case as the pressure ring does. The kit is taken to hold the plates for its
 * largest number of faces. All of them stay in the stack, because its height sets the preload: idle
 * plates lie next to plates of their own kind at the outer end. (Changing the number of faces by
 * re-ordering plates is common practice, no source.)
 *
 * @param plates in order, the plate at the pressure ring first
 */
public record PlateStack(List<Plate> plates) {
  /** What a plate turns with. */
  public enum Plate {
    CASE,
    GEAR
  }

  /** Copies the plates. */
  public PlateStack {
    plates = List.copyOf(plates);
  }

  /** Returns the stack of a kit with a number of working faces per side. */
  public static PlateStack of(PartsKit kit, int faces) {
    List<Integer> possible = kit.facesPerSide();
    int most = Math.max(faces, possible.get(possible.size() - 1));
    int idleCase = (most + 2) / 2 - (faces + 2) / 2;
    int idleGear = (most + 1) / 2 - (faces + 1) / 2;
    List<Plate> plates = new ArrayList<>();
    for (int i = 0; i <= faces; i++) {
      Plate plate = i % 2 == 0 ? Plate.CASE : Plate.GEAR;
      plates.add(plate);
      int idle = plate == Plate.CASE ? idleCase : idleGear;
      for (int k = 0; i >= faces - 1 && k < idle; k++) {
        plates.add(plate);
      }
    }
    return new PlateStack(plates);
  }

  /** Returns the number of friction faces: neighbours of different kind. */
  public int faces() {
    int faces = 0;
    for (int i = 1; i < plates.size(); i++) {
      faces += plates.get(i) == plates.get(i - 1) ? 0 : 1;
    }
    return faces;
  }

  /** Returns the number of plates of a kind. */
  public int count(Plate kind) {
    return (int) plates.stream().filter(plate -> plate == kind).count();
  }

  /**
   * Returns the order in words for a bench: {@code 3 × (C G), C, 3 G, 2 C}. C turns with the case,
   * G with the side gear.
   */
  public String order() {
    List<String> parts = new ArrayList<>();
    int i = 0;
    int pairs = 0;
    while (run(i) == 1 && run(i + 1) == 1) {
      pairs++;
      i += 2;
    }
    if (pairs > 0) {
      parts.add(pairs == 1 ? "C G" : pairs + " × (C G)");
    }
    while (i < plates.size()) {
      int run = run(i);
      String letter = plates.get(i) == Plate.CASE ? "C" : "G";
      parts.add(run == 1 ? letter : run + " " + letter);
      i += run;
    }
    return String.join(", ", parts);
  }

  private int run(int from) {
    int to = from;
    while (to < plates.size() && plates.get(to) == plates.get(from)) {
      to++;
    }
    return to - from;
  }
}
