package rampwright.optimiser.cli;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** One JSON object in the making. JSON has no NaN and no infinity: such a number becomes null. */
final class JsonMap {
  private final Map<String, Object> entries = new LinkedHashMap<>();

  JsonMap put(String name, double value) {
    // adding zero turns a negative zero into zero
    entries.put(name, Double.isFinite(value) ? value + 0.0 : null);
    return this;
  }

  JsonMap put(String name, int value) {
    entries.put(name, value);
    return this;
  }

  JsonMap put(String name, Object value) {
    entries.put(name, value instanceof JsonMap map ? map.entries : value);
    return this;
  }

  JsonMap putAll(Map<String, Object> more) {
    entries.putAll(more);
    return this;
  }

  Map<String, Object> map() {
    return Collections.unmodifiableMap(entries);
  }
}
