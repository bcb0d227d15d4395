package rampwright.web.browser;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A file that cannot be a circuit gives one message and changes nothing. */
class BadUploadIT extends BrowserTest {
  @TempDir private Path folder;

  private void upload(Path file) {
    open("event/circuit");
    page.locator("input[type=file]").setInputFiles(file);
  }

  private void nothingHasChanged() {
    assertThat(page.getByText("Race on this circuit alone")).hasCount(0);
    open("");
    assertThat(page.locator(".rw-circuit").first()).isVisible();
    assertThat(page.locator("main")).not().containsText("lap_of_a_bad_day");
  }

  @Test
  void aMissingColumnIsNamed() throws IOException {
    Path file = folder.resolve("lap_of_a_bad_day.csv");
    Files.writeString(file, "Time [s],Speed [km/h]\n0,100\n1,101\n2,102\n3,103\n4,104\n");
    upload(file);
    assertThat(page.locator(".rw-notice-error[role=alert]")).hasCount(1);
    assertThat(page.locator(".rw-notice-error[role=alert]")).containsText("lap_of_a_bad_day.csv");
    assertThat(page.locator(".rw-notice-error[role=alert]")).containsText("must be");
    nothingHasChanged();
  }

  @Test
  void anotherFileIsReadAfterABadOne() throws IOException {
    for (String name : new String[] {"first_of_two.csv", "second_of_two.csv"}) {
      Path file = folder.resolve(name);
      Files.writeString(file, "Time [s],Speed [km/h]\n0,100\n1,101\n2,102\n3,103\n4,104\n");
      if (name.startsWith("first")) {
        upload(file);
      } else {
        page.locator("input[type=file]").setInputFiles(file);
      }
      assertThat(page.locator(".rw-notice-error[role=alert]")).containsText(name);
    }
  }

  @Test
  void anotherKindOfFileIsRefused() throws IOException {
    Path file = folder.resolve("lap_of_a_bad_day.csv");
    byte[] noise = new byte[5000];
    for (int i = 0; i < noise.length; i++) {
      noise[i] = (byte) (i * 31 + i / 7);
    }
    Files.write(file, noise);
    upload(file);
    assertThat(page.locator(".rw-notice-error[role=alert]")).hasCount(1);
    assertThat(page.locator(".rw-notice-error[role=alert]")).containsText("lap_of_a_bad_day.csv");
    nothingHasChanged();
  }

  @Test
  void aFileThatIsTooLargeIsRefusedBeforeItIsSent() throws IOException {
    Path file = folder.resolve("lap_of_a_bad_day.csv");
    try (RandomAccessFile sparse = new RandomAccessFile(file.toFile(), "rw")) {
      sparse.setLength(200_000_000L);
    }
    upload(file);
    assertThat(page.locator(".rw-notice-error[role=alert]")).containsText("must be at most 100 MB");
    nothingHasChanged();
  }

  @Test
  void aBadFieldIsToldAndTheFileIsNotReadWithIt() throws IOException {
    open("event/circuit");
    page.getByLabel("Smoothing length").fill("much");
    page.getByText("Read again").click();
    assertThat(page.locator(".rw-notice-error[role=alert]"))
        .hasText("There is no file yet. Maybe choose one in step 1.");
    Path file = folder.resolve("lap_of_a_bad_day.csv");
    Files.writeString(file, "distance_m,curvature_1pm\n0,0\n1,0\n");
    page.locator("input[type=file]").setInputFiles(file);
    assertThat(page.locator(".rw-notice-error[role=alert]"))
        .hasText("The smoothing length (much) must be a number, between 0 and 200 m.");
    nothingHasChanged();
  }
}
