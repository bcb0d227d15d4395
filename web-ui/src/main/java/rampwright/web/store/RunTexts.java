package rampwright.web.store;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.type.TypeReference;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.util.List;
import java.util.Map;
import rampwright.optimiser.search.SearchProgress;
import rampwright.optimiser.search.SearchResult;

/** Parts of a search run as the JSON text that is stored. */
final class RunTexts {
  private static final ObjectMapper JSON =
      JsonMapper.builder().disable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES).build();

  private RunTexts() {}

  static String inputs(Map<String, String> files) {
    return write(files);
  }

  static Map<String, String> inputs(String text) {
    return read(text, new TypeReference<>() {});
  }

  static String progress(List<SearchProgress> progress) {
    return write(progress);
  }

  static List<SearchProgress> progress(String text) {
    return read(text, new TypeReference<>() {});
  }

  static String result(SearchResult result) {
    return write(result);
  }

  static SearchResult result(String text) {
    return read(text, new TypeReference<>() {});
  }

  private static String write(Object value) {
    try {
      return JSON.writeValueAsString(value);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("A search run is always plain data", e);
    }
  }

  private static <T> T read(String text, TypeReference<T> type) {
    try {
      return JSON.readValue(text, type);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("The stored search run is damaged", e);
    }
  }
}
