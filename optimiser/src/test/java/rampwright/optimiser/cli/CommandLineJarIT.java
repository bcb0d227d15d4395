package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The packaged command line in a process of its own, in a locale that knows ASCII only. */
class CommandLineJarIT {
  private static final Path JAR = Path.of("target/rampwright-cli.jar").toAbsolutePath();
  private static final long PATIENCE = 120;

  @TempDir private Path folder;

  private CommandRun run(String... arguments) throws IOException, InterruptedException {
    Path out = folder.resolve("out");
    Path err = folder.resolve("err");
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.addAll(List.of("-jar", JAR.toString()));
    command.addAll(List.of(arguments));
    ProcessBuilder builder =
        new ProcessBuilder(command)
            .directory(folder.toFile())
            .redirectOutput(out.toFile())
            .redirectError(err.toFile());
    builder.environment().put("LC_ALL", "C");
    builder.environment().remove("JAVA_TOOL_OPTIONS");
    Process process = builder.start();
    assertThat(process.waitFor(PATIENCE, TimeUnit.SECONDS)).isTrue();
    return new CommandRun(process.exitValue(), text(out), text(err));
  }

  private static String text(Path file) throws IOException {
    return Files.readString(file, StandardCharsets.UTF_8);
  }

  @Test
  void theVersionIsThatOfTheBuild() throws IOException, InterruptedException {
    CommandRun run = run("--version");
    assertThat(run.code()).isZero();
    assertThat(run.out()).matches("rampwright \\d+\\.\\d+\\.\\d+\\S*\\R");
  }

  @Test
  void samplesAreInTheJarAndUnitsSurviveAPlainLocale() throws IOException, InterruptedException {
    CommandRun run =
        run(
            "trim",
            "sample:kestrelwick",
            "--setting",
            "open",
            "--curvature-1pm",
            "0.04",
            "--limit",
            "corner");
    assertThat(run.code()).isZero();
    assertThat(run.err()).isEmpty();
    assertThat(run.out()).contains(" m/s²", "N·m");
  }

  @Test
  void aSheetIsWrittenWithItsFontsAndWithoutAWordOnStandardError()
      throws IOException, InterruptedException {
    CommandRun run =
        run("sheet", "sample:kestrelwick", "--setting", "firm", "--out", "firm.pdf", "--json");
    assertThat(run.code()).isZero();
    assertThat(run.json().get("sheetFile").textValue()).isEqualTo("firm.pdf");
    assertThat(folder.resolve("firm.pdf")).isNotEmptyFile();
  }
}
