package rampwright.web;

import com.vaadin.flow.component.page.AppShellConfigurator;
import com.vaadin.flow.component.page.Push;
import com.vaadin.flow.server.AppShellSettings;
import com.vaadin.flow.theme.Theme;
import org.springframework.boot.SpringApplication;
import org.springframework.boot.autoconfigure.SpringBootApplication;

/** Starts the page and is its shell: theme and server push apply to every view. */
@SpringBootApplication
@Theme("rampwright")
@Push
public class RampwrightApplication implements AppShellConfigurator {
  private static final long serialVersionUID = 1L;

  @Override
  public void configurePage(AppShellSettings settings) {
    settings.addFavIcon("icon", "rampwright/mark.svg", "any");
  }

  /**
   * Starts the web page on the address of {@code application.properties}.
   *
   * @param arguments Spring Boot options, for example {@code --server.port=8081}
   */
  public static void main(String[] arguments) {
    SpringApplication.run(RampwrightApplication.class, arguments);
  }
}
