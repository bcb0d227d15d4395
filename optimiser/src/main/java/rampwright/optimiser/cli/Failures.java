package rampwright.optimiser.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import rampwright.vehicle.input.InvalidInput;

/** Tells what went wrong in one message on standard error. */
final class Failures {
  private Failures() {}

  /** Tells of a command line that is not understood. */
  static int badArgument(ParameterException fault, String[] arguments) {
    CommandLine command = fault.getCommandLine();
    String message = fault.getMessage();
    Throwable cause = fault.getCause();
    command.getErr().println(cause instanceof InvalidInput ? cause.getMessage() : message);
    command.getErr().println("See: " + command.getCommandSpec().qualifiedName() + " --help");
    return Rampwright.BAD_INPUT;
  }

  /** Tells of a command that could not do its job. */
  static int failed(Exception fault, CommandLine command, ParseResult parsed) {
    PrintWriter err = command.getErr();
    if (fault instanceof InvalidInput) {
      err.println(fault.getMessage());
      return Rampwright.BAD_INPUT;
    }
    if (fault instanceof IOException || fault instanceof UncheckedIOException) {
      Throwable cause = fault.getCause() instanceof IOException ? fault.getCause() : fault;
      err.println("A file could not be written: " + cause.getMessage() + ".");
      return Rampwright.BAD_INPUT;
    }
    err.println("Rampwright " + ProgramVersion.text() + " failed, which is a fault of its own:");
    fault.printStackTrace(err);
    return CommandLine.ExitCode.SOFTWARE;
  }
}
