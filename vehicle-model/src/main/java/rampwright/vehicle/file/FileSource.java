package rampwright.vehicle.file;

import java.io.ByteArrayInputStream;
import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Locale;
import java.util.Map;
import rampwright.vehicle.input.InvalidInput;

/**
 * Where files that refer to each other by relative path are kept: a folder, the samples inside a
 * jar, or texts in memory. Paths use forward slashes.
 */
public interface FileSource {
  /**
   * Opens a file.
   *
   * @param path path within this source
   * @throws IOException when there is no such file or it cannot be read
   */
  InputStream open(String path) throws IOException;

  /** Returns the file's name as people know it. */
  default String describe(String path) {
    return path;
  }

  /** Returns the files below a folder. */
  static FileSource folder(Path folder) {
    return new FileSource() {
      @Override
      public InputStream open(String path) throws IOException {
        Path file = folder.resolve(path);
        if (!Files.isRegularFile(file)) {
          throw new FileNotFoundException(path);
        }
        return Files.newInputStream(file);
      }

      @Override
      public String describe(String path) {
        return folder.resolve(path).toString();
      }
    };
  }

  /** Returns the files on the class path below a base that ends with a slash. */
  static FileSource classPath(ClassLoader loader, String base) {
    return path -> {
      InputStream stream = loader.getResourceAsStream(base + path);
      if (stream == null) {
        throw new FileNotFoundException(path);
      }
      return stream;
    };
  }

  /** Returns texts in memory by path. */
  static FileSource texts(Map<String, String> texts) {
    Map<String, String> copy = Map.copyOf(texts);
    return path -> {
      String text = copy.get(path);
      if (text == null) {
        throw new FileNotFoundException(path);
      }
      return new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
    };
  }

  /**
   * Reads a whole file as UTF-8 text.
   *
   * @param path path within this source
   * @param limit largest size (bytes)
   * @throws InvalidInput when it is missing, larger, or no UTF-8 text
   */
  default String text(String path, int limit) {
    byte[] bytes;
    try (InputStream stream = open(path)) {
      bytes = stream.readNBytes(limit + 1);
    } catch (IOException e) {
      throw unreadable(describe(path));
    }
    if (bytes.length > limit) {
      throw InvalidInput.of(
              "size of the file",
              "above " + size(limit),
              "at most " + size(limit),
              "this is another kind of file")
          .at(describe(path));
    }
    try {
      return StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
    } catch (CharacterCodingException e) {
      throw InvalidInput.of(
              "file", "not UTF-8", "plain text in UTF-8", "save it again with that encoding")
          .at(describe(path));
    }
  }

  /** Returns the error for a file that is missing or cannot be read. */
  static InvalidInput unreadable(String described) {
    return InvalidInput.of(
        "file",
        described,
        "a file that can be read",
        "the path is wrong: it counts from the folder of the file that names it");
  }

  /** Returns the path of a file that another file names relative to its own folder. */
  static String resolve(String from, String named) {
    if (named.startsWith("/")) {
      return named;
    }
    Deque<String> parts = new ArrayDeque<>();
    int folder = from.lastIndexOf('/');
    String joined = (folder < 0 ? "" : from.substring(0, folder + 1)) + named;
    for (String part : joined.split("/")) {
      boolean up = part.equals("..") && !parts.isEmpty() && !parts.peekLast().equals("..");
      if (up) {
        parts.removeLast();
      } else if (!part.equals(".")) {
        parts.addLast(part);
      }
    }
    return String.join("/", parts);
  }

  private static String size(int bytes) {
    return String.format(Locale.ROOT, "%d kB", bytes / 1000);
  }
}
