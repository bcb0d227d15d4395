package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.PrintWriter;
import java.io.StringWriter;

/**
 * One command run in this process.
 *
 * @param code exit code
 * @param out standard output
 * @param err standard error
 */
record CommandRun(int code, String out, String err) {
  static CommandRun of(String... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int code = Rampwright.run(new PrintWriter(out), new PrintWriter(err), arguments);
    return new CommandRun(code, out.toString(), err.toString());
  }

  /** Returns standard output as the one JSON document that it must be. */
  JsonNode json() {
    assertThat(err).isEmpty();
    try {
      return new ObjectMapper()
          .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
          .readTree(out);
    } catch (JsonProcessingException e) {
      throw new AssertionError("no JSON: " + out, e);
    }
  }

  /** Demands that bad input was told in one line. */
  void isBadInput(String message) {
    assertThat(err).isEqualTo(message + System.lineSeparator());
    assertThat(out).isEmpty();
    assertThat(code).isEqualTo(2);
  }
}
