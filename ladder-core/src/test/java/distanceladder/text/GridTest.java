package distanceladder.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class GridTest {
    @Test
    void numbersStandOnPointAndSign() {
        Grid grid = Grid.with("name", "estimate", "unit")
                .titled("What comes out")
                .row("Hubble constant", Figures.pair(73.32, 1.7), "km/s/Mpc")
                .row("zero point", Figures.pair(-19.2311, 0.049), "mag")
                .row("none of it", "none", "")
                .build();
        assertEquals("""
                What comes out
                name                    estimate  unit
                ───────────────  ───────────────  ────────
                Hubble constant   73.3   ± 1.7    km/s/Mpc
                zero point       -19.231 ± 0.049  mag
                none of it       none""", grid.text());
        assertEquals(grid.text(), grid.toString());
    }

    @Test
    void countsAndDoubles() {
        assertEquals(
                """
                object     n        x
                ──────  ────  ───────
                a          3  1.50000
                b       1200  0.25000""",
                Grid.with("object", "n", "x")
                        .row("a", 3, "1.50000")
                        .row("b", 1200, "0.25000")
                        .build()
                        .text());
        assertEquals(
                "      x\n───────\n1.50000", Grid.with("x").row(1.5).build().text());
    }

    @Test
    void pairsWithAPowerOfTenAreNumbers() {
        assertEquals(
                """
                                rate
                ────────────────────
                 (7.131 ± 0.014)e-13
                (-7.13  ± 0.14)e-13""",
                Grid.with("rate")
                        .row("(7.131 ± 0.014)e-13")
                        .row("(-7.13 ± 0.14)e-13")
                        .build()
                        .text());
    }

    /** One object called 42 does not make names into numbers. */
    @Test
    void aColumnOfNamesStaysAtTheLeft() {
        assertEquals(
                """
                object
                ───────
                42
                Tarn 01
                Tarn 02""",
                Grid.with("object")
                        .row("42")
                        .row("Tarn 01")
                        .row("Tarn 02")
                        .build()
                        .text());
    }

    @Test
    void emptyCellsKeepTheirPlace() {
        assertEquals("""
                a  b
                ─  ─
                   x
                y""", Grid.with("a", "b").row("", "x").row("y", "").build().text());
        assertEquals("  b\n  ─\n  x", Grid.with("", "b").row("", "x").build().text());
    }

    @Test
    void withoutRows() {
        assertEquals("a  bc\n─  ──", Grid.with("a", "bc").build().text());
    }

    @Test
    void widthIsInCharactersAsSeen() {
        assertEquals(
                "name  n\n────  ─\n𝛼\u03B2    1\nµas   2",
                Grid.with("name", "n").row("𝛼\u03B2", 1).row("µas", 2).build().text());
    }

    @Test
    void aLineBreakDoesNotBreakTheTable() {
        assertEquals("a\n───\nx y", Grid.with("a").row("x\r\ny").build().text());
    }

    @Test
    void rowsHaveOneCellForEachColumn() {
        ValueFault fault =
                assertThrows(ValueFault.class, () -> Grid.with("a", "b").row("x"));
        assertTrue(fault.getMessage().contains("[a, b]"), fault.getMessage());
    }

    @Test
    void builtGridsAreNotChangedByTheirBuilder() {
        Grid.Builder builder = Grid.with("a").row("x");
        Grid grid = builder.build();
        builder.row("y").titled("later");
        assertEquals("a\n─\nx", grid.text());
    }

    @Test
    void tableForANotebook() {
        assertEquals(
                "<table><caption>R &amp; D</caption><tr><th>a&lt;b</th><th>n</th></tr>"
                        + "<tr><td>&quot;x&quot;</td><td style=\"text-align:right\">1.5 ± 0.1</td></tr></table>",
                Grid.with("a<b", "n")
                        .titled("R & D")
                        .row("\"x\"", "1.5 ± 0.1")
                        .build()
                        .html());
    }

    @Test
    void textForANotebookIsEscaped() {
        Shown shown = () -> "a < b & c";
        assertEquals("<pre>a &lt; b &amp; c</pre>", shown.html());
    }
}
