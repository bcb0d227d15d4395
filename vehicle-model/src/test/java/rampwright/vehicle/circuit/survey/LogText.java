package rampwright.vehicle.circuit.survey;

import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.function.DoubleUnaryOperator;

/** Logs of made-up laps, free of noise. */
final class LogText {
  private LogText() {}

  /**
   * A lap of a line at a speed.
   *
   * @param curvature (1/m) over distance (m)
   * @param speed (m/s) over distance (m)
   * @param length of the lap (m)
   * @param rate samples a second
   * @return time_s, speed_mps, ay_mps2
   */
  static String lap(
      DoubleUnaryOperator curvature, DoubleUnaryOperator speed, double length, double rate) {
    StringBuilder text = new StringBuilder("time_s,speed_mps,ay_mps2\n");
    int fine = 100;
    double s = 0;
    for (int step = 0; s < length; step++) {
      double v = speed.applyAsDouble(s);
      if (step % fine == 0) {
        text.append(
            String.format(
                Locale.ROOT,
                "%.4f,%.6f,%.6f\n",
                step / fine / rate,
                v,
                v * v * curvature.applyAsDouble(s)));
      }
      s += v / rate / fine;
    }
    return text.toString();
  }

  static InputStream stream(String text) {
    return new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
  }

  static ImportedCircuit read(String text) {
    return CircuitImport.read("lap.csv", stream(text), ImportOptions.defaults());
  }
}
