package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Segment.Corner;
import rampwright.vehicle.circuit.Segment.Straight;
import rampwright.vehicle.circuit.SegmentLine;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.input.InvalidInput;

/** The forms in which loggers write one lap. */
class LogVariantsTest {
  private static final double RADIUS = 80;
  private static final double LENGTH = 2 * Math.PI * RADIUS;

  private static String ring(double speed) {
    return LogText.lap(s -> 1 / RADIUS, s -> speed, LENGTH, 20);
  }

  private static void isTheRing(ImportedCircuit imported) {
    assertThat(imported.circuit().length()).isCloseTo(LENGTH, within(1.5));
    assertThat(imported.circuit().stations())
        .allSatisfy(s -> assertThat(1 / s.curvature()).isCloseTo(RADIUS, within(0.4)));
  }

  private static ImportedCircuit read(String text, ImportOptions options) {
    return CircuitImport.read("lap.csv", LogText.stream(text), options);
  }

  private static double[] numbers(String line) {
    return List.of(line.split(",")).stream().mapToDouble(Double::parseDouble).toArray();
  }

  private static String rows(String log, String header, Function<double[], String> row) {
    return header
        + "\n"
        + log.lines()
            .skip(1)
            .map(line -> row.apply(numbers(line)))
            .collect(Collectors.joining("\n"));
  }

  @Test
  void yawRateInPlaceOfLateralAcceleration() {
    String log =
        rows(
            ring(20),
            "time_s,speed_mps,yaw rate [deg/s]",
            n -> String.format(Locale.ROOT, "%f,%f,%f", n[0], n[1], Math.toDegrees(n[2] / n[1])));
    ImportedCircuit imported = LogText.read(log);
    isTheRing(imported);
    assertThat(imported.report().notes()).contains("Curvature is yaw rate over speed.");
    assertThat(imported.report().get(Figure.YAW_RATE_OFFSET)).isPresent();
  }

  @Test
  void semicolonsDecimalCommasAndARowOfUnits() {
    String log =
        rows(
            ring(20),
            "Session 3\nTime;Speed;Lateral acc\ns;km/h;g",
            n ->
                String.format(Locale.ROOT, "%.3f;%.3f;%.5f", n[0], 3.6 * n[1], n[2] / 9.80665)
                    .replace('.', ','));
    ImportedCircuit imported = LogText.read(log);
    isTheRing(imported);
    assertThat(imported.report().notes()).contains("Numbers were read with a decimal comma.");
  }

  @Test
  void namesUnitsAndSignFromAMapping() {
    String log =
        rows(
            ring(20),
            "a,b,c",
            n -> String.format(Locale.ROOT, "%f,%f,%f", 1000 * n[0], n[1] / 0.44704, -n[2]));
    ImportOptions options =
        ImportOptions.defaults()
            .withColumns("time=a[ms], speed=b[mph], lateral_acceleration=-c[m/s2]");
    isTheRing(read(log, options));
  }

