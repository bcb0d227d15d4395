package rampwright.vehicle.circuit;

import static rampwright.vehicle.circuit.Segment.Corner.degrees;

import java.util.List;
import rampwright.vehicle.circuit.Segment.Straight;

/** The segment lists behind the sample circuits. Names, places and layouts are invented. */
public final class SampleCircuits {
  /** Spacing of the stations (m). */
  private static final double SPACING = 2;

  private SampleCircuits() {}

  /** Returns the slow sample: anticlockwise, six hairpins. */
  public static Circuit slow() {
    return rounded(
        SegmentLine.closed(
            "Kestrelwick",
            List.of(
                new Straight(230),
                degrees(14, 168, 14),
                new Straight(190),
                degrees(12, -172, 12),
                new Straight(175),
                degrees(16, 170, 16),
                new Straight(210),
                degrees(30, -84, 18),
                new Straight(110),
                degrees(25, 70, 16),
                new Straight(95),
                degrees(18, 176, 16),
                new Straight(80),
                degrees(11, -168, 12),
                new Straight(120),
                degrees(40, 118, 24),
                new Straight(210),
                degrees(35, -66, 16),
                new Straight(120),
                degrees(13, 148, 12),
                new Straight(150)),
            2300,
            SPACING));
  }

  /** Returns the fast sample: clockwise, 4 km, corners of 60 to 250 m and one chicane. */
  public static Circuit fast() {
    return rounded(
        SegmentLine.closed(
            "Velmoor",
            List.of(
                new Straight(330),
                degrees(90, -95, 40),
                new Straight(140),
                degrees(160, 45, 50),
                new Straight(110),
                degrees(130, -75, 50),
                new Straight(330),
                degrees(65, -120, 35),
                new Straight(240),
                degrees(75, 70, 35),
                new Straight(180),
                degrees(60, -55, 26),
                new Straight(12),
                degrees(60, 95, 30),
                new Straight(12),
                degrees(60, -50, 26),
                new Straight(260),
                degrees(120, -100, 45),
                new Straight(220),
                degrees(200, 50, 60),
                new Straight(200),
                degrees(250, -60, 70),
                new Straight(100),
                degrees(110, -65, 45),
                new Straight(330)),
            4000,
            SPACING));
  }

  /** Fewer digits make a file that a person can read; the position stays good to a micrometre. */
  private static Circuit rounded(Circuit circuit) {
    return new Circuit(
        circuit.name(),
        circuit.closed(),
        circuit.length(),
        circuit.stations().stream()
            .map(
                s ->
                    Station.flat(
                        s.distance(),
                        rounded(s.curvature(), 1e12),
                        rounded(s.x(), 1e6),
                        rounded(s.y(), 1e6)))
            .toList());
  }

  private static double rounded(double value, double perUnit) {
    return Math.round(value * perUnit) / perUnit + 0.0;
  }
}
