package rampwright.optimiser.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.circuit.survey.CircuitImport;
import rampwright.vehicle.circuit.survey.ImportOptions;
import rampwright.vehicle.circuit.survey.ImportPlot;
import rampwright.vehicle.circuit.survey.ImportedCircuit;
import rampwright.vehicle.circuit.survey.StationCsv;
import rampwright.vehicle.input.InvalidInput;

/** {@code rampwright circuit}: a circuit from a logged lap or a surveyed line. */
@Command(
    name = "circuit",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    customSynopsis = {
      "rampwright circuit LOG.csv --out CIRCUIT.csv [--columns MAPPING] [--plot MAP.svg]",
      "                   [--smoothing-m L] [--spacing-m L] [--lap N] [--open]",
      "                   [--longest-dropout-s T] [--json]"
    },
    description = {
      "Makes a circuit of a logged lap or a surveyed line.",
      "Tells what was done to the data; the plot shows curvature and map before and after."
    })
final class CircuitCommand implements Callable<Integer> {
  @Mixin private OutputOption output;

  @Parameters(
      paramLabel = "LOG.csv",
      description = "Log or line; sample:NAME is a sample, for example sample:velmoor_lap.")
  private String log;

  @Option(
      names = "--out",
      paramLabel = "CIRCUIT.csv",
      required = true,
      description = "Circuit to write; one that is there already is replaced.")
  private Path out;

  @Option(
      names = "--columns",
      paramLabel = "MAPPING",
      defaultValue = "",
      description = {
        "Which column holds what, for example",
        "time=t[s],speed=v[km/h],lateral_acceleration=-ay[g]",
        "(a minus where right is positive). What is not named is taken from the header."
      })
  private String columns;

  @Option(names = "--plot", paramLabel = "MAP.svg", description = "Plot to judge the circuit by.")
  private Path plot;

  @Option(
      names = "--smoothing-m",
      paramLabel = "L",
      description = "Waves of curvature shorter than this (m) are smoothed away.")
  private Double smoothing;

  @Option(names = "--spacing-m", paramLabel = "L", description = "Distance between stations (m).")
  private Double spacing;

  @Option(names = "--lap", paramLabel = "N", description = "Lap of the log; without: the fastest.")
  private Integer lap;

  @Option(names = "--open", description = "The end does not join the start.")
  private boolean open;

  @Option(
      names = "--longest-dropout-s",
      paramLabel = "T",
      description = "Longest stretch of missing values (s) that is bridged.")
  private Double dropout;

  @Override
  public Integer call() throws IOException {
    ImportOptions options = options();
    ImportedCircuit imported = read(options);
    UserFile.write(out, StationCsv.write(imported.circuit()).getBytes(StandardCharsets.UTF_8));
    if (plot != null) {
      UserFile.write(plot, ImportPlot.svg(imported).getBytes(StandardCharsets.UTF_8));
    }
    output.print(
        () ->
            imported.report().text() + "Written: " + out + (plot == null ? "" : ", " + plot) + "\n",
        () -> CircuitDocument.of(imported, out, plot));
    return 0;
  }

  private ImportOptions options() {
    ImportOptions options = ImportOptions.defaults().withColumns(columns).withClosed(!open);
    options = smoothing == null ? options : options.withSmoothing(smoothing);
    options = spacing == null ? options : options.withSpacing(spacing);
    options = dropout == null ? options : options.withLongestDropout(dropout);
    return lap == null ? options : options.withLap(lap);
  }

  private ImportedCircuit read(ImportOptions options) {
    Optional<String> sample = SampleName.find(log, "logged lap");
    try (InputStream in = open(sample)) {
      return CircuitImport.read(sample.orElse(log), in, options);
    } catch (IOException e) {
      throw InvalidInput.of("file", log, "a file that can be read", "the path is wrong");
    }
  }

  private InputStream open(Optional<String> sample) throws IOException {
    if (sample.isPresent()) {
      return SampleFiles.open(sample.get());
    }
    return Files.newInputStream(UserFile.path(log));
  }
}
