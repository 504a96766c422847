package distanceladder.relation;

import distanceladder.covariance.Covariance;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Errors that data of several rungs have in common, as one dense block over them: a covariance of magnitudes of a survey
 * that feeds two rungs.
 *
 * <p>Each rung that takes part is handed the same object by {@link Rung#withJointNoise}; the block is added to the rung's
 * own noise. In a set with only some of the rungs, its part for them is used.
 */
public final class JointNoise {
    private final String name;
    private final List<Entry> entries;
    private final Map<Entry, Integer> index;
    private final Covariance covariance;

    private record Entry(String rung, String datum) {}

    private JointNoise(String name, List<Entry> entries, Covariance covariance) {
        this.name = name;
        this.entries = List.copyOf(entries);
        this.covariance = covariance;
        this.index = new HashMap<>();
        for (Entry entry : entries) {
            if (index.put(entry, index.size()) != null) {
                throw new NameFault(
                        "datum \"" + entry.datum + "\" of rung \"" + entry.rung + "\" stands twice",
                        "a datum stands once in a joint noise",
                        name,
                        "leave one out");
            }
        }
        if (covariance.size() != entries.size()) {
            throw new ValueFault(
                    "covariance of " + covariance.size() + " rows",
                    "there is one row for each of the " + entries.size() + " data named",
                    name,
                    "give " + entries.size());
        }
    }

    /**
     * Begins a joint noise.
     *
     * @param name its name
     * @return a builder without data
     */
    public static Builder named(String name) {
        return new Builder(name);
    }

    /** Collects the data of a joint noise, in the order of its covariance. */
    public static final class Builder {
        private final String name;
        private final List<Entry> entries = new ArrayList<>();

        Builder(String name) {
            this.name = name;
        }

        /**
         * Adds data of a rung.
         *
         * @param rung name of the rung
         * @param data names of data in it
         * @return this builder
         */
        public Builder on(String rung, List<String> data) {
            data.forEach(datum -> entries.add(new Entry(rung, datum)));
            return this;
        }

        /**
         * Finishes it.
         *
         * @param covariance one row for each datum named, in that order, in base units squared
         * @return the joint noise
         */
        public JointNoise with(Covariance covariance) {
            return new JointNoise(name, entries, covariance);
        }
    }

    /**
     * Its name.
     *
     * @return the name
     */
    public String name() {
        return name;
    }

    /**
     * How many data it has.
     *
     * @return rows of the covariance
     */
    public int size() {
        return entries.size();
    }

    /**
     * Where a datum stands.
     *
     * @param rung name of its rung
     * @param datum its name
     * @return its row, or -1 when it has no part
     */
    public int row(String rung, String datum) {
        return index.getOrDefault(new Entry(rung, datum), -1);
    }

    /**
     * The covariance.
     *
     * @return of all its data
     */
    public Covariance covariance() {
        return covariance;
    }
}
