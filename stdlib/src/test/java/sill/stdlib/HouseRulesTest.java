package sill.stdlib;

import static com.tngtech.archunit.core.domain.JavaModifier.FINAL;
import static com.tngtech.archunit.core.domain.JavaModifier.STATIC;
import static com.tngtech.archunit.lang.conditions.ArchPredicates.are;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaCall;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaField;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** What keeps helpers the same everywhere: nothing but the JDK, nothing that changes, nothing a JVM may round its way. */
class HouseRulesTest {
    /** The functions of {@link Math} that need not be correctly rounded, by its own documentation. */
    private static final Set<String> MAY_DIFFER = Set.of(
            "sin", "cos", "tan", "asin", "acos", "atan", "atan2", "exp", "log", "log10", "cbrt", "pow", "sinh", "cosh",
            "tanh", "hypot", "expm1", "log1p", "random");

    private static final JavaClasses CLASSES = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("sill.stdlib");

    @Test
    void allClassesAreLookedAt() {
        assertThat(CLASSES).hasSizeGreaterThanOrEqualTo(20);
    }

    @Test
    void helpersNeedTheJdkAlone() {
        classes()
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage("sill.stdlib", "java.lang..", "java.util..", "java.math")
                .check(CLASSES);
    }

    @Test
    void functionsThatMathMayRoundItsWayComeFromStrictMath() {
        noClasses().should().callMethodWhere(inMath()).check(CLASSES);
    }

    @Test
    void nothingStaticChanges() {
        fields().that(are(inSource().and(isStatic()))).should().beFinal().check(CLASSES);
        fields().that(are(inSource().and(isStatic())))
                .should()
                .haveRawType(DescribedPredicate.describe("not an array", type -> !type.isArray()))
                .check(CLASSES);
        fields().that(are(inSource()))
                .should()
                .bePrivate()
                .orShould()
                .haveModifier(STATIC)
                .check(CLASSES);
        fields().that(are(inSource())).should().haveModifier(FINAL).check(CLASSES);
    }

    private static DescribedPredicate<JavaCall<?>> inMath() {
        return DescribedPredicate.describe(
                "a function that Math may round its own way",
                call -> call.getTargetOwner().isEquivalentTo(Math.class)
                        && MAY_DIFFER.contains(call.getTarget().getName()));
    }

    /** Not what the compiler adds, such as an enum's list of constants. */
    private static DescribedPredicate<JavaField> inSource() {
        return DescribedPredicate.describe(
                "in source", field -> !field.getName().contains("$"));
    }

    private static DescribedPredicate<JavaField> isStatic() {
        return DescribedPredicate.describe(
                "static", field -> field.getModifiers().contains(STATIC));
    }
}
