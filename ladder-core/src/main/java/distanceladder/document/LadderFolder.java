package distanceladder.document;

import distanceladder.astro.Unit;
import distanceladder.ladder.Ladder;
import distanceladder.relation.Amount;
import distanceladder.relation.Kind;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.text.Fault;
import distanceladder.text.GraphFault;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.Shown;
import distanceladder.text.ValueFault;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * A folder with a ladder: {@code ladder.json} and the CSV tables that it names.
 *
 * <p>The document is one object, {@code "version": 1}, with two parts.
 *
 * <p>{@code "sources"}: an object; each source by its name is <br>
 * {@code {"value": -0.017, "sigma": 0.005, "unit": "mas"}} (normal; systematic unless {@code "kind": "statistical"}), <br>
 * {@code {"value": 1.0, "unit": "1"}} (exact), or <br>
 * {@code {"free": true, "unit": "mag"}} (fixed by the data alone; {@code "start"} where iteration starts).
 *
 * <p>{@code "rungs"}: a list in any order. Each has {@code "name"}, {@code "kind"} and {@code "rests on"} (names of rungs,
 * none when left out). All but anchors have {@code "table"} (a file in the folder), {@code "datum"} (the column of the data's
 * names), {@code "object"} (the column of objects, when it is another), and {@code "columns"}: for each column that the kind
 * reads, its name in the table and its unit, as {@code "parallax": ["plx", "mas"]}; {@code "scatter"}: {@code [0.08, "mag"]} or
 * {@code "estimated"}; {@code "calibrators"}: objects that must have a distance from beneath. By kind:
 *
 * <ul>
 *   <li>{@code "parallaxes"}: {@code "offset"} (a source);
 *   <li>{@code "period-luminosity"}: {@code "pivot"}, {@code "zero point"}, {@code "slope"}, {@code "metallicity"} (sources),
 *       {@code "common offsets"} (list of sources);
 *   <li>{@code "secondary indicator"}: {@code "zero point"}, {@code "covariates"} and {@code "uncertain covariates"} (lists of
 *       columns), {@code "common offsets"};
 *   <li>{@code "velocity-distance"}: {@code "form"} ({@code "velocity"} or {@code "magnitudes"}), {@code "peculiar velocity"}
 *       ({@code [250, "km/s"]}), {@code "q0"} and {@code "j0"} together, or {@code "expansion": false} for f = 1;
 *   <li>{@code "anchor"}: {@code "object"}, {@code "value"}, {@code "sigma"}, {@code "unit"}, {@code "systematic"} (a number in
 *       the same unit, or the name of a source).
 * </ul>
 */
public final class LadderFolder implements Shown {
    /** The file that describes a ladder. */
    public static final String FILE = "ladder.json";

    private final Map<String, Rung<?>> rungs;
    private final Ladder ladder;

    private LadderFolder(Map<String, Rung<?>> rungs, Ladder ladder) {
        this.rungs = rungs;
        this.ladder = ladder;
    }

    /**
     * Reads a folder.
     *
     * @param folder the folder that holds {@code ladder.json}
     * @return its ladder
     * @throws Fault when something does not fit, with file, line and column
     */
    public static LadderFolder read(Path folder) {
        Path file = folder.resolve(FILE);
        if (!Files.isRegularFile(file)) {
            throw new NameFault(
                    "file \"" + file + "\"", "a ladder's folder has a document " + FILE, "", "check the folder's path");
        }
        String text;
        try {
            text = Files.readString(file, StandardCharsets.UTF_8);
        } catch (IOException failed) {
            throw new ValueFault(
                    "file \"" + file + "\" cannot be read: " + failed.getMessage(),
                    "the document is a readable text in UTF-8",
                    FILE,
                    "check the file and its encoding");
        }
        Fields root = new Fields("the ladder", StrictJson.parse(FILE, text));
        double version = root.number("version");
        if (version != 1) {
            throw new ValueFault(
                    "version = " + version, "this library reads version 1", root.whereOf("version"), "write 1");
        }
        Map<String, Source> sources = sources(root);
        Map<String, RungReader> readers = new LinkedHashMap<>();
        for (Node node : root.need("rungs").list("\"rungs\"")) {
            RungReader reader = new RungReader(folder, node, sources);
            if (readers.put(reader.name(), reader) != null) {
                throw new NameFault(
                        "two rungs are called \"" + reader.name() + "\"",
                        "a name means one thing within a ladder",
                        node.where(),
                        "rename one");
            }
        }
        root.done();
        if (readers.isEmpty()) {
            throw new GraphFault("0 rungs", "a ladder has a rung", root.whereOf("rungs"), "describe one");
        }
        Map<String, Rung<?>> built = new LinkedHashMap<>();
        for (String name : readers.keySet()) {
            build(name, readers, built, new LinkedHashSet<>());
        }
        return new LadderFolder(built, Ladder.of(built.values().toArray(new Rung<?>[0])));
    }

