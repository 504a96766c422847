package distanceladder.document;

import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.rung.Anchor;
import distanceladder.rung.Parallaxes;
import distanceladder.rung.PeriodLuminosity;
import distanceladder.rung.SecondaryIndicator;
import distanceladder.rung.VelocityDistance;
import distanceladder.table.Table;
import distanceladder.table.TableReading;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.ValueFault;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Reads one rung of a document. */
final class RungReader {
    private static final List<String> KINDS =
            List.of("parallaxes", "period-luminosity", "secondary indicator", "velocity-distance", "anchor");

    private final Path folder;
    private final Fields fields;
    private final Map<String, Source> sources;
    private final String name;

    RungReader(Path folder, Node node, Map<String, Source> sources) {
        this.folder = folder;
        this.fields = new Fields("a rung", node);
        this.sources = sources;
        this.name = fields.text("name");
    }

    String name() {
        return name;
    }

    String where() {
        return fields.where();
    }

    /** Names of the rungs beneath, with the place where each is named. */
    Map<String, String> restsOn() {
        Map<String, String> out = new LinkedHashMap<>();
        fields.find("rests on")
                .ifPresent(node -> node.list("\"rests on\"").forEach(n -> out.put(n.text("\"rests on\""), n.where())));
        return out;
    }

    /** Builds the rung; what its kind refuses is told with the rung's place in the document. */
    Rung<?> build(List<Rung<?>> beneath) {
        try {
            return built(beneath);
        } catch (ValueFault f) {
            throw new ValueFault(f.what(), f.rule(), placed(f.where()), f.repair());
        } catch (NameFault f) {
            throw new NameFault(f.what(), f.rule(), placed(f.where()), f.repair());
        }
    }

    private String placed(String where) {
        return where.contains(", line ") ? where : where + " (rung \"" + name + "\", " + fields.where() + ")";
    }

    private Rung<?> built(List<Rung<?>> beneath) {
        String kind = fields.text("kind");
        Rung<?>[] under = beneath.toArray(new Rung<?>[0]);
        Rung<?> rung =
                switch (kind) {
                    case "parallaxes" -> finished(parallaxes().calibratedBy(under));
                    case "period-luminosity" -> finished(pulsators().calibratedBy(under));
                    case "secondary indicator" -> finished(indicator().calibratedBy(under));
                    case "velocity-distance" -> finished(flow().calibratedBy(under));
                    case "anchor" -> anchor();
                    default ->
                        throw new NameFault(
                                "kind \"" + kind + "\"",
                                "a rung is of a kind that the document knows",
                                fields.whereOf("kind"),
                                Nearest.hint(kind, KINDS));
                };
        fields.done();
        return rung;
    }

    private <R extends Rung<R>> R finished(R rung) {
        R out = rung;
        Optional<Node> scatter = fields.find("scatter");
        if (scatter.isPresent()) {
            if (scatter.get().isText()) {
                String word = scatter.get().text("\"scatter\"");
                if (!word.equals("estimated")) {
                    throw new NameFault(
                            "scatter \"" + word + "\"",
                            "a scatter is [number, unit] or \"estimated\"",
                            scatter.get().where(),
                            "write \"estimated\" or [0.08, \"mag\"]");
                }
                out = out.withEstimatedScatter();
            } else {
                out = out.withScatter(fields.amount("scatter").orElseThrow());
            }
        }
        List<String> calibrators = fields.texts("calibrators");
        return calibrators.isEmpty() ? out : out.withCalibrators(calibrators.toArray(new String[0]));
    }

    private Parallaxes parallaxes() {
        Parallaxes rung = Parallaxes.of(name, observations());
        Optional<Source> offset = source("offset");
        return offset.isPresent() ? rung.withOffset(offset.get()) : rung;
    }

    private PeriodLuminosity pulsators() {
        PeriodLuminosity rung = PeriodLuminosity.of(name, observations());
        Optional<Double> pivot = fields.numberIfAny("pivot");
        rung = pivot.isPresent() ? rung.withPivot(pivot.get()) : rung;
        Optional<Source> zeroPoint = source("zero point");
        rung = zeroPoint.isPresent() ? rung.withZeroPoint(zeroPoint.get()) : rung;
        Optional<Source> slope = source("slope");
        rung = slope.isPresent() ? rung.withSlope(slope.get()) : rung;
        Optional<Source> metals = source("metallicity");
        rung = metals.isPresent() ? rung.withMetallicity(metals.get()) : rung;
        for (String offset : fields.texts("common offsets")) {
            rung = rung.withCommonOffset(source(offset, fields.whereOf("common offsets")));
        }
        return rung;
    }

    private SecondaryIndicator indicator() {
        SecondaryIndicator rung = SecondaryIndicator.of(name, observations());
        Optional<Source> zeroPoint = source("zero point");
        rung = zeroPoint.isPresent() ? rung.withZeroPoint(zeroPoint.get()) : rung;
        for (String column : fields.texts("covariates")) {
            rung = rung.withCovariate(column);
        }
        for (String column : fields.texts("uncertain covariates")) {
            rung = rung.withUncertainCovariate(column);
        }
        for (String offset : fields.texts("common offsets")) {
            rung = rung.withCommonOffset(source(offset, fields.whereOf("common offsets")));
        }
        return rung;
    }

