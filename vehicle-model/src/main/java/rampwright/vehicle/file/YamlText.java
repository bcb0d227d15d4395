package rampwright.vehicle.file;

import com.fasterxml.jackson.core.io.JsonStringEncoder;
import java.math.BigDecimal;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** Writes maps, lists, texts, numbers and flags as YAML that {@link YamlReader} reads back. */
public final class YamlText {
  private static final Pattern PLAIN =
      Pattern.compile("[A-Za-z][A-Za-z0-9_./-]*( [A-Za-z0-9_./-]+)*");
  private static final Set<String> RESERVED =
      Set.of("true", "false", "null", "yes", "no", "on", "off", "y", "n");

  private YamlText() {}

  /** Returns the text of a whole file; lists of scalars stand in one line. */
  public static String write(Map<String, ?> root) {
    StringBuilder out = new StringBuilder();
    map(out, "", root);
    return out.toString();
  }

  private static void map(StringBuilder out, String indent, Map<?, ?> map) {
    String lead = "";
    for (Map.Entry<?, ?> entry : map.entrySet()) {
      out.append(lead).append(entry.getKey()).append(':');
      value(out, indent + "  ", entry.getValue());
      lead = indent;
    }
  }

  private static void value(StringBuilder out, String indent, Object value) {
    if (value instanceof Map<?, ?> map && !map.isEmpty()) {
      out.append('\n').append(indent);
      map(out, indent, map);
    } else if (value instanceof List<?> list && list.stream().anyMatch(Map.class::isInstance)) {
      out.append('\n');
      for (Object item : list) {
        out.append(indent).append("- ");
        map(out, indent + "  ", (Map<?, ?>) item);
      }
    } else {
      out.append(' ').append(inline(value)).append('\n');
    }
  }

  private static String inline(Object value) {
    if (value instanceof List<?> list) {
      return list.stream().map(YamlText::inline).collect(Collectors.joining(", ", "[", "]"));
    }
    if (value instanceof Map<?, ?>) {
      return "{}";
    }
    if (value instanceof BigDecimal number) {
      return number.signum() == 0 ? "0" : number.stripTrailingZeros().toPlainString();
    }
    return value instanceof String text ? quoted(text) : String.valueOf(value);
  }

  private static String quoted(String text) {
    if (PLAIN.matcher(text).matches() && !RESERVED.contains(text.toLowerCase(Locale.ROOT))) {
      return text;
    }
    return '"' + new String(JsonStringEncoder.getInstance().quoteAsString(text)) + '"';
  }
}
