package rampwright.web;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.lang.conditions.ArchConditions.be;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.dependency.CssImport;
import com.vaadin.flow.component.dependency.JavaScript;
import com.vaadin.flow.component.dependency.JsModule;
import com.vaadin.flow.component.dependency.NpmPackage;
import com.vaadin.flow.component.dependency.StyleSheet;
import com.vaadin.flow.component.page.AppShellConfigurator;
import com.vaadin.flow.router.Route;
import java.io.IOException;
import java.lang.annotation.Annotation;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.planted.nopackageinfo.ClassOfAPackageWithoutPurpose;
import rampwright.planted.web.chart.ChartThatKnowsAView;
import rampwright.planted.web.compare.PublicView;
import rampwright.planted.web.compare.ViewThatImportsStyles;
import rampwright.planted.web.compare.ViewThatNeedsAPackage;
import rampwright.planted.web.compare.ViewWithALocalModule;
import rampwright.planted.web.compare.ViewWithALocalScriptAmongSeveral;
import rampwright.planted.web.compare.ViewWithStaticState;
import rampwright.planted.web.search.ShellWithAStyleSheet;
import rampwright.planted.web.search.ViewThatOwnsAThread;
import rampwright.planted.web.store.StoreThatKnowsAComponent;

/**
 * Directions inside the page, what would break Vaadin's ready-made bundle, and what holds for all
 * modules; each rule is shown to bite on a planted class.
 */
class WebArchitectureTest {
  private static final JavaClasses PRODUCTION =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("rampwright");
  private static final JavaClasses PLANTED =
      new ClassFileImporter().importPackages("rampwright.planted");

  private static final String[] AREAS = {
    "..web.event..",
    "..web.lap..",
    "..web.search..",
    "..web.compare..",
    "..web.runplan..",
    "..web.sheet..",
    "..web.debrief..",
    "..web.library.."
  };

  /** Each rule with the planted class that it must report. */
  static Stream<Arguments> rules() {
    return Stream.of(
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..web.chart..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(AREAS)
                .as("charts know no area of the page"),
            ChartThatKnowsAView.class),
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..web.store..")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("com.vaadin..")
                .orShould()
                .dependOnClassesThat()
                .resideInAnyPackage(AREAS)
                .as("storage knows no component and no area of the page"),
            StoreThatKnowsAComponent.class),
        arguments(
            slices().matching("rampwright..web.(*)..").should().beFreeOfCycles(),
            ChartThatKnowsAView.class),
        arguments(
            classes().that().areAnnotatedWith(Route.class).should().notBePublic(),
            PublicView.class),
        arguments(
            noClasses()
                .that()
                .areAssignableTo(Component.class)
                .should()
                .dependOnClassesThat()
                .areAssignableTo(Thread.class)
                .orShould()
                .dependOnClassesThat()
                .areAssignableTo(ExecutorService.class)
                .orShould()
                .dependOnClassesThat()
                .belongToAnyOf(Executors.class, CompletableFuture.class)
                .as("work belongs to a service: it must not die with a view"),
            ViewThatOwnsAThread.class),
        arguments(
            noClasses()
                .should(be(carrying(NpmPackage.class)))
                .as("no npm package: it cannot be in the ready-made bundle"),
            ViewThatNeedsAPackage.class),
        arguments(
            noClasses()
                .should(be(carrying(CssImport.class)))
                .as("no style import: it cannot be in the ready-made bundle"),
            ViewThatImportsStyles.class),
        arguments(
            noClasses()
                .should(be(loadingFromElsewhere()))
                .as("scripts and styles come from our own jar, not from a bundle or another host"),
            ViewWithALocalModule.class),
        arguments(
            noClasses()
                .should(be(loadingFromElsewhere()))
                .as("scripts and styles come from our own jar, each of several"),
            ViewWithALocalScriptAmongSeveral.class),
        arguments(
            noClasses()
                .that()
                .areAssignableTo(AppShellConfigurator.class)
                .should(be(carrying(StyleSheet.class)))
                .as("a style sheet on the shell is ignored; it belongs on a view or in the theme"),
            ShellWithAStyleSheet.class),
        arguments(fields().that().areStatic().should().beFinal(), ViewWithStaticState.class),
        arguments(
            classes()
                .should(
                    be(
                        DescribedPredicate.<JavaClass>describe(
                            "in a package that says what it is for",
                            type -> type.getPackage().tryGetPackageInfo().isPresent()))),
            ClassOfAPackageWithoutPurpose.class));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rules")
  void rampwrightKeepsTheRule(ArchRule rule, Class<?> planted) {
    rule.allowEmptyShould(true).check(PRODUCTION);
  }

  @ParameterizedTest(name = "{1}: {0}")
  @MethodSource("rules")
  void thePlantedViolationIsReported(ArchRule rule, Class<?> planted) {
    assertThat(rule.evaluate(PLANTED).getFailureReport().getDetails())
        .anyMatch(line -> line.contains(planted.getName()));
  }

  @Test
  void theRulesLookAtAllModules() {
    assertThat(PRODUCTION.contain(RampwrightApplication.class)).isTrue();
    assertThat(PRODUCTION.contain("rampwright.optimiser.package-info")).isTrue();
    assertThat(PRODUCTION.contain("rampwright.vehicle.package-info")).isTrue();
    assertThat(PRODUCTION).noneMatch(type -> type.getPackageName().contains("planted"));
  }

  @Test
  void theThemeImportsNothingThatTheReadyMadeBundleLacks() throws IOException {
    Path theme = Path.of("src/main/frontend/themes/rampwright/theme.json");
    assertThat(importsOf(Files.readString(theme))).isEmpty();
    assertThat(importsOf("{\"lumoImports\": [\"typography\"]}")).containsExactly("lumoImports");
  }

  private static List<String> importsOf(String theme) {
    return Stream.of("lumoImports", "importCss", "assets").filter(theme::contains).toList();
  }

  private static DescribedPredicate<JavaClass> carrying(Class<? extends Annotation> annotation) {
    return describe(
        "annotated with @" + annotation.getSimpleName(),
        type -> type.reflect().getDeclaredAnnotationsByType(annotation).length > 0);
  }

  private static DescribedPredicate<JavaClass> loadingFromElsewhere() {
    return describe(
        "loading a script or a style sheet that is not at context://",
        type -> addresses(type.reflect()).anyMatch(address -> !address.startsWith("context://")));
  }

  private static Stream<String> addresses(Class<?> type) {
    return Stream.of(
            Arrays.stream(type.getDeclaredAnnotationsByType(JsModule.class)).map(JsModule::value),
            Arrays.stream(type.getDeclaredAnnotationsByType(JavaScript.class))
                .map(JavaScript::value),
            Arrays.stream(type.getDeclaredAnnotationsByType(StyleSheet.class))
                .map(StyleSheet::value))
        .flatMap(Function.identity());
  }
}
