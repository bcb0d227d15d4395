package rampwright.optimiser;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideOutsideOfPackages;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.security.SecureRandom;
import java.time.Clock;
import java.time.Instant;
import java.util.Random;
import java.util.SplittableRandom;
import java.util.UUID;
import java.util.concurrent.ThreadLocalRandom;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.planted.optimiser.debrief.DebriefThatPrints;
import rampwright.planted.optimiser.event.EventThatKnowsTheSearch;
import rampwright.planted.optimiser.kit.KitThatKnowsTheEvent;
import rampwright.planted.optimiser.kit.KitThatReadsTheClock;
import rampwright.planted.optimiser.runplan.RunPlanThatUsesTheSearchLibrary;
import rampwright.planted.optimiser.search.SearchThatCountsForEveryone;
import rampwright.planted.optimiser.search.SearchThatKnowsTheCommandLine;
import rampwright.planted.optimiser.search.SearchThatKnowsThePage;
import rampwright.planted.optimiser.search.SearchWithoutSeed;

/** Directions and repeatability of the optimiser; each rule is shown to bite on a planted class. */
class OptimiserArchitectureTest {
  private static final JavaClasses PRODUCTION =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("rampwright.optimiser");
  private static final JavaClasses PLANTED =
      new ClassFileImporter().importPackages("rampwright.planted");

  /** Each rule with the planted class that it must report. */
  static Stream<Arguments> rules() {
    return Stream.of(
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..optimiser..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("rampwright..web..", "com.vaadin..", "org.springframework..")
                .as("the optimiser knows nothing of the page"),
            SearchThatKnowsThePage.class),
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..optimiser..")
                .and()
                .resideOutsideOfPackage("..optimiser.cli..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("..optimiser.cli..", "picocli..")
                .as("only the command line knows the command line"),
            SearchThatKnowsTheCommandLine.class),
        arguments(
            mayKnowOfTheOptimiserOnly("..optimiser.kit..", "..optimiser.kit.."),
            KitThatKnowsTheEvent.class),
        arguments(
            mayKnowOfTheOptimiserOnly(
                "..optimiser.event..", "..optimiser.kit..", "..optimiser.event.."),
            EventThatKnowsTheSearch.class),
        arguments(
            slices().matching("rampwright..optimiser.(*)..").should().beFreeOfCycles(),
            EventThatKnowsTheSearch.class),
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..optimiser..")
                .and()
                .resideOutsideOfPackages("..optimiser.search..", "..optimiser.study..")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("io.jenetics..")
                .as("only the search and the studies know the search library"),
            RunPlanThatUsesTheSearchLibrary.class),
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..optimiser..")
                .should()
                .callConstructor(Random.class)
                .orShould()
                .callConstructor(SplittableRandom.class)
                .orShould()
                .callMethod(Math.class, "random")
                .orShould()
                .callMethod(UUID.class, "randomUUID")
                .orShould()
                .callMethod(RandomGenerator.class, "getDefault")
                .orShould()
                .callMethod(RandomGenerator.class, "of", String.class)
                .orShould()
                .callMethod(RandomGeneratorFactory.class, "create")
                .orShould()
                .dependOnClassesThat()
                .belongToAnyOf(ThreadLocalRandom.class, SecureRandom.class)
                .as("every random number comes from a given seed"),
            SearchWithoutSeed.class),
        arguments(
            noClasses()
                .that()
                .resideInAnyPackage(
                    "..optimiser.kit..",
                    "..optimiser.event..",
                    "..optimiser.study..",
                    "..optimiser.runplan..",
                    "..optimiser.debrief..")
                .should()
                .callMethod(System.class, "nanoTime")
                .orShould()
                .callMethod(System.class, "currentTimeMillis")
                .orShould()
                .callMethod(Instant.class, "now")
                .orShould()
                .dependOnClassesThat()
                .belongToAnyOf(Clock.class)
                .as("what is computed does not depend on the time of day"),
            KitThatReadsTheClock.class),
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..optimiser..")
                .and()
                .resideOutsideOfPackage("..optimiser.cli..")
                .should()
                .accessField(System.class, "out")
                .orShould()
                .accessField(System.class, "err")
                .orShould()
                .callMethod(System.class, "exit", int.class)
                .as("only the command line prints or ends the process"),
            DebriefThatPrints.class),
        arguments(
            fields()
                .that()
                .areDeclaredInClassesThat()
                .resideInAPackage("..optimiser..")
                .and()
                .areStatic()
                .should()
                .beFinal(),
            SearchThatCountsForEveryone.class));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rules")
  void theOptimiserKeepsTheRule(ArchRule rule, Class<?> planted) {
    rule.allowEmptyShould(true).check(PRODUCTION);
  }

  @ParameterizedTest(name = "{1}: {0}")
  @MethodSource("rules")
  void thePlantedViolationIsReported(ArchRule rule, Class<?> planted) {
    assertThat(rule.evaluate(PLANTED).getFailureReport().getDetails())
        .anyMatch(line -> line.contains(planted.getName()));
  }

  @Test
  void theRulesLookAtTheWholeOptimiser() {
    assertThat(PRODUCTION.contain("rampwright.optimiser.package-info")).isTrue();
    assertThat(PRODUCTION).noneMatch(type -> type.getPackageName().contains("planted"));
  }

  private static ArchRule mayKnowOfTheOptimiserOnly(String from, String... known) {
    return noClasses()
        .that()
        .resideInAPackage(from)
        .should()
        .dependOnClassesThat(resideInAPackage("..optimiser..").and(resideOutsideOfPackages(known)))
        .as(from + " knows of the optimiser only " + String.join(", ", known));
  }
}
