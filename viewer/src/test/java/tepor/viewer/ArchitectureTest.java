package tepor.viewer;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import com.tngtech.archunit.library.GeneralCodingRules;
import com.tngtech.archunit.library.dependencies.SliceAssignment;
import com.tngtech.archunit.library.dependencies.SliceIdentifier;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The arrows between modules and packages, and what only certain packages may do. */
class ArchitectureTest {
    /** From the bottom to the top: a package uses itself and what stands before it. */
    private static final List<String> LAYERS = List.of(
            "tepor.mesher.outline",
            "tepor.mesher.curve",
            "tepor.mesher.chain",
            "tepor.mesher.dxf",
            "tepor.mesher.section",
            "tepor.mesher.soundness",
            "tepor.mesher.mending",
            "tepor.mesher.triangulation",
            "tepor.mesher.refinement",
            "tepor.mesher.mesh",
            "tepor.solver.quantity",
            "tepor.solver.model",
            "tepor.solver.casefile",
            "tepor.solver.element",
            "tepor.solver.assembly",
            "tepor.solver.linear",
            "tepor.solver.field",
            "tepor.solver.bracket",
            "tepor.solver.trust",
            "tepor.solver.answer",
            "tepor.viewer.wording",
            "tepor.viewer.picture",
            "tepor.viewer.export",
            "tepor.viewer.report",
            "tepor.viewer.window",
            "tepor.viewer.command");

    private static final JavaClasses CLASSES = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("tepor");

    @Test
    void packagesUseOnlyWhatStandsBelow() {
        ArchRule rule = classes().that().resideInAPackage("tepor..").should(useOnlyWhatStandsBelow());
        rule.check(CLASSES);
    }

    @Test
    void noCirclesBetweenPackages() {
        ArchRule rule = slices().assignedFrom(new SliceAssignment() {
                    @Override
                    public SliceIdentifier getIdentifierOf(JavaClass one) {
                        return SliceIdentifier.of(one.getPackageName());
                    }

                    @Override
                    public String getDescription() {
                        return "packages";
                    }
                })
                .should()
                .beFreeOfCycles();
        rule.check(CLASSES);
    }

    @Test
    void noCirclesBetweenFiles() {
        ArchRule rule = slices().assignedFrom(new SliceAssignment() {
                    @Override
                    public SliceIdentifier getIdentifierOf(JavaClass one) {
                        return SliceIdentifier.of(outermost(one).getName());
                    }

                    @Override
                    public String getDescription() {
                        return "files";
                    }
                })
                .should()
                .beFreeOfCycles();
        rule.check(CLASSES);
    }

    @Test
    void onlyTheCommandLinePrints() {
        ArchRule rule = noClasses()
                .that()
                .resideOutsideOfPackage("tepor.viewer.command..")
                .should(GeneralCodingRules.ACCESS_STANDARD_STREAMS);
        rule.check(CLASSES);
    }

    @Test
    void onlyMainEndsTheProcess() {
        ArchRule rule = noClasses()
                .that()
                .doNotHaveFullyQualifiedName("tepor.viewer.command.Main")
                .should()
                .callMethod(System.class, "exit", int.class)
                .orShould()
                .callMethod(Runtime.class, "exit", int.class)
                .orShould()
                .callMethod(Runtime.class, "halt", int.class);
        rule.check(CLASSES);
    }

    @Test
    void onlyQuantityAndCaseFileKnowUnits() {
        ArchRule rule = noClasses()
                .that()
                .resideOutsideOfPackages("tepor.solver.quantity..", "tepor.solver.casefile..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("javax.measure..", "tech.units..", "systems.uom..", "si.uom..", "tech.uom..");
        rule.check(CLASSES);
    }

    @Test
    void onlyTheWindowKnowsJavaFx() {
        ArchRule rule = noClasses()
                .that()
                .resideOutsideOfPackage("tepor.viewer.window..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("javafx..");
        rule.check(CLASSES);
    }

    @Test
    void onlyTheCommandLineKnowsItsLibraries() {
        ArchRule rule = noClasses()
                .that()
                .resideOutsideOfPackage("tepor.viewer.command..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("picocli..", "me.tongfei..");
        rule.check(CLASSES);
    }

    @Test
    void nobodyThrowsGenericExceptions() {
        ArchRule rule = GeneralCodingRules.NO_CLASSES_SHOULD_THROW_GENERIC_EXCEPTIONS;
        rule.check(CLASSES);
    }

    private static JavaClass outermost(JavaClass one) {
        return one.getEnclosingClass().map(ArchitectureTest::outermost).orElse(one);
    }

    private static int layer(JavaClass one) {
        String name = one.getPackageName() + ".";
        for (int i = 0; i < LAYERS.size(); i++) {
            if (name.startsWith(LAYERS.get(i) + ".")) {
                return i;
            }
        }
        return -1;
    }

    private static ArchCondition<JavaClass> useOnlyWhatStandsBelow() {
        return new ArchCondition<>("use only packages that stand below their own") {
            @Override
            public void check(JavaClass one, ConditionEvents events) {
                int own = layer(one);
                if (own < 0) {
                    events.add(SimpleConditionEvent.violated(one, one.getName() + " is in no known package"));
                }
                for (Dependency dependency : one.getDirectDependenciesFromSelf()) {
                    JavaClass target = dependency.getTargetClass().getBaseComponentType();
                    if (target.getPackageName().startsWith("tepor.") && layer(target) > own) {
                        events.add(SimpleConditionEvent.violated(dependency, dependency.getDescription()));
                    }
                }
            }
        };
    }
}
