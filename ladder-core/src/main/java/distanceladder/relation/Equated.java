package distanceladder.relation;

import distanceladder.information.Unknowns;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.ValueFault;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * A relation given by an {@link Equation}.
 *
 * <p>Linearised about {@code (mu0, theta0)}: {@code a = dg/dmu}, {@code b = dg/dtheta}, {@code y = observed - g(mu0,
 * theta0) + a mu0 + b . theta0}. Columns measured with an error are
 * private unknowns of the datum, linearised at their own joint estimate and eliminated ({@link #withUncertain}). A known offset of the datum from its object (geometry) is added to mu before.
 */
public final class Equated implements Relation {
    private static final double[] NO_SHIFT = new double[0];

    private final Equation equation;
    private final ToDoubleFunction<Datum> start;
    private final java.util.function.Function<Datum, Optional<String>> refusal;
    private final String offsetColumn;
    private final UncertainColumns uncertain;

    private Equated(
            Equation equation,
            ToDoubleFunction<Datum> start,
            java.util.function.Function<Datum, Optional<String>> refusal,
            String offsetColumn,
            UncertainColumns uncertain) {
        this.uncertain = uncertain;
        this.equation = equation;
        this.start = start;
        this.refusal = refusal;
        this.offsetColumn = offsetColumn;
    }

    /**
     * A relation that starts at modulus 0, and by which any datum gives its object a distance.
     *
     * @param equation the equation
     * @return the relation
     */
    public static Equated of(Equation equation) {
        return new Equated(equation, datum -> 0, datum -> Optional.empty(), "", UncertainColumns.NONE);
    }

    /**
     * The same relation with a start for the moduli.
     *
     * @param modulus a first modulus from a datum alone
     * @return the relation
     */
    public Equated startingAt(ToDoubleFunction<Datum> modulus) {
        return new Equated(equation, modulus, refusal, offsetColumn, uncertain);
    }

    /**
     * The same relation with a rule for data that alone give no distance.
     *
     * @param reason why a datum alone gives its object none, empty when it does
     * @return the relation
     */
    public Equated refusing(java.util.function.Function<Datum, Optional<String>> reason) {
        return new Equated(equation, start, reason, offsetColumn, uncertain);
    }

    /**
     * The same relation with known offsets of the data from their objects.
     *
     * @param column a column of magnitudes: modulus of the datum minus modulus of its object
     * @return the relation
     */
    public Equated withOffsets(String column) {
        return new Equated(equation, start, refusal, column, uncertain);
    }

    /**
     * The same relation with columns that were measured with an error, read by {@link Terms#uncertain}.
     *
     * @param columns their names; each has its errors in a column "{@code name} error"
     * @return the relation
     */
    public Equated withUncertain(String... columns) {
        return new Equated(equation, start, refusal, offsetColumn, uncertain.with(List.of(columns)));
    }

    @Override
    public List<String> uncertain() {
        return uncertain.names();
    }

    /**
     * The same relation with a covariance between the errors of an uncertain column and of another, or of the observable.
     *
     * @param uncertainColumn an uncertain column
     * @param other another, or the observable
     * @param covarianceColumn a column of covariances, in the product of both base units
     * @return the relation
     */
    public Equated withErrorCovariance(String uncertainColumn, String other, String covarianceColumn) {
        return new Equated(
                equation,
                start,
                refusal,
                offsetColumn,
                uncertain.withCovariance(uncertainColumn, other, covarianceColumn));
    }

    @Override
    public Points start(Definition definition) {
        Unknowns unknowns = unknownsOf(definition);
        double[] parameters = new double[unknowns.size()];
        for (Input input : definition.inputs()) {
            for (int i = 0; i < input.unknowns().size(); i++) {
                int column = unknowns.column(input.unknowns().get(i));
                if (column >= 0) {
                    parameters[column] = input.mean()[i];
                }
            }
        }
        View view = new View(definition, unknowns, parameters);
        double[] moduli = new double[definition.data().size()];
        for (int i = 0; i < moduli.length; i++) {
            view.datum = i;
            moduli[i] = start.applyAsDouble(view);
        }
        double[][] covariates = new double[moduli.length][uncertain.size()];
        for (int k = 0; k < uncertain.size(); k++) {
            double[] measured = definition.data().column(uncertain.names().get(k));
            for (int i = 0; i < measured.length; i++) {
                covariates[i][k] = measured[i];
            }
        }
        return Points.of(moduli, parameters).withCovariates(covariates);
    }

    static Unknowns unknownsOf(Definition definition) {
        return Unknowns.of(definition.parameters().values());
    }

    @Override
    public Optional<String> refusal(Definition definition, int datum, Points at) {
        double[] parameters = new double[at.parameterCount()];
        for (int j = 0; j < parameters.length; j++) {
            parameters[j] = at.parameter(j);
        }
        View view = new View(definition, unknownsOf(definition), parameters);
        view.datum = datum;
        return refusal.apply(view);
    }

    @Override
    public Relation part(int... rows) {
        return this;
    }

    @Override
    public Linearised linearise(Definition definition, Points at) {
        Observations data = definition.data();
        Unknowns unknowns = unknownsOf(definition);
        int n = data.size();
        UncertainColumns.Errors errors = uncertain.errors(definition);
        double[] observed = data.column(definition.observable());
        double[] offsets = offsetColumn.isEmpty() ? new double[n] : data.column(offsetColumn);
        Row row = new Row(definition, unknowns, at, uncertain.names());
        double[] a = new double[n];
        double[][] rows = new double[n][];
        double[] extra = new double[n];
        double[][] shifts = new double[n][];
        boolean curved = uncertain.size() > 0;
        for (int i = 0; i < n; i++) {
            boolean bears = !data.objects().get(i).isEmpty();
            Dual g = equation.predict(row.begin(i, bears, offsets[i]), row);
            a[i] = bears ? g.partial(0) : 0;
            rows[i] = row(g, at, unknowns.size(), observed[i] - g.value() + a[i] * at.modulus(i));
            if (uncertain.size() == 0) {
                shifts[i] = NO_SHIFT;
            } else {
                double[] slopes = slopes(g, unknowns.size());
                rows[i][unknowns.size()] -= errors.shift(i, slopes, at);
                extra[i] = errors.extra(i, slopes);
                shifts[i] = errors.covarianceWithRow(i, slopes);
            }
            requireFinite(definition, i, rows[i][unknowns.size()]);
            curved |= g.curved();
        }
        return new Linearised(unknowns, a, rows, List.of(), curved, extra, shifts);
    }

    private static double[] row(Dual g, Points at, int p, double right) {
        double[] row = new double[p + 1];
        double sum = right;
        for (int j = 0; j < p; j++) {
            double slope = g.partial(j + 1);
            row[j] = slope;
            sum += slope * at.parameter(j);
        }
        row[p] = sum;
        return row;
    }

    private double[] slopes(Dual g, int p) {
        double[] slopes = new double[uncertain.size()];
        for (int k = 0; k < slopes.length; k++) {
            slopes[k] = g.partial(1 + p + k);
        }
        return slopes;
    }

    private static void requireFinite(Definition definition, int datum, double right) {
        if (!Double.isFinite(right)) {
            throw new ValueFault(
                    "prediction for datum \"" + definition.data().names().get(datum) + "\" is not a finite number",
                    "a relation predicts a finite observable",
                    "rung \"" + definition.name() + "\"",
                    "check the datum's columns, and where the parameters start");
        }
    }

    private static NameFault unknownRole(Definition definition, String role) {
        return new NameFault(
                "parameter \"" + role + "\"",
                "a relation reads parameters that its rung names",
                "rung \"" + definition.name() + "\"",
                Nearest.hint(role, definition.parameters().keySet()));
    }

    /** The terms of one row; remembers the order in which an equation asks, so that looking up costs no hashing. */
    private static final class Row implements Terms {
        private final Definition definition;
        private final Unknowns unknowns;
        private final Points at;
        private final Tape tape;
        private final List<String> uncertain;
        private final Recall<Dual> parameters = new Recall<>(this::variable);
        private final Recall<double[]> columns;
        private int datum;

        Row(Definition definition, Unknowns unknowns, Points at, List<String> uncertain) {
            this.uncertain = uncertain;
            this.definition = definition;
            this.columns = new Recall<>(definition.data()::column);
            this.unknowns = unknowns;
            this.at = at;
            this.tape = new Tape(1 + unknowns.size() + uncertain.size());
        }

        Dual begin(int index, boolean bears, double offset) {
            datum = index;
            tape.rewind();
            parameters.rewind();
            columns.rewind();
            Dual modulus = bears ? tape.variable(0, at.modulus(index)) : tape.constant(0);
            return offset == 0 ? modulus : modulus.add(offset);
        }

        @Override
        public Dual parameter(String role) {
            return parameters.get(role);
        }

        /** Parameters have the same value for all data: one number for each serves all rows. */
        private Dual variable(String role) {
            String unknown = definition.parameters().get(role);
            if (unknown == null) {
                throw unknownRole(definition, role);
            }
            int index = unknowns.column(unknown);
            return tape.lasting(index + 1, at.parameter(index));
        }

        @Override
        public Dual uncertain(String column) {
            int k = uncertain.indexOf(column);
            if (k < 0) {
                throw new NameFault(
                        "uncertain column \"" + column + "\"",
                        "a relation says beforehand which columns it reads as uncertain",
                        "rung \"" + definition.name() + "\"",
                        "name it in withUncertain; " + Nearest.hint(column, uncertain));
            }
            return tape.variable(1 + unknowns.size() + k, at.covariate(datum, k));
        }

        @Override
        public double column(String column) {
            return columns.get(column)[datum];
        }
    }

    /** One datum with present values. */
    private static final class View implements Datum {
        private final Definition definition;
        private final Unknowns unknowns;
        private final double[] parameters;
        private int datum;

        View(Definition definition, Unknowns unknowns, double[] parameters) {
            this.definition = definition;
            this.unknowns = unknowns;
            this.parameters = parameters;
        }

        @Override
        public String name() {
            return definition.data().names().get(datum);
        }

        @Override
        public double observed() {
            return definition.data().column(definition.observable())[datum];
        }

        @Override
        public double sigma() {
            return Math.sqrt(definition.noise().covariance().entry(datum, datum));
        }

        @Override
        public double column(String column) {
            return definition.data().column(column)[datum];
        }

        @Override
        public double parameter(String role) {
            String unknown = definition.parameters().get(role);
            if (unknown == null) {
                throw unknownRole(definition, role);
            }
            return parameters[unknowns.column(unknown)];
        }
    }
}
