package rampwright.vehicle.circuit.survey;

import java.util.Locale;

/** The numbers of an {@link ImportReport}, in the order in which people read them. */
public enum Figure {
  ROWS("rows in the file", "", 0),
  LAP("number of the lap", "", 0),
  SAMPLES("samples of the lap", "", 0),
  SAMPLE_RATE("sample rate", "Hz", 1),
  LAP_TIME("lap time", "s", 3),
  POINTS("points", "", 0),
  REPEATED("repeated rows or points left out", "", 0),
  SPIKES("single values out of line, bridged", "", 0),
  DROPOUTS("dropouts bridged", "", 0),
  BRIDGED("values bridged", "", 0),
  LONGEST_DROPOUT("longest dropout", "s", 3),
  FIXES("positions used", "", 0),
  LENGTH_BY_SPEED("length by speed", "m", 1),
  LENGTH_BY_POSITION("length by position", "m", 1),
  LENGTH_OF_CHORDS("length of the chords", "m", 1),
  LENGTH_OF_CURVE("length of the curve through the points", "m", 1),
  DISTANCE_CORRECTION("correction of the distance to the positions", "%", 2),
  SMOOTHING_LENGTH("smoothing length", "m", 1),
  SMOOTHING_CHANGE("change by smoothing, root mean square", "1/m", 6),
  TURNING_BEFORE("whole turning before closing", "deg", 2),
  TURNING_AFTER("whole turning after closing", "deg", 2),
  LATERAL_OFFSET("offset taken from the lateral acceleration", "m/s²", 4),
  YAW_RATE_OFFSET("offset taken from the yaw rate", "rad/s", 5),
  GAP_BEFORE("gap between end and start before closing", "m", 2),
  GAP_AFTER("gap between end and start after closing", "m", 6),
  CLOSING_CHANGE("change of curvature by closing, root mean square", "1/m", 6),
  POSITION_DEVIATION("distance from the positions, root mean square", "m", 2),
  POSITION_DEVIATION_MOST("distance from the positions, largest", "m", 2),
  CLIMB("height between lowest and highest place", "m", 1),
  LENGTH("length", "m", 1),
  STATIONS("stations", "", 0),
  SPACING("distance between stations", "m", 3),
  SMALLEST_RADIUS("smallest radius", "m", 1);

  private final String label;
  private final String unit;
  private final int decimals;

  Figure(String label, String unit, int decimals) {
    this.label = label;
    this.unit = unit;
    this.decimals = decimals;
  }

  /** Returns the words for people. */
  public String label() {
    return label;
  }

  /** Returns the unit, empty for a pure number. */
  public String unit() {
    return unit;
  }

  /** Returns a value of this figure with its unit. */
  public String shown(double value) {
    double scale = Math.pow(10, decimals);
    // plus zero, lest a small negative number shows as -0
    double rounded = Math.rint(value * scale) / scale + 0.0;
    String number = String.format(Locale.ROOT, "%." + decimals + "f", rounded);
    return unit.isEmpty() ? number : number + " " + unit;
  }
}
