package rampwright.web.widget;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;
import rampwright.vehicle.input.Quantity;

/** Numbers as people read them, each with its unit. */
public final class Shown {
  private static final String UNKNOWN = "–";

  private Shown() {}

  /**
   * Returns an SI value in the unit of its quantity, in the fewest of six digits that tell it.
   *
   * @param quantity what it is
   * @param si the value in SI units
   */
  public static String of(Quantity quantity, double si) {
    return withUnit(bare(quantity, si), quantity.unit());
  }

  /** Returns the same without the unit, as it stands in a field. */
  public static String bare(Quantity quantity, double si) {
    BigDecimal shown = new BigDecimal(si / quantity.siPerUnit()).round(new MathContext(6));
    BigDecimal plain = shown.stripTrailingZeros();
    return (plain.signum() == 0 ? BigDecimal.ZERO : plain).toPlainString();
  }

  /**
   * Returns a value with a fixed number of decimals.
   *
   * @param value already in the unit; not a number is shown as a dash
   */
  public static String of(double value, int decimals, String unit) {
    return Double.isFinite(value) ? withUnit(bare(value, decimals), unit) : UNKNOWN;
  }

  /** Returns the number alone, with a real minus sign. */
  public static String bare(double value, int decimals) {
    if (!Double.isFinite(value)) {
      return UNKNOWN;
    }
    String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    return zero ? text.replace("-", "") : text.replace('-', '−');
  }

  /** Returns a difference with its sign. */
  public static String signed(double value, int decimals, String unit) {
    String text = of(value, decimals, unit);
    boolean positive = value > 0 && text.chars().anyMatch(c -> c >= '1' && c <= '9');
    return positive ? "+" + text : text;
  }

  /** Returns a unit as it is written on screen. */
  public static String unit(String unit) {
    return unit.equals("deg") ? "°" : unit;
  }

  private static String withUnit(String number, String unit) {
    if (unit.isEmpty()) {
      return number;
    }
    return unit.equals("deg") ? number + "°" : number + " " + unit;
  }
}
