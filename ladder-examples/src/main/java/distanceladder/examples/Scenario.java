package distanceladder.examples;

import distanceladder.astro.Cosmography;
import distanceladder.astro.Distances;
import distanceladder.chance.Draws;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * Makes the tables of the invented Skerry Point observatory from a known truth and a seed.
 *
 * <p>Every number depends on (seed, name, index) alone, so the tables are the same on every machine. Nothing in them is
 * taken from the sky: stars, galaxies and measurements are made up.
 */
public final class Scenario {
    /** The seed of the committed tables. */
    public static final long SEED = 13;

    static final double HUBBLE = 71.8;
    static final double ZERO_POINT = -5.92;
    static final double SLOPE = -3.31;
    static final double METALLICITY = -0.21;
    static final double SCATTER = 0.08;
    static final double PARALLAX_OFFSET = -0.021;
    static final double CAMERA = 0.013;
    static final double EXPLOSION = -19.24;
    static final double SHAPE = -0.14;
    static final double COLOUR = 3.05;
    static final double EXPLOSION_SCATTER = 0.10;
    static final double ROTATOR = -21.35;
    static final double WIDTH = -8.8;
    static final double ROTATOR_SCATTER = 0.30;
    static final double PECULIAR = 250;
    static final double DECELERATION = -0.55;
    static final double JERK = 1;

    private static final List<String> HOSTS =
            List.of("Ashmere", "Brindle", "Calder", "Dunlin", "Eskdale", "Fenwick", "Garrow", "Hollin");
    private static final List<String> ANCHORS = List.of("Anvil", "Beacon");

    private final long seed;
    private final Map<String, Double> moduli = new LinkedHashMap<>();

    Scenario(long seed) {
        this.seed = seed;
        moduli.put("Anvil", 29.38);
        moduli.put("Beacon", 28.71);
        double[] hosts = {31.02, 31.38, 31.71, 31.95, 32.17, 32.33, 32.58, 32.74};
        for (int i = 0; i < hosts.length; i++) {
            moduli.put(HOSTS.get(i), hosts[i]);
        }
    }

    /**
     * Writes all tables.
     *
     * @param args the folder to write to
     * @throws IOException when it cannot be written
     */
    public static void main(String[] args) throws IOException {
        Path folder = Path.of(args[0]);
        for (Map.Entry<String, String> table : new Scenario(SEED).tables().entrySet()) {
            Files.writeString(folder.resolve(table.getKey()), table.getValue(), StandardCharsets.UTF_8);
        }
    }

    /** All tables by file name. */
    Map<String, String> tables() {
        Map<String, String> tables = new LinkedHashMap<>();
        tables.put("nearby.csv", nearby());
        tables.put("anchors.csv", anchors());
        tables.put("pulsators.csv", pulsators());
        tables.put("flow.csv", flow());
        tables.put("explosions.csv", explosions());
        tables.put("rotators.csv", rotators());
        tables.put("truth.csv", truth());
        return tables;
    }

    private double normal(String name, int index) {
        return Draws.of(seed, name).normal(0, index);
    }

    private double between(String name, int index, double from, double to) {
        return from + (to - from) * Draws.of(seed, name).uniform(0, index);
    }

    private static String line(Object... cells) {
        List<String> out = new ArrayList<>();
        for (Object cell : cells) {
            out.add(cell instanceof Double x ? String.format(Locale.ROOT, "%.3f", x) : String.valueOf(cell));
        }
        return String.join(",", out) + "\n";
    }

    private String nearby() {
        StringBuilder out = new StringBuilder(line(
                "star",
                "parallax_mas",
                "parallax_error_mas",
                "log_period",
                "magnitude",
                "magnitude_error",
                "metallicity"));
        for (int i = 1; i <= 60; i++) {
            String star = String.format(Locale.ROOT, "Tarn %02d", i);
            boolean faint = i % 6 == 0;
            double kiloparsec = faint ? between(star, 0, 3, 6) : between(star, 0, 0.4, 6);
            double error = faint ? between(star, 1, 0.3, 0.45) : between(star, 1, 0.018, 0.05);
            double parallax = 1 / kiloparsec + PARALLAX_OFFSET + error * normal(star, 2);
            double logPeriod = between(star, 3, 0.6, 1.6);
            double metals = 0.1 * normal(star, 4);
            double magnitudeError = between(star, 5, 0.015, 0.03);
            double magnitude = Distances.modulusFromMegaparsec(kiloparsec / 1000)
                    + luminosity(logPeriod, metals)
                    + SCATTER * normal(star, 6)
                    + magnitudeError * normal(star, 7);
            out.append(line(star, parallax, error, logPeriod, magnitude, magnitudeError, metals));
        }
        return out.toString();
    }

    private static double luminosity(double logPeriod, double metals) {
        return ZERO_POINT + SLOPE * (logPeriod - 1) + METALLICITY * metals;
    }

    private String anchors() {
        StringBuilder out = new StringBuilder(line("galaxy", "modulus", "statistical", "systematic"));
        out.append(anchor("Anvil", 0.025, 0.02));
        out.append(anchor("Beacon", 0.035, 0.03));
        return out.toString();
    }

    private String anchor(String galaxy, double statistical, double systematic) {
        double sigma = Math.sqrt(statistical * statistical + systematic * systematic);
        return line(galaxy, modulus(galaxy) + sigma * normal(galaxy, 0), statistical, systematic);
    }

    private double modulus(String galaxy) {
        return moduli.getOrDefault(galaxy, Double.NaN);
    }

