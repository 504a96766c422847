package distanceladder.document;

import distanceladder.text.ValueFault;
import java.util.List;
import java.util.Map;

/** A value of a document with the place where it stands. */
final class Node {
    private final Object value;
    private final String where;

    /**
     * A value.
     *
     * @param value a Map of String to Node, a List of Node, a String, a Double, or a Boolean
     * @param where file, line and column
     */
    Node(Object value, String where) {
        this.value = value;
        this.where = where;
    }

    String where() {
        return where;
    }

    boolean isText() {
        return value instanceof String;
    }

    String text(String what) {
        if (value instanceof String text && !text.isBlank()) {
            return text;
        }
        throw wrong(what, "a text that is not empty");
    }

    double number(String what) {
        if (value instanceof Double x) {
            if (Math.abs(x) <= 1e300) {
                return x;
            }
            throw new ValueFault(what + " = " + x, "a number is at most 1e300", where, "check the number and its unit");
        }
        throw wrong(what, "a number");
    }

    boolean truth(String what) {
        if (value instanceof Boolean b) {
            return b;
        }
        throw wrong(what, "true or false");
    }

    @SuppressWarnings("unchecked")
    List<Node> list(String what) {
        if (value instanceof List<?> list) {
            return (List<Node>) list;
        }
        throw wrong(what, "a list in square brackets");
    }

    @SuppressWarnings("unchecked")
    Map<String, Node> object(String what) {
        if (value instanceof Map<?, ?> map) {
            return (Map<String, Node>) map;
        }
        throw wrong(what, "an object in braces");
    }

    private ValueFault wrong(String what, String wanted) {
        String shown = value instanceof Map ? "an object" : value instanceof List ? "a list" : "\"" + value + "\"";
        return new ValueFault(what + " is " + shown, "it is " + wanted, where, "write " + wanted);
    }
}
