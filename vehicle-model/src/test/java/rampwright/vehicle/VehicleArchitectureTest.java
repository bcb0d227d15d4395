package rampwright.vehicle;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.assignableTo;
import static com.tngtech.archunit.core.domain.JavaModifier.SYNTHETIC;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaCall;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.time.Clock;
import java.util.AbstractCollection;
import java.util.AbstractMap;
import java.util.Calendar;
import java.util.Date;
import java.util.Random;
import java.util.SplittableRandom;
import java.util.random.RandomGenerator;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.planted.vehicle.chassis.ChassisThatReadsAFile;
import rampwright.planted.vehicle.circuit.CircuitThatKnowsATyre;
import rampwright.planted.vehicle.differential.DifferentialThatKnowsATyre;
import rampwright.planted.vehicle.lap.LapThatKeepsItsWorkspace;
import rampwright.planted.vehicle.lap.LapThatRollsDice;
import rampwright.planted.vehicle.trim.TrimThatCountsItsCalls;
import rampwright.planted.vehicle.trim.TrimThatKnowsTheLap;
import rampwright.planted.vehicle.trim.TrimThatReadsTheClock;
import rampwright.planted.vehicle.tyre.TyreThatKnowsTheOptimiser;

/** Directions and purity of the vehicle model; each rule is shown to bite on a planted class. */
class VehicleArchitectureTest {
  private static final JavaClasses PRODUCTION =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("rampwright.vehicle");
  private static final JavaClasses PLANTED =
      new ClassFileImporter().importPackages("rampwright.planted");

  private static final String[] SOLVERS = {
    "..vehicle.input..",
    "..vehicle.tyre..",
    "..vehicle.differential..",
    "..vehicle.driveline..",
    "..vehicle.chassis..",
    "..vehicle.trim..",
    "..vehicle.lap..",
    "..vehicle.balance..",
    "..vehicle.manoeuvre.."
  };

  /** Each rule with the planted class that it must report. */
  static Stream<Arguments> rules() {
    return Stream.of(
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..vehicle..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("..optimiser..", "rampwright.web..")
                .as("the vehicle model knows neither the optimiser nor the page"),
            TyreThatKnowsTheOptimiser.class),
        arguments(
            mayNotKnow("..vehicle.differential..", "..vehicle.tyre..", "..vehicle.chassis.."),
            DifferentialThatKnowsATyre.class),
        arguments(
            mayNotKnow(
                "..vehicle.circuit..",
                "..vehicle.tyre..",
                "..vehicle.chassis..",
                "..vehicle.driveline..",
                "..vehicle.differential..",
                "..vehicle.trim..",
                "..vehicle.lap.."),
            CircuitThatKnowsATyre.class),
        arguments(
            mayNotKnow(
                "..vehicle.trim..",
                "..vehicle.lap..",
                "..vehicle.balance..",
                "..vehicle.manoeuvre.."),
            TrimThatKnowsTheLap.class),
        arguments(
            slices().matching("rampwright..vehicle.(*)..").should().beFreeOfCycles(),
            TrimThatKnowsTheLap.class),
        arguments(
            noClasses()
                .that()
                .resideInAnyPackage(SOLVERS)
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("java.nio.file..", "java.net..", "com.fasterxml.jackson..")
                .as("solvers read no files"),
            ChassisThatReadsAFile.class),
        arguments(
            fields()
                .that()
                .areDeclaredInClassesThat()
                .resideInAPackage("..vehicle..")
                .and()
                .areStatic()
                .should()
                .beFinal(),
            TrimThatCountsItsCalls.class),
        arguments(
            fields()
                .that()
                .areDeclaredInClassesThat()
                .resideInAPackage("..vehicle..")
                .and()
                .areStatic()
                .and()
                .doNotHaveModifier(SYNTHETIC)
                .should()
                .notHaveRawType(thatCanChange()),
            LapThatKeepsItsWorkspace.class),
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..vehicle..")
                .should()
                .callMethod(System.class, "nanoTime")
                .orShould()
                .callMethod(System.class, "currentTimeMillis")
                .orShould()
                .callMethodWhere(timeOfDay())
                .orShould()
                .dependOnClassesThat()
                .belongToAnyOf(Clock.class, Date.class, Calendar.class)
                .as("the model reads no clock"),
            TrimThatReadsTheClock.class),
        arguments(
            noClasses()
                .that()
                .resideInAPackage("..vehicle..")
                .should()
                .callMethod(Math.class, "random")
                .orShould()
                .dependOnClassesThat()
                .areAssignableTo(Random.class)
                .orShould()
                .dependOnClassesThat()
                .areAssignableTo(RandomGenerator.class)
                .orShould()
                .dependOnClassesThat()
                .areAssignableTo(SplittableRandom.class)
                .orShould()
                .dependOnClassesThat()
                .resideInAPackage("org.apache.commons.math3.random..")
                .as("the model draws no random numbers"),
            LapThatRollsDice.class));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("rules")
  void theModelKeepsTheRule(ArchRule rule, Class<?> planted) {
    rule.allowEmptyShould(true).check(PRODUCTION);
  }

  @ParameterizedTest(name = "{1}: {0}")
  @MethodSource("rules")
  void thePlantedViolationIsReported(ArchRule rule, Class<?> planted) {
    assertThat(rule.evaluate(PLANTED).getFailureReport().getDetails())
        .anyMatch(line -> line.contains(planted.getName()));
  }

  @Test
  void theRulesLookAtTheWholeModel() {
    assertThat(PRODUCTION.contain("rampwright.vehicle.package-info")).isTrue();
    assertThat(PRODUCTION).noneMatch(type -> type.getPackageName().contains("planted"));
  }

  private static ArchRule mayNotKnow(String from, String... to) {
    return noClasses()
        .that()
        .resideInAPackage(from)
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(to);
  }

  private static DescribedPredicate<JavaClass> thatCanChange() {
    return describe("array", JavaClass::isArray)
        .or(assignableTo(AbstractCollection.class))
        .or(assignableTo(AbstractMap.class))
        .or(assignableTo(ThreadLocal.class))
        .or(assignableTo(StringBuilder.class))
        .or(JavaClass.Predicates.resideInAPackage("java.util.concurrent.."))
        .as("a type whose content can change");
  }

  private static DescribedPredicate<JavaCall<?>> timeOfDay() {
    return describe(
        "now() of java.time",
        call ->
            call.getName().equals("now")
                && call.getTargetOwner().getPackageName().equals("java.time"));
  }
}
