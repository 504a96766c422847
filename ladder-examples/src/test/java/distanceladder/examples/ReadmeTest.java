package distanceladder.examples;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.document.LadderFolder;
import distanceladder.text.Fault;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** The README's code is compiled code, and the output that it shows is what that code prints. */
class ReadmeTest {
    private static final Path README = Path.of("..", "README.md");
    private static final Path SOURCE = Path.of("src/test/java/distanceladder/examples/FirstLadder.java");

    private static String read(Path path) throws IOException {
        return Files.readString(path, StandardCharsets.UTF_8);
    }

    /** The first fenced block after a heading. */
    private static String block(String heading, String fence) throws IOException {
        String text = read(README);
        int from = text.indexOf(fence, text.indexOf("\n## " + heading)) + fence.length();
        return text.substring(from, text.indexOf("```", from)).strip();
    }

    private static String region(String name) throws IOException {
        String text = read(SOURCE);
        String begin = "// begin " + name;
        String code = text.substring(text.indexOf(begin) + begin.length(), text.indexOf("// end " + name));
        return code.stripIndent().strip().replace("shown.add(", "show(");
    }

    private static String printed(List<Object> shown) {
        return shown.stream().map(Object::toString).collect(Collectors.joining("\n\n"));
    }

    @Test
    void firstLadder() throws IOException {
        assertEquals(region("first ladder"), block("A first ladder", "```java\n"));
        assertEquals(printed(FirstLadder.show()), block("A first ladder", "```text\n"));
    }

    @Test
    void ownRelation() throws IOException {
        assertEquals(region("own relation"), block("A relation of your own", "```java\n"));
        assertEquals(printed(FirstLadder.showOwn()), block("A relation of your own", "```text\n"));
    }

    @Test
    void folderOfTables() throws IOException {
        Path folder = Path.of("folders/first-ladder");
        assertEquals(read(folder.resolve("ladder.json")).strip(), block("Your own tables", "```json\n"));
        assertTrue(LadderFolder.read(folder).ladder().solve().text().contains("Hubble constant"));
        Fault fault = assertThrows(Fault.class, () -> {
            Path copy = Files.createTempDirectory("ladder");
            for (String table : List.of("stars.csv", "hosts.csv", "events.csv", "flow.csv")) {
                Files.copy(folder.resolve(table), copy.resolve(table));
            }
            String text = read(folder.resolve("ladder.json"));
            Files.writeString(copy.resolve("ladder.json"), text.replace("[\"plx\"", "[\"plxx\""));
            LadderFolder.read(copy);
        });
        assertEquals(fault.getMessage(), block("Your own tables", "```text\n"));
    }
}
