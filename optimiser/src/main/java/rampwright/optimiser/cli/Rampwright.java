package rampwright.optimiser.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.logging.LogManager;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The {@code rampwright} command; without a subcommand it prints its help. */
@Command(
    name = "rampwright",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    subcommands = {
      LapCommand.class,
      TrimCommand.class,
      SearchCommand.class,
      CompareCommand.class,
      SheetCommand.class,
      CircuitCommand.class
    },
    synopsisSubcommandLabel = "COMMAND",
    description =
        "Finds preload, ramp angles and plate count of a plate-type limited-slip differential.",
    footer = {
      "",
      "Exit codes: 0 done, 2 bad input, 3 no setting meets the limits, 1 a fault of the program.",
      "A setting from a model is a proposal: the maker's manual and the rules of the event prevail."
    })
public final class Rampwright implements Runnable {
  /** Exit code of a search in which no setting meets the limits. */
  static final int NOTHING_MEETS_THE_LIMITS = 3;

  /** Exit code of bad input. */
  static final int BAD_INPUT = 2;

  @Spec private CommandSpec spec;

  /**
   * Runs one command and ends the process with its exit code.
   *
   * @param arguments the command line
   */
  public static void main(String[] arguments) {
    // standard error is for our messages: the PDF libraries would list the fonts they try there
    System.setProperty("slf4j.internal.verbosity", "ERROR");
    LogManager.getLogManager().reset();
    // JSON is UTF-8 by its standard, and units like N·m and m/s² are lost in a plain locale
    PrintWriter out = new PrintWriter(System.out, true, StandardCharsets.UTF_8);
    PrintWriter err = new PrintWriter(System.err, true, StandardCharsets.UTF_8);
    System.exit(run(out, err, arguments));
  }

  /**
   * Runs one command.
   *
   * @param out standard output
   * @param err standard error
   * @param arguments the command line
   * @return the exit code
   */
  public static int run(PrintWriter out, PrintWriter err, String... arguments) {
    int code =
        new CommandLine(new Rampwright())
            .setOut(out)
            .setErr(err)
            .setCaseInsensitiveEnumValuesAllowed(true)
            .setParameterExceptionHandler(Failures::badArgument)
            .setExecutionExceptionHandler(Failures::failed)
            .execute(arguments);
    out.flush();
    err.flush();
    return code;
  }

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }
}
