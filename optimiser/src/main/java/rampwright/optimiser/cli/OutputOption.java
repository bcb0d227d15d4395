package rampwright.optimiser.cli;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.ObjectWriter;
import java.io.PrintWriter;
import java.util.Map;
import java.util.function.Supplier;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** What a command answers: tables for people, or one JSON document and nothing else. */
final class OutputOption {
  private static final ObjectWriter JSON = new ObjectMapper().writerWithDefaultPrettyPrinter();

  @Spec(Spec.Target.MIXEE)
  private CommandSpec command;

  @Option(
      names = "--json",
      description = "Print one JSON document and nothing else; units stand in its names.")
  private boolean json;

  /** Returns whether the answer is a JSON document. */
  boolean json() {
    return json;
  }

  /** Prints the answer in the form that was asked for. */
  void print(Supplier<String> text, Supplier<Map<String, Object>> document) {
    PrintWriter out = command.commandLine().getOut();
    if (!json) {
      out.print(text.get());
      return;
    }
    try {
      out.println(JSON.writeValueAsString(document.get()));
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("maps of numbers and texts are always JSON", e);
    }
  }
}
