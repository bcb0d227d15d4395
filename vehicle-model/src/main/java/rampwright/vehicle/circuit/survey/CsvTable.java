package rampwright.vehicle.circuit.survey;

import java.io.InputStream;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import rampwright.vehicle.input.InvalidInput;

/**
 * The columns of a CSV file that mean something, in SI units and ISO 8855 signs, read in one pass.
 * An empty cell or {@code NaN} is a dropout and reads as NaN.
 */
final class CsvTable {
  /** Most rows; a day of driving at 20 Hz. */
  static final int MOST_ROWS = 2_000_000;

  private static final Pattern NUMBER =
      Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)?");
  private static final Pattern COMMA_NUMBER = Pattern.compile("[+-]?\\d+,\\d+([eE][+-]?\\d+)?");

  private final CsvReader reader;
  private final CsvHeader header;
  private final Map<Column, Series> series = new EnumMap<>(Column.class);
  private final Series lines = new Series();
  private boolean decimalComma;

  private CsvTable(CsvReader reader, CsvHeader header) {
    this.reader = reader;
    this.header = header;
    header.mapped().forEach(column -> series.put(column.column(), new Series()));
  }

  /**
   * Reads a file.
   *
   * @param file its name for messages
   * @throws InvalidInput when it breaks a rule of the format
   */
  static CsvTable read(String file, InputStream in, ColumnMapping mapping) {
    CsvReader reader = new CsvReader(file, in);
    CsvHeader header = CsvHeader.read(reader, mapping);
    CsvTable table = new CsvTable(reader, header);
    table.readRows(header.firstRow());
    return table;
  }

  /** Returns whether a column was found. */
  boolean has(Column column) {
    return series.containsKey(column);
  }

  /** Returns the values of a column that was found. */
  Series get(Column column) {
    return series.get(column);
  }

  /**
   * Returns one value of a column, or another where the file has no such column.
   *
   * @throws InvalidInput when the cell is empty
   */
  double value(Column column, int row, double otherwise) {
    if (!has(column)) {
      return otherwise;
    }
    double value = get(column).get(row);
    if (Double.isNaN(value)) {
      throw InvalidInput.of(column.label(), "NaN", "a number", "the cell is empty");
    }
    return value;
  }

  /**
   * Checks that columns are there.
   *
   * @throws InvalidInput when one is missing
   */
  void require(Column... columns) {
    for (Column column : columns) {
      if (!has(column)) {
        throw InvalidInput.of(
                "column for " + column.label(),
                "missing",
                "in the header",
                "name it in the mapping, as in "
                    + column.key()
                    + "=TITLE; the header is: "
                    + header.shown())
            .at(headerPlace());
      }
    }
  }

  /** Returns the number of rows. */
  int rows() {
    return lines.size();
  }

  /** Returns where a row stands in the file. */
  String place(int row) {
    return reader.file() + ":" + (int) lines.get(row);
  }

  /** Returns the file's name for messages. */
  String file() {
    return reader.file();
  }

  /** Returns where the header stands. */
  String headerPlace() {
    return header.place();
  }

  /** Returns the columns that are used. */
  List<MappedColumn> mapped() {
    return header.mapped();
  }

  /** Returns the header cells of columns that are not used. */
  List<String> ignored() {
    return header.ignored();
  }

  /** Returns the {@code # key: value} lines. */
  Map<String, String> notes() {
    return reader.notes();
  }

  /** Returns whether numbers are written with a decimal comma. */
  boolean decimalComma() {
    return decimalComma;
  }

  private void readRows(String first) {
    List<MappedColumn> columns = header.mapped();
    String line = first;
    while (line != null) {
      List<String> cells = CsvReader.cells(line, header.separator());
      if (cells.size() != header.size()) {
        throw wrongCellCount(cells);
      }
      if (lines.size() == MOST_ROWS) {
        throw InvalidInput.of(
                "number of rows",
                "more than " + MOST_ROWS,
                "at most " + MOST_ROWS,
                "export one lap only")
            .at(reader.file());
      }
      lines.add(reader.line());
      for (MappedColumn column : columns) {
        String cell = cells.get(header.index(column.column()));
        series.get(column.column()).add(number(column, cell) * column.factor());
      }
      line = reader.nextLine();
    }
  }

  private InvalidInput wrongCellCount(List<String> cells) {
    boolean decimalCommas = header.separator() == ',' && cells.size() == 2 * header.size();
    return InvalidInput.of(
            "row",
            cells.size() + " cells",
            header.size() + " cells as in the header",
            decimalCommas
                ? "the numbers have decimal commas: separate the columns with semicolons"
                : "the line is cut short or holds a separator too many")
        .at(reader.place());
  }

  static boolean isNumber(String cell) {
    return NUMBER.matcher(cell).matches() || COMMA_NUMBER.matcher(cell).matches();
  }

  private double number(MappedColumn column, String cell) {
    if (cell.isEmpty() || cell.equalsIgnoreCase("nan")) {
      return Double.NaN;
    }
    if (NUMBER.matcher(cell).matches()) {
      return inRange(column, Double.parseDouble(cell));
    }
    if (header.separator() != ',' && COMMA_NUMBER.matcher(cell).matches()) {
      decimalComma = true;
      return inRange(column, Double.parseDouble(cell.replace(',', '.')));
    }
    throw InvalidInput.of(
            column.column().label(),
            cell,
            "a number in " + column.unit().symbol(),
            "leave the cell empty where the sensor dropped out")
        .at(reader.place());
  }

  private double inRange(MappedColumn column, double value) {
    try {
      column.column().quantity().check(value * column.factor());
      return value;
    } catch (InvalidInput e) {
      throw e.at(reader.place());
    }
  }
}
