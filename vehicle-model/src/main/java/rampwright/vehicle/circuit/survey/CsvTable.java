package rampwright.vehicle.circuit.survey;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import rampwright.vehicle.input.InvalidInput;

/**
 * The columns of a CSV file that mean something, in SI units and ISO 8855 signs, read in one pass.
 * An empty cell or {@code NaN} is a dropout and reads as NaN.
 */
final class CsvTable {
  /** Most rows; a day of driving at 20 Hz. */
  static final int MOST_ROWS = 2_000_000;

  private static final int MOST_LINES_BEFORE_HEADER = 60;
  private static final Pattern NUMBER =
      Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)?");
  private static final Pattern COMMA_NUMBER = Pattern.compile("[+-]?\\d+,\\d+([eE][+-]?\\d+)?");

  private final CsvReader reader;
  private final List<MappedColumn> mapped = new ArrayList<>();
  private final List<String> ignored = new ArrayList<>();
  private final Map<Column, Series> series = new EnumMap<>(Column.class);
  private final Series lines = new Series();
  private char separator;
  private List<Header> headers = List.of();
  private boolean decimalComma;

  private CsvTable(CsvReader reader) {
    this.reader = reader;
  }

  /**
   * Reads a file.
   *
   * @param file its name for messages
   * @throws InvalidInput when it breaks a rule of the format
   */
  static CsvTable read(String file, InputStream in, ColumnMapping mapping) {
    CsvTable table = new CsvTable(new CsvReader(file, in));
    String first = table.findHeader(mapping);
    table.map(mapping);
    table.readRows(table.withoutUnitsRow(first, mapping));
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
                    + shownHeader())
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
    return reader.file() + ":" + headerLine;
  }

  /** Returns the columns that are used. */
  List<MappedColumn> mapped() {
    return List.copyOf(mapped);
  }

  /** Returns the header cells of columns that are not used. */
  List<String> ignored() {
    return List.copyOf(ignored);
  }

  /** Returns the {@code # key: value} lines. */
  Map<String, String> notes() {
    return reader.notes();
  }

  /** Returns whether numbers are written with a decimal comma. */
  boolean decimalComma() {
    return decimalComma;
  }

  private int headerLine;

  /** Finds the header and returns the line after it. */
  private String findHeader(ColumnMapping mapping) {
    String line = reader.nextLine();
    if (line == null) {
      throw InvalidInput.of("file", "empty", "a header and rows of numbers", "").at(reader.file());
    }
    String widest = line;
    int widestLine = reader.line();
    int widestColumns = 0;
    for (int count = 0; line != null && count < MOST_LINES_BEFORE_HEADER; count++) {
      List<Header> candidates = headersOf(line);
      if (meaningful(candidates, mapping) >= 2) {
        return take(line, reader.line());
      }
      boolean wider = candidates.size() > widestColumns;
      if (wider) {
        widest = line;
        widestLine = reader.line();
        widestColumns = candidates.size();
      }
      line = reader.nextLine();
    }
    take(widest, widestLine);
    throw noHeader();
  }

  private InvalidInput noHeader() {
    boolean numbers = headers.stream().allMatch(h -> NUMBER.matcher(h.cell()).matches());
    return InvalidInput.of(
            "header",
            shownHeader(),
            "a line with the names of at least two known columns, such as time, speed and"
                + " lateral_acceleration, x and y, or distance and curvature",
            numbers ? "the line with the names is missing" : "name the columns in a mapping")
        .at(headerPlace());
  }

  private String shownHeader() {
    String cells = String.join(", ", headers.stream().map(Header::cell).toList());
    return cells.length() > 200 ? cells.substring(0, 200) + "…" : cells;
  }

  private String take(String line, int number) {
    separator = CsvReader.separator(line);
    headers = headersOf(line);
    headerLine = number;
    return reader.nextLine();
  }

  private static List<Header> headersOf(String line) {
    return CsvReader.cells(line, CsvReader.separator(line)).stream().map(Header::of).toList();
  }

  private static int meaningful(List<Header> headers, ColumnMapping mapping) {
    Set<Column> columns = new LinkedHashSet<>();
    for (Header header : headers) {
      header.column().ifPresent(columns::add);
    }
    for (ColumnMapping.Entry entry : mapping.entries()) {
      if (headers.stream().anyMatch(header -> named(header, entry))) {
        columns.add(entry.column());
      }
    }
    return columns.size();
  }

  private static boolean named(Header header, ColumnMapping.Entry entry) {
    return header.cell().equalsIgnoreCase(entry.title())
        || header.title().equalsIgnoreCase(entry.title());
  }

  private final Map<Column, Integer> places = new EnumMap<>(Column.class);

  private void map(ColumnMapping mapping) {
    for (ColumnMapping.Entry entry : mapping.entries()) {
      List<Integer> found = indices(header -> named(header, entry));
      if (found.isEmpty()) {
        throw InvalidInput.of(
                "column " + entry.title() + " of the mapping",
                "missing",
                "in the header",
                "use one of: " + shownHeader())
            .at(headerPlace());
      }
      places.put(entry.column(), only(entry.column(), found));
    }
    for (Column column : Column.values()) {
      List<Integer> found = indices(header -> header.column().equals(Optional.of(column)));
      found.removeAll(places.values());
      if (!places.containsKey(column) && !found.isEmpty()) {
        places.put(column, only(column, found));
      }
    }
  }

  private List<Integer> indices(java.util.function.Predicate<Header> wanted) {
    List<Integer> found = new ArrayList<>();
    for (int i = 0; i < headers.size(); i++) {
      if (wanted.test(headers.get(i))) {
        found.add(i);
      }
    }
    return found;
  }

  private int only(Column column, List<Integer> found) {
    if (found.size() > 1) {
      String cells = String.join(" and ", found.stream().map(i -> headers.get(i).cell()).toList());
      throw InvalidInput.of(
              "column for " + column.label(),
              cells,
              "one column",
              "name the one to use in the mapping, as in "
                  + column.key()
                  + "="
                  + headers.get(found.get(0)).cell())
          .at(headerPlace());
    }
    return found.get(0);
  }

  /** Takes units from the header, the row below it and the mapping; returns the first data line. */
  private String withoutUnitsRow(String line, ColumnMapping mapping) {
    List<String> cells = line == null ? List.of() : CsvReader.cells(line, separator);
    boolean units =
        cells.size() == headers.size()
            && cells.stream().noneMatch(this::isNumber)
            && cells.stream().anyMatch(cell -> Unit.of(bare(cell)).isPresent());
    places.forEach(
        (column, place) -> {
          Header header = headers.get(place);
          if (units && header.unit().isEmpty()) {
            header = new Header(header.cell(), header.title(), bare(cells.get(place)));
          }
          MappedColumn use = column(column, header, mapping);
          mapped.add(use);
          series.put(column, new Series());
        });
    for (int i = 0; i < headers.size(); i++) {
      if (!places.containsValue(i)) {
        ignored.add(headers.get(i).cell());
      }
    }
    return units ? reader.nextLine() : line;
  }

  private static String bare(String unit) {
    return unit.replaceAll("[\\[\\]()]", "");
  }

  private MappedColumn column(Column column, Header header, ColumnMapping mapping) {
    try {
      Optional<ColumnMapping.Entry> entry = mapping.entry(column);
      if (entry.isEmpty()) {
        return MappedColumn.of(column, header);
      }
      boolean reversed = entry.get().reversed();
      Unit unit = entry.get().unit().orElseGet(() -> MappedColumn.of(column, header).unit());
      return new MappedColumn(column, header.cell(), unit, reversed);
    } catch (InvalidInput e) {
      throw e.at(headerPlace());
    }
  }

  private void readRows(String first) {
    String line = first;
    while (line != null) {
      List<String> cells = CsvReader.cells(line, separator);
      if (cells.size() != headers.size()) {
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
      for (MappedColumn column : mapped) {
        String cell = cells.get(places.get(column.column()));
        series.get(column.column()).add(number(column, cell) * column.factor());
      }
      line = reader.nextLine();
    }
  }

  private InvalidInput wrongCellCount(List<String> cells) {
    boolean decimalCommas = separator == ',' && cells.size() == 2 * headers.size();
    return InvalidInput.of(
            "row",
            cells.size() + " cells",
            headers.size() + " cells as in the header",
            decimalCommas
                ? "the numbers have decimal commas: separate the columns with semicolons"
                : "the line is cut short or holds a separator too many")
        .at(reader.place());
  }

  private boolean isNumber(String cell) {
    return NUMBER.matcher(cell).matches() || COMMA_NUMBER.matcher(cell).matches();
  }

  private double number(MappedColumn column, String cell) {
    if (cell.isEmpty() || cell.equalsIgnoreCase("nan")) {
      return Double.NaN;
    }
    if (NUMBER.matcher(cell).matches()) {
      return inRange(column, Double.parseDouble(cell));
    }
    if (separator != ',' && COMMA_NUMBER.matcher(cell).matches()) {
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
