package sill.tests.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import org.junit.jupiter.api.Test;

/** Who may know whom. */
class PackageRulesTest {
    private static final JavaClasses HOUSE = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("sill");

    /** A rule holds for nothing at all when nothing was looked at. Raise the number as the house grows. */
    @Test
    void theWholeHouseIsLookedAt() {
        assertThat(HOUSE.stream().filter(type -> !type.getPackageName().startsWith("sill.stdlib")))
                .hasSizeGreaterThan(280);
        assertThat(HOUSE.stream().filter(type -> type.getPackageName().startsWith("sill.stdlib")))
                .hasSizeGreaterThan(20);
    }

    @Test
    void packagesFormNoCircle() {
        slices().matching("sill.(**)").should().beFreeOfCycles().check(HOUSE);
    }

    @Test
    void stdlibKnowsNothingOfTheEngine() {
        classes()
                .that()
                .resideInAPackage("sill.stdlib..")
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage("sill.stdlib..", "java..")
                .check(HOUSE);
    }

    @Test
    void theSnippetEvaluatorStaysInTheWorker() {
        noClasses()
                .that()
                .resideOutsideOfPackage("sill.worker")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("jdk.jshell..")
                .check(HOUSE);
    }

    @Test
    void theCompilersTreeStaysInTheSheetAndTheInference() {
        noClasses()
                .that()
                .resideOutsideOfPackages("sill.sheet", "sill.inference")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(
                        "com.sun.source..",
                        "com.sun.tools..",
                        "javax.lang.model.element..",
                        "javax.lang.model.type..",
                        "javax.lang.model.util..")
                .check(HOUSE);
    }

    /** The worker hands a compiler to the sheet's translation and reads what the snippet evaluator says of errors. */
    @Test
    void theCompilerIsStartedByTheSheetAndTheWorkerAlone() {
        noClasses()
                .that()
                .resideOutsideOfPackages("sill.sheet", "sill.worker")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("javax.tools..")
                .check(HOUSE);
    }

    @Test
    void onlyCommandsWriteToTheTerminal() {
        noClasses()
                .that()
                .resideOutsideOfPackage("sill.cli")
                .should()
                .accessField(System.class, "out")
                .orShould()
                .accessField(System.class, "err")
                .check(HOUSE);
    }

    /** The worker's reports go where its standard output went before worksheet code could reach it. */
    @Test
    void onlyCommandsAndTheWorkerKnowTheStreamsBelow() {
        noClasses()
                .that()
                .resideOutsideOfPackages("sill.cli", "sill.worker")
                .should()
                .accessField(java.io.FileDescriptor.class, "out")
                .orShould()
                .accessField(java.io.FileDescriptor.class, "err")
                .check(HOUSE);
    }

    @Test
    void theInferenceKnowsUnitsAlone() {
        classes()
                .that()
                .resideInAPackage("sill.inference")
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage("sill.inference", "sill.units", "com.sun.source..", "javax.lang.model..", "java..")
                .check(HOUSE);
    }

    @Test
    void toleranceRunsAreNumericsAlone() {
        classes()
                .that()
                .resideInAPackage("sill.study")
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage("sill.study", "org.apache.commons.math3..", "org.apache.commons.rng..", "java..")
                .check(HOUSE);
    }

    @Test
    void modelsAndRecordKnowNeitherCompilerNorWorker() {
        noClasses()
                .that()
                .resideInAnyPackage(
                        "sill.markup..",
                        "sill.plot..",
                        "sill.record..",
                        "sill.trace..",
                        "sill.units..",
                        "sill.values..",
                        "sill.words..",
                        "sill.worksheet..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("sill.sheet..", "sill.worker..", "sill.cli..")
                .check(HOUSE);
    }
}
