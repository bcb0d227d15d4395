package rampwright.vehicle.file;

import java.util.Collections;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/** A group of keys in a YAML file, all of them known to the reader. */
public final class YamlMap {
  private final YamlNode node;
  private final Map<String, YamlNode> entries;

  YamlMap(YamlNode node, Map<String, YamlNode> entries) {
    this.node = node;
    this.entries = entries;
  }

  /** Returns the place of the whole group. */
  public YamlNode node() {
    return node;
  }

  /** Returns the keys with their values in the order of the file. */
  public Map<String, YamlNode> entries() {
    return Collections.unmodifiableMap(entries);
  }

  /** Returns the value of a key, empty when the key is missing. */
  public Optional<YamlNode> find(String key) {
    return Optional.ofNullable(entries.get(key));
  }

  /**
   * Returns the value of a key.
   *
   * @throws InvalidInput when the key is missing
   */
  public YamlNode get(String key) {
    return find(key).orElseThrow(() -> missing(key.replace('_', ' '), key));
  }

  /**
   * Returns the number of a quantity's key in SI units.
   *
   * @throws InvalidInput when the key is missing or its value no number or out of range
   */
  public double number(Quantity quantity) {
    return find(quantity.key())
        .orElseThrow(() -> missing(quantity.label(), quantity.key()))
        .number(quantity);
  }

  /** Returns the number of a quantity's key in SI units, or another value when it is missing. */
  public double number(Quantity quantity, double otherwise) {
    return find(quantity.key()).map(value -> value.number(quantity)).orElse(otherwise);
  }

  /** Returns what the supplier makes; an error without a place gets the group's. */
  public <T> T place(Supplier<T> maker) {
    return node.place(maker);
  }

  private InvalidInput missing(String name, String key) {
    return node.fault(name, "missing", "given here", "a line with " + key + " was lost");
  }
}
