package rampwright.vehicle.circuit.survey;

import java.io.InputStream;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import rampwright.vehicle.input.InvalidInput;

/**
 * The first track of a GPX 1.1 file (the schema of 2004, namespace {@code
 * http://www.topografix.com/GPX/1/1}), or its first route where it has no track: latitude and
 * longitude in degrees on WGS 84, elevation in metres. Segments follow one another. A document type
 * is refused, so nothing outside the file is ever read.
 */
final class GpxReader {
  private static final String NAMESPACE = "http://www.topografix.com/GPX/1/1";

  private final String file;
  private final XMLStreamReader xml;
  private final LinePoints track = new LinePoints();
  private final LinePoints route = new LinePoints();
  private String name = "";
  private int tracks;
  private int routes;

  private GpxReader(String file, XMLStreamReader xml) {
    this.file = file;
    this.xml = xml;
  }

  static LinePoints.Named read(String file, InputStream in, ImportReport.Draft report) {
    XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
    factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
    factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
    try {
      XMLStreamReader xml = factory.createXMLStreamReader(in);
      GpxReader reader = new GpxReader(file, xml);
      reader.readAll();
      return reader.chosen(report);
    } catch (XMLStreamException e) {
      int line = e.getLocation() == null ? 1 : e.getLocation().getLineNumber();
      throw InvalidInput.of(
              "text", "no well-formed XML", "a GPX 1.1 document", "the file was cut short")
          .at(file + ":" + line);
    }
  }

  private LinePoints.Named chosen(ImportReport.Draft report) {
    LinePoints chosen = track.size() > 0 ? track : route;
    int others = (track.size() > 0 ? tracks : routes) - 1;
    if (chosen.size() == 0) {
      throw InvalidInput.of("file", "no point", "a GPX file with a track or a route", "").at(file);
    }
    if (others > 0) {
      report.warn("The file holds " + others + " more tracks or routes, which were not used.");
    }
    return new LinePoints.Named(name, chosen);
  }

  private void readAll() throws XMLStreamException {
    boolean root = true;
    while (xml.hasNext()) {
      int event = xml.next();
      if (event == XMLStreamConstants.DTD) {
        throw InvalidInput.of("document type", "present", "left out of a GPX file", "").at(place());
      }
      if (event == XMLStreamConstants.START_ELEMENT) {
        if (root) {
          checkRoot();
          root = false;
        }
        start(xml.getLocalName());
      }
    }
  }

  private void checkRoot() {
    String namespace = xml.getNamespaceURI();
    if (!"gpx".equals(xml.getLocalName()) || !NAMESPACE.equals(namespace)) {
      throw InvalidInput.of(
              "root element",
              xml.getLocalName() + " in the namespace " + namespace,
              "gpx in the namespace " + NAMESPACE,
              "export it again as GPX 1.1")
          .at(place());
    }
  }

  private void start(String element) throws XMLStreamException {
    switch (element) {
      case "trk" -> tracks++;
      case "rte" -> routes++;
      case "trkpt" -> point(tracks == 1 ? track : new LinePoints());
      case "rtept" -> point(routes == 1 ? route : new LinePoints());
      case "name" -> {
        boolean first = name.isEmpty() && tracks + routes == 1;
        name = first ? xml.getElementText().strip() : name;
      }
      default -> {
        // metadata, waypoints and extensions hold no line
      }
    }
  }

  private void point(LinePoints points) throws XMLStreamException {
    String place = place();
    double latitude = number("latitude", xml.getAttributeValue(null, "lat"), place);
    double longitude = number("longitude", xml.getAttributeValue(null, "lon"), place);
    double height = Double.NaN;
    String point = xml.getLocalName();
    int event = xml.next();
    while (event != XMLStreamConstants.END_ELEMENT || !xml.getLocalName().equals(point)) {
      if (event == XMLStreamConstants.START_ELEMENT && xml.getLocalName().equals("ele")) {
        height = number("elevation", xml.getElementText().strip(), place());
      }
      event = xml.next();
    }
    points.addGeographic(longitude, latitude, height, place);
  }

  private static double number(String what, String text, String place) {
    try {
      return Double.parseDouble(text == null ? "missing" : text);
    } catch (NumberFormatException e) {
      throw InvalidInput.of(what, text == null ? "missing" : text, "a number", "").at(place);
    }
  }

  private String place() {
    return file + ":" + xml.getLocation().getLineNumber();
  }
}
