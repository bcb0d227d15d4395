package rampwright.vehicle.circuit.survey;

import java.io.InputStream;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.Pose;
import rampwright.vehicle.circuit.Station;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * Circuits as CSV, one row per station: {@code distance_m, curvature_1pm} and, where known, {@code
 * x_m, y_m, grade_deg, bank_deg, grip_left, grip_right}. Name, length and whether the end joins the
 * start stand above the header as {@code # name: …}, {@code # length_m: …}, {@code # closed: true}.
 *
 * <p>What was written reads back the same, number by number; angles, which the file holds in
 * degrees, to the last binary digit but one.
 */
public final class StationCsv {
  private static final String NAME = "name";
  private static final String LENGTH = "length_m";
  private static final String CLOSED = "closed";

  private static final List<Field> FIELDS =
      List.of(
          new Field("distance_m", Station.DISTANCE, Double.NaN, Station::distance),
          new Field("curvature_1pm", Station.CURVATURE, Double.NaN, Station::curvature),
          new Field("x_m", Station.POSITION, Double.NaN, Station::x),
          new Field("y_m", Station.POSITION, Double.NaN, Station::y),
          new Field("grade_deg", Station.GRADE, 0, Station::grade),
          new Field("bank_deg", Station.BANK, 0, Station::bank),
          new Field("grip_left", Station.GRIP, 1, Station::gripLeft),
          new Field("grip_right", Station.GRIP, 1, Station::gripRight));

  private StationCsv() {}

  /**
   * Reads a circuit.
   *
   * @param file the file's name for messages; without folder and ending it is the circuit's name
   *     where the file gives none
   * @param in the text; read to its end and not closed
   * @throws InvalidInput when it breaks a rule
   */
  public static Circuit read(String file, InputStream in) {
    InputStream limited = new LimitedStream(file, in, LimitedStream.LARGEST_FILE);
    return circuit(CsvTable.read(file, limited, ColumnMapping.GUESSED));
  }

  /** Returns the circuit of a table that has distance and curvature. */
  static Circuit circuit(CsvTable table) {
    table.require(Column.DISTANCE, Column.CURVATURE);
    if (!table.ignored().isEmpty()) {
      throw InvalidInput.of(
              "column " + table.ignored().get(0),
              "unknown",
              "one of: distance_m, curvature_1pm, x_m, y_m, grade_deg, bank_deg, grip_left,"
                  + " grip_right",
              "")
          .at(table.headerPlace());
    }
    boolean closed = closed(table);
    List<Station> stations = new ArrayList<>();
    for (int row = 0; row < table.rows(); row++) {
      stations.add(station(table, row));
    }
    double length = length(table, closed);
    try {
      return placed(table, new Circuit(name(table), closed, length, stations));
    } catch (InvalidInput e) {
      throw e.where().isEmpty() ? e.at(table.file()) : e;
    }
  }

  private static String name(CsvTable table) {
    return table.notes().getOrDefault(NAME, FileName.stem(table.file()));
  }

  private static boolean closed(CsvTable table) {
    String text = table.notes().get(CLOSED);
    if (text != null && !text.equals("true") && !text.equals("false")) {
      throw InvalidInput.of("note " + CLOSED, text, "true or false", "").at(table.file());
    }
    return "true".equals(text);
  }

  private static double length(CsvTable table, boolean closed) {
    String text = table.notes().get(LENGTH);
    if (text == null && closed) {
      throw InvalidInput.of(
              "length of the circuit",
              "missing",
              "given for a closed circuit",
              "add a line # "
                  + LENGTH
                  + ": with the distance from the first station round to itself")
          .at(table.file());
    }
    if (text == null) {
      return table.rows() == 0 ? 0 : table.get(Column.DISTANCE).get(table.rows() - 1);
    }
    try {
      return Station.DISTANCE.check(Double.parseDouble(text));
    } catch (NumberFormatException e) {
      throw InvalidInput.of("length of the circuit", text, "a number in m", "").at(table.file());
    } catch (InvalidInput e) {
      throw e.at(table.file());
    }
  }

  private static Station station(CsvTable table, int row) {
    try {
      double distance = table.value(Column.DISTANCE, row, Double.NaN);
      if (row > 0 && distance <= table.get(Column.DISTANCE).get(row - 1)) {
        throw InvalidInput.value(
            "distance",
            distance,
            "m",
            "above that of the row before it",
            "two laps or two rows of one place are in the file");
      }
      return new Station(
          distance,
          table.value(Column.CURVATURE, row, Double.NaN),
          table.value(Column.X, row, 0),
          table.value(Column.Y, row, 0),
          table.value(Column.GRADE, row, 0),
          table.value(Column.BANK, row, 0),
          table.value(Column.GRIP_LEFT, row, 1),
          table.value(Column.GRIP_RIGHT, row, 1));
    } catch (InvalidInput e) {
      throw e.at(table.place(row));
    }
  }

  /** Adds positions to a circuit whose file has none. */
  private static Circuit placed(CsvTable table, Circuit circuit) {
    if (table.has(Column.X) && table.has(Column.Y)) {
      return circuit;
    }
    List<Station> stations = new ArrayList<>();
    Pose pose = Pose.ORIGIN;
    for (int i = 0; i < circuit.stations().size(); i++) {
      Station station = circuit.stations().get(i);
      if (i > 0) {
        Station before = circuit.stations().get(i - 1);
        pose =
            pose.after(
                station.distance() - before.distance(), before.curvature(), station.curvature());
      }
      stations.add(moved(station, pose));
    }
    return new Circuit(circuit.name(), circuit.closed(), circuit.length(), stations);
  }

  private static Station moved(Station station, Pose pose) {
    return new Station(
        station.distance(),
        station.curvature(),
        pose.x(),
        pose.y(),
        station.grade(),
        station.bank(),
        station.gripLeft(),
        station.gripRight());
  }

  /**
   * Returns a circuit as the text of a file; columns that hold nothing of their own are left out.
   */
  public static String write(Circuit circuit) {
    StringBuilder text = new StringBuilder();
    text.append("# ").append(NAME).append(": ").append(circuit.name()).append('\n');
    text.append("# ").append(CLOSED).append(": ").append(circuit.closed()).append('\n');
    text.append("# ").append(LENGTH).append(": ").append(circuit.length()).append('\n');
    List<Field> fields = FIELDS.stream().filter(field -> field.tells(circuit)).toList();
    text.append(String.join(",", fields.stream().map(Field::key).toList())).append('\n');
    for (Station station : circuit.stations()) {
      text.append(String.join(",", fields.stream().map(field -> field.text(station)).toList()));
      text.append('\n');
    }
    return text.toString();
  }

  private record Field(
      String key, Quantity quantity, double otherwise, ToDoubleFunction<Station> value) {
    boolean tells(Circuit circuit) {
      return circuit.stations().stream().anyMatch(s -> value.applyAsDouble(s) != otherwise);
    }

    String text(Station station) {
      String shortest = Double.toString(value.applyAsDouble(station) / quantity.siPerUnit());
      return new BigDecimal(shortest).toPlainString();
    }
  }
}