  @Test
  void theFastestWholeLapIsTakenUnlessOneIsNamed() {
    StringBuilder log = new StringBuilder("time_s,speed_mps,ay_mps2,lap\n");
    double start = 0;
    double[] speeds = {20, 21, 20.5};
    for (int lap = 0; lap < speeds.length; lap++) {
      double from = start;
      int number = lap + 1;
      String rows =
          rows(
              ring(speeds[lap]),
              "",
              n -> String.format(Locale.ROOT, "%.4f,%f,%f,%d", from + n[0], n[1], n[2], number));
      log.append(rows.substring(1)).append('\n');
      start += LENGTH / speeds[lap];
    }
    // an unfinished lap does not count
    log.append(
        String.format(Locale.ROOT, "%.4f,21,5.5125,4\n%.4f,21,5.5125,4\n", start, start + 0.05));
    ImportedCircuit fastest = LogText.read(log.toString());
    isTheRing(fastest);
    assertThat(fastest.report().get(Figure.LAP).orElseThrow()).isEqualTo(2);
    assertThat(fastest.report().notes())
        .contains("The file holds 4 laps, 3 of them whole; the fastest was taken.");
    ImportedCircuit third = read(log.toString(), ImportOptions.defaults().withLap(3));
    isTheRing(third);
    assertThat(third.report().get(Figure.LAP_TIME).orElseThrow())
        .isCloseTo(LENGTH / 20.5, within(0.051));
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> read(log.toString(), ImportOptions.defaults().withLap(7)))
        .withMessage("lap.csv: The number of the lap (7) must be one of the file's: 1, 2, 3, 4.");
  }

  @Test
  void aFigureOfEightTurnsBackToItsDirection() {
    Circuit eight =
        SegmentLine.closed(
            "Eight",
            List.of(
                new Straight(150),
                Corner.degrees(50, 135, 30),
                new Straight(60),
                Corner.degrees(50, 135, 30),
                new Straight(150),
                Corner.degrees(50, -135, 30),
                new Straight(60),
                Corner.degrees(50, -135, 30)),
            900,
            1);
    List<Station> stations = eight.stations();
    String log =
        LogText.lap(
            s -> stations.get((int) Math.round(s) % stations.size()).curvature(),
            s -> 20,
            eight.length(),
            50);
    ImportedCircuit imported = LogText.read(log);
    assertThat(imported.report().get(Figure.TURNING_BEFORE).orElseThrow())
        .isCloseTo(0, within(5.0));
    assertThat(imported.report().get(Figure.TURNING_AFTER).orElseThrow())
        .isCloseTo(0, within(1e-9));
    assertThat(imported.report().get(Figure.SMALLEST_RADIUS).orElseThrow())
        .isCloseTo(50, within(1.0));
  }

  @Test
  void anOpenRunIsNotClosed() {
    String log = LogText.lap(s -> s / 200 / 60, s -> 15, 200, 50);
    Circuit run = read(log, ImportOptions.defaults().withClosed(false)).circuit();
    assertThat(run.closed()).isFalse();
    assertThat(run.length()).isCloseTo(200, within(0.3));
    for (Station station : run.stations()) {
      boolean end = station.distance() < 10 || station.distance() > 190;
      // cells at the ends are half as long and lie a quarter of their length off their station
      assertThat(station.curvature())
          .isCloseTo(station.distance() / 200 / 60, within(end ? 2e-4 : 1e-5));
    }
  }

  @Test
  void speedInMphThatClaimsKmhIsNamedByTheTurningOfTheLap() {
    String log =
        rows(
            ring(20),
            "time_s,Speed (km/h),ay_mps2",
            n -> String.format(Locale.ROOT, "%f,%f,%f", n[0], n[1] / 0.44704, n[2]));
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> LogText.read(log))
        .withMessage(
            "lap.csv:1: The unit of the column Speed (km/h) (km/h) must be mph to agree with the"
                + " rest of the file (the lap turns by 580 degrees instead of 360). Maybe write"
                + " speed=Speed[mph] in the column mapping.");
  }

  @Test
  void speedInMphThatClaimsKmhIsNamedByTheLongitudinalAcceleration() {
    double wave = 2 * Math.PI / LENGTH;
    String log = LogText.lap(s -> 1 / RADIUS, s -> 20 + 5 * Math.sin(wave * s), LENGTH, 50);
    String withAx =
        rows(
            log,
            "time_s,speed [km/h],ay_mps2,longitudinal acceleration [g]",
            n -> {
              // dv/dt = v dv/ds, with cos from the sine
              double sin = (n[1] - 20) / 5;
              return String.format(
                  Locale.ROOT,
                  "%f,%f,%f,%f",
                  n[0],
                  n[1] / 0.44704,
                  n[2],
                  n[1] * 5 * wave * Math.sqrt(Math.max(0, 1 - sin * sin)) / 9.80665);
            });
    // the sign of the cosine is lost: only the size of the two is compared here
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> LogText.read(withAx))
        .withMessageContaining("must be mph to agree with the rest of the file");
  }

  @Test
  void dropoutsAreBridgedAndCounted() {
    List<String> lines = ring(20).lines().toList();
    StringBuilder log = new StringBuilder();
    for (int i = 0; i < lines.size(); i++) {
      String line = lines.get(i);
      boolean missing = i >= 100 && i < 110;
      boolean empty = i >= 200 && i < 205;
      if (!missing) {
        log.append(empty ? line.substring(0, line.lastIndexOf(',') + 1) : line).append('\n');
      }
    }
    ImportedCircuit imported = LogText.read(log.toString());
    isTheRing(imported);
    // ten rows of two columns, and five values of one
    assertThat(imported.report().get(Figure.BRIDGED).orElseThrow()).isEqualTo(25);
    assertThat(imported.report().get(Figure.DROPOUTS).orElseThrow()).isEqualTo(3);
    assertThat(imported.report().get(Figure.LONGEST_DROPOUT).orElseThrow())
        .isCloseTo(0.55, within(1e-6));
  }
}
