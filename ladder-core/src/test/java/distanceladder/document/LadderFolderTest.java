package distanceladder.document;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Amount;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Anchor;
import distanceladder.rung.Parallaxes;
import distanceladder.rung.PeriodLuminosity;
import distanceladder.text.Fault;
import distanceladder.text.GraphFault;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class LadderFolderTest {
    private static final String GOOD = """
            {"version": 1,
             "sources": {"offset": {"value": -17, "sigma": 5, "unit": "µas"}},
             "rungs": [
              {"name": "parallaxes", "kind": "parallaxes", "table": "stars.csv", "datum": "star", "offset": "offset",
               "columns": {"parallax": ["plx", "mas"], "parallax error": ["plx_err", "mas"]}},
              {"name": "far anchor", "kind": "anchor", "object": "C", "value": 10.4, "sigma": 0.1, "unit": "mag",
               "systematic": 0.05},
              {"name": "pulsators", "kind": "period-luminosity", "table": "stars.csv", "datum": "star",
               "rests on": ["parallaxes", "far anchor"], "scatter": [50, "mmag"],
               "columns": {"magnitude": ["mag", "mag"], "magnitude error": ["mag_err", "mag"], "period": ["p", "d"]}}]}
            """;
    private static final String STARS = """
            star,plx,plx_err,mag,mag_err,p
            A,0.98,0.02,4.06,0.05,10.2
            B,0.41,0.02,5.11,0.05,16.6
            C,0.66,0.03,4.95,0.05,9.55
            D,-0.02,0.15,7.62,0.05,7.1
            """;

    @TempDir
    Path folder;

    @BeforeEach
    void write() throws IOException {
        Files.writeString(folder.resolve("ladder.json"), GOOD);
        Files.writeString(folder.resolve("stars.csv"), STARS);
    }

    private <F extends Fault> F refused(Class<F> kind, String from, String to) throws IOException {
        assertTrue(GOOD.contains(from), from);
        Files.writeString(folder.resolve("ladder.json"), GOOD.replace(from, to));
        F fault = assertThrows(kind, () -> LadderFolder.read(folder));
        assertTrue(fault.where().contains("line") || fault.what().contains("depth"), fault.getMessage());
        assertTrue(!fault.rule().isEmpty() && !fault.repair().isEmpty());
        return fault;
    }

    /** Read from the folder or built in code: the same ladder to the last bit. */
    @Test
    void equalsTheLadderBuiltInCode() {
        Observations stars = Observations.of("stars.csv", "A", "B", "C", "D")
                .with("parallax", Unit.MILLIARCSECOND, 0.98, 0.41, 0.66, -0.02)
                .with("parallax error", Unit.MILLIARCSECOND, 0.02, 0.02, 0.03, 0.15);
        Observations pulsating = Observations.of("stars.csv", "A", "B", "C", "D")
                .with("magnitude", Unit.MAGNITUDE, 4.06, 5.11, 4.95, 7.62)
                .with("magnitude error", Unit.MAGNITUDE, 0.05, 0.05, 0.05, 0.05)
                .with("period", Unit.DAY, 10.2, 16.6, 9.55, 7.1);
        Source offset = Source.normal("offset", Amount.microarcseconds(-17).plusMinus(5));
        PeriodLuminosity pulsators = PeriodLuminosity.of("pulsators", pulsating)
                .withScatter(Amount.of(50, Unit.MILLIMAGNITUDE))
                .calibratedBy(
                        Parallaxes.of("parallaxes", stars).withOffset(offset),
                        Anchor.named("far anchor", "C", Amount.modulus(10.4).plusMinus(0.1))
                                .withSystematic(Amount.magnitudes(0.05)));
        Solution code = Ladder.of(pulsators).solve();
        Solution file = LadderFolder.read(folder).ladder().solve();
        for (var value : new distanceladder.relation.Value[] {
            pulsators.zeroPoint(), pulsators.slope(), offset, pulsators.distance("D")
        }) {
            assertEquals(code.of(value).value(), file.of(value).value(), 0, value.name());
            assertEquals(code.of(value).sigma(), file.of(value).sigma(), 0, value.name());
        }
    }

    @Test
    void unknownNamesComeWithTheNearest() throws IOException {
        assertTrue(refused(NameFault.class, "\"offset\": \"offset\"", "\"offset\": \"ofset\"")
                .repair()
                .contains("offset"));
        assertTrue(refused(NameFault.class, "[\"plx\", \"mas\"]", "[\"plxx\", \"mas\"]")
                .repair()
                .contains("plx"));
        assertTrue(refused(NameFault.class, "[\"plx\", \"mas\"]", "[\"plx\", \"mass\"]")
                .repair()
                .contains("mas"));
        assertTrue(refused(NameFault.class, "\"kind\": \"parallaxes\"", "\"kind\": \"paralaxes\"")
                .repair()
                .contains("parallaxes"));
        assertTrue(refused(NameFault.class, "\"rests on\": [\"parallaxes\"", "\"rests on\": [\"parallax\"")
                .repair()
                .contains("parallaxes"));
        assertTrue(
                refused(NameFault.class, "\"scatter\"", "\"scater\"").repair().contains("scatter"));
        assertTrue(refused(NameFault.class, "\"datum\": \"star\", \"offset\"", "\"datum\": \"stars\", \"offset\"")
                .repair()
                .contains("star"));
    }

    @Test
    void placesAreLineAndColumn() throws IOException {
        NameFault fault = refused(NameFault.class, "[\"plx\", \"mas\"]", "[\"plx\", \"mass\"]");
        assertEquals("ladder.json, line 5, column 36", fault.where());
    }

    @Test
    void wrongTypesAndNumbers() throws IOException {
        refused(ValueFault.class, "\"value\": -17", "\"value\": \"-17\"");
        refused(ValueFault.class, "\"version\": 1", "\"version\": 2");
        refused(ValueFault.class, "\"sigma\": 5", "\"sigma\": -5");
        refused(ValueFault.class, "\"sigma\": 5", "\"sigma\": 1e400");
        refused(ValueFault.class, "\"sigma\": 5", "\"sigma\": 1e301");
        refused(ValueFault.class, "\"sigma\": 5", "\"sigma\": null");
        refused(ValueFault.class, "\"name\": \"pulsators\"", "\"name\": 7");
        refused(ValueFault.class, "[50, \"mmag\"]", "[50]");
        refused(NameFault.class, "[50, \"mmag\"]", "\"guessed\"");
        refused(ValueFault.class, "\"rests on\": [\"parallaxes\", \"far anchor\"]", "\"rests on\": \"parallaxes\"");
        refused(ValueFault.class, "[\"plx\", \"mas\"]", "[\"plx\", \"km/s\"]");
    }

    @Test
    void missingFieldsRepeatedKeysAndBrokenText() throws IOException {
        assertTrue(refused(NameFault.class, "\"value\": -17, ", "").what().contains("value"));
        refused(
                ValueFault.class,
                "\"datum\": \"star\", \"offset\"",
                "\"datum\": \"star\", \"datum\": \"p\", \"offset\"");
        refused(ValueFault.class, "\"version\": 1,", "\"version\": 1");
        refused(ValueFault.class, "\"sources\": {", "\"sources\": " + "[".repeat(80) + "{");
        refused(NameFault.class, "\"name\": \"pulsators\"", "\"name\": \"parallaxes\"");
    }

    @Test
    void cyclesAndEmptyLadders() throws IOException {
        GraphFault cycle = refused(
                GraphFault.class, "\"offset\": \"offset\",", "\"offset\": \"offset\", \"rests on\": [\"pulsators\"],");
        assertTrue(cycle.what().contains("->"), cycle.what());
        Files.writeString(folder.resolve("ladder.json"), "{\"version\": 1, \"rungs\": []}");
        assertThrows(GraphFault.class, () -> LadderFolder.read(folder));
    }

    @Test
    void pathsStayInsideTheFolder() throws IOException {
        Path outside = Files.createTempFile("outside", ".csv");
        Files.writeString(outside, STARS);
        assertTrue(refused(
                        ValueFault.class,
                        "\"stars.csv\", \"datum\": \"star\", \"offset\"",
                        "\"../" + outside.getFileName() + "\", \"datum\": \"star\", \"offset\"")
                .rule()
                .contains("inside"));
        refused(
                ValueFault.class,
                "\"stars.csv\", \"datum\": \"star\", \"offset\"",
                "\"" + outside + "\", \"datum\": \"star\", \"offset\"");
        Files.createSymbolicLink(folder.resolve("link.csv"), outside);
        refused(
                ValueFault.class,
                "\"stars.csv\", \"datum\": \"star\", \"offset\"",
                "\"link.csv\", \"datum\": \"star\", \"offset\"");
        refused(
                NameFault.class,
                "\"stars.csv\", \"datum\": \"star\", \"offset\"",
                "\"missing.csv\", \"datum\": \"star\", \"offset\"");
        Files.delete(outside);
    }

    @Test
    void faultsOfTablesTellFileLineAndColumn() throws IOException {
        table("star,plx,plx_err,mag,mag_err,p\n", "stars.csv");
        table(STARS.replace("0.41", "nothing"), "stars.csv, line 3, column 2 (plx)");
        table(STARS.replace("B,0.41,", "B,"), "stars.csv, line 3");
        table(STARS.replace("0.66,0.03", "0.66,-0.03"), "stars.csv, line 4, column 3 (plx_err)");
        table(STARS.replace("0.66", "NaN"), "stars.csv, line 4, column 2 (plx)");
        table(STARS.replace("B,", "A,"), "stars.csv, line 3");
    }

    private void table(String text, String where) throws IOException {
        Files.writeString(folder.resolve("stars.csv"), text);
        Fault fault = assertThrows(Fault.class, () -> LadderFolder.read(folder));
        assertTrue(fault.where().contains(where), fault.getMessage());
    }

    @Test
    void folderWithoutDocument() {
        NameFault fault = assertThrows(NameFault.class, () -> LadderFolder.read(folder.resolve("nowhere")));
        assertTrue(fault.what().contains("ladder.json"));
    }
}
