package rampwright.optimiser.sheet;

import java.util.Locale;
import rampwright.vehicle.input.Quantity;

/** Numbers as the sheet prints them. */
final class Shown {
  /** Keeps a number and its unit on one line. */
  static final char NO_BREAK = '\u00a0';

  private Shown() {}

  /** Returns a number with a fixed number of decimals and a true minus sign. */
  static String number(double value, int decimals) {
    String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    if (text.startsWith("-")) {
      return zero ? text.substring(1) : "−" + text.substring(1);
    }
    return text;
  }

  /** Returns a number with its sign; nothing but zeros has none. */
  static String signed(double value, int decimals) {
    String text = number(value, decimals);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    return zero || text.startsWith("−") ? text : "+" + text;
  }

  /** Returns a number with at most {@code decimals} decimals, without trailing zeros. */
  static String brief(double value, int decimals) {
    String text = number(value, decimals);
    return text.contains(".") ? text.replaceFirst("\\.?0+$", "") : text;
  }

  /** Returns an angle (rad) in degrees. */
  static String degrees(double angle) {
    return brief(Math.toDegrees(angle), 1) + "°";
  }

  /** Returns a torque (N·m). */
  static String torque(double torque) {
    return brief(torque, 1) + NO_BREAK + "N·m";
  }

  /** Returns a lap time (s) as minutes and seconds. */
  static String lapTime(double seconds) {
    long millis = Math.round(seconds * 1e3);
    long minutes = millis / 60_000;
    double rest = (millis % 60_000) / 1e3;
    return minutes == 0
        ? number(rest, 3) + NO_BREAK + "s"
        : String.format(Locale.ROOT, "%d:%06.3f\u00a0min", minutes, rest);
  }

  /** Returns a value (SI) in the unit that people see. */
  static String of(Quantity quantity, double si) {
    String number = brief(si / quantity.siPerUnit(), 3);
    String unit = quantity.unit().equals("deg") ? "°" : quantity.unit();
    return unit.isEmpty() || unit.equals("°") ? number + unit : number + NO_BREAK + unit;
  }

  /** Returns a text cut to a length, with an ellipsis where something is missing. */
  static String cut(String text, int longest) {
    int points = text.codePointCount(0, text.length());
    return points <= longest
        ? text
        : text.substring(0, text.offsetByCodePoints(0, longest - 1)).stripTrailing() + "…";
  }
}
