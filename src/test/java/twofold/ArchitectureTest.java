package twofold;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noFields;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.domain.JavaPackage;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchRule;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** The rules that keep the program in one direction, each with its reason. */
class ArchitectureTest {
    private static final JavaClasses PROGRAM = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("twofold");

    @Test
    void packagesUseOnlyWhatLiesBelowThem() {
        ArchRule rule = layeredArchitecture()
                .consideringOnlyDependenciesInAnyPackage("twofold..")
                .layer("main")
                .definedBy("twofold")
                .layer("command")
                .definedBy("twofold.command..")
                .layer("file")
                .definedBy("twofold.file..")
                .layer("picture")
                .definedBy("twofold.picture..")
                .layer("session")
                .definedBy("twofold.session..")
                .layer("window")
                .definedBy("twofold.window..")
                .layer("study")
                .definedBy("twofold.study..")
                .layer("edit")
                .definedBy("twofold.edit..")
                .layer("cavity")
                .definedBy("twofold.cavity..")
                .layer("layout")
                .definedBy("twofold.layout..")
                .layer("design")
                .definedBy("twofold.design..")
                .layer("material")
                .definedBy("twofold.material..")
                .layer("optics")
                .definedBy("twofold.optics..")
                .whereLayer("main")
                .mayNotBeAccessedByAnyLayer()
                .whereLayer("command")
                .mayOnlyBeAccessedByLayers("main")
                .whereLayer("window")
                .mayOnlyBeAccessedByLayers("main")
                .whereLayer("session")
                .mayOnlyBeAccessedByLayers("window")
                .whereLayer("file")
                .mayOnlyBeAccessedByLayers("session", "command", "window")
                .whereLayer("picture")
                .mayOnlyBeAccessedByLayers("command", "window")
                .whereLayer("edit")
                .mayOnlyBeAccessedByLayers("session", "window")
                .whereLayer("study")
                .mayOnlyBeAccessedByLayers("edit", "file", "picture", "session", "command", "window")
                .whereLayer("cavity")
                .mayOnlyBeAccessedByLayers("edit", "study", "file", "picture", "session", "command", "window")
                .whereLayer("layout")
                .mayOnlyBeAccessedByLayers("cavity", "edit", "study", "file", "picture", "session", "command", "window")
                .whereLayer("material")
                .mayOnlyBeAccessedByLayers("layout", "edit", "window")
                .whereLayer("design")
                .mayNotAccessAnyLayer()
                .whereLayer("optics")
                .mayNotAccessAnyLayer()
                .because("a reader who holds the diagram of packages in mind must be able to trust it");
        rule.check(PROGRAM);
    }

    @Test
    void packagesHaveNoCycles() {
        slices().matching("twofold.(*)..")
                .should()
                .beFreeOfCycles()
                .because("a cycle makes two packages one")
                .check(PROGRAM);
    }

    @Test
    void onlyTheWindowKnowsJavaFx() {
        noClasses()
                .that()
                .resideOutsideOfPackage("twofold.window..")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("javafx..")
                .because("everything but the window must run with no display and no toolkit")
                .check(PROGRAM);
    }

    @Test
    void onlyPicturesKnowAwt() {
        noClasses()
                .that()
                .resideOutsideOfPackage("twofold.picture..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("java.awt..", "javax.swing..")
                .because("pictures are described once to a painter of ours; two toolkits in one program start twice")
                .check(PROGRAM);
    }

    @Test
    void onlyFilesKnowJson() {
        noClasses()
                .that()
                .resideOutsideOfPackage("twofold.file..")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("com.fasterxml..")
                .because("the format of files is one package's business")
                .check(PROGRAM);
    }

    @Test
    void onlyTheStartTouchesStandardStreams() {
        noClasses()
                .that()
                .doNotHaveFullyQualifiedName("twofold.Main")
                .should()
                .accessField(System.class, "out")
                .orShould()
                .accessField(System.class, "err")
                .orShould()
                .callMethod(System.class, "exit", int.class)
                .because("commands are functions of arguments and streams, so that tests and windows can call them")
                .check(PROGRAM);
    }

    @Test
    void nothingStaticIsMutable() {
        noFields()
                .that()
                .areStatic()
                .and()
                .areNotFinal()
                .should()
                .beDeclaredInClassesThat()
                .resideInAPackage("twofold..")
                .allowEmptyShould(true)
                .because("state that everybody can change is state that nobody knows")
                .check(PROGRAM);
    }

    @Test
    void namesSayWhatAClassIs() {
        noClasses()
                .should()
                .haveNameMatching(".*(Util|Utils|Common|Manager|Helper|Impl)")
                .because("such a name fits anything, and then anything gets in")
                .check(PROGRAM);
    }

    @Test
    void valuesAreImmutable() {
        classes()
                .that()
                .areRecords()
                .should()
                .haveOnlyFinalFields()
                .because("designs and answers never change underneath anybody")
                .check(PROGRAM);
    }

    @Test
    void everyPackageOpensWithAPage() {
        List<String> without = packages(PROGRAM.getPackage("twofold"))
                .filter(p -> !p.getName().equals("twofold"))
                .filter(p ->
                        p.getClasses().stream().noneMatch(c -> c.getSimpleName().equals("package-info")))
                .map(JavaPackage::getName)
                .toList();
        assertThat(without)
                .as("packages without a package-info, the page that says what a package is for")
                .isEmpty();
    }

    @Test
    void whatIsCountedIsThere() {
        assertThat(PROGRAM.stream().map(JavaClass::getPackageName).distinct())
                .as("the importer sees the program, so the rules above were not checked on nothing")
                .contains("twofold.design", "twofold.optics", "twofold.cavity");
        assertThat(PROGRAM.stream().filter(c -> c.getModifiers().contains(JavaModifier.FINAL)))
                .hasSizeGreaterThan(20);
    }

    private static Stream<JavaPackage> packages(JavaPackage root) {
        return Stream.concat(Stream.of(root), root.getSubpackages().stream().flatMap(ArchitectureTest::packages));
    }
}
