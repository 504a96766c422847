package distanceladder.document;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import distanceladder.text.ValueFault;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** JSON (RFC 8259) read into nodes that know their place; repeated keys, depths and sizes beyond reason are refused. */
final class StrictJson {
    private static final int DEEPEST = 64;
    private static final int LONGEST = 10_000_000;
    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(DEEPEST)
                    .maxNumberLength(100)
                    .build())
            .build();

    private final String label;
    private final JsonParser parser;

    private StrictJson(String label, JsonParser parser) {
        this.label = label;
        this.parser = parser;
    }

    static Node parse(String label, String text) {
        if (text.length() > LONGEST) {
            throw new ValueFault(
                    text.length() + " characters", "a document has at most " + LONGEST, label, "keep data in tables");
        }
        try (JsonParser parser = FACTORY.createParser(text)) {
            StrictJson reader = new StrictJson(label, parser);
            parser.nextToken();
            Node root = reader.value();
            if (parser.nextToken() != null) {
                throw new ValueFault(
                        "more text after the end", "a document is one object", reader.where(), "take it away");
            }
            return root;
        } catch (JsonProcessingException broken) {
            var at = broken.getLocation();
            String where = at == null ? label : place(label, at.getLineNr(), at.getColumnNr());
            throw new ValueFault(
                    broken.getOriginalMessage(), "the document is JSON, each key once", where, "mend the text there");
        } catch (IOException impossible) {
            throw new ValueFault(impossible.toString(), "the document can be read", label, "try again");
        }
    }

    private static String place(String label, int line, int column) {
        return label + ", line " + line + ", column " + column;
    }

    private String where() {
        var at = parser.currentTokenLocation();
        return place(label, at.getLineNr(), at.getColumnNr());
    }

    private Node value() throws IOException {
        JsonToken token = parser.currentToken();
        String where = where();
        if (token == null) {
            throw new ValueFault("nothing", "a document is one object", label, "write the ladder");
        }
        return switch (token) {
            case START_OBJECT -> new Node(object(), where);
            case START_ARRAY -> new Node(array(), where);
            case VALUE_STRING -> new Node(parser.getText(), where);
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new Node(parser.getDoubleValue(), where);
            case VALUE_TRUE -> new Node(true, where);
            case VALUE_FALSE -> new Node(false, where);
            default ->
                throw new ValueFault(
                        "null", "a field that is named has a value", where, "give a value or leave the field out");
        };
    }

    private Map<String, Node> object() throws IOException {
        Map<String, Node> out = new LinkedHashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String key = parser.currentName();
            parser.nextToken();
            out.put(key, value());
        }
        return out;
    }

    private List<Node> array() throws IOException {
        List<Node> out = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            out.add(value());
        }
        return out;
    }
}
