package rampwright.vehicle.circuit.survey;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Function;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Segment.Corner;
import rampwright.vehicle.circuit.Segment.Straight;
import rampwright.vehicle.circuit.SegmentLine;
import rampwright.vehicle.circuit.Station;

/**
 * Makes the bad logs, lines and station files among the samples: a good lap of an oval with one
 * fault each. The bad events and kits there are written by hand.
 *
 * <p>Run {@link #main} with the samples' folder to write them again.
 */
public final class BadFiles {
  private static final double RATE = 10;
  private static final Circuit OVAL =
      SegmentLine.closed(
          "Oval",
          List.of(
              new Straight(150),
              Corner.degrees(40, 180, 30),
              new Straight(150),
              Corner.degrees(40, 180, 30)),
          610,
          1);

  private BadFiles() {}

  /** One sample of the good lap. */
  private record Row(double time, double speed, double lateral, double x, double y) {}

  /** Writes the files into the folder of the samples. */
  public static void main(String[] folder) throws IOException {
    Path failures = Files.createDirectories(Path.of(folder[0]).resolve("failure"));
    for (Map.Entry<String, byte[]> file : files().entrySet()) {
      Files.write(failures.resolve(file.getKey()), file.getValue());
    }
  }

  /** Returns each file by its name. */
  static Map<String, byte[]> files() {
    Map<String, byte[]> files = new LinkedHashMap<>();
    texts().forEach((name, text) -> files.put(name, text.getBytes(StandardCharsets.UTF_8)));
    files.put("binary.csv", new byte[] {0x1f, 0x4c, 0x0, 0x13, 0x7f, 0x0, 0x0, 0x42});
    files.put("latin1.csv", "name;Höhe\n1;2\n".getBytes(StandardCharsets.ISO_8859_1));
    return files;
  }

  private static Map<String, String> texts() {
    String good = log(lap());
    Map<String, String> files = new LinkedHashMap<>();
    files.put("empty.csv", "");
    files.put("log_without_header.csv", good.substring(good.indexOf('\n') + 1));
    files.put("log_without_lateral.csv", good.replace("lateral_g", "note"));
    files.put("log_unknown_unit.csv", good.replace("speed_kmh", "speed [furlong/h]"));
    files.put("log_without_unit.csv", good.replace("speed_kmh", "speed"));
    files.put("log_speed_twice.csv", good.replace("lateral_g", "velocity_kmh"));
    files.put("log_word.csv", replaced(good, 40, line -> line.replaceFirst(",[^,]*", ",n/a")));
    files.put("log_short_row.csv", replaced(good, 40, line -> line.substring(0, 9)));
    files.put(
        "log_mph.csv", log(changed(r -> new Row(r.time, r.speed / 1.609344, r.lateral, r.x, r.y))));
    files.put("log_lateral_in_g.csv", withoutPosition(good).replace("lateral_g", "lateral_mps2"));
    files.put(
        "log_right_positive.csv",
        log(changed(r -> new Row(r.time, r.speed, -r.lateral, r.x, r.y))));
    files.put(
        "log_clock_backwards.csv",
        log(
            changed(
                r -> new Row(r.time > 15 ? r.time - 14 : r.time, r.speed, r.lateral, r.x, r.y))));
    files.put(
        "log_long_dropout.csv",
        log(
            changed(
                r ->
                    new Row(
                        r.time,
                        r.time > 8 && r.time < 11 ? Double.NaN : r.speed,
                        r.lateral,
                        r.x,
                        r.y))));
    files.put(
        "log_rows_missing.csv",
        log(lap().stream().filter(r -> r.time < 8 || r.time > 11).toList()));
    files.put(
        "log_jump.csv",
        log(
            changed(
                r -> new Row(r.time, r.time > 8 ? r.speed + 12 : r.speed, r.lateral, r.x, r.y))));
    files.put(
        "log_position_jump.csv",
        log(
            changed(
                r ->
                    new Row(
                        r.time,
                        r.speed,
                        r.lateral,
                        r.x + (r.time > 8 && r.time < 9 ? 90 : 0),
                        r.y))));
    files.put(
        "log_stop.csv",
        log(
            changed(
                r ->
                    new Row(
                        r.time,
                        r.time > 12 && r.time < 14 ? 1 + 0.2 * Math.sin(7 * r.time) : r.speed,
                        r.lateral,
                        r.x,
                        r.y))));
    files.put("log_half_lap.csv", withoutPosition(log(lap().subList(0, 130))));
    files.put("log_half_lap_positions.csv", log(lap().subList(0, 200)));
    files.put("log_few_samples.csv", log(lap().subList(0, 30)));
    files.put("line_not_closed.csv", line(0, 450));
    files.put("line_hole.csv", line(0, 11) + line(140, 610).replace("x_m,y_m\n", ""));
    files.put("line_point_out_of_place.csv", replaced(line(0, 610), 30, l -> "140.00,60.00"));
    files.put("line_swapped.csv", "longitude,latitude\n" + "45.0000,130.0000\n".repeat(20));
    files.put("stations_nan.csv", replaced(stations(), 24, l -> l.replaceFirst(",.*", ",NaN")));
    files.put(
        "stations_backwards.csv", replaced(stations(), 24, l -> l.replaceFirst("^[^,]*", "30.0")));
    files.put(
        "stations_radius.csv", replaced(stations(), 200, l -> l.replaceFirst(",.*", ",40.0")));
    files.put("line_cut_short.gpx", gpx());
    files.put("line_wrong_version.gpx", gpx().replace("GPX/1/1", "GPX/1/0"));
    files.put("two_lines.geojson", geoJson());
    return files;
  }

