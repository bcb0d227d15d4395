package rampwright.vehicle.circuit.survey;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import java.util.Random;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.LapRequest;
import rampwright.vehicle.lap.LapSolver;
import rampwright.vehicle.lap.LimitForm;

/**
 * Makes the logged lap among the samples: the model's own lap of Velmoor as sensors would have
 * recorded it at 50 Hz. Sizes of the errors are common practice, no source.
 *
 * <p>Run {@link #main} with the samples' folder to write the file again.
 */
public final class SampleLog {
  static final String PATH = "logs/velmoor_lap.csv";

  private static final double RATE = 50;
  private static final double G = 9.80665;
  private static final long SEED = 20260412;

  /** The wheel-speed sensor's rolling radius is set too large by this share. */
  static final double SPEED_ERROR = 0.006;

  /** Zero offset of the lateral accelerometer (m/s²). */
  static final double LATERAL_OFFSET = 0.12;

  private static final double SPEED_NOISE = 0.05;
  private static final double LATERAL_NOISE = 0.3;
  private static final double LONGITUDINAL_NOISE = 0.25;
  private static final double YAW_RATE_NOISE = Math.toRadians(0.4);

  /** Slow wander and scatter of the satellite receiver (m), which gives every fifth row. */
  private static final double WANDER = 0.7;

  private static final double SCATTER = 0.12;
  private static final int ROWS_PER_FIX = 5;
  private static final double WANDER_TIME = 20;

  /** A place in mid-ocean: the circuit is invented. */
  static final double LATITUDE = Math.toRadians(45);

  static final double LONGITUDE = Math.toRadians(-30);

  private SampleLog() {}

  /** Returns the lap behind the log, solved at a spacing (m). */
  static Lap lap(Circuit circuit, double spacing) {
    FileSource samples = FileSource.classPath(SampleFiles.class.getClassLoader(), SampleFiles.BASE);
    return LapSolver.solve(
        new LapRequest(
            CarFile.read(samples, "cars/touring_car.yaml"),
            DifferentialSet.rear(OpenDifferential.IDEAL),
            Conditions.STANDARD,
            Driver.QUICK,
            LimitForm.DRIVER,
            circuit,
            spacing));
  }

  /** Writes the file into the folder of the samples. */
  public static void main(String[] folder) throws IOException {
    Path file = Path.of(folder[0]).resolve(PATH);
    Files.createDirectories(file.getParent());
    Files.writeString(file, text(lap(SampleCircuits.fast(), 2)), StandardCharsets.UTF_8);
  }

  static String text(Lap lap) {
    Curve time = channel(lap, Channel.TIME);
    Curve distance = Curve.of(columnY(time), columnX(time));
    Curve speed = channel(lap, Channel.SPEED);
    Curve lateral = channel(lap, Channel.AY);
    Curve longitudinal = channel(lap, Channel.AX);
    Random random = new Random(SEED);
    StringBuilder text = new StringBuilder(header());
    double wanderX = WANDER * random.nextGaussian();
    double wanderY = WANDER * random.nextGaussian();
    double keep = Math.exp(-ROWS_PER_FIX / RATE / WANDER_TIME);
    double held = Double.NaN;
    for (int row = 0; row / RATE < lap.time(); row++) {
      double t = row / RATE;
      double s = distance.at(t);
      double v = speed.at(s);
      double shownSpeed = v * (1 + SPEED_ERROR) + SPEED_NOISE * random.nextGaussian();
      held = Faults.holdsSpeed(t) ? held : shownSpeed;
      double ay = lateral.at(s) + LATERAL_OFFSET + LATERAL_NOISE * random.nextGaussian();
      ay = Faults.spike(row) ? -45 : ay;
      double ax = longitudinal.at(s) + LONGITUDINAL_NOISE * random.nextGaussian();
      double yawRate = lateral.at(s) / v + YAW_RATE_NOISE * random.nextGaussian();
      String position = ",,";
      if (row % ROWS_PER_FIX == 0) {
        wanderX = keep * wanderX + Math.sqrt(1 - keep * keep) * WANDER * random.nextGaussian();
        wanderY = keep * wanderY + Math.sqrt(1 - keep * keep) * WANDER * random.nextGaussian();
        double[] place = place(lap.request().circuit(), s);
        place[0] += wanderX + SCATTER * random.nextGaussian();
        place[1] += wanderY + SCATTER * random.nextGaussian();
        position = Faults.losesSatellites(t) ? position : geographic(place[0], place[1]);
      }
      if (!Faults.loses(t)) {
        String lateralG = Faults.losesLateral(t) ? "" : number("%.3f", ay / G);
        text.append(number("%.2f,%.1f,", 100 + t, 3.6 * held))
            .append(lateralG)
            .append(number(",%.3f,%.2f", ax / G, Math.toDegrees(yawRate)))
            .append(position)
            .append('\n');
      }
    }
    return text.toString();
  }

  private static String header() {
    return "# name: Velmoor logged\n"
        + "# The model's own lap of Velmoor with an open differential and made-up sensor errors.\n"
        + "Time [s],Speed [km/h],LatAcc [g],LongAcc [g],Yaw rate [deg/s],Latitude [deg],"
        + "Longitude [deg]\n";
  }

  /** What goes wrong during the lap. */
  private static final class Faults {
    static boolean loses(double t) {
      return t > 12.01 && t < 12.31;
    }

    static boolean losesLateral(double t) {
      return t > 31.01 && t < 31.43;
    }

    static boolean holdsSpeed(double t) {
      return t > 48.01 && t < 48.61;
    }

    static boolean losesSatellites(double t) {
      return t > 55 && t < 58.5;
    }

    static boolean spike(int row) {
      return row == 1010 || row == 2900;
    }
  }

  /** A channel over distance, with the first station repeated at the end of the lap. */
  private static Curve channel(Lap lap, Channel channel) {
    int n = lap.road().size();
    double[] s = new double[n + 1];
    double[] y = new double[n + 1];
    for (int i = 0; i < n; i++) {
      s[i] = i * lap.road().spacing();
      y[i] = lap.trace().get(channel, i);
    }
    s[n] = lap.road().length();
    y[n] = channel == Channel.TIME ? lap.time() : y[0];
    return Curve.of(s, y);
  }

  private static double[] columnX(Curve curve) {
    double[] x = new double[curve.size()];
    Arrays.setAll(x, curve::x);
    return x;
  }

  private static double[] columnY(Curve curve) {
    double[] y = new double[curve.size()];
    Arrays.setAll(y, curve::y);
    return y;
  }

  private static double[] place(Circuit circuit, double s) {
    int n = circuit.stations().size();
    double step = circuit.length() / n;
    int i = (int) (s / step) % n;
    Station a = circuit.stations().get(i);
    Station b = circuit.stations().get((i + 1) % n);
    double share = s / step - Math.floor(s / step);
    return new double[] {a.x() + share * (b.x() - a.x()), a.y() + share * (b.y() - a.y())};
  }

  private static String geographic(double x, double y) {
    double[] place = OceanPlace.of(LATITUDE, LONGITUDE, x, y);
    return number(",%.8f,%.8f", Math.toDegrees(place[0]), Math.toDegrees(place[1]));
  }

  private static String number(String format, Object... values) {
    return String.format(Locale.ROOT, format, values);
  }
}
