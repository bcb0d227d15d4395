package rampwright.optimiser.cli;

import java.util.Optional;
import picocli.CommandLine.IVersionProvider;

/** The version that the build wrote into the jar. */
final class ProgramVersion implements IVersionProvider {
  private static final String NOT_PACKAGED = "(not packaged)";

  static String text() {
    String version = ProgramVersion.class.getPackage().getImplementationVersion();
    return Optional.ofNullable(version).orElse(NOT_PACKAGED);
  }

  @Override
  public String[] getVersion() {
    return new String[] {"rampwright " + text()};
  }
}
