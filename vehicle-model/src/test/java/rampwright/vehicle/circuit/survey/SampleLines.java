package rampwright.vehicle.circuit.survey;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.circuit.Station;

/**
 * Makes the surveyed lines among the samples from the sample circuits, and the hilly circuit.
 *
 * <p>Run {@link #main} with the samples' folder to write the files again.
 */
public final class SampleLines {
  static final String XY = "lines/velmoor_survey.csv";
  static final String GPX = "lines/thornbeck_track.gpx";
  static final String HILLY = "circuits/thornbeck.csv";

  /** A place in mid-ocean: the circuit is invented. */
  private static final double LATITUDE = Math.toRadians(-40);

  private static final double LONGITUDE = Math.toRadians(-15);

  private SampleLines() {}

  /** Writes the files into the folder of the samples. */
  public static void main(String[] folder) throws IOException {
    for (Map.Entry<String, String> file : files().entrySet()) {
      Path path = Path.of(folder[0]).resolve(file.getKey());
      Files.createDirectories(path.getParent());
      Files.writeString(path, file.getValue(), StandardCharsets.UTF_8);
    }
  }

  /** Returns each text by its path below the samples. */
  static Map<String, String> files() {
    Map<String, String> files = new LinkedHashMap<>();
    files.put(HILLY, StationCsv.write(SampleCircuits.hilly()));
    files.put(XY, xy(SampleCircuits.fast()));
    files.put(GPX, gpx(SampleCircuits.hilly()));
    return files;
  }

  /** Every third station to the centimetre. */
  private static String xy(Circuit circuit) {
    StringBuilder text = new StringBuilder("# name: Velmoor surveyed\nx_m,y_m\n");
    for (int i = 0; i < circuit.stations().size(); i += 3) {
      Station station = circuit.stations().get(i);
      text.append(String.format(Locale.ROOT, "%.2f,%.2f\n", station.x(), station.y()));
    }
    return text.toString();
  }

  /** Every second station to a millionth of a degree and a decimetre of height. */
  private static String gpx(Circuit circuit) {
    StringBuilder text =
        new StringBuilder(
            "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<gpx version=\"1.1\""
                + " creator=\"Rampwright samples\" xmlns=\"http://www.topografix.com/GPX/1/1\">\n"
                + "<trk><name>Thornbeck track</name><trkseg>\n");
    List<Station> stations = circuit.stations();
    double height = 120;
    for (int i = 0; i < stations.size(); i++) {
      Station station = stations.get(i);
      if (i % 2 == 0) {
        double[] place = OceanPlace.of(LATITUDE, LONGITUDE, station.x(), station.y());
        text.append(
            String.format(
                Locale.ROOT,
                "<trkpt lat=\"%.7f\" lon=\"%.7f\"><ele>%.1f</ele></trkpt>\n",
                Math.toDegrees(place[0]),
                Math.toDegrees(place[1]),
                height));
      }
      height += Math.tan(station.grade()) * circuit.length() / stations.size();
    }
    return text.append("</trkseg></trk></gpx>\n").toString();
  }
}
