package rampwright.web.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.Page;
import com.microsoft.playwright.Route;
import org.junit.jupiter.api.Test;

/** Shows that the guard of all browser tests bites. */
class PageGuardIT extends BrowserTest {
  @Test
  void notesForeignRequestsAndScriptErrors() {
    Page careless = page.context().newPage();
    careless.route("**/*", Route::abort);
    PageGuard guard = new PageGuard(careless);

    careless.setContent(
        "<img src='http://elsewhere.example/a.png'><script>throw new Error('planted')</script>");

    assertThat(guard.problems())
        .hasSize(2)
        .contains("request to another host: http://elsewhere.example/a.png")
        .anyMatch(problem -> problem.startsWith("script error: Error: planted"));
  }
}
