package rampwright.optimiser.cli;

import java.util.Locale;
import java.util.Map;

/** How units stand in names, where signs and spaces cannot. */
final class UnitName {
  private static final Map<String, String> NAMES =
      Map.ofEntries(
          Map.entry("", ""),
          Map.entry("m", "M"),
          Map.entry("s", "S"),
          Map.entry("N", "N"),
          Map.entry("N·m", "Nm"),
          Map.entry("m/s", "Mps"),
          Map.entry("m/s²", "Mps2"),
          Map.entry("1/m", "1pm"),
          Map.entry("1/m²", "1pm2"),
          Map.entry("1/s", "1ps"),
          Map.entry("rad", "Rad"),
          Map.entry("rad/s", "Radps"),
          Map.entry("deg", "Deg"),
          Map.entry("Hz", "Hz"),
          Map.entry("%", "Percent"));

  private UnitName() {}

  /** Returns the end of a JSON name, for example {@code Mps2} for m/s². */
  static String inJson(String unit) {
    String name = NAMES.get(unit);
    if (name == null) {
      throw new IllegalArgumentException("a unit without a name: " + unit);
    }
    return name;
  }

  /** Returns the end of a column's name, for example {@code _mps2} for m/s². */
  static String inFiles(String unit) {
    return unit.isEmpty() ? "" : "_" + inJson(unit).toLowerCase(Locale.ROOT);
  }
}
