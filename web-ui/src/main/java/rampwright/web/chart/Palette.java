package rampwright.web.chart;

import java.util.List;

/**
 * The colours that tell settings apart. Each is a property of the page's style sheet with a value
 * for the light and one for the dark page; each goes with a dash of its own, so that colour is
 * never the only difference.
 */
public final class Palette {
  private static final List<String> DASHES = List.of("solid", "dashed", "mixed", "dotted");
  private static final List<String> CSS_DASHES = List.of("solid", "dashed", "double", "dotted");
  private static final List<String> SYMBOLS = List.of("circle", "triangle", "rect", "diamond");

  /** Number of settings that can be told apart. */
  public static final int SIZE = DASHES.size();

  private Palette() {}

  /** Returns the colour of a setting, 0 to {@link #SIZE}-1, as a property of the style sheet. */
  public static String colour(int index) {
    return "--rw-line-" + (index + 1);
  }

  /** Returns the border style that stands for a setting's dash outside a chart. */
  public static String cssDash(int index) {
    return CSS_DASHES.get(index);
  }

  static String dash(int index) {
    return DASHES.get(index);
  }

  static String symbol(int index) {
    return SYMBOLS.get(index);
  }
}
