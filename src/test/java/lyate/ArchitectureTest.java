package lyate;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.belongToAnyOf;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.net.URI;
import java.net.URISyntaxException;
import java.net.URL;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Holds the package arrows drawn in DEVELOPERS.md. */
class ArchitectureTest {

    /** Each package may use those before it, never those after it. */
    private static final List<String> ORDER = List.of("table", "molecule", "stock", "site", "acidity", "flask", "fit",
            "review", "bench", "sheet", "report", "window", "command");

    private static final JavaClasses PROGRAM = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests()).importPackages("lyate");

    static List<String> packages() {
        return ORDER.subList(0, ORDER.size() - 1);
    }

    @ParameterizedTest
    @MethodSource("packages")
    void aPackageKnowsOnlyThoseBeforeIt(String name) {
        String[] later = ORDER.subList(ORDER.indexOf(name) + 1, ORDER.size()).stream()
                .map(ArchitectureTest::named).toArray(String[]::new);
        noClasses().that().resideInAPackage(named(name)).should().dependOnClassesThat().resideInAnyPackage(later)
                .because("text becomes a verdict in one direction, and a reader can follow it").check(PROGRAM);
    }

    @Test
    void theFlaskIsPureNumbers() {
        noClasses().that().resideInAPackage(named("flask")).should().dependOnClassesThat()
                .resideInAnyPackage(named("table"), named("molecule"), named("stock"), named("site"), named("acidity"))
                .because("a solver sees amounts and pKa values, never a table").check(PROGRAM);
    }

    @Test
    void theProgramRunsWithoutTheFit() {
        noClasses().that().resideOutsideOfPackage(named("fit")).should().dependOnClassesThat().resideInAPackage(named("fit"))
                .because("coefficients are tables by the time the program runs").check(PROGRAM);
    }

    @Test
    void onlyTheMoleculePackageKnowsTheToolkit() {
        noClasses().that().resideOutsideOfPackage(named("molecule")).should().dependOnClassesThat()
                .resideInAPackage("org.openscience.cdk..")
                .because("rules accept only our own perceived molecule").check(PROGRAM);
    }

    @Test
    void onlyTheWindowKnowsSwing() {
        noClasses().that().resideOutsideOfPackage(named("window")).should().dependOnClassesThat()
                .resideInAnyPackage("javax.swing..", "com.formdev..")
                .because("engine and command line run without a display").check(PROGRAM);
    }

    /** Names of files are URIs here and there; nothing else of the package is used. */
    @Test
    void nothingOpensTheNetwork() {
        noClasses().should().dependOnClassesThat(resideInAPackage("java.net..").and(not(belongToAnyOf(URI.class, URISyntaxException.class, URL.class))))
                .orShould().dependOnClassesThat().resideInAnyPackage("javax.net..", "java.rmi..", "javax.naming..", "java.nio.channels.spi..")
                .orShould().dependOnClassesThat().haveNameMatching("java\\.nio\\.channels\\.(Asynchronous)?(Server)?(Socket|Datagram).*")
                .orShould().callMethod(URL.class, "openConnection").orShould().callMethod(URL.class, "openStream")
                .because("what a chemist types stays on the chemist's machine").check(PROGRAM);
    }

    private static String named(String name) {
        return "lyate." + name + "..";
    }
}
