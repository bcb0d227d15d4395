package rampwright.optimiser.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import java.util.stream.Collectors;
import rampwright.vehicle.lap.Channel;
import rampwright.vehicle.lap.Lap;
import rampwright.vehicle.lap.Trace;

/** A lap's trace as CSV: one column per channel with the unit in its name, one row per station. */
final class TraceFile {
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
    return channel.name().toLowerCase(Locale.ROOT) + UnitName.inFiles(channel.unit());
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
