package rampwright.web;

import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.springframework.boot.context.event.ApplicationReadyEvent;
import org.springframework.boot.web.context.WebServerApplicationContext;
import org.springframework.context.event.EventListener;
import org.springframework.core.env.Environment;
import org.springframework.stereotype.Component;

/** Tells the person who started the page where it is. */
@Component
class AddressNotice {
  private static final Logger LOG = LoggerFactory.getLogger(AddressNotice.class);

  private final Environment environment;

  AddressNotice(Environment environment) {
    this.environment = environment;
  }

  @EventListener
  void onReady(ApplicationReadyEvent event) {
    if (event.getApplicationContext() instanceof WebServerApplicationContext web) {
      LOG.info(
          "Open http://{}:{}/ in a browser",
          environment.getProperty("server.address", "127.0.0.1"),
          web.getWebServer().getPort());
    }
  }
}
