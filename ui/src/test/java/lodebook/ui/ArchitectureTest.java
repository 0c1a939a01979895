package lodebook.ui;

import static com.tngtech.archunit.base.DescribedPredicate.alwaysTrue;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.type;
import static com.tngtech.archunit.core.domain.properties.HasName.Predicates.nameMatching;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.library.GeneralCodingRules;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// The floors of the house and the habits that hold on all of them.
class ArchitectureTest {
  private static final List<String> DATABASE =
      List.of("java.sql..", "javax.sql..", "org.jooq..", "org.h2..", "org.flywaydb..");

  @SuppressWarnings("NullAway.Init")
  private static JavaClasses house;

  @BeforeAll
  static void readTheHouse() {
    house =
        new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("lodebook");
  }

  /// An empty scan would make every rule below hold.
  @ParameterizedTest
  @ValueSource(
      strings = {
        "lodebook.assembly.field",
        "lodebook.assembly.magnet",
        "lodebook.assembly.layout",
        "lodebook.db",
        "lodebook.reports",
        "lodebook.ui"
      })
  void theScanSawEveryFloor(String start) {
    long seen =
        house.stream()
            .filter(c -> c.getPackageName().startsWith(start))
            .filter(c -> !c.getSimpleName().equals("package-info"))
            .count();
    assertTrue(seen > 0, "no class of " + start + " was scanned");
  }

  @Test
  void assemblyLooksAtNobody() {
    noClasses()
        .that()
        .resideInAPackage("lodebook.assembly..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("lodebook.db..", "lodebook.reports..", "lodebook.ui..")
        .check(house);
  }

  @Test
  void reportsAndBookDoNotKnowEachOther() {
    noClasses()
        .that()
        .resideInAPackage("lodebook.reports..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("lodebook.db..", "lodebook.ui..")
        .check(house);
    noClasses()
        .that()
        .resideInAPackage("lodebook.db..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("lodebook.reports..", "lodebook.ui..")
        .check(house);
  }

  @Test
  void noTwoPackagesImportEachOtherInACircle() {
    slices()
        .matching("lodebook.(**)")
        .should()
        .beFreeOfCycles()
        .ignoreDependency(resideInAPackage("lodebook.db.tables.."), alwaysTrue())
        .check(house);
  }

  @Test
  void packagesAreNamedByTopic() {
    noClasses()
        .should()
        .resideInAnyPackage("..util..", "..model..", "..service..", "..impl..")
        .check(house);
  }

  @Test
  void databaseStaysInTheBook() {
    noClasses()
        .that()
        .resideOutsideOfPackage("lodebook.db..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(DATABASE.toArray(String[]::new))
        .check(house);
  }

  @Test
  void assemblyIsPureComputation() {
    noClasses()
        .that()
        .resideInAPackage("lodebook.assembly..")
        .should()
        .dependOnClassesThat(
            resideInAnyPackage(
                "java.io..",
                "java.nio.file..",
                "java.time..",
                "java.sql..",
                "java.net..",
                "javafx..",
                "java.awt.."))
        .orShould()
        .dependOnClassesThat(type(java.util.concurrent.ThreadLocalRandom.class))
        .orShould()
        .callConstructor(java.util.Random.class)
        .orShould()
        .callMethod(Math.class, "random")
        .orShould()
        .callMethod(System.class, "nanoTime")
        .orShould()
        .callMethod(System.class, "currentTimeMillis")
        .check(house);
  }

  @Test
  void onlyTheDesktopKnowsJavaFx() {
    noClasses()
        .that()
        .resideOutsideOfPackage("lodebook.ui.desk..")
        .should()
        .dependOnClassesThat()
        .resideInAPackage("javafx..")
        .check(house);
  }

  @Test
  void filesKnowNeitherFace() {
    noClasses()
        .that()
        .resideInAnyPackage("lodebook.ui.files..", "lodebook.ui.paper..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("javafx..", "picocli..", "lodebook.ui.cli..", "lodebook.ui.desk..")
        .allowEmptyShould(true)
        .check(house);
  }

  @Test
  void standardStreamsBelongToTheCommandLine() {
    noClasses()
        .that()
        .resideOutsideOfPackage("lodebook.ui.cli..")
        .and()
        .doNotHaveFullyQualifiedName("lodebook.ui.Main")
        .should(GeneralCodingRules.ACCESS_STANDARD_STREAMS)
        .check(house);
  }

  @Test
  void oneClockAndOneExit() {
    noClasses()
        .that()
        .doNotHaveFullyQualifiedName("lodebook.ui.Main")
        .should()
        .callMethod(System.class, "exit", int.class)
        .orShould()
        .callMethod(Runtime.class, "halt", int.class)
        .check(house);
    noClasses()
        .should()
        .callMethodWhere(
            com.tngtech.archunit.core.domain.JavaCall.Predicates.target(nameMatching(".*"))
                .and(
                    com.tngtech.archunit.core.domain.JavaCall.Predicates.target(
                        com.tngtech.archunit.core.domain.properties.HasOwner.Predicates.With.owner(
                            resideInAPackage("java.time"))))
                .and(
                    com.tngtech.archunit.core.domain.JavaCall.Predicates.target(
                        nameMatching("now")))
                .and(
                    com.tngtech.archunit.core.domain.JavaCall.Predicates.target(
                        com.tngtech.archunit.core.domain.properties.HasParameterTypes.Predicates
                            .rawParameterTypes(new Class<?>[0]))))
        .check(house);
  }

  @Test
  void threadsInsideTheDatabaseAreNeverInterrupted() {
    noClasses()
        .should()
        .callMethod(Thread.class, "interrupt")
        .orShould()
        .callMethod(java.util.concurrent.ExecutorService.class, "shutdownNow")
        .orShould()
        .callMethod(java.util.concurrent.Future.class, "cancel", boolean.class)
        .check(house);
  }

  @Test
  void oldDatesAreNotUsed() {
    noClasses().should().dependOnClassesThat(type(java.util.Date.class)).check(house);
  }

  @Test
  void nothingMutableIsStatic() {
    fields()
        .that()
        .areStatic()
        .and()
        .areDeclaredInClassesThat()
        .resideOutsideOfPackage("lodebook.db.tables..")
        .should()
        .haveModifier(JavaModifier.FINAL)
        .check(house);
  }
}
