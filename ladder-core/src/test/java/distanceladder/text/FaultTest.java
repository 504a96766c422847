package distanceladder.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.ObjectInputStream;
import java.io.ObjectOutputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class FaultTest {
    static Stream<Fault> kinds() {
        return Stream.of(
                new ValueFault("what", "rule", "where", "repair"),
                new NameFault("what", "rule", "where", "repair"),
                new GraphFault("what", "rule", "where", "repair"),
                new RankFault("what", "rule", "where", "repair", List.of("M", "offset")),
                new ConvergenceFault("what", "rule", "where", "repair"));
    }

    @ParameterizedTest
    @MethodSource("kinds")
    void fourParts(Fault fault) {
        assertEquals("what", fault.what());
        assertEquals("rule", fault.rule());
        assertEquals("where", fault.where());
        assertEquals("repair", fault.repair());
        assertEquals("what\n  rule:   rule\n  where:  where\n  repair: repair", fault.getMessage());
    }

    @Test
    void noPlaceNoLine() {
        assertEquals("w\n  rule:   r\n  repair: m", new ValueFault("w", "r", "", "m").getMessage());
    }

    /** A fault that was thrown on another machine arrives whole, with the parameters of a rank fault. */
    @ParameterizedTest
    @MethodSource("kinds")
    void travels(Fault fault) throws IOException, ClassNotFoundException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ObjectOutputStream out = new ObjectOutputStream(bytes)) {
            out.writeObject(fault);
        }
        try (ObjectInputStream in = new ObjectInputStream(new ByteArrayInputStream(bytes.toByteArray()))) {
            Fault arrived = assertInstanceOf(fault.getClass(), in.readObject());
            assertEquals(fault.getMessage(), arrived.getMessage());
            assertEquals("repair", arrived.repair());
            if (arrived instanceof RankFault rank) {
                assertEquals(List.of("M", "offset"), rank.parameters());
            }
        }
    }

    @Test
    void parametersAreCopied() {
        List<String> names = new ArrayList<>(List.of("M", "offset"));
        RankFault fault = new RankFault("w", "r", "", "m", names);
        names.clear();
        assertEquals(List.of("M", "offset"), fault.parameters());
        assertThrows(
                UnsupportedOperationException.class, () -> fault.parameters().add("b"));
    }
}
