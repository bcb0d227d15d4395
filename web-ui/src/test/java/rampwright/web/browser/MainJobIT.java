package rampwright.web.browser;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;
import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.Download;
import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.AriaRole;
import com.microsoft.playwright.options.BoundingBox;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Pattern;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import rampwright.samples.SampleFiles;

/** The whole job: from a logged lap to the sheet that the crew builds from. */
class MainJobIT extends BrowserTest {
  @TempDir private Path folder;

  @Test
  void leadsFromALoggedLapToTheSheet() throws IOException {
    open("");
    openEvent("Velmoor summer race");
    takeCircuit();
    searchAndReload();
    compare();
    sheet();
  }

  private void openEvent(String name) {
    page.getByLabel("Open event").click();
    page.getByRole(AriaRole.OPTION, new Page.GetByRoleOptions().setName(name)).click();
    assertThat(page.locator(".rw-event-name")).hasText(name);
  }

  private void takeCircuit() throws IOException {
    page.getByText("Circuit from a file: logged lap").click();
    Path log = folder.resolve("velmoor_lap.csv");
    try (InputStream in = SampleFiles.open("logs/velmoor_lap.csv")) {
      Files.copy(in, log);
    }
    page.locator("input[type=file]").setInputFiles(log);
    assertThat(page.getByText("3 Judge it: Velmoor logged")).isVisible();
    assertThat(page.locator("img.rw-plot")).isVisible();
    assertThat(page.getByText("logged lap", new Page.GetByTextOptions().setExact(true)))
        .isVisible();

    page.getByLabel("Smoothing length").fill("20");
    page.getByText("Read again").click();
    assertThat(page.getByText("20.0 m")).isVisible();
    page.getByText("Race on this circuit alone").click();
    assertThat(page.locator(".rw-circuit")).hasCount(1);
    assertThat(page.locator(".rw-figure-title")).hasText("Velmoor logged");
  }

  private void searchAndReload() {
    page.getByRole(AriaRole.LINK, new Page.GetByRoleOptions().setName("Search")).click();
    page.getByLabel("Most evaluations").fill("12");
    page.getByText("Start the search").click();
    assertThat(page.locator(".rw-run-state")).containsText("at most 12 evaluations");
    page.reload();
    Locator answer = page.getByText(Pattern.compile("^(Best setting|Nearest to the limits)$"));
    assertThat(answer).isVisible();
    assertThat(page.locator(".rw-run-state")).containsText("done");
    assertThat(page.locator("rw-chart:has(canvas)")).hasCount(1);
  }

  private void compare() {
    page.getByText("Compare with today's").click();
    assertThat(page.locator("rw-chart:has(canvas)")).hasCount(7);
    assertThat(page.getByText("By corner and phase of as raced")).isVisible();
    // the cursor of one chart is that of all; a chart whose value lies beyond its axis shows none
    Locator speed = page.locator("rw-chart").nth(2);
    speed.scrollIntoViewIfNeeded();
    BoundingBox box = speed.boundingBox();
    page.mouse().move(box.x + box.width / 2, box.y + box.height / 2);
    Locator cursors =
        page.locator("rw-chart").filter(new Locator.FilterOptions().setHasText("distance"));
    assertThat(cursors.nth(3)).isVisible();
  }

  private void sheet() throws IOException {
    page.getByRole(AriaRole.LINK, new Page.GetByRoleOptions().setName("Search")).click();
    page.getByText("Make its sheet").click();
    Locator link = page.getByText("Download the sheet (PDF, A4)");
    assertThat(link).isVisible();
    assertThat(page.getByText("Bench check before it goes in")).isVisible();
    Download download = page.waitForDownload(link::click);
    assertThat(download.suggestedFilename()).startsWith("setup-").endsWith(".pdf");
    try (PDDocument sheet = Loader.loadPDF(download.path().toFile())) {
      assertThat(sheet.getNumberOfPages()).isEqualTo(1);
      assertThat(new PDFTextStripper().getText(sheet)).contains("Velmoor logged");
    }
  }
}
