package rampwright.vehicle.file;

import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Supplier;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * One value of a YAML file, with the place where it stands. The accessors turn it into what the
 * caller needs or throw an {@link InvalidInput} that names file, line and key path.
 */
public final class YamlNode {
  private static final Pattern NUMBER =
      Pattern.compile("[-+]?(\\d+\\.?\\d*|\\.\\d+)([eE][-+]?\\d+)?");
  private static final Pattern NUMBER_WITH_MORE =
      Pattern.compile("[-+]?\\d[\\d.]*\\s*[^\\d\\s.,].*");

  private final String file;
  private final int line;
  private final String path;
  private final String text;
  private final List<YamlNode> items;
  private final Map<String, YamlNode> entries;

  private YamlNode(
      String file,
      int line,
      String path,
      String text,
      List<YamlNode> items,
      Map<String, YamlNode> entries) {
    this.file = file;
    this.line = line;
    this.path = path;
    this.text = text;
    this.items = items;
    this.entries = entries;
  }

  static YamlNode scalar(String file, int line, String path, String text) {
    return new YamlNode(file, line, path, text, null, null);
  }

  static YamlNode nothing(String file, int line, String path) {
    return new YamlNode(file, line, path, null, null, null);
  }

  static YamlNode list(String file, int line, String path, List<YamlNode> items) {
    return new YamlNode(file, line, path, null, List.copyOf(items), null);
  }

  static YamlNode map(String file, int line, String path, Map<String, YamlNode> entries) {
    return new YamlNode(file, line, path, null, null, entries);
  }

  static String place(String file, int line, String path) {
    return file + ":" + line + (path.isEmpty() ? "" : ": " + path);
  }

  /** Returns the line in the file, counted from 1. */
  public int line() {
    return line;
  }

  /** Returns the last part of the key path. */
  public String key() {
    return path.substring(path.lastIndexOf('.') + 1);
  }

  /** Returns whether this is a group of keys. */
  public boolean isMap() {
    return entries != null;
  }

  /**
   * Opens a group of keys.
   *
   * @param known every key that may stand in it
   * @throws InvalidInput when this is no group or holds another key
   */
  public YamlMap map(Collection<String> known) {
    if (entries == null) {
      throw fault(named(), shown(), "a group of keys", "use: " + String.join(", ", known));
    }
    for (Map.Entry<String, YamlNode> entry : entries.entrySet()) {
      if (!known.contains(entry.getKey())) {
        String advice =
            Suggestion.nearest(entry.getKey(), known)
                .map(near -> "you meant " + near)
                .orElse("use one of: " + String.join(", ", known));
        String place = place(file, entry.getValue().line, path);
        throw InvalidInput.of("key", entry.getKey(), "one that is known here", advice).at(place);
      }
    }
    return new YamlMap(this, entries);
  }

  /**
   * Returns the value of one key of a group whose other keys depend on it.
   *
   * @throws InvalidInput when this is no group or the key is missing
   */
  public YamlNode peek(String key) {
    if (entries == null) {
      throw fault(named(), shown(), "a group of keys", "");
    }
    return new YamlMap(this, entries).get(key);
  }

  /**
   * Returns the items of a list.
   *
   * @throws InvalidInput when this is no list
   */
  public List<YamlNode> items() {
    if (items == null) {
      throw fault(named(), shown(), "a list", "write it as [a, b] or with a dash before each item");
    }
    return items;
  }

  /**
   * Returns a text.
   *
   * @throws InvalidInput when this is a list, a group or nothing
   */
  public String text() {
    if (text == null || text.isBlank()) {
      throw fault(named(), shown(), "some text", "");
    }
    return text;
  }

  /**
   * Returns a number in SI units.
   *
   * @param quantity gives name, unit and range
   * @throws InvalidInput when this is no number or out of range
   */
  public double number(Quantity quantity) {
    if (text == null || !NUMBER.matcher(text).matches()) {
      String unit = quantity.unit().isEmpty() ? "" : " in " + quantity.unit();
      throw fault(quantity.label(), shown(), "a number" + unit, numberAdvice());
    }
    return place(() -> quantity.check(Double.parseDouble(text) * quantity.siPerUnit()));
  }

  /**
   * Returns a whole number.
   *
   * @param quantity gives name and range
   * @throws InvalidInput when this is no whole number or out of range
   */
  public int wholeNumber(Quantity quantity) {
    double value = number(quantity);
    if (value != Math.rint(value)) {
      throw fault(quantity.label(), shown(), "a whole number", "");
    }
    return (int) value;
  }

  /**
   * Returns yes or no.
   *
   * @throws InvalidInput when this is neither {@code true} nor {@code false}
   */
  public boolean flag() {
    if (!"true".equals(text) && !"false".equals(text)) {
      throw fault(named(), shown(), "true or false", "");
    }
    return "true".equals(text);
  }

  /**
   * Returns one of several values known by name.
   *
   * @throws InvalidInput when the text is none of the names
   */
  public <T> T choice(Map<String, T> values) {
    T value = text == null ? null : values.get(text);
    if (value == null) {
      List<String> names = values.keySet().stream().sorted().toList();
      String advice =
          Suggestion.nearest(shown(), names).map(near -> "you meant " + near).orElse("");
      throw fault(named(), shown(), "one of: " + String.join(", ", names), advice);
    }
    return value;
  }

  /** Returns what the supplier makes; an error without a place gets this one's. */
  public <T> T place(Supplier<T> maker) {
    try {
      return maker.get();
    } catch (InvalidInput e) {
      throw e.where().isEmpty() ? e.at(place(file, line, path)) : e;
    }
  }

  /** Returns an error at this place. */
  public InvalidInput fault(String name, String value, String rule, String advice) {
    return InvalidInput.of(name, value, rule, advice).at(place(file, line, path));
  }

  /** Returns the names of an enum's constants, in lower case, with their values. */
  public static <E extends Enum<E>> Map<String, E> names(Class<E> type) {
    return Stream.of(type.getEnumConstants())
        .collect(Collectors.toMap(e -> e.name().toLowerCase(Locale.ROOT), e -> e));
  }

  private String named() {
    return path.isEmpty() ? "file" : key().replace('_', ' ');
  }

  private String shown() {
    if (entries != null) {
      return "a group of keys";
    }
    if (items != null) {
      return "a list";
    }
    return text == null ? "nothing" : text;
  }

  private String numberAdvice() {
    if (text == null) {
      return "";
    }
    if (NUMBER.matcher(text.replace(',', '.')).matches()) {
      return "the decimal sign is a comma: use a point";
    }
    return NUMBER_WITH_MORE.matcher(text).matches()
        ? "the unit was written behind the number: leave it out"
        : "";
  }
}
