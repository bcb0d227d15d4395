package rampwright.web.browser;

import static com.microsoft.playwright.assertions.PlaywrightAssertions.assertThat;

import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.AriaRole;
import org.junit.jupiter.api.Test;

class StartPageIT extends BrowserTest {
  @Test
  void opensOnTheEvent() {
    open("");

    assertThat(page.getByRole(AriaRole.HEADING, new Page.GetByRoleOptions().setName("Event")))
        .isVisible();
    assertThat(page).hasTitle("Event · Rampwright");
  }
}
