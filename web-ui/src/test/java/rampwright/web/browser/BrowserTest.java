package rampwright.web.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.BrowserContext;
import com.microsoft.playwright.BrowserType;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.Playwright;
import com.microsoft.playwright.assertions.PlaywrightAssertions;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.context.SpringBootTest.WebEnvironment;
import org.springframework.boot.test.web.server.LocalServerPort;
import org.springframework.test.context.ActiveProfiles;

/**
 * Starts the application on a free port and a fresh browser page for each test. After each test it
 * checks what must hold on every screen: nothing was asked of another host, and no script failed.
 */
@SpringBootTest(webEnvironment = WebEnvironment.RANDOM_PORT)
@ActiveProfiles("test")
abstract class BrowserTest {
  private static Playwright playwright;
  private static Browser browser;

  /** A lap on a busy machine takes longer than a click (ms). */
  private static final double PATIENCE = 120_000;

  @LocalServerPort private int port;
  private BrowserContext context;
  private PageGuard guard;

  /** The page of the running test. */
  protected Page page;

  @BeforeAll
  static void startBrowser() {
    playwright = Playwright.create();
    browser =
        playwright
            .chromium()
            .launch(
                new BrowserType.LaunchOptions()
                    .setExecutablePath(Chromium.executable())
                    .setArgs(Chromium.ARGUMENTS));
  }

  @AfterAll
  static void stopBrowser() {
    browser.close();
    playwright.close();
  }

  @BeforeEach
  void openPage() {
    context = browser.newContext(new Browser.NewContextOptions().setViewportSize(1440, 900));
    page = context.newPage();
    page.setDefaultTimeout(PATIENCE);
    PlaywrightAssertions.setDefaultAssertionTimeout(PATIENCE);
    guard = new PageGuard(page);
  }

  @AfterEach
  void closePage() {
    context.close();
    assertThat(guard.problems()).as("problems on the page").isEmpty();
  }

  /**
   * Opens a view and waits until it has settled.
   *
   * @param path the route without a leading slash, for example {@code search}
   */
  protected void open(String path) {
    page.navigate("http://127.0.0.1:" + port + "/" + path);
    page.waitForFunction(
        "() => window.Vaadin?.Flow?.clients"
            + " && Object.values(Vaadin.Flow.clients).every(c => !c.isActive?.())");
  }
}