    private static Rung<?> build(
            String name, Map<String, RungReader> readers, Map<String, Rung<?>> built, Set<String> path) {
        Rung<?> done = built.get(name);
        if (done != null) {
            return done;
        }
        RungReader reader = readers.get(name);
        if (reader == null) {
            throw new IllegalArgumentException(name);
        }
        if (!path.add(name)) {
            throw new GraphFault(
                    "cycle: " + String.join(" -> ", path) + " -> " + name,
                    "no rung rests on itself, directly or through others",
                    reader.where(),
                    "take one of these references away");
        }
        List<Rung<?>> beneath = new ArrayList<>();
        for (Map.Entry<String, String> reference : reader.restsOn().entrySet()) {
            if (!readers.containsKey(reference.getKey())) {
                throw new NameFault(
                        "rung \"" + reference.getKey() + "\"",
                        "all that a rung rests on is described",
                        reference.getValue(),
                        Nearest.hint(reference.getKey(), readers.keySet()));
            }
            beneath.add(build(reference.getKey(), readers, built, path));
        }
        path.remove(name);
        Rung<?> rung = reader.build(beneath);
        built.put(name, rung);
        return rung;
    }

    private static Map<String, Source> sources(Fields root) {
        Map<String, Source> out = new LinkedHashMap<>();
        root.find("sources")
                .ifPresent(node -> node.object("\"sources\"").forEach((name, n) -> {
                    Fields f = new Fields("source \"" + name + "\"", n);
                    Unit unit = f.unit("unit");
                    boolean free = f.find("free").map(x -> x.truth("\"free\"")).orElse(false);
                    Source source;
                    if (free) {
                        source = Source.free(name, unit)
                                .starting(f.numberIfAny("start").orElse(0.0));
                    } else {
                        source = known(name, f, unit);
                    }
                    f.done();
                    out.put(name, source);
                }));
        return out;
    }

    private static Source known(String name, Fields f, Unit unit) {
        double sigma = f.numberIfAny("sigma").orElse(0.0);
        if (sigma < 0) {
            throw new ValueFault(
                    "sigma = " + sigma + " " + unit.symbol(),
                    "a standard deviation is not negative",
                    f.whereOf("sigma"),
                    "give 0 or more");
        }
        Source source = Source.normal(name, new Amount(f.number("value"), sigma, unit));
        String kind = f.find("kind").map(n -> n.text("\"kind\"")).orElse("systematic");
        if (!kind.equals("systematic") && !kind.equals("statistical")) {
            throw new NameFault(
                    "kind \"" + kind + "\"",
                    "a source is systematic or statistical",
                    f.whereOf("kind"),
                    Nearest.hint(kind, List.of("systematic", "statistical")));
        }
        return kind.equals("statistical") ? source.statistical() : checked(source);
    }

    private static Source checked(Source source) {
        return source.kind() == Kind.SYSTEMATIC ? source : source.systematic();
    }

    /**
     * The ladder.
     *
     * @return all rungs of the document
     */
    public Ladder ladder() {
        return ladder;
    }

    /**
     * The rungs in the order of the document.
     *
     * @return an unmodifiable list
     */
    public List<Rung<?>> rungs() {
        return List.copyOf(rungs.values());
    }

    @Override
    public String text() {
        return ladder.text();
    }

    @Override
    public String toString() {
        return text();
    }
}
