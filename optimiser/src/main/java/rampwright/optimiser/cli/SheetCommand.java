package rampwright.optimiser.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.sheet.SetupSheet;
import rampwright.optimiser.sheet.SetupSheets;
import rampwright.optimiser.sheet.SheetPdf;

/** {@code rampwright sheet}: the setup sheet that the crew builds from. */
@Command(
    name = "sheet",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    customSynopsis = "rampwright sheet EVENT.yaml --setting NAME --out SHEET.pdf [--json]",
    description = {
      "Writes the setup sheet of a setting that the kit builds, as PDF.",
      "One page: parts, stack order, bench check, what to change and the expected laps."
    })
final class SheetCommand implements Callable<Integer> {
  @Mixin private EventArgument event;
  @Mixin private OutputOption output;

  @Option(
      names = "--setting",
      paramLabel = "NAME",
      required = true,
      description = "Name of one of the event's settings.")
  private String setting;

  @Option(
      names = "--out",
      paramLabel = "SHEET.pdf",
      required = true,
      description = "File to write; one that is there already is replaced.")
  private Path out;

  @Override
  public Integer call() throws IOException {
    Event read = event.read();
    SetupSheet sheet = SetupSheets.of(read, read.setting(setting));
    ByteArrayOutputStream pdf = new ByteArrayOutputStream();
    SheetPdf.write(sheet, pdf);
    UserFile.write(out, pdf.toByteArray());
    output.print(
        () -> "Setup sheet of " + setting + ": " + out + "\n",
        () ->
            new JsonMap()
                .put("event", read.name())
                .put("setting", setting)
                .put("sheetFile", out.toString())
                .map());
    return 0;
  }
}
