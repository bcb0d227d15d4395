package rampwright.vehicle.circuit.survey;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import rampwright.vehicle.input.InvalidInput;

/**
 * Rows of separated values (RFC 4180 without line breaks inside quotes), one line at a time, in
 * UTF-8. Comma, semicolon and tab separate; blank lines are passed over, lines that start with #
 * are comments of which {@code # key: value} is kept as a note.
 */
final class CsvReader {
  /** Longest line (characters); a longer one means that this is no text of rows. */
  private static final int LONGEST_LINE = 100_000;

  private final String file;
  private final BufferedReader reader;
  private final Map<String, String> notes = new LinkedHashMap<>();
  private final StringBuilder text = new StringBuilder();
  private int line;

  CsvReader(String file, InputStream in) {
    this.file = file;
    this.reader =
        new BufferedReader(
            new InputStreamReader(
                in,
                StandardCharsets.UTF_8
                    .newDecoder()
                    .onMalformedInput(CodingErrorAction.REPORT)
                    .onUnmappableCharacter(CodingErrorAction.REPORT)));
  }

  /** Returns the file's name for messages. */
  String file() {
    return file;
  }

  /** Returns the number of the line read last, from 1. */
  int line() {
    return line;
  }

  /** Returns where the line read last stands. */
  String place() {
    return file + ":" + line;
  }

  /** Returns the notes read so far. */
  Map<String, String> notes() {
    return notes;
  }

  /** Returns the next line that is neither blank nor a comment, null at the end. */
  String nextLine() {
    String next = readLine();
    while (next != null && (next.isBlank() || next.startsWith("#"))) {
      note(next);
      next = readLine();
    }
    return next;
  }

  private void note(String comment) {
    int colon = comment.indexOf(':');
    if (colon > 0) {
      notes.putIfAbsent(comment.substring(1, colon).strip(), comment.substring(colon + 1).strip());
    }
  }

  private String readLine() {
    text.setLength(0);
    line++;
    try {
      int c = reader.read();
      if (c < 0) {
        return null;
      }
      for (; c >= 0 && c != '\n'; c = reader.read()) {
        if (text.length() == LONGEST_LINE || c == 0) {
          throw notText(c == 0 ? "a zero byte" : "a line above " + LONGEST_LINE + " characters");
        }
        if (c != '\r' && !(c == '\uFEFF' && line == 1)) {
          text.append((char) c);
        }
      }
    } catch (CharacterCodingException e) {
      throw notText("not UTF-8");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.toString();
  }

  private InvalidInput notText(String found) {
    return InvalidInput.of(
            "text",
            found,
            "lines of separated values in UTF-8",
            "export it again as CSV with that encoding")
        .at(place());
  }

  /** Returns the character that separates the cells of a line: tab, else semicolon, else comma. */
  static char separator(String line) {
    if (line.indexOf('\t') >= 0) {
      return '\t';
    }
    return line.indexOf(';') >= 0 ? ';' : ',';
  }

  /** Returns the cells of a line without quotes and surrounding blanks. */
  static List<String> cells(String line, char separator) {
    List<String> cells = new ArrayList<>();
    StringBuilder cell = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      if (c == '"') {
        boolean doubled = quoted && i + 1 < line.length() && line.charAt(i + 1) == '"';
        if (doubled) {
          cell.append('"');
          i++;
        } else {
          quoted = !quoted;
        }
      } else if (c == separator && !quoted) {
        cells.add(cell.toString().strip());
        cell.setLength(0);
      } else {
        cell.append(c);
      }
    }
    cells.add(cell.toString().strip());
    return cells;
  }
}
