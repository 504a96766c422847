package distanceladder.text;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class NearestTest {
    private static final List<String> RUNGS = List.of("parallaxes", "pulsators", "explosions", "flow", "ring galaxy");

    /** Insert, drop, replace and swap cost one each, letters of both cases are alike (Damerau 1964). */
    @Test
    void edits() {
        assertEquals(0, Nearest.distance("Flow", "fLOW"));
        assertEquals(1, Nearest.distance("flow", "flows"));
        assertEquals(1, Nearest.distance("flow", "low"));
        assertEquals(1, Nearest.distance("flow", "flaw"));
        assertEquals(1, Nearest.distance("flow", "folw"));
        assertEquals(3, Nearest.distance("kitten", "sitting"));
        assertEquals(4, Nearest.distance("", "flow"));
    }

    @Test
    void nearestFirst() {
        assertEquals(List.of("pulsators"), Nearest.to("Pulsator", RUNGS));
        assertEquals(List.of("flow"), Nearest.to("folw", RUNGS));
        assertEquals(List.of("host 12", "host 1", "host 10"), Nearest.to("host 12", hosts(12)));
        assertEquals(List.of("abc1", "abc2", "abc3"), Nearest.to("abc", List.of("abc3", "abc1", "abc4", "abc2")));
    }

    @Test
    void aNameStandsOnce() {
        assertEquals(List.of("flow"), Nearest.to("flw", List.of("flow", "flow")));
    }

    @Test
    void nothingInCommonIsNotNear() {
        assertEquals(List.of(), Nearest.to("H0", List.of("zp", "mu", "b")));
        assertEquals(List.of(), Nearest.to("", List.of("a", "zp")));
        assertEquals(List.of(), Nearest.to("quasar", RUNGS));
    }

    @Test
    void phrases() {
        assertEquals("nearest known: \"flow\"", Nearest.hint("folw", RUNGS));
        assertEquals(
                "known: \"explosions\", \"flow\", \"parallaxes\", \"pulsators\", \"ring galaxy\"",
                Nearest.hint("quasar", RUNGS));
        assertEquals("none are known", Nearest.hint("flow", List.of()));
        assertEquals(
                "known: \"host 1\", \"host 10\", \"host 11\", \"host 12\", \"host 13\", \"host 14\", \"host 15\","
                        + " \"host 16\" and 12 more",
                Nearest.hint("a quite different name", hosts(20)));
    }

    private static List<String> hosts(int count) {
        List<String> names = new ArrayList<>();
        for (int i = 1; i <= count; i++) {
            names.add("host " + i);
        }
        return names;
    }
}
