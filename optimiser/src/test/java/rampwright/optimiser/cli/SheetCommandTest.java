package rampwright.optimiser.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SheetCommandTest {
  @TempDir private Path folder;

  @Test
  void aSheetIsWrittenIntoAFolderThatIsMade() throws IOException {
    Path out = folder.resolve("sheets/firm.pdf");
    CommandRun run =
        CommandRun.of(
            "sheet",
            Samples.coarse(folder),
            "--setting",
            "firm",
            "--out",
            out.toString(),
            "--json");
    assertThat(run.code()).isZero();
    assertThat(run.json().get("sheetFile").textValue()).isEqualTo(out.toString());
    assertThat(new String(Files.readAllBytes(out), StandardCharsets.ISO_8859_1))
        .startsWith("%PDF-")
        .contains("%%EOF");
    try (var files = Files.list(out.getParent())) {
      assertThat(files).containsExactly(out);
    }
  }

  @Test
  void aSettingWithoutPartsHasNoSheetAndWhatWasThereStays() throws IOException {
    Path out = Files.writeString(folder.resolve("s.pdf"), "earlier");
    CommandRun.of("sheet", "sample:kestrelwick", "--setting", "open", "--out", out.toString())
        .isBadInput(
            "The setting of a setup sheet (open) must be built from the parts kit; a differential"
                + " that is only compared with has no parts to fit. Maybe use one of: [as raced,"
                + " more preload, firm].");
    assertThat(out).hasContent("earlier");
  }
}
