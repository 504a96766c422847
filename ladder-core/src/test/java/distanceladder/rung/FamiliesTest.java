package distanceladder.rung;

import static distanceladder.relation.Amount.milliarcseconds;
import static distanceladder.relation.Amount.modulus;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import distanceladder.astro.Unit;
import distanceladder.relation.Derived;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** What holds for the families as a whole. */
class FamiliesTest {
    private static final JavaClasses FLOOR = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("distanceladder.rung");

    @Test
    void noFamilyKnowsAnother() {
        List<JavaClass> families =
                FLOOR.stream().filter(c -> c.isAssignableTo(Rung.class)).toList();
        assertEquals(7, families.size());
        for (JavaClass family : families) {
            List<String> others = family.getDirectDependenciesFromSelf().stream()
                    .map(d -> d.getTargetClass())
                    .filter(c -> c != family && families.contains(c))
                    .map(JavaClass::getName)
                    .distinct()
                    .toList();
            assertEquals(List.of(), others, family.getName());
        }
    }

    @Test
    void theFloorKnowsOnlyWhatIsBeneathIt() {
        List<String> allowed = List.of("rung", "relation", "covariance", "astro", "text");
        for (JavaClass c : FLOOR) {
            List<String> above = c.getDirectDependenciesFromSelf().stream()
                    .map(d -> d.getTargetClass().getPackageName())
                    .filter(p -> p.startsWith("distanceladder."))
                    .map(p -> p.substring("distanceladder.".length()))
                    .filter(p -> !allowed.contains(p))
                    .distinct()
                    .toList();
            assertEquals(List.of(), above, c.getName());
        }
    }

    /** The lines between the marks are those of package-info. */
    @Test
    void theExampleOfThePackageRuns() throws IOException {
        Observations stars = Observations.of("stars", "s")
                .with("parallax", Unit.MILLIARCSECOND, 1)
                .with("parallax error", Unit.MILLIARCSECOND, 0.02);
        Observations pulsating = Observations.of("pulsators", "s", "t")
                .with("magnitude", Unit.MAGNITUDE, 5, 24)
                .with("magnitude error", Unit.MAGNITUDE, 0.02, 0.02)
                .with("log period", Unit.LOG_DAY, 1, 1.2);
        Observations galaxies = Observations.of("galaxies", "g")
                .with("velocity", Unit.KILOMETRE_PER_SECOND, 5000)
                .with("velocity error", Unit.KILOMETRE_PER_SECOND, 50);
        // example
        Source offset = Source.normal("parallax offset", milliarcseconds(-0.017).plusMinus(0.005));
        Parallaxes nearby = Parallaxes.of("nearby", stars).withOffset(offset);
        Anchor anchor = Anchor.of("ring galaxy", modulus(29.40).plusMinus(0.03)).withSystematic(modulus(0.02));
        PeriodLuminosity pulsators = PeriodLuminosity.of("pulsators", pulsating).calibratedBy(nearby, anchor);
        VelocityDistance flow =
                VelocityDistance.of("flow", galaxies).inMagnitudes().calibratedBy(pulsators);
        Derived hubble = flow.hubbleConstant();
        // end
        assertEquals("Hubble constant", hubble.name());
        assertTrue(flow.text().contains("rests on pulsators"), flow.text());
        String test = Files.readString(Path.of("src/test/java/distanceladder/rung/FamiliesTest.java"));
        String shown = Files.readString(Path.of("src/main/java/distanceladder/rung/package-info.java"));
        assertEquals(block(test, "// example", "// end"), block(shown, "<pre>{@code", "}</pre>"));
    }

    /** The text between two marks without the margin of a comment, blanks and line ends. */
    private static String block(String text, String from, String to) {
        int start = text.indexOf('\n', text.indexOf(from)) + 1;
        return text.substring(start, text.indexOf(to, start))
                .lines()
                .map(line -> line.replaceFirst("^ \\*", "").replace(" ", ""))
                .collect(Collectors.joining());
    }
}
