package rampwright.vehicle.circuit.survey;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * What was done to a file on its way to a circuit.
 *
 * @param file its name
 * @param source what it was taken for, for example {@code logged lap}
 * @param figures the numbers, in the unit of each {@link Figure}
 * @param notes what was done, one sentence each
 * @param warnings what a person should look at before trusting the circuit, one sentence each
 */
public record ImportReport(
    String file,
    String source,
    Map<Figure, Double> figures,
    List<String> notes,
    List<String> warnings) {

  /** Copies the collections. */
  public ImportReport {
    Map<Figure, Double> copy = new EnumMap<>(Figure.class);
    copy.putAll(figures);
    figures = Collections.unmodifiableMap(copy);
    notes = List.copyOf(notes);
    warnings = List.copyOf(warnings);
  }

  /** Returns a figure in its unit, empty when it does not apply to the source. */
  public OptionalDouble get(Figure figure) {
    Double value = figures.get(figure);
    return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
  }

  /** Returns the report as lines of text. */
  public String text() {
    Stream<String> head = Stream.of(file + ": " + source);
    Stream<String> numbers =
        figures.entrySet().stream()
            .map(entry -> entry.getKey().label() + ": " + entry.getKey().shown(entry.getValue()));
    Stream<String> cautions = warnings.stream().map(warning -> "Caution: " + warning);
    return Stream.of(head, numbers, notes.stream(), cautions)
        .flatMap(lines -> lines)
        .collect(Collectors.joining("\n", "", "\n"));
  }

  /** Collects a report while a file is read. */
  static final class Draft {
    private final String file;
    private final String source;
    private final Map<Figure, Double> figures = new EnumMap<>(Figure.class);
    private final List<String> notes = new ArrayList<>();
    private final List<String> warnings = new ArrayList<>();

    Draft(String file, String source) {
      this.file = file;
      this.source = source;
    }

    String file() {
      return file;
    }

    void set(Figure figure, double value) {
      figures.put(figure, value);
    }

    void note(String sentence) {
      notes.add(sentence);
    }

    void warn(String sentence) {
      warnings.add(sentence);
    }

    ImportReport report() {
      return new ImportReport(file, source, figures, notes, warnings);
    }
  }
}