    private VelocityDistance flow() {
        VelocityDistance rung = VelocityDistance.of(name, observations());
        Optional<Double> q0 = fields.numberIfAny("q0");
        Optional<Double> j0 = fields.numberIfAny("j0");
        if (q0.isPresent() != j0.isPresent()) {
            throw new NameFault("only one of q0 and j0", "both are given, or none", fields.where(), "add the other");
        }
        rung = q0.isPresent() ? rung.withExpansion(q0.get(), j0.orElseThrow()) : rung;
        boolean expansion =
                fields.find("expansion").map(n -> n.truth("\"expansion\"")).orElse(true);
        rung = expansion ? rung : rung.withoutExpansionTerms();
        Optional<Amount> peculiar = fields.amount("peculiar velocity");
        rung = peculiar.isPresent() ? rung.withPeculiarVelocity(peculiar.get()) : rung;
        String form = fields.find("form").map(n -> n.text("\"form\"")).orElse("velocity");
        return switch (form) {
            case "velocity" -> rung;
            case "magnitudes" -> rung.inMagnitudes();
            default ->
                throw new NameFault(
                        "form \"" + form + "\"",
                        "the form is velocity or magnitudes",
                        fields.whereOf("form"),
                        Nearest.hint(form, List.of("velocity", "magnitudes")));
        };
    }

    private Anchor anchor() {
        Unit unit = fields.unit("unit");
        Amount given = new Amount(fields.number("value"), fields.number("sigma"), unit);
        Anchor anchor = Anchor.named(name, fields.text("object"), given);
        Optional<Node> systematic = fields.find("systematic");
        if (systematic.isEmpty()) {
            return anchor;
        }
        return systematic.get().isText()
                ? anchor.withSystematic(source("systematic").orElseThrow())
                : anchor.withSystematic(Amount.of(fields.number("systematic"), unit));
    }

    private Optional<Source> source(String field) {
        return fields.find(field).map(n -> source(n.text("\"" + field + "\""), n.where()));
    }

    private Source source(String wanted, String where) {
        Source found = sources.get(wanted);
        if (found == null) {
            throw new NameFault(
                    "source \"" + wanted + "\"",
                    "a source that is named is described",
                    where,
                    Nearest.hint(wanted, sources.keySet()));
        }
        return found;
    }

    private Observations observations() {
        Table table = Table.read(inside(fields.text("table"), fields.whereOf("table")));
        TableReading reading = table.observations(column(table, fields.text("datum"), fields.whereOf("datum")));
        Optional<Node> object = fields.find("object");
        if (object.isPresent()) {
            reading = reading.object(
                    column(table, object.get().text("\"object\""), object.get().where()));
        }
        for (Map.Entry<String, Node> entry :
                fields.need("columns").object("\"columns\"").entrySet()) {
            List<Node> pair = entry.getValue().list("column \"" + entry.getKey() + "\"");
            if (pair.size() != 2) {
                throw new ValueFault(
                        "column \"" + entry.getKey() + "\" has " + pair.size() + " parts",
                        "it is the table's column and a unit",
                        entry.getValue().where(),
                        "write [\"plx\", \"mas\"]; the unit of a plain number is \"1\"");
            }
            Unit unit = Fields.unit(pair.get(1).text("unit"), pair.get(1).where());
            String from = column(table, pair.get(0).text("column"), pair.get(0).where());
            reading = entry.getKey().endsWith(" error")
                    ? reading.error(entry.getKey(), unit, from)
                    : reading.number(entry.getKey(), unit, from);
        }
        return reading.build();
    }

    private static String column(Table table, String column, String where) {
        if (!table.columns().contains(column)) {
            throw new NameFault(
                    "column \"" + column + "\"",
                    "a column that is named is in " + table.label(),
                    where,
                    Nearest.hint(column, table.columns()));
        }
        return column;
    }

    /** A file inside the folder, also after links are followed. */
    private Path inside(String file, String where) {
        Path path = folder.resolve(file).normalize();
        try {
            Path home = folder.toRealPath();
            if (path.startsWith(folder.normalize()) && !Path.of(file).isAbsolute()) {
                if (!Files.exists(path)) {
                    throw new NameFault(
                            "table \"" + file + "\"",
                            "a table that is named is in the folder",
                            where,
                            "check its name");
                }
                if (path.toRealPath().startsWith(home)) {
                    return path;
                }
            }
        } catch (IOException failed) {
            throw new ValueFault(
                    "table \"" + file + "\": " + failed.getMessage(), "a table can be read", where, "check the file");
        }
        throw new ValueFault(
                "table \"" + file + "\"",
                "tables are inside the ladder's folder",
                where,
                "move the table into the folder");
    }
}
