package rampwright.vehicle.input;

import java.util.Locale;

/**
 * One physical quantity that a person may enter: the single place where its name, unit and allowed
 * range stand. Files, forms, the search and the setup sheet derive from it.
 *
 * @param key the name in files, unit included ({@code mass_kg})
 * @param label the words on screen and in messages ({@code mass})
 * @param unit the unit that people see ({@code kg}, {@code deg}); empty for a pure number
 * @param siPerUnit factor from the shown unit to SI
 * @param min smallest allowed value, in the shown unit
 * @param max largest allowed value, in the shown unit
 * @param advice what may help when the value is out of range; may be empty
 */
public record Quantity(
    String key,
    String label,
    String unit,
    double siPerUnit,
    double min,
    double max,
    String advice) {

  /** Rejects a range that is empty or not a number. */
  public Quantity {
    if (!(min <= max) || !(siPerUnit > 0)) {
      throw new IllegalArgumentException("empty range or factor of quantity " + key);
    }
  }

  /** Returns a quantity whose shown unit is the SI unit. */
  public static Quantity si(
      String key, String label, String unit, double min, double max, String advice) {
    return new Quantity(key, label, unit, 1, min, max, advice);
  }

  /** Returns an angle that people see in degrees. */
  public static Quantity degrees(String key, String label, double min, double max, String advice) {
    return new Quantity(key, label, "deg", Math.PI / 180, min, max, advice);
  }

  /**
   * Returns the value unchanged when it is within the range.
   *
   * @param si the value in SI units
   * @throws InvalidInput when the value is NaN, infinite or out of range
   */
  public double check(double si) {
    double shown = si / siPerUnit;
    double slack = 1e-12 * Math.max(Math.abs(min), Math.abs(max));
    if (!(shown >= min - slack && shown <= max + slack) || Double.isInfinite(si)) {
      throw InvalidInput.value(label, shown, unit, rule(), advice);
    }
    return si;
  }

  /** Returns the rule in words, for example {@code between 50 and 20000 kg}. */
  public String rule() {
    String suffix = unit.isEmpty() ? "" : " " + unit;
    if (max == Double.POSITIVE_INFINITY) {
      return "at least " + plain(min) + suffix;
    }
    return "between " + plain(min) + " and " + plain(max) + suffix;
  }

  private static String plain(double value) {
    return value == Math.rint(value)
        ? Long.toString((long) value)
        : String.format(Locale.ROOT, "%s", value);
  }
}
