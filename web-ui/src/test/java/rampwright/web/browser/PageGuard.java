package rampwright.web.browser;

import com.microsoft.playwright.Page;
import java.net.URI;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;

/** Notes what must happen on no screen: a request to another host, or a script that fails. */
final class PageGuard {
  private final List<String> problems = new CopyOnWriteArrayList<>();

  /**
   * Watches a page from now on.
   *
   * @param page the page, before it is opened
   */
  PageGuard(Page page) {
    page.onRequest(request -> noteForeign(request.url()));
    page.onPageError(error -> problems.add("script error: " + error));
  }

  /** What was noted so far, in order. */
  List<String> problems() {
    return List.copyOf(problems);
  }

  private void noteForeign(String url) {
    String host = URI.create(url).getHost();
    if (host != null && !host.equals("127.0.0.1")) {
      problems.add("request to another host: " + url);
    }
  }
}
