package rampwright.vehicle.circuit.survey;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import rampwright.vehicle.input.InvalidInput;

/**
 * The LineString of a GeoJSON text (RFC 7946): alone, as a feature, or in a feature collection that
 * holds one. Positions are longitude and latitude in degrees on WGS 84 (section 4) and optionally
 * height in metres (section 3.1.1).
 */
final class GeoJsonReader {
  private final String file;
  private final List<JsonNode> lines = new ArrayList<>();
  private String name = "";

  private GeoJsonReader(String file) {
    this.file = file;
  }

  static LinePoints.Named read(String file, InputStream in) {
    GeoJsonReader reader = new GeoJsonReader(file);
    try {
      reader.collect(JsonMapper.builder().build().readTree(in));
    } catch (JsonProcessingException e) {
      int line = e.getLocation() == null ? 1 : e.getLocation().getLineNr();
      throw InvalidInput.of("text", "no JSON", "a GeoJSON text", "the file was cut short")
          .at(file + ":" + line);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return new LinePoints.Named(reader.name, reader.points());
  }

  private void collect(JsonNode node) {
    switch (node.path("type").asText()) {
      case "FeatureCollection" -> node.path("features").forEach(this::collect);
      case "Feature" -> {
        boolean line = node.path("geometry").path("type").asText().equals("LineString");
        name = line ? node.path("properties").path("name").asText("") : name;
        collect(node.path("geometry"));
      }
      case "LineString" -> lines.add(node.path("coordinates"));
      default -> {
        // other geometries hold no line
      }
    }
  }

  private LinePoints points() {
    if (lines.size() != 1) {
      throw InvalidInput.of(
              "number of LineString geometries",
              Integer.toString(lines.size()),
              "1",
              "export the one line that is the lap")
          .at(file);
    }
    LinePoints points = new LinePoints();
    for (JsonNode position : lines.get(0)) {
      String place = file + ", position " + (points.size() + 1);
      if (position.size() < 2 || !position.get(0).isNumber() || !position.get(1).isNumber()) {
        throw InvalidInput.of(
                "position", position.toString(), "[longitude, latitude] in degrees", "")
            .at(place);
      }
      double height = position.path(2).isNumber() ? position.get(2).asDouble() : Double.NaN;
      points.addGeographic(position.get(0).asDouble(), position.get(1).asDouble(), height, place);
    }
    return points;
  }
}
