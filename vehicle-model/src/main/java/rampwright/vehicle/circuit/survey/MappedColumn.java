package rampwright.vehicle.circuit.survey;

import java.util.List;
import java.util.stream.Collectors;
import rampwright.vehicle.input.InvalidInput;

/**
 * Which column of a file holds a quantity, and how.
 *
 * @param column what it means
 * @param header its cell in the header
 * @param unit its unit
 * @param reversed whether its sign is opposite to ISO 8855 (left positive)
 */
public record MappedColumn(Column column, String header, Unit unit, boolean reversed) {
  /** Checks that the unit can be one of such a quantity. */
  public MappedColumn {
    if (unit.dimension() != column.dimension()) {
      throw wrongUnit(column, header, unit.symbol());
    }
  }

  /** Returns the column of a header cell, with the unit that it names or the usual one. */
  static MappedColumn of(Column column, Header header) {
    if (header.unit().isEmpty()) {
      return new MappedColumn(column, header.cell(), usualUnit(column, header.cell()), false);
    }
    Unit unit =
        Unit.of(header.unit()).orElseThrow(() -> wrongUnit(column, header.cell(), header.unit()));
    return new MappedColumn(column, header.cell(), unit, false);
  }

  private static Unit usualUnit(Column column, String header) {
    return switch (column.dimension()) {
      case TIME -> Unit.SECOND;
      case LENGTH -> Unit.METRE;
      case ANGLE -> Unit.DEGREE;
      case CURVATURE -> Unit.PER_METRE;
      case NUMBER -> Unit.NONE;
      case SPEED, ACCELERATION, ANGULAR_RATE -> throw wrongUnit(column, header, "none");
    };
  }

  private static InvalidInput wrongUnit(Column column, String header, String unit) {
    return InvalidInput.of(
        "unit of the column " + header,
        unit,
        "one of: " + Unit.symbols(column.dimension()),
        "name it in the mapping, as in "
            + column.key()
            + "="
            + Header.of(header).title()
            + "["
            + firstSymbol(column)
            + "]");
  }

  private static String firstSymbol(Column column) {
    return Unit.symbols(column.dimension()).split(",")[0];
  }

  /** Returns the factor from the file's value to SI and ISO 8855 signs. */
  double factor() {
    return reversed ? -unit.si() : unit.si();
  }

  /** Returns the entry of a mapping, for example {@code speed=Speed[km/h]}. */
  @Override
  public String toString() {
    String title = Header.of(header).title();
    return column.key() + "=" + (reversed ? "-" : "") + title + "[" + unit.symbol() + "]";
  }

  static String list(List<MappedColumn> columns) {
    return columns.stream().map(MappedColumn::toString).collect(Collectors.joining(", "));
  }
}
