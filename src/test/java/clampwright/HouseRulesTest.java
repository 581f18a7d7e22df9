package clampwright;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The walls of the house: which package may use which. DEVELOPERS.md draws the same picture. */
@AnalyzeClasses(packages = "clampwright", importOptions = ImportOption.DoNotIncludeTests.class)
class HouseRulesTest {

  @ArchTest
  static final ArchRule DATA_RUNS_ONE_WAY =
      layeredArchitecture()
          .consideringOnlyDependenciesInLayers()
          .layer("quantity")
          .definedBy("clampwright.quantity..")
          .layer("joint")
          .definedBy("clampwright.joint..")
          .layer("catalog")
          .definedBy("clampwright.catalog..")
          .layer("mechanics")
          .definedBy("clampwright.mechanics..")
          .layer("figure")
          .definedBy("clampwright.figure..")
          .layer("paint")
          .definedBy("clampwright.paint..")
          .layer("store")
          .definedBy("clampwright.store..")
          .layer("edit")
          .definedBy("clampwright.edit..")
          .layer("view")
          .definedBy("clampwright.view..")
          .layer("app")
          .definedBy("clampwright.app..")
          .whereLayer("app")
          .mayNotBeAccessedByAnyLayer()
          .whereLayer("view")
          .mayOnlyBeAccessedByLayers("app")
          .whereLayer("edit")
          .mayOnlyBeAccessedByLayers("view", "app")
          .whereLayer("store")
          .mayOnlyBeAccessedByLayers("app")
          .whereLayer("paint")
          .mayOnlyBeAccessedByLayers("view", "app")
          .whereLayer("figure")
          .mayOnlyBeAccessedByLayers("paint", "view", "app")
          .whereLayer("mechanics")
          .mayOnlyBeAccessedByLayers("figure", "edit", "view", "app")
          .whereLayer("catalog")
          .mayOnlyBeAccessedByLayers("edit", "view", "app")
          .whereLayer("joint")
          .mayOnlyBeAccessedByLayers(
              "catalog", "mechanics", "figure", "paint", "store", "edit", "view", "app");

  @ArchTest
  static final ArchRule THE_CORE_KNOWS_NO_SCREEN =
      noClasses()
          .that()
          .resideInAnyPackage(
              "clampwright.quantity..",
              "clampwright.joint..",
              "clampwright.catalog..",
              "clampwright.mechanics..",
              "clampwright.figure..",
              "clampwright.store..")
          .should()
          .dependOnClassesThat()
          .resideInAPackage("javafx..");

  @ArchTest
  static final ArchRule THE_MODEL_OBSERVES_WITHOUT_A_SCREEN =
      noClasses()
          .that()
          .resideInAPackage("clampwright.edit..")
          .should()
          .dependOnClassesThat(
              resideInAPackage("javafx..")
                  .and(
                      not(
                          resideInAnyPackage(
                              "javafx.beans..", "javafx.collections..", "javafx.util.."))));

  @ArchTest
  static final ArchRule PALETTES_KNOW_NO_SCREEN =
      noClasses()
          .that()
          .resideInAPackage("clampwright.paint")
          .should()
          .dependOnClassesThat()
          .resideInAPackage("javafx..");

  @ArchTest
  static final ArchRule AWT_ONLY_IN_PRINT =
      noClasses()
          .that()
          .resideOutsideOfPackage("clampwright.paint.print..")
          .should()
          .dependOnClassesThat()
          .resideInAnyPackage("java.awt..", "javax.swing..");

  @ArchTest
  static final ArchRule NO_CYCLES =
      slices().matching("clampwright.(*)..").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule NAMES_SAY_WHAT_A_THING_IS =
      classes()
          .should()
          .haveSimpleNameNotEndingWith("Impl")
          .andShould()
          .haveSimpleNameNotEndingWith("Manager")
          .andShould()
          .haveSimpleNameNotEndingWith("Helper")
          .andShould()
          .haveSimpleNameNotEndingWith("Util")
          .andShould()
          .haveSimpleNameNotEndingWith("Utils");
}
