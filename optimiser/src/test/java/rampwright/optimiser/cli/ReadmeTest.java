package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.regex.MatchResult;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The examples of the README say what the commands print: the same words in the same order, and
 * numbers within 2 % or 0.05, so that a solver that gets better by milliseconds leaves the page
 * true.
 */
class ReadmeTest {
  private static final String PROMPT = "$ rampwright ";
  private static final String ELLIPSIS = "...";
  private static final Pattern BLOCK = Pattern.compile("(?s)```\n(\\$ rampwright .*?)\n```");
  private static final Pattern ARGUMENT = Pattern.compile("\"([^\"]*)\"|(\\S+)");
  private static final Pattern NUMBER = Pattern.compile("[+-]?\\d+(?:\\.\\d+)?(?:E-?\\d+)?");

  static List<String> examples() throws IOException {
    return BLOCK
        .matcher(Files.readString(Path.of("../README.md")))
        .results()
        .map(block -> block.group(1))
        .toList();
  }

  @Test
  void theReadmeHasExamples() throws IOException {
    assertThat(examples()).hasSizeGreaterThanOrEqualTo(3);
  }

  @ParameterizedTest
  @MethodSource("examples")
  void anExampleSaysWhatTheCommandPrints(String example) {
    List<String> lines = example.lines().toList();
    CommandRun run = CommandRun.of(arguments(lines.get(0).substring(PROMPT.length())));
    assertThat(run.err()).isEmpty();
    assertThat(run.code()).isZero();
    Deque<String> printed = new ArrayDeque<>(run.out().lines().toList());
    boolean skipping = false;
    for (String shown : lines.subList(1, lines.size())) {
      while (skipping && !printed.isEmpty() && !alike(shown, printed.peek())) {
        printed.remove();
      }
      skipping = shown.equals(ELLIPSIS);
      if (!skipping) {
        assertThat(printed).as("left to print when the README shows: %s", shown).isNotEmpty();
        String next = printed.remove();
        assertThat(alike(shown, next)).as("README: %s%nprinted: %s", shown, next).isTrue();
      }
    }
    assertThat(skipping || printed.isEmpty()).as("lines that are not shown: %s", printed).isTrue();
  }

  private static String[] arguments(String command) {
    return ARGUMENT
        .matcher(command)
        .results()
        .map(word -> word.group(1) == null ? word.group(2) : word.group(1))
        .toArray(String[]::new);
  }

  private static boolean alike(String shown, String printed) {
    return words(shown).equals(words(printed)) && near(numbers(shown), numbers(printed));
  }

  /** Widths of columns follow their numbers, so white space does not count. */
  private static String words(String line) {
    return NUMBER.matcher(line).replaceAll(Matcher.quoteReplacement("#")).replaceAll("\\s+", " ");
  }

  private static List<Double> numbers(String line) {
    List<Double> numbers = new ArrayList<>();
    NUMBER
        .matcher(line)
        .results()
        .map(MatchResult::group)
        .forEach(n -> numbers.add(Double.valueOf(n)));
    return numbers;
  }

  private static boolean near(List<Double> shown, List<Double> printed) {
    for (int i = 0; i < shown.size(); i++) {
      double most = Math.max(0.05, 0.02 * Math.abs(shown.get(i)));
      if (Math.abs(shown.get(i) - printed.get(i)) > most) {
        return false;
      }
    }
    return true;
  }
}
