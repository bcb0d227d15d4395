package rampwright.vehicle.circuit.survey;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import rampwright.vehicle.input.InvalidInput;

/**
 * The header of a CSV file: which cell means what in which unit. It is the first line with at least
 * two known names; loggers write notes above it and often a row of units below it.
 */
final class CsvHeader {
  private static final int MOST_LINES_BEFORE_HEADER = 60;

  private final CsvReader reader;
  private final List<MappedColumn> mapped = new ArrayList<>();
  private final List<String> ignored = new ArrayList<>();
  private final Map<Column, Integer> places = new EnumMap<>(Column.class);
  private char separator;
  private List<Header> headers = List.of();
  private int headerLine;
  private String firstRow;

  private CsvHeader(CsvReader reader) {
    this.reader = reader;
  }

  /** Reads as far as the first row of values. */
  static CsvHeader read(CsvReader reader, ColumnMapping mapping) {
    CsvHeader header = new CsvHeader(reader);
    String next = header.findHeader(mapping);
    header.map(mapping);
    header.firstRow = header.withoutUnitsRow(next, mapping);
    return header;
  }

  /** Returns the first row of values, null where there is none. */
  String firstRow() {
    return firstRow;
  }

  char separator() {
    return separator;
  }

  /** Returns the number of cells. */
  int size() {
    return headers.size();
  }

  /** Returns where the header stands. */
  String place() {
    return reader.file() + ":" + headerLine;
  }

  /** Returns the columns that are used. */
  List<MappedColumn> mapped() {
    return List.copyOf(mapped);
  }

  /** Returns the cells of columns that are not used. */
  List<String> ignored() {
    return List.copyOf(ignored);
  }

  /** Returns which cell of a row holds a column that is used. */
  int index(Column column) {
    return places.get(column);
  }

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
    boolean numbers = headers.stream().allMatch(h -> CsvTable.isNumber(h.cell()));
    return InvalidInput.of(
            "header",
            shown(),
            "a line with the names of at least two known columns, such as time, speed and"
                + " lateral_acceleration, x and y, or distance and curvature",
            numbers ? "the line with the names is missing" : "name the columns in a mapping")
        .at(place());
  }

  /** Returns the cells of the header for a message. */
  String shown() {
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

  private void map(ColumnMapping mapping) {
    for (ColumnMapping.Entry entry : mapping.entries()) {
      List<Integer> found = indices(header -> named(header, entry));
      if (found.isEmpty()) {
        throw InvalidInput.of(
                "column " + entry.title() + " of the mapping",
                "missing",
                "in the header",
                "use one of: " + shown())
            .at(place());
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

  private List<Integer> indices(Predicate<Header> wanted) {
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
          .at(place());
    }
    return found.get(0);
  }

  /** Takes units from the header, the row below it and the mapping; returns the first data line. */
  private String withoutUnitsRow(String line, ColumnMapping mapping) {
    List<String> cells = line == null ? List.of() : CsvReader.cells(line, separator);
    boolean units =
        cells.size() == headers.size()
            && cells.stream().noneMatch(CsvTable::isNumber)
            && cells.stream().anyMatch(cell -> Unit.of(bare(cell)).isPresent());
    places.forEach(
        (column, place) -> {
          Header header = headers.get(place);
          if (units && header.unit().isEmpty()) {
            header = new Header(header.cell(), header.title(), bare(cells.get(place)));
          }
          MappedColumn use = column(column, header, mapping);
          mapped.add(use);
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
      throw e.at(place());
    }
  }
}
