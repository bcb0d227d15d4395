package rampwright.vehicle.file;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import com.fasterxml.jackson.dataformat.yaml.YAMLParser;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.yaml.snakeyaml.error.MarkedYAMLException;
import rampwright.vehicle.input.InvalidInput;

/**
 * Turns YAML text into {@link YamlNode}s. Plain data only: no tags, no aliases, one document, no
 * key twice, at most {@link #DEEPEST} levels and {@link #LARGEST} bytes.
 */
public final class YamlReader {
  /** Largest file (bytes). */
  public static final int LARGEST = 1_000_000;

  /** Deepest nesting. */
  public static final int DEEPEST = 20;

  private static final YAMLFactory FACTORY = new YAMLFactory();

  private final String file;
  private final YAMLParser parser;

  private YamlReader(String file, YAMLParser parser) {
    this.file = file;
    this.parser = parser;
  }

  /**
   * Reads the root of a file.
   *
   * @throws InvalidInput when the file is missing or no plain YAML
   */
  public static YamlNode read(FileSource source, String path) {
    return parse(source.describe(path), source.text(path, LARGEST));
  }

  /**
   * Reads the root of a text.
   *
   * @param file name for messages
   * @throws InvalidInput when the text is no plain YAML
   */
  public static YamlNode parse(String file, String text) {
    try (YAMLParser parser = FACTORY.createParser(text)) {
      return new YamlReader(file, parser).root();
    } catch (JsonProcessingException e) {
      if (e.getCause() instanceof MarkedYAMLException fault && fault.getProblemMark() != null) {
        throw notYaml(file, fault.getProblemMark().getLine() + 1, fault.getProblem());
      }
      throw notYaml(file, 1, e.getOriginalMessage());
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static InvalidInput notYaml(String file, int line, String problem) {
    String first = String.valueOf(problem).lines().findFirst().orElse("").strip();
    return InvalidInput.of(
            "text",
            first,
            "YAML",
            "the indent is uneven, a bracket or quote is open, or a tab stands at the start of a"
                + " line")
        .at(file + ":" + line);
  }

  private YamlNode root() throws IOException {
    if (parser.nextToken() == null) {
      throw InvalidInput.of("file", "empty", "a list of keys and values", "").at(file + ":1");
    }
    YamlNode root = node("", line(), 0);
    if (parser.nextToken() != null) {
      throw InvalidInput.of("file", "several documents", "one document", "a line --- is in it")
          .at(file + ":" + line());
    }
    return root;
  }

  private YamlNode node(String path, int line, int depth) throws IOException {
    plainDataOnly(path, line);
    if (depth > DEEPEST) {
      throw fault(path, line, "nesting", "more than " + DEEPEST + " levels", "less deep", "");
    }
    JsonToken token = parser.currentToken();
    if (token == JsonToken.START_OBJECT) {
      return YamlNode.map(file, line, path, entries(path, depth));
    }
    if (token == JsonToken.START_ARRAY) {
      return YamlNode.list(file, line, path, items(path, depth));
    }
    return token == JsonToken.VALUE_NULL
        ? YamlNode.nothing(file, line, path)
        : YamlNode.scalar(file, line, path, parser.getText());
  }

  private Map<String, YamlNode> entries(String path, int depth) throws IOException {
    Map<String, YamlNode> entries = new LinkedHashMap<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      String key = parser.currentName();
      int line = line();
      YamlNode before = entries.get(key);
      if (before != null) {
        String advice = "the one in line " + before.line() + " is older";
        throw fault(path, line, "key", key, "given once", advice);
      }
      parser.nextToken();
      entries.put(key, node(path.isEmpty() ? key : path + "." + key, line, depth + 1));
    }
    return entries;
  }

  private List<YamlNode> items(String path, int depth) throws IOException {
    List<YamlNode> items = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      items.add(node(path + "[" + (items.size() + 1) + "]", line(), depth + 1));
    }
    return items;
  }

  private void plainDataOnly(String path, int line) throws IOException {
    if (parser.isCurrentAlias()) {
      String advice = "repeat the values in full";
      throw fault(path, line, "value", "an alias", "plain data", advice);
    }
    if (parser.getTypeId() != null) {
      String value = "tagged !" + parser.getTypeId();
      throw fault(path, line, "value", value, "plain data", "leave the tag out");
    }
  }

  private InvalidInput fault(
      String path, int line, String name, String value, String rule, String advice) {
    return InvalidInput.of(name, value, rule, advice).at(YamlNode.place(file, line, path));
  }

  private int line() {
    return parser.currentTokenLocation().getLineNr();
  }
}
