package rampwright.vehicle.input;

import java.util.Locale;

/**
 * Input that breaks a rule. The message says what, where, the value, the rule and what may help, in
 * one form: <i>The NAME (VALUE UNIT) must be RULE. Maybe ADVICE.</i> with {@code WHERE: } before it
 * once the place is known.
 */
public final class InvalidInput extends IllegalArgumentException {
  private static final long serialVersionUID = 1L;

  private final String where;
  private final String what;

  private InvalidInput(String where, String what, Throwable cause) {
    super(where.isEmpty() ? what : where + ": " + what, cause);
    this.where = where;
    this.what = what;
  }

  /** Returns the error for a numeric value, with its unit. */
  public static InvalidInput value(
      String name, double value, String unit, String rule, String advice) {
    String shown = unit.isEmpty() ? number(value) : number(value) + " " + unit;
    return of(name, shown, rule, advice);
  }

  /** Returns the error for any value already turned into text. */
  public static InvalidInput of(String name, String value, String rule, String advice) {
    String tail = advice.isEmpty() ? "" : " Maybe " + advice + ".";
    return new InvalidInput(
        "", "The " + name + " (" + value + ") must be " + rule + "." + tail, null);
  }

  /** Returns the error with a complete message of its own (for faults that have no one value). */
  public static InvalidInput message(String message) {
    return new InvalidInput("", message, null);
  }

  /**
   * Returns this error with the place (file, line, key path) in front; the outermost comes first.
   */
  public InvalidInput at(String place) {
    return new InvalidInput(where.isEmpty() ? place : place + ": " + where, what, this);
  }

  /** Returns the place, empty when unknown. */
  public String where() {
    return where;
  }

  /** Returns the message without the place. */
  public String what() {
    return what;
  }

  private static String number(double value) {
    if (Double.isNaN(value) || Double.isInfinite(value)) {
      return Double.toString(value);
    }
    if (value == Math.rint(value) && Math.abs(value) < 1e9) {
      return Long.toString((long) value);
    }
    return String.format(Locale.ROOT, "%.6g", value)
        .replaceFirst("(\\.\\d*?)0+(?=$|e)", "$1")
        .replaceFirst("\\.$", "");
  }
}
