package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Segment.Corner;
import rampwright.vehicle.circuit.Segment.Straight;
import rampwright.vehicle.circuit.SegmentLine;

/** What holds for the import of any lap, whatever its noise. */
@Tag("property")
class ClosingPropertyTest {

  /** A noisy log of an oval; {@code side} 1 for left, -1 for right. */
  private static String log(double radius, double straight, int seed, double offset, int side) {
    Circuit oval =
        SegmentLine.closed(
            "Oval",
            List.of(
                new Straight(straight),
                Corner.degrees(radius, 180, 25),
                new Straight(straight),
                Corner.degrees(radius, 180, 25)),
            2 * straight + 2 * Math.PI * radius + 50,
            1);
    Random random = new Random(seed);
    StringBuilder text = new StringBuilder("time_s,speed_mps,ay_mps2\n");
    double s = 0;
    for (int i = 0; s < oval.length(); i++) {
      double v = 20 + random.nextDouble();
      double curvature = oval.stations().get((int) s % oval.stations().size()).curvature();
      double lateral = v * v * curvature + offset + 0.4 * random.nextGaussian();
      text.append(String.format(Locale.ROOT, "%.2f,%.3f,%.4f\n", i / 25.0, v, side * lateral));
      s += v / 25;
    }
    return text.toString();
  }

  /** Total turning of a simple closed curve: 2*pi (Hopf's theorem on the turning of tangents). */
  @Property(tries = 20)
  void aLapTurnsOnceAndEndsAtItsStart(
      @ForAll @DoubleRange(min = 30, max = 90) double radius,
      @ForAll @DoubleRange(min = 60, max = 300) double straight,
      @ForAll @IntRange(max = 1000) int seed,
      @ForAll @DoubleRange(min = -0.1, max = 0.1) double offset) {
    ImportReport report = LogText.read(log(radius, straight, seed, offset, 1)).report();
    assertThat(report.get(Figure.TURNING_AFTER).orElseThrow()).isCloseTo(360, within(1e-9));
    assertThat(report.get(Figure.GAP_AFTER).orElseThrow()).isLessThan(1e-8);
  }

  @Property(tries = 10)
  void theMirroredLogGivesTheMirroredCircuit(
      @ForAll @DoubleRange(min = 30, max = 90) double radius,
      @ForAll @IntRange(max = 1000) int seed) {
    Circuit left = LogText.read(log(radius, 120, seed, 0, 1)).circuit();
    Circuit right = LogText.read(log(radius, 120, seed, 0, -1)).circuit();
    assertThat(right.length()).isEqualTo(left.length());
    for (int i = 0; i < left.stations().size(); i++) {
      assertThat(right.stations().get(i).curvature())
          .isCloseTo(-left.stations().get(i).curvature(), within(1e-12));
      assertThat(right.stations().get(i).y()).isCloseTo(-left.stations().get(i).y(), within(1e-8));
    }
  }
}
