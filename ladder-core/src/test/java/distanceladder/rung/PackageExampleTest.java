package distanceladder.rung;

import static distanceladder.relation.Amount.milliarcseconds;
import static distanceladder.relation.Amount.modulus;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.relation.Derived;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** The example of the package is compiled and run. */
class PackageExampleTest {
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
        String test = Files.readString(Path.of("src/test/java/distanceladder/rung/PackageExampleTest.java"));
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
