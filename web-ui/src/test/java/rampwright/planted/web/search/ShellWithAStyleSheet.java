package rampwright.planted.web.search;

import com.vaadin.flow.component.dependency.StyleSheet;
import com.vaadin.flow.component.page.AppShellConfigurator;

/** Puts a style sheet on the shell, where it is ignored, on purpose. */
@StyleSheet("context://planted.css")
public final class ShellWithAStyleSheet implements AppShellConfigurator {
  private static final long serialVersionUID = 1L;
}
