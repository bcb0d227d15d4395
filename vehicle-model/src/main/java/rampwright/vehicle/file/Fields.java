package rampwright.vehicle.file;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.ToDoubleFunction;
import rampwright.vehicle.input.Quantity;

/**
 * The numbers of a record, each named once: from this list a reader knows the keys and a writer
 * what to write.
 *
 * @param <T> the record
 */
public final class Fields<T> {
  private record Field<T>(Quantity quantity, ToDoubleFunction<T> value, double otherwise) {}

  private final List<Field<T>> fields;

  private Fields(List<Field<T>> fields) {
    this.fields = List.copyOf(fields);
  }

  /** Returns an empty list of a record's numbers. */
  public static <T> Fields<T> none() {
    return new Fields<>(List.of());
  }

  /** Returns this list with one more number that a file must give. */
  public Fields<T> with(Quantity quantity, ToDoubleFunction<T> value) {
    return with(quantity, value, Double.NaN);
  }

  /** Returns this list with one more number that a file may leave out (SI value then). */
  public Fields<T> with(Quantity quantity, ToDoubleFunction<T> value, double otherwise) {
    List<Field<T>> more = new ArrayList<>(fields);
    more.add(new Field<>(quantity, value, otherwise));
    return new Fields<>(more);
  }

  /** Returns the quantities in the order of the file. */
  public List<Quantity> quantities() {
    return fields.stream().map(Field::quantity).toList();
  }

  /** Returns the keys of all numbers and some more. */
  public Set<String> keysAnd(String... more) {
    Set<String> keys = new LinkedHashSet<>(List.of(more));
    fields.forEach(field -> keys.add(field.quantity.key()));
    return keys;
  }

  /** Reads all numbers from a group of keys. */
  public Numbers read(YamlMap map) {
    Map<Quantity, Double> values = new LinkedHashMap<>();
    for (Field<T> field : fields) {
      double value =
          Double.isNaN(field.otherwise)
              ? map.number(field.quantity)
              : map.number(field.quantity, field.otherwise);
      values.put(field.quantity, value);
    }
    return new Numbers(values);
  }

  /** Reads all numbers from a node that holds them and nothing else. */
  public Numbers read(YamlNode node) {
    return read(node.map(keysAnd()));
  }

  /** Returns the record's numbers as keys and values of a file. */
  public Map<String, Object> write(T record) {
    Map<String, Object> values = new LinkedHashMap<>();
    for (Field<T> field : fields) {
      values.put(field.quantity.key(), shown(field.quantity, field.value.applyAsDouble(record)));
    }
    return values;
  }

  /**
   * Returns an SI value in the shown unit with as few digits as give the same value when read back.
   */
  public static BigDecimal shown(Quantity quantity, double si) {
    BigDecimal exact = new BigDecimal(si / quantity.siPerUnit());
    for (int digits = 1; digits < 17; digits++) {
      BigDecimal rounded = exact.round(new MathContext(digits));
      if (rounded.doubleValue() * quantity.siPerUnit() == si) {
        return rounded;
      }
    }
    return exact.round(new MathContext(17));
  }

  /** Numbers that were read, by quantity. */
  public static final class Numbers {
    private final Map<Quantity, Double> values;

    private Numbers(Map<Quantity, Double> values) {
      this.values = values;
    }

    /** Returns one of them in SI units. */
    public double of(Quantity quantity) {
      return values.get(quantity);
    }
  }
}
