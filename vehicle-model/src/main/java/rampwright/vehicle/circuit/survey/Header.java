package rampwright.vehicle.circuit.survey;

import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * One cell of a header: a title with or without a unit, as {@code Speed (km/h)}, {@code Speed
 * [km/h]}, {@code speed_kmh} or {@code Speed km/h}.
 *
 * @param cell the cell as it stands in the file
 * @param title the part without the unit
 * @param unit the unit as it is spelt, empty when there is none
 */
record Header(String cell, String title, String unit) {
  private static final Pattern BRACKETS = Pattern.compile("(.*?)\\s*[\\[(]([^\\])]*)[\\])]\\s*");
  private static final Pattern LAST_PART = Pattern.compile("(.*\\S)[_\\s]+(\\S+)");

  static Header of(String cell) {
    Matcher brackets = BRACKETS.matcher(cell);
    if (brackets.matches() && !brackets.group(1).isBlank()) {
      return new Header(cell, brackets.group(1).strip(), brackets.group(2).strip());
    }
    Matcher last = LAST_PART.matcher(cell);
    if (last.matches() && Column.of(cell).isEmpty() && Unit.of(last.group(2)).isPresent()) {
      return new Header(cell, last.group(1).strip(), last.group(2));
    }
    return new Header(cell, cell, "");
  }

  /** Returns the column that the title stands for. */
  Optional<Column> column() {
    return Column.of(title);
  }

  /** Returns letters and digits of a title, in lower case. */
  static String plain(String title) {
    return title.toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]", "");
  }
}