  private static List<Row> lap() {
    List<Row> rows = new ArrayList<>();
    double s = 0;
    for (int i = 0; s < OVAL.length(); i++) {
      double speed = 22 + 5 * Math.cos(4 * Math.PI * (s / OVAL.length() - 0.12));
      Station station = OVAL.stations().get((int) Math.round(s) % OVAL.stations().size());
      double lateral = station.curvature() * speed * speed / 9.80665;
      rows.add(new Row(i / RATE, speed, lateral, station.x(), station.y()));
      s += speed / RATE;
    }
    return rows;
  }

  private static List<Row> changed(Function<Row, Row> fault) {
    return lap().stream().map(fault).toList();
  }

  private static String log(List<Row> rows) {
    StringBuilder text = new StringBuilder("time_s,speed_kmh,lateral_g,x_m,y_m\n");
    for (Row row : rows) {
      text.append(
          String.format(
              Locale.ROOT,
              "%.1f,%.2f,%.4f,%.1f,%.1f\n",
              row.time,
              3.6 * row.speed,
              row.lateral,
              row.x,
              row.y));
    }
    return text.toString();
  }

  private static String withoutPosition(String log) {
    return log.replaceAll("(?m),[^,\n]*,[^,\n]*$", "");
  }

  /** Replaces one line (from 1) of a text. */
  private static String replaced(String text, int line, Function<String, String> fault) {
    List<String> lines = new ArrayList<>(text.lines().toList());
    lines.set(line - 1, fault.apply(lines.get(line - 1)));
    return String.join("\n", lines) + "\n";
  }

  /** Points of the oval, one every 5 m. */
  private static String line(int from, int to) {
    StringBuilder text = new StringBuilder("x_m,y_m\n");
    for (Station station : OVAL.stations()) {
      boolean wanted =
          station.distance() >= from && station.distance() < to && station.distance() % 5 < 0.5;
      if (wanted) {
        text.append(String.format(Locale.ROOT, "%.2f,%.2f\n", station.x(), station.y()));
      }
    }
    return text.toString();
  }

  private static String stations() {
    StringBuilder text =
        new StringBuilder("# closed: true\n# length_m: 610\ndistance_m,curvature_1pm\n");
    for (Station station : OVAL.stations()) {
      text.append(
          String.format(Locale.ROOT, "%.1f,%.6f\n", station.distance(), station.curvature()));
    }
    return text.toString();
  }

  private static String gpx() {
    StringBuilder text =
        new StringBuilder(
            "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<gpx version=\"1.1\""
                + " creator=\"sample\" xmlns=\"http://www.topografix.com/GPX/1/1\">\n"
                + "<trk><trkseg>\n");
    for (int i = 0; i < 12; i++) {
      text.append(String.format(Locale.ROOT, "<trkpt lat=\"45.%04d\" lon=\"-30.0\"/>\n", i));
    }
    return text.toString();
  }

  private static String geoJson() {
    String geometry =
        "{\"type\": \"Feature\", \"properties\": {}, \"geometry\": {\"type\": \"LineString\","
            + " \"coordinates\": [[-30, 45], [-30.001, 45], [-30.001, 45.001]]}}";
    return "{\"type\": \"FeatureCollection\", \"features\": ["
        + geometry
        + ",\n"
        + geometry
        + "]}\n";
  }
}
