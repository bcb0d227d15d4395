package rampwright.vehicle.circuit;

import static rampwright.vehicle.circuit.Segment.Corner.degrees;

import java.util.List;
import rampwright.vehicle.circuit.Segment.Straight;

/**
 * The segment lists and hills behind the sample circuits. Names, places and layouts are invented.
 */
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

  /**
   * Returns the hilly sample: anticlockwise, with a crest, a banked and an adversely cambered
   * corner and a stretch that is damp on the left.
   */
  public static Circuit hilly() {
    Circuit flat =
        rounded(
            SegmentLine.closed(
                "Thornbeck",
                List.of(
                    new Straight(300),
                    degrees(45, 110, 30),
                    new Straight(160),
                    degrees(70, -60, 30),
                    new Straight(220),
                    degrees(22, 150, 20),
                    new Straight(260),
                    degrees(110, 75, 50),
                    new Straight(180),
                    degrees(55, -70, 30),
                    new Straight(150),
                    degrees(60, 155, 40),
                    new Straight(240)),
                2600,
                SPACING));
    return new Circuit(
        flat.name(),
        true,
        flat.length(),
        flat.stations().stream().map(SampleCircuits::withHills).toList());
  }

  private static Station withHills(Station flat) {
    double s = flat.distance();
    double wave = 2 * Math.PI / 2600;
    // heights 8, 4 and 3 m in waves of the whole, a third and a fifth of the lap
    double slope =
        8 * wave * Math.cos(wave * s)
            + 12 * wave * Math.cos(3 * wave * s + 1)
            + 15 * wave * Math.cos(5 * wave * s + 2);
    double bankDegrees = 6 * hump(s, 2180, 2500) - 2.5 * hump(s, 1760, 1960);
    return new Station(
        s,
        flat.curvature(),
        flat.x(),
        flat.y(),
        Math.toRadians(rounded(Math.toDegrees(Math.atan(slope)), 1e4)),
        Math.toRadians(rounded(bankDegrees, 1e4)),
        rounded(1 - 0.1 * hump(s, 760, 1060), 1e4),
        1);
  }

  /** Rises from 0 to 1 and falls again between two distances (m), with even slope. */
  private static double hump(double s, double from, double to) {
    if (s <= from || s >= to) {
      return 0;
    }
    double edge = Math.min(1, Math.min(s - from, to - s) / 60);
    return edge * edge * (3 - 2 * edge);
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
