package distanceladder;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.conditions.ArchConditions;

/** The floors of the house, lowest first: each uses only those under it. */
@AnalyzeClasses(packages = "distanceladder", importOptions = ImportOption.DoNotIncludeTests.class)
class FloorsTest {
    private static ArchRule only(String floor, String... under) {
        String[] allowed = new String[under.length + 1];
        allowed[0] = "distanceladder." + floor;
        for (int i = 0; i < under.length; i++) {
            allowed[i + 1] = "distanceladder." + under[i];
        }
        return noClasses()
                .that()
                .resideInAPackage("distanceladder." + floor)
                .should(ArchConditions.dependOnClassesThat(JavaClass.Predicates.resideInAPackage("distanceladder..")
                        .and(com.tngtech.archunit.base.DescribedPredicate.not(
                                JavaClass.Predicates.resideInAnyPackage(allowed)))))
                .because(floor + " may use only " + String.join(", ", under));
    }

    @ArchTest
    static final ArchRule TEXT = only("text");

    @ArchTest
    static final ArchRule ASTRO = only("astro", "text");

    @ArchTest
    static final ArchRule COVARIANCE = only("covariance", "text");

    @ArchTest
    static final ArchRule INFORMATION = only("information", "covariance", "text");

    @ArchTest
    static final ArchRule FIT = only("fit", "information", "covariance", "text");

    @ArchTest
    static final ArchRule CHANCE = only("chance", "covariance", "text");

    @ArchTest
    static final ArchRule RELATION = only("relation", "chance", "fit", "information", "covariance", "astro", "text");

    @ArchTest
    static final ArchRule RUNG =
            only("rung", "relation", "chance", "fit", "information", "covariance", "astro", "text");

    @ArchTest
    static final ArchRule LADDER =
            only("ladder", "relation", "chance", "fit", "information", "covariance", "astro", "text");

    @ArchTest
    static final ArchRule TABLE = only("table", "ladder", "rung", "relation", "chance", "covariance", "astro", "text");

    @ArchTest
    static final ArchRule DOCUMENT =
            only("document", "table", "ladder", "rung", "relation", "chance", "covariance", "astro", "text");

    @ArchTest
    static final ArchRule CSV_IN_ONE_PLACE = noClasses()
            .that()
            .resideOutsideOfPackage("distanceladder.table")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("de.siegmar..");

    @ArchTest
    static final ArchRule JSON_IN_ONE_PLACE = noClasses()
            .that()
            .resideOutsideOfPackage("distanceladder.document")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("com.fasterxml..");

    /** No family of rungs knows another. */
    @ArchTest
    static final ArchRule FAMILIES_APART = classes()
            .that()
            .resideInAPackage("distanceladder.rung")
            .and()
            .areTopLevelClasses()
            .should(new com.tngtech.archunit.lang.ArchCondition<JavaClass>("not use another family") {
                @Override
                public void check(JavaClass family, com.tngtech.archunit.lang.ConditionEvents events) {
                    family.getDirectDependenciesFromSelf().forEach(d -> {
                        JavaClass target = d.getTargetClass().getBaseComponentType();
                        boolean other = target.getPackageName().equals("distanceladder.rung")
                                && !target.getName().startsWith(family.getName());
                        if (other) {
                            events.add(com.tngtech.archunit.lang.SimpleConditionEvent.violated(
                                    family, d.getDescription()));
                        }
                    });
                }
            });

    @ArchTest
    static final ArchRule NO_CYCLES =
            slices().matching("distanceladder.(*)..").should().beFreeOfCycles();

    /** Powers, logarithms and angles have the same bits everywhere. */
    @ArchTest
    static final ArchRule STRICT_MATH = noClasses()
            .should()
            .callMethodWhere(com.tngtech.archunit.core.domain.JavaCall.Predicates.target(
                            com.tngtech.archunit.core.domain.properties.HasOwner.Predicates.With.owner(
                                    JavaClass.Predicates.equivalentTo(Math.class)))
                    .and(com.tngtech.archunit.core.domain.JavaCall.Predicates.target(
                            com.tngtech.archunit.core.domain.properties.HasName.Predicates.nameMatching(
                                    "exp|log|log10|log1p|expm1|pow|sin|cos|tan|asin|acos|atan|atan2|cbrt|hypot|fma"))));
}
