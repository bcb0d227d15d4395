package rampwright.optimiser.cli;

import java.util.ArrayList;
import java.util.List;

/** A table in plain text: the first column to the left, all others to the right. */
final class TextTable {
  private static final String GAP = "  ";

  private final List<List<String>> rows = new ArrayList<>();

  /** Adds a row; rows may be shorter than the longest. */
  TextTable row(String... cells) {
    return row(List.of(cells));
  }

  TextTable row(List<String> cells) {
    rows.add(List.copyOf(cells));
    return this;
  }

  /** Returns the table with a line end after every row. */
  @Override
  public String toString() {
    int columns = rows.stream().mapToInt(List::size).max().orElse(0);
    List<Integer> widths = new ArrayList<>();
    for (int c = 0; c < columns; c++) {
      int column = c;
      widths.add(
          rows.stream()
              .filter(row -> row.size() > column)
              .mapToInt(row -> length(row.get(column)))
              .max()
              .orElse(0));
    }
    StringBuilder out = new StringBuilder();
    for (List<String> row : rows) {
      StringBuilder line = new StringBuilder();
      for (int c = 0; c < row.size(); c++) {
        String space = " ".repeat(widths.get(c) - length(row.get(c)));
        line.append(c == 0 ? row.get(c) + space : GAP + space + row.get(c));
      }
      out.append(line.toString().stripTrailing()).append('\n');
    }
    return out.toString();
  }

  private static int length(String text) {
    return text.codePointCount(0, text.length());
  }
}
