package rampwright.web.store;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.EventFile;
import rampwright.optimiser.event.WeightedCircuit;
import rampwright.optimiser.kit.KitFile;
import rampwright.vehicle.circuit.survey.StationCsv;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.FileSource;

/** An event as the texts of its files, by path: what is stored is what could stand on disk. */
public final class EventTexts {
  private static final String EVENT = "event.yaml";
  private static final String CAR = "car.yaml";
  private static final String KIT = "kit.yaml";

  private EventTexts() {}

  /** Returns the files of an event. */
  public static Map<String, String> write(Event event) {
    Map<String, String> texts = new LinkedHashMap<>();
    List<String> circuits = new ArrayList<>();
    for (WeightedCircuit weighted : event.circuits()) {
      String path = "circuit-" + (circuits.size() + 1) + ".csv";
      circuits.add(path);
      texts.put(path, StationCsv.write(weighted.circuit()));
    }
    texts.put(CAR, CarFile.write(event.car()));
    texts.put(KIT, KitFile.write(event.kit()));
    texts.put(EVENT, EventFile.write(event, new EventFile.Names(CAR, KIT, circuits)));
    return texts;
  }

  /** Returns the event of files that {@link #write} made. */
  public static Event read(Map<String, String> texts) {
    return EventFile.read(FileSource.texts(texts), EVENT);
  }
}
