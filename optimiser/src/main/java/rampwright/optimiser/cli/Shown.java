package rampwright.optimiser.cli;

import java.util.Locale;

/** Numbers as people read them. */
final class Shown {
  private static final String NONE = "-";

  private Shown() {}

  /** Returns a number with a fixed count of decimals, or a dash when it is none. */
  static String number(double value, int decimals) {
    if (!Double.isFinite(value)) {
      return NONE;
    }
    String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
    // a rounded small negative number is no minus zero
    return text.matches("-0(\\.0*)?") ? text.substring(1) : text;
  }

  /** Returns a number with its sign; one that is shown as zero has none. */
  static String signed(double value, int decimals) {
    String text = number(value, decimals);
    boolean positive = value > 0 && text.matches(".*[1-9].*");
    return positive ? "+" + text : text;
  }

  /** Returns a speed (m/s) in km/h. */
  static String kmh(double speed) {
    return number(speed * 3.6, 1);
  }

  /** Returns an angle (rad) in degrees. */
  static String degrees(double angle) {
    return number(Math.toDegrees(angle), 2);
  }
}
