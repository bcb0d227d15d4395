package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RampwrightTest {
  @Test
  void withoutACommandItTellsWhatItCanDo() {
    CommandRun run = CommandRun.of();
    assertThat(run.code()).isZero();
    assertThat(run.out()).contains("lap", "trim", "Exit codes: 0 done, 2 bad input, 3 no setting");
  }

  @Test
  void theVersionIsTold() {
    assertThat(CommandRun.of("--version").out()).startsWith("rampwright ");
    assertThat(CommandRun.of("lap", "--version").out()).startsWith("rampwright ");
  }

  @Test
  void anUnknownCommandOrOptionIsBadInput() {
    CommandRun command = CommandRun.of("lpa", "sample:kestrelwick");
    assertThat(command.code()).isEqualTo(2);
    assertThat(command.err()).contains("lpa").contains("See: rampwright --help");
    CommandRun option = CommandRun.of("lap", "sample:kestrelwick", "--jsn");
    assertThat(option.code()).isEqualTo(2);
    assertThat(option.err()).contains("--jsn").contains("See: rampwright lap --help");
    assertThat(option.out()).isEmpty();
  }

  @Test
  void aMissingEventIsTold(@TempDir Path folder) {
    String path = folder.resolve("lost.yaml").toString();
    CommandRun.of("lap", path, "--json")
        .isBadInput(
            "The file ("
                + path
                + ") must be a file that can be read. Maybe the path is wrong: it counts from the"
                + " folder of the file that names it.");
    CommandRun sample = CommandRun.of("lap", "sample:velmor");
    assertThat(sample.code()).isEqualTo(2);
    assertThat(sample.err())
        .startsWith("The sample (velmor) must be one of: double_header, kestrelwick, velmoor")
        .endsWith(". Maybe you meant velmoor." + System.lineSeparator());
  }

  @Test
  void anEventThatBreaksARuleIsToldWithItsPlace(@TempDir Path folder) throws IOException {
    Path event = Files.writeString(folder.resolve("e.yaml"), "name: x\ncra: y\n");
    CommandRun.of("lap", event.toString())
        .isBadInput(
            event + ":2: The key (cra) must be one that is known here. Maybe you meant car.");
  }

  @Test
  void filesAreFoundFromTheFolderOfTheEvent(@TempDir Path folder) throws IOException {
    Path events = Files.createDirectories(folder.resolve("events"));
    Path event = Samples.copy(folder).resolve("events/kestrelwick.yaml");
    assertThat(event).startsWith(events);
    CommandRun run =
        CommandRun.of(
            "trim",
            event.toString(),
            "--setting",
            "open",
            "--curvature-1pm",
            "0.02",
            "--limit",
            "corner");
    assertThat(run.err()).isEmpty();
    assertThat(run.code()).isZero();
  }
}
