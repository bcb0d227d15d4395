package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import rampwright.vehicle.input.InvalidInput;

/** One ring in the ocean as CSV, GPX and GeoJSON. */
class GeographicLineTest {
  private static final double RADIUS = 150;
  private static final int POINTS = 150;

  private static ImportedCircuit read(String name, String text) {
    return CircuitImport.read(name, LogText.stream(text), ImportOptions.defaults());
  }

  /** Latitude and longitude (deg) of a point, by the radii of the ellipsoid at 45°. */
  private static double[] place(int i) {
    double t = 2 * Math.PI * i / POINTS;
    double meridian = 6367381.8;
    double parallel = 6388838.3 * Math.cos(Math.toRadians(45));
    return new double[] {
      45 + Math.toDegrees(RADIUS * Math.sin(t) / meridian),
      -30 + Math.toDegrees(RADIUS * Math.cos(t) / parallel)
    };
  }

  private static String points(String format) {
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < POINTS; i++) {
      double[] place = place(i);
      text.append(String.format(Locale.ROOT, format, place[0], place[1]));
    }
    return text.toString();
  }

  private static String gpx(String before, String points) {
    return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
        + before
        + "<gpx version=\"1.1\" creator=\"test\" xmlns=\"http://www.topografix.com/GPX/1/1\">\n"
        + "<metadata><name>not this</name></metadata>\n"
        + "<trk><name>Ring &amp; ring</name><trkseg>\n"
        + points
        + "</trkseg></trk></gpx>\n";
  }

  private static void isTheRing(ImportedCircuit imported) {
    assertThat(imported.circuit().length()).isCloseTo(2 * Math.PI * RADIUS, within(0.02));
    assertThat(imported.circuit().stations())
        .allSatisfy(s -> assertThat(1 / s.curvature()).isCloseTo(RADIUS, within(0.2)));
    assertThat(imported.report().text()).contains("(WGS 84)");
  }

  @Test
  void latitudeAndLongitudeInCsv() {
    isTheRing(read("ring.csv", "latitude,longitude\n" + points("%.9f,%.9f\n")));
  }

  @Test
  void aTrackInGpxWithHeights() {
    ImportedCircuit imported =
        read(
            "ring.gpx",
            gpx("", points("<trkpt lat=\"%.9f\" lon=\"%.9f\"><ele>12.5</ele></trkpt>\n")));
    isTheRing(imported);
    assertThat(imported.circuit().name()).isEqualTo("Ring & ring");
    assertThat(imported.circuit().stations()).allMatch(s -> Math.abs(s.grade()) < 1e-9);
    assertThat(imported.report().get(Figure.CLIMB).orElseThrow()).isLessThan(1e-9);
  }

  @Test
  void aFeatureInGeoJson() {
    StringBuilder positions = new StringBuilder();
    for (int i = 0; i < POINTS; i++) {
      double[] place = place(i);
      positions.append(
          String.format(Locale.ROOT, "%s[%.9f, %.9f]", i == 0 ? "" : ", ", place[1], place[0]));
    }
    ImportedCircuit imported =
        read(
            "ring.geojson",
            "{\"type\": \"FeatureCollection\", \"features\": [{\"type\": \"Feature\","
                + " \"properties\": {\"name\": \"Ring\"}, \"geometry\": {\"type\": \"LineString\","
                + " \"coordinates\": ["
                + positions
                + "]}}]}");
    isTheRing(imported);
    assertThat(imported.circuit().name()).isEqualTo("Ring");
  }

  @Test
  void nothingOutsideAGpxFileIsRead() {
    String entity = "<!DOCTYPE gpx [<!ENTITY outside SYSTEM \"file:///etc/hostname\">]>\n";
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> read("ring.gpx", gpx(entity, "<trkpt lat=\"&outside;\" lon=\"1\"/>")))
        .withMessage("ring.gpx:2: The document type (present) must be left out of a GPX file.");
  }
}
