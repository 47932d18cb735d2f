package lyate;

import static com.tngtech.archunit.library.Architectures.layeredArchitecture;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.syntax.ArchRuleDefinition;

/** Holds the package arrows of docs and DEVELOPERS.md. */
@AnalyzeClasses(packages = "lyate", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {

    @ArchTest
    static final ArchRule packagesDependOneWay = layeredArchitecture().consideringOnlyDependenciesInLayers()
            .withOptionalLayers(true)
            .layer("table").definedBy("lyate.table")
            .layer("molecule").definedBy("lyate.molecule")
            .layer("stock").definedBy("lyate.stock")
            .layer("site").definedBy("lyate.site")
            .layer("acidity").definedBy("lyate.acidity..")
            .layer("fit").definedBy("lyate.fit")
            .layer("flask").definedBy("lyate.flask")
            .layer("review").definedBy("lyate.review")
            .layer("bench").definedBy("lyate.bench")
            .layer("sheet").definedBy("lyate.sheet")
            .layer("report").definedBy("lyate.report")
            .layer("command").definedBy("lyate.command")
            .layer("window").definedBy("lyate.window")
            .whereLayer("window").mayOnlyBeAccessedByLayers("command")
            .whereLayer("command").mayNotBeAccessedByAnyLayer()
            .whereLayer("fit").mayOnlyBeAccessedByLayers("command")
            .whereLayer("report").mayOnlyBeAccessedByLayers("command", "window")
            .whereLayer("sheet").mayOnlyBeAccessedByLayers("report", "command", "window")
            .whereLayer("bench").mayOnlyBeAccessedByLayers("sheet", "report", "command", "window")
            .whereLayer("review").mayOnlyBeAccessedByLayers("bench", "sheet", "report", "command", "window")
            .whereLayer("flask").mayOnlyBeAccessedByLayers("review", "bench", "sheet", "report", "command", "window")
            .whereLayer("acidity").mayOnlyBeAccessedByLayers("fit", "flask", "review", "bench", "sheet", "report", "command", "window")
            .whereLayer("site").mayOnlyBeAccessedByLayers("acidity", "fit", "flask", "review", "bench", "sheet", "report", "command", "window")
            .whereLayer("stock").mayOnlyBeAccessedByLayers("site", "acidity", "fit", "flask", "review", "bench", "sheet", "report", "command", "window")
            .because("text becomes a verdict in one direction, and a reader can follow it");

    @ArchTest
    static final ArchRule onlyMoleculeKnowsTheToolkit = ArchRuleDefinition.noClasses()
            .that().resideOutsideOfPackages("lyate.molecule..", "lyate.window..")
            .should().dependOnClassesThat().resideInAPackage("org.openscience.cdk..")
            .because("rules accept only our own perceived molecule");

    @ArchTest
    static final ArchRule onlyTheWindowKnowsSwing = ArchRuleDefinition.noClasses()
            .that().resideOutsideOfPackages("lyate.window..", "lyate.command..")
            .should().dependOnClassesThat().resideInAPackage("javax.swing..")
            .because("engine and command line run without a display");
}
