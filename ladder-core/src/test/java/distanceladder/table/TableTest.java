package distanceladder.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class TableTest {
    private static final String STARS = """
            # an invented night
            # of two stars

            star, plx , note
            S 1, 0.25,"far, and ""faint"\""

            "#2",-1.5e-1,
            """;

    private static ValueFault refused(String text) {
        return assertThrows(ValueFault.class, () -> Table.parse("stars.csv", text));
    }

    @Test
    void cellsLinesAndColumnsAreReadAsWritten() {
        Table stars = Table.parse("stars.csv", STARS);
        assertEquals("stars.csv", stars.label());
        assertEquals(List.of("star", "plx", "note"), stars.columns());
        assertEquals(2, stars.size());
        assertEquals("S 1", stars.cell(0, "star"));
        assertEquals("far, and \"faint\"", stars.cell(0, "note"));
        assertEquals("#2", stars.cell(1, "star"));
        assertEquals("", stars.cell(1, "note"));
        assertEquals(0.25, stars.number(0, "plx"));
        assertEquals(-0.15, stars.number(1, "plx"));
        assertEquals(5, stars.line(0));
        assertEquals(7, stars.line(1));
        assertEquals("stars.csv, line 7, column 2 (plx)", stars.where(1, "plx"));
        assertThrows(UnsupportedOperationException.class, () -> stars.columns().add("more"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"\n", "\r\n", "\r"})
    void everyLineEndCountsOnce(String end) {
        Table table = Table.parse("t", String.join(end, "a,b", "\"1" + end + "1\",2", "3,4", ""));
        assertEquals(2, table.line(0));
        assertEquals(4, table.line(1));
        ValueFault fault = refused(String.join(end, "# c", "a,b", "\"1" + end + "1\",2", "3,\"4"));
        assertEquals("stars.csv, line 5", fault.where());
    }

    @Test
    void byteOrderMarkIsNoPartOfTheFirstName() {
        assertEquals(List.of("a"), Table.parse("t", "\uFEFFa\n1\n").columns());
        assertEquals(List.of("a"), Table.parse("t", "\uFEFF# c\na\n1\n").columns());
    }

    @Test
    void fileIsReadInUtf8AndKnownByItsName(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("stars.csv");
        Files.writeString(file, "\uFEFFstar,µ\nSjö 1,2\n", StandardCharsets.UTF_8);
        Table stars = Table.read(file);
        assertEquals("stars.csv", stars.label());
        assertEquals("Sjö 1", stars.cell(0, "star"));
        assertEquals(2, stars.number(0, "µ"));
    }

    @Test
    void missingFileIsNamed(@TempDir Path folder) {
        Path file = folder.resolve("stras.csv");
        NameFault fault = assertThrows(NameFault.class, () -> Table.read(file));
        assertEquals("file \"" + file + "\"", fault.what());
    }

    @Test
    void unreadableFileIsRefused(@TempDir Path folder) throws IOException {
        Path latin = folder.resolve("latin.csv");
        Files.write(latin, "star\nSjö\n".getBytes(StandardCharsets.ISO_8859_1));
        assertEquals(
                "latin.csv",
                assertThrows(ValueFault.class, () -> Table.read(latin)).where());
        assertThrows(ValueFault.class, () -> Table.read(folder));
    }

    @ParameterizedTest
    @CsvSource({"'',no header", "'# only a comment\n',no header", "'a,b\n',0 rows", "'a,b',0 rows"})
    void emptyTableIsRefused(String text, String what) {
        ValueFault fault = refused(text);
        assertEquals(what, fault.what());
        assertEquals("stars.csv", fault.where());
    }

    @ParameterizedTest
    @CsvSource({"'\na,b,\n1,2,3\n',3", "'\na, ,b\n1,2,3\n',2", "'\na,b, a\n1,2,3\n',3"})
    void blankOrRepeatedColumnNameIsRefused(String text, int column) {
        NameFault fault = assertThrows(NameFault.class, () -> Table.parse("stars.csv", text));
        assertTrue(fault.what().startsWith("column " + column + " "), fault.what());
        assertEquals("stars.csv, line 2", fault.where());
    }

    @ParameterizedTest
    @CsvSource({"'a,b\n1,2\n3\n',1 cells", "'a,b\n1,2\n3,4,5\n',3 cells", "'a,b\n1,2\n  \n',1 cells"})
    void rowOfAnotherWidthIsRefused(String text, String what) {
        ValueFault fault = refused(text);
        assertEquals(what, fault.what());
        assertEquals("stars.csv, line 3", fault.where());
    }

    @ParameterizedTest
    @CsvSource(
            quoteCharacter = '\'',
            value = {
                "'a,b\n1,\"x\n2,y\n3,z\n',2",
                "'a,b\n1,\"x\n2,\"y\"\n',3",
                "'a,b\n1,\"x\"y\n',2",
                "'a,b\n1,2\n3,x\"y\n',3",
                "'a,b\n1, \"x,y\"\n',2"
            })
    void quoteThatWouldSwallowCellsIsRefused(String text, int line) {
        assertEquals("stars.csv, line " + line, refused(text).where());
    }

    @Test
    void quotesInCommentsMeanNothing() {
        assertEquals(
                1, Table.parse("t", "# the \"best night\n# 5\" mirror\na\n1\n").size());
    }

    @Test
    void commentUnderTheHeaderIsRefusedAndNotSkipped() {
        ValueFault fault = refused("star,plx\nS 1,1\n#2,2\n");
        assertEquals("the line begins with #", fault.what());
        assertEquals("stars.csv, line 3", fault.where());
    }

    @Test
    void cellBeyondTheParserIsRefused() {
        assertEquals("stars.csv", refused("a\n" + "x".repeat(20_000_000) + "\n").where());
    }

    @ParameterizedTest
    @ValueSource(strings = {"abc", "", "NaN", "Infinity", "1e999", "1d", "0x1p3", "1 2", "1;5", "\u22121", "--1", "."})
    void cellThatIsNoFiniteNumberIsRefused(String cell) {
        Table table = Table.parse("stars.csv", "# c\nstar,err,plx\nS,1,1\nT,1," + cell + "\n");
        ValueFault fault = assertThrows(ValueFault.class, () -> table.number(1, "plx"));
        assertEquals("plx = \"" + cell + "\"", fault.what());
        assertEquals("the cell is a finite number", fault.rule());
        assertEquals("stars.csv, line 4, column 3 (plx)", fault.where());
    }

    @ParameterizedTest
    @CsvSource({"1,1", "-0.5,-0.5", "+.5,0.5", "5.,5", "1E-3,0.001", "-2.5e+2,-250"})
    void decimalNumbersAreRead(String cell, double x) {
        assertEquals(x, Table.parse("t", "a\n" + cell + "\n").number(0, "a"));
    }

    @Test
    void missingColumnNamesTheNearest() {
        Table stars = Table.parse("stars.csv", STARS);
        for (NameFault fault : List.of(
                assertThrows(NameFault.class, () -> stars.cell(0, "pls")),
                assertThrows(NameFault.class, () -> stars.number(0, "pls")),
                assertThrows(NameFault.class, () -> stars.where(0, "pls")))) {
            assertEquals("column \"pls\"", fault.what());
            assertEquals("stars.csv", fault.where());
            assertTrue(fault.repair().contains("\"plx\""), fault.repair());
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {-1, 2})
    void rowOutsideTheTableIsRefused(int row) {
        Table stars = Table.parse("stars.csv", STARS);
        for (ValueFault fault : List.of(
                assertThrows(ValueFault.class, () -> stars.cell(row, "star")),
                assertThrows(ValueFault.class, () -> stars.number(row, "plx")),
                assertThrows(ValueFault.class, () -> stars.where(row, "plx")),
                assertThrows(ValueFault.class, () -> stars.line(row)))) {
            assertEquals("row " + row, fault.what());
            assertEquals("rows are counted from 0 to 1", fault.rule());
        }
    }

    @Test
    void longTableShowsItsHeadAndSaysHowMuchIsLeft() {
        StringBuilder text = new StringBuilder("a\n");
        for (int i = 0; i < 15; i++) {
            text.append("row").append(i).append('\n');
        }
        String shown = Table.parse("t", text.toString()).toString();
        assertTrue(shown.contains("t: 15 rows") && shown.contains("row11") && !shown.contains("row12"), shown);
        assertTrue(shown.endsWith("... and 3 more rows"), shown);
    }
}