    private String pulsators() {
        StringBuilder out =
                new StringBuilder(line("star", "galaxy", "log_period", "magnitude", "magnitude_error", "metallicity"));
        List<String> galaxies = new ArrayList<>(ANCHORS);
        galaxies.addAll(HOSTS);
        for (String galaxy : galaxies) {
            int stars = ANCHORS.contains(galaxy) ? 60 : (int) between(galaxy, 1, 38, 64);
            double metals = 0.1 * normal(galaxy, 2) - 0.05;
            for (int i = 1; i <= stars; i++) {
                String star = String.format(Locale.ROOT, "%s %02d", galaxy, i);
                double logPeriod = between(star, 0, ANCHORS.contains(galaxy) ? 0.7 : 1.0, 1.8);
                double own = metals + 0.05 * normal(star, 1);
                double error = between(star, 2, 0.06, 0.22);
                double magnitude = modulus(galaxy)
                        + luminosity(logPeriod, own)
                        + CAMERA
                        + SCATTER * normal(star, 3)
                        + error * normal(star, 4);
                out.append(line(star, galaxy, logPeriod, magnitude, error, own));
            }
        }
        return out.toString();
    }

    private String flow() {
        StringBuilder out = new StringBuilder(line("galaxy", "velocity_km_s", "velocity_error_km_s"));
        for (int i = 1; i <= 120; i++) {
            String galaxy = String.format(Locale.ROOT, "Fell %03d", i);
            double velocity = between(galaxy, 0, 3500, 24000);
            double z = velocity / Cosmography.LIGHT_KM_PER_S;
            moduli.put(
                    galaxy,
                    Distances.modulusFromMegaparsec(Cosmography.luminosityDistance(z, HUBBLE, DECELERATION, JERK)));
            double error = between(galaxy, 1, 20, 60);
            long observed = StrictMath.round(velocity + PECULIAR * normal(galaxy, 2) + error * normal(galaxy, 3));
            out.append(line(galaxy, observed, StrictMath.round(error)));
        }
        return out.toString();
    }

    private String explosions() {
        StringBuilder out =
                new StringBuilder(line("event", "galaxy", "magnitude", "magnitude_error", "shape", "colour"));
        List<String> galaxies = new ArrayList<>(HOSTS);
        galaxies.add("Brindle");
        galaxies.add("Garrow");
        for (int i = 1; i <= 70; i++) {
            galaxies.add(String.format(Locale.ROOT, "Fell %03d", i));
        }
        for (int i = 0; i < galaxies.size(); i++) {
            String event = String.format(Locale.ROOT, "E%03d", i + 1);
            double shape = normal(event, 0);
            double colour = 0.07 * normal(event, 1);
            double error = between(event, 2, 0.06, 0.13);
            double magnitude = modulus(galaxies.get(i))
                    + EXPLOSION
                    + SHAPE * shape
                    + COLOUR * colour
                    + EXPLOSION_SCATTER * normal(event, 3)
                    + error * normal(event, 4);
            out.append(line(event, galaxies.get(i), magnitude, error, shape, colour));
        }
        return out.toString();
    }

    private String rotators() {
        StringBuilder out = new StringBuilder(line("galaxy", "magnitude", "magnitude_error", "log_width", "orbital"));
        List<String> galaxies = new ArrayList<>(HOSTS);
        for (int i = 41; i <= 120; i++) {
            galaxies.add(String.format(Locale.ROOT, "Fell %03d", i));
        }
        for (String galaxy : galaxies) {
            double width = 0.12 * normal("width of " + galaxy, 0);
            double error = between("width of " + galaxy, 1, 0.05, 0.1);
            int orbital = HOSTS.contains(galaxy) ? 1 : 0;
            double magnitude = modulus(galaxy)
                    + ROTATOR
                    + WIDTH * width
                    + CAMERA * orbital
                    + ROTATOR_SCATTER * normal("width of " + galaxy, 2)
                    + error * normal("width of " + galaxy, 3);
            out.append(line(galaxy, magnitude, error, width, orbital));
        }
        return out.toString();
    }

    private String truth() {
        StringBuilder out = new StringBuilder(line("quantity", "value"));
        out.append(line("Hubble constant [km/s/Mpc]", HUBBLE));
        out.append(line("pulsator zero point [mag]", ZERO_POINT));
        out.append(line("pulsator slope [mag/dex]", SLOPE));
        out.append(line("metallicity coefficient [mag/dex]", METALLICITY));
        out.append(line("pulsator scatter [mag]", SCATTER));
        out.append(line("parallax offset [mas]", PARALLAX_OFFSET));
        out.append(line("camera zero point [mag]", CAMERA));
        out.append(line("explosions zero point [mag]", EXPLOSION));
        out.append(line("explosions shape coefficient [mag]", SHAPE));
        out.append(line("explosions colour coefficient [mag]", COLOUR));
        out.append(line("explosions scatter [mag]", EXPLOSION_SCATTER));
        out.append(line("rotators zero point [mag]", ROTATOR));
        out.append(line("rotators width coefficient [mag/dex]", WIDTH));
        out.append(line("rotators scatter [mag]", ROTATOR_SCATTER));
        out.append(line("peculiar velocities [km/s]", PECULIAR));
        out.append(line("deceleration parameter", DECELERATION));
        out.append(line("jerk parameter", JERK));
        for (String galaxy : ANCHORS) {
            out.append(line("modulus of " + galaxy + " [mag]", modulus(galaxy)));
        }
        for (String galaxy : HOSTS) {
            out.append(line("modulus of " + galaxy + " [mag]", modulus(galaxy)));
        }
        return out.toString();
    }
}
