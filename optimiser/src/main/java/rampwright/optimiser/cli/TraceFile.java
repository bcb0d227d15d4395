package rampwright.optimiser.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.Trace;

/** A lap's trace as CSV: one column per channel with the unit in its name, one row per station. */
final class TraceFile {
  private static final Map<String, String> UNITS =
      Map.of(
          "m", "_m",
          "s", "_s",
          "m/s", "_mps",
          "m/s²", "_mps2",
          "1/m", "_1pm",
          "1/m²", "_1pm2",
          "1/s", "_1ps",
          "rad", "_rad",
          "rad/s", "_radps",
          "N·m", "_nm");

  private TraceFile() {}

  /** Writes a lap's trace into a folder, which is made where it is missing. */
  static void write(Path folder, String name, Lap lap) throws IOException {
    Files.createDirectories(folder);
    try (PrintWriter out =
        new PrintWriter(
            Files.newBufferedWriter(folder.resolve(name), StandardCharsets.UTF_8), false)) {
      out.println(header());
      for (int i = 0; i < lap.trace().stations(); i++) {
        out.println(row(lap, i));
      }
      if (out.checkError()) {
        throw new IOException(folder.resolve(name).toString());
      }
    }
  }

  static String header() {
    return Arrays.stream(Channel.values()).map(TraceFile::title).collect(Collectors.joining(","));
  }

  private static String title(Channel channel) {
    String suffix = channel.unit().isEmpty() ? "" : UNITS.getOrDefault(channel.unit(), "_n");
    return channel.name().toLowerCase(Locale.ROOT) + suffix;
  }

  private static String row(Lap lap, int station) {
    Trace trace = lap.trace();
    return Arrays.stream(Channel.values())
        .map(
            channel ->
                channel == Channel.LIMIT
                    ? lap.limit(station).label()
                    : number(trace.get(channel, station)))
        .collect(Collectors.joining(","));
  }

  private static String number(double value) {
    return value == Math.rint(value) && Math.abs(value) < 1e6
        ? Long.toString((long) value)
        : String.format(Locale.ROOT, "%.8g", value);
  }
}
