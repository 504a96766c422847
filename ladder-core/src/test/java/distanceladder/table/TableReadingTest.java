package distanceladder.table;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.relation.Observations;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TableReadingTest {
    private static final Table STARS = Table.parse("stars.csv", """
            # invented
            star,host,plx,plx_error,mag
            S 1,Near,250,20,11.5
            S 2,Near,-30,40,12.25
            S 3,,10,5,13
            """);

    private static Table with(String row) {
        return Table.parse("stars.csv", "star,host,plx,plx_error\nS 1,Near,250,20\n" + row + "\n");
    }

    @Test
    void columnsGetNamesObjectsAndUnits() {
        Observations read = STARS.observations("star")
                .object("host")
                .number("parallax", Unit.MICROARCSECOND, "plx")
                .error("parallax error", Unit.MICROARCSECOND, "plx_error")
                .number("magnitude", Unit.MAGNITUDE, "mag")
                .build();
        assertEquals("stars.csv", read.label());
        assertEquals(List.of("S 1", "S 2", "S 3"), read.names());
        assertEquals(List.of("Near", "Near", ""), read.objects());
        assertEquals(List.of("parallax", "parallax error", "magnitude"), read.columns());
        assertEquals(Unit.MICROARCSECOND, read.unit("parallax"));
        assertArrayEquals(new double[] {0.25, -0.03, 0.01}, read.column("parallax"), 1e-16);
        assertArrayEquals(new double[] {0.02, 0.04, 0.005}, read.errors("parallax error", Unit.MILLIARCSECOND), 1e-17);
        assertArrayEquals(new double[] {11.5, 12.25, 13}, read.column("magnitude"));
    }

    @Test
    void dataBearOnThemselvesUnlessToldOtherwise() {
        assertEquals(
                List.of("S 1", "S 2", "S 3"), STARS.observations("star").build().objects());
    }

    @Test
    void rowsAreChosenBeforeTheyAreRead() {
        TableReading all =
                with("S 2,Far,unknown,3").observations("star").number("parallax", Unit.MILLIARCSECOND, "plx");
        Observations near = all.where("host", "Near"::equals).build();
        assertEquals(List.of("S 1"), near.names());
        assertThrows(ValueFault.class, all::build);
    }

    @Test
    void readingsDoNotChangeOneAnother() {
        TableReading first = STARS.observations("star");
        first.object("host").where("host", "Near"::equals).number("magnitude", Unit.MAGNITUDE, "mag");
        Observations read = first.build();
        assertEquals(3, read.size());
        assertEquals(List.of(), read.columns());
    }

    @Test
    void testThatLeavesNoRowIsRefused() {
        ValueFault fault =
                assertThrows(ValueFault.class, () -> STARS.observations("star").where("host", "Nowhere"::equals));
        assertEquals("none of 3 rows passes the test of column \"host\"", fault.what());
        assertEquals("stars.csv", fault.where());
    }

    @Test
    void missingColumnIsRefusedWhereItIsNamed() {
        TableReading reading = STARS.observations("star");
        for (NameFault fault : List.of(
                assertThrows(NameFault.class, () -> STARS.observations("plxx")),
                assertThrows(NameFault.class, () -> reading.object("plxx")),
                assertThrows(NameFault.class, () -> reading.number("parallax", Unit.MILLIARCSECOND, "plxx")),
                assertThrows(NameFault.class, () -> reading.error("parallax", Unit.MILLIARCSECOND, "plxx")),
                assertThrows(NameFault.class, () -> reading.where("plxx", cell -> true)))) {
            assertEquals("column \"plxx\"", fault.what());
            assertTrue(fault.repair().contains("\"plx\""), fault.repair());
        }
    }

    @Test
    void nameReadTwiceIsRefused() {
        TableReading once = STARS.observations("star").number("parallax", Unit.MILLIARCSECOND, "plx");
        NameFault fault = assertThrows(NameFault.class, () -> once.error("parallax", Unit.MILLIARCSECOND, "plx_error"));
        assertEquals("\"parallax\" is read twice", fault.what());
        assertThrows(NameFault.class, () -> once.number("parallax", Unit.MILLIARCSECOND, "plx"));
    }

    @Test
    void datumWithoutNameIsRefusedWithItsLine() {
        NameFault fault = assertThrows(
                NameFault.class, () -> with(",Near,1,1").observations("star").build());
        assertEquals("stars.csv, line 3, column 1 (star)", fault.where());
        assertEquals("give it a name", fault.repair());
    }

    @Test
    void datumThatStandsTwiceIsRefusedWithBothLines() {
        NameFault fault = assertThrows(
                NameFault.class, () -> with("S 1,Far,1,1").observations("star").build());
        assertEquals("datum \"S 1\"", fault.what());
        assertEquals("stars.csv, line 3, column 1 (star)", fault.where());
        assertTrue(fault.repair().contains("stars.csv, line 2, column 1 (star)"), fault.repair());
    }

    @Test
    void cellThatIsNoNumberIsRefusedWithItsLine() {
        TableReading reading =
                with("S 2,Near,abc,1").observations("star").number("parallax", Unit.MILLIARCSECOND, "plx");
        ValueFault fault = assertThrows(ValueFault.class, reading::build);
        assertEquals("plx = \"abc\"", fault.what());
        assertEquals("stars.csv, line 3, column 3 (plx)", fault.where());
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "-0.0", "-2", "1e-999"})
    void errorThatIsNotAboveZeroIsRefusedWithItsLine(String cell) {
        TableReading reading = with("S 2,Near,1," + cell)
                .observations("star")
                .error("parallax error", Unit.MILLIARCSECOND, "plx_error");
        ValueFault fault = assertThrows(ValueFault.class, reading::build);
        assertEquals("plx_error = " + cell + " mas", fault.what());
        assertEquals("a standard deviation is above zero", fault.rule());
        assertEquals("stars.csv, line 3, column 4 (plx_error)", fault.where());
    }
}
