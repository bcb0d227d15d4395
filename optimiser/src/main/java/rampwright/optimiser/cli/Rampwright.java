package rampwright.optimiser.cli;

import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The {@code rampwright} command; without a subcommand it prints its help. */
@Command(
    name = "rampwright",
    mixinStandardHelpOptions = true,
    description =
        "Finds preload, ramp angles and plate count of a plate-type limited-slip differential.")
public final class Rampwright implements Runnable {
  @Spec private CommandSpec spec;

  /**
   * Runs one command and ends the process with its exit code.
   *
   * @param arguments the command line
   */
  public static void main(String[] arguments) {
    System.exit(new CommandLine(new Rampwright()).execute(arguments));
  }

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }
}
