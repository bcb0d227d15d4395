package rampwright.vehicle.circuit.survey;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import rampwright.vehicle.input.InvalidInput;

/**
 * The columns that a user names, as {@code time=Time, speed=Speed[km/h],
 * lateral_acceleration=-LatAcc[g]}: quantity, title in the header, unit in brackets where the
 * header does not say it, a minus before the title where right is positive. What it does not name
 * is guessed from the header.
 *
 * @param entries one per named quantity
 */
public record ColumnMapping(List<Entry> entries) {
  private static final Pattern ENTRY =
      Pattern.compile("\\s*([\\w ]+?)\\s*=\\s*(-?)\\s*(.+?)\\s*(?:\\[([^\\]]*)\\])?\\s*");

  /** Every column is guessed from the header. */
  public static final ColumnMapping GUESSED = new ColumnMapping(List.of());

  /**
   * One named quantity.
   *
   * @param column what the column means
   * @param title its title or whole cell in the header
   * @param unit its unit, empty when the header says it
   * @param reversed whether right is positive
   */
  public record Entry(Column column, String title, Optional<Unit> unit, boolean reversed) {}

  /** Copies the list. */
  public ColumnMapping {
    entries = List.copyOf(entries);
  }

  /**
   * Reads a mapping as a user writes it; an empty text means that all is guessed.
   *
   * @throws InvalidInput when an entry is not understood
   */
  public static ColumnMapping parse(String text) {
    List<Entry> entries = new ArrayList<>();
    for (String part : text.split(",")) {
      if (!part.isBlank()) {
        Entry entry = entry(part);
        if (entries.stream().anyMatch(known -> known.column == entry.column)) {
          throw InvalidInput.of("column mapping", part.strip(), "given once per quantity", "");
        }
        entries.add(entry);
      }
    }
    return new ColumnMapping(entries);
  }

  private static Entry entry(String part) {
    Matcher matcher = ENTRY.matcher(part);
    if (!matcher.matches()) {
      throw InvalidInput.of(
          "column mapping", part.strip(), "written as quantity=title or quantity=title[unit]", "");
    }
    Column column =
        Column.of(matcher.group(1))
            .orElseThrow(
                () ->
                    InvalidInput.of(
                        "quantity of a column mapping",
                        matcher.group(1),
                        "one of: "
                            + String.join(
                                ", ", Arrays.stream(Column.values()).map(Column::key).toList()),
                        ""));
    Optional<Unit> unit = Optional.ofNullable(matcher.group(4)).map(text -> unit(column, text));
    return new Entry(column, matcher.group(3), unit, !matcher.group(2).isEmpty());
  }

  private static Unit unit(Column column, String text) {
    return Unit.of(text)
        .filter(unit -> unit.dimension() == column.dimension())
        .orElseThrow(
            () ->
                InvalidInput.of(
                    "unit of " + column.key() + " in the column mapping",
                    text,
                    "one of: " + Unit.symbols(column.dimension()),
                    ""));
  }

  /** Returns the entry of a quantity. */
  Optional<Entry> entry(Column column) {
    return entries.stream().filter(entry -> entry.column == column).findFirst();
  }

  /** Returns the entry as a user writes it. */
  @Override
  public String toString() {
    return String.join(", ", entries.stream().map(ColumnMapping::text).toList());
  }

  private static String text(Entry entry) {
    return entry.column.key()
        + "="
        + (entry.reversed ? "-" : "")
        + entry.title
        + entry.unit.map(unit -> "[" + unit.symbol() + "]").orElse("");
  }
}
