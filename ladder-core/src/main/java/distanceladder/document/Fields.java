package distanceladder.document;

import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** The fields of one object of a document; what was not asked for is refused at the end. */
final class Fields {
    private final String what;
    private final String where;
    private final Map<String, Node> fields;
    private final Set<String> asked = new LinkedHashSet<>();

    Fields(String what, Node node) {
        this.what = what;
        this.where = node.where();
        this.fields = node.object(what);
    }

    String where() {
        return where;
    }

    String whereOf(String name) {
        Node node = fields.get(name);
        return node == null ? where : node.where();
    }

    Optional<Node> find(String name) {
        asked.add(name);
        return Optional.ofNullable(fields.get(name));
    }

    Node need(String name) {
        return find(name)
                .orElseThrow(() -> new NameFault(
                        what + " has no field \"" + name + "\"",
                        "the field is needed",
                        where,
                        "add \"" + name + "\"" + (fields.isEmpty() ? "" : "; " + Nearest.hint(name, fields.keySet()))));
    }

    String text(String name) {
        return need(name).text(label(name));
    }

    double number(String name) {
        return need(name).number(label(name));
    }

    Optional<Double> numberIfAny(String name) {
        return find(name).map(n -> n.number(label(name)));
    }

    Unit unit(String name) {
        Node node = need(name);
        return unit(node.text(label(name)), node.where());
    }

    static Unit unit(String symbol, String where) {
        try {
            return Unit.of(symbol);
        } catch (NameFault unknown) {
            throw new NameFault(unknown.what(), unknown.rule(), where, unknown.repair());
        }
    }

    List<String> texts(String name) {
        List<String> out = new ArrayList<>();
        find(name).ifPresent(node -> node.list(label(name)).forEach(n -> out.add(n.text(label(name)))));
        return out;
    }

    /** A pair of a number and a unit. */
    Optional<Amount> amount(String name) {
        return find(name).map(node -> {
            List<Node> pair = node.list(label(name));
            if (pair.size() != 2) {
                throw new ValueFault(
                        label(name) + " has " + pair.size() + " parts",
                        "it is a number and a unit",
                        node.where(),
                        "write [0.08, \"mag\"]");
            }
            Unit unit = unit(pair.get(1).text(label(name)), pair.get(1).where());
            return Amount.of(pair.get(0).number(label(name)), unit);
        });
    }

    private String label(String name) {
        return "\"" + name + "\" of " + what;
    }

    /** Refuses fields that nobody asked for. */
    void done() {
        for (Map.Entry<String, Node> entry : fields.entrySet()) {
            if (!asked.contains(entry.getKey())) {
                throw new NameFault(
                        "field \"" + entry.getKey() + "\" of " + what,
                        "a field is one that this object has",
                        entry.getValue().where(),
                        Nearest.hint(entry.getKey(), asked));
            }
        }
    }
}
