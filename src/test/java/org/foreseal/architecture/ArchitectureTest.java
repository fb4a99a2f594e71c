package org.foreseal.architecture;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.GeneralCodingRules.NO_CLASSES_SHOULD_THROW_GENERIC_EXCEPTIONS;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The rooms of the code and the arrows between them. */
@AnalyzeClasses(packages = "org.foreseal", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
  @ArchTest
  static final ArchRule roomsUseOnlyWhatLiesBelow =
      layeredArchitecture()
          .consideringOnlyDependenciesInLayers()
          .layer("quantity")
          .definedBy("org.foreseal.quantity..")
          .layer("yaml")
          .definedBy("org.foreseal.yaml..")
          .layer("molecule")
          .definedBy("org.foreseal.molecule..")
          .layer("rule")
          .definedBy("org.foreseal.rule..")
          .layer("network")
          .definedBy("org.foreseal.network..")
          .layer("thermo")
          .definedBy("org.foreseal.thermo..")
          .layer("chromatography")
          .definedBy("org.foreseal.chromatography..")
          .layer("plan")
          .definedBy("org.foreseal.plan..")
          .layer("run")
          .definedBy("org.foreseal.run..")
          .layer("report")
          .definedBy("org.foreseal.report..")
          .layer("cli")
          .definedBy("org.foreseal.cli..")
          .whereLayer("cli")
          .mayNotBeAccessedByAnyLayer()
          .whereLayer("report")
          .mayOnlyBeAccessedByLayers("cli")
          .whereLayer("run")
          .mayOnlyBeAccessedByLayers("report", "cli")
          .whereLayer("plan")
          .mayOnlyBeAccessedByLayers("run", "report", "cli")
          .whereLayer("chromatography")
          .mayOnlyBeAccessedByLayers("run", "report", "cli")
          .whereLayer("thermo")
          .mayOnlyBeAccessedByLayers("plan", "run", "report", "cli")
          .whereLayer("network")
          .mayOnlyBeAccessedByLayers("plan", "run", "report", "cli")
          .whereLayer("yaml")
          .mayOnlyBeAccessedByLayers("rule", "run")
          .whereLayer("rule")
          .mayOnlyBeAccessedByLayers("network", "run", "report", "cli");

  @ArchTest
  static final ArchRule roomsFormNoCycle =
      slices().matching("org.foreseal.(*)..").should().beFreeOfCycles();

  @ArchTest
  static final ArchRule theCheminformaticsLibraryStaysInTheMoleculeRoom =
      noClasses()
          .that(not(resideInAPackage("org.foreseal.molecule..")))
          .should()
          .dependOnClassesThat(
              resideInAnyPackage(
                  "org.openscience..", "uk.ac.cam.ch.wwmm..", "io.github.dan2097.."));

  @ArchTest
  static final ArchRule theGraphLibraryStaysInTheNetworkRoom =
      noClasses()
          .that(not(resideInAPackage("org.foreseal.network..")))
          .should()
          .dependOnClassesThat(resideInAPackage("org.jgrapht.."));

  @ArchTest
  static final ArchRule theCommandLineLibraryStaysInTheCommandRoom =
      noClasses()
          .that(not(resideInAPackage("org.foreseal.cli..")))
          .should()
          .dependOnClassesThat(resideInAPackage("picocli.."));

  @ArchTest
  static final ArchRule onlyCommandsPrintOrExit =
      noClasses()
          .that(not(resideInAPackage("org.foreseal.cli..")))
          .should()
          .accessField(System.class, "out")
          .orShould()
          .accessField(System.class, "err")
          .orShould()
          .callMethod(System.class, "exit", int.class);

  @ArchTest static final ArchRule noGenericExceptions = NO_CLASSES_SHOULD_THROW_GENERIC_EXCEPTIONS;

  @ArchTest static final ArchRule noMutableStatics = fields().that().areStatic().should().beFinal();
}
