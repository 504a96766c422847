package distanceladder.chance;

import distanceladder.text.ValueFault;

/**
 * Random numbers that depend on (seed, k, name, index) alone.
 *
 * <p>k is the number of the draw, the name is that of the source or datum that is drawn, the index counts the numbers
 * that it needs in one draw. Nothing is stored and nothing advances: any number can be asked for in any order, on any
 * thread or machine, and is the same bits on every Java.
 *
 * <p>Words are those of Philox 4x64-10 (Salmon, Moraes, Dror and Shaw 2011, Parallel random numbers: as easy as 1, 2,
 * 3) with the key (seed, hash of name) and the counter (index / 4, k, 0, 0), of which the word index mod 4 is given.
 * The hash is FNV-1a of 64 bits over the UTF-16 code units, high byte first, then the finaliser of SplitMix64; two
 * given names share a hash with a chance of 5e-20. Cost: some tens of nanoseconds a number; the four words of one counter cost
 * little more than one ({@link #fill}).
 */
public final class Draws {
    private static final int WORDS = 4;
    private static final double STEP = 0x1p-53;

    private final long seed;
    private final String name;
    private final long hash;

    private Draws(long seed, String name) {
        this.seed = seed;
        this.name = name;
        this.hash = hash(name);
    }

    /**
     * The stream of a name.
     *
     * @param seed any number; another seed gives other, independent draws
     * @param name name of what is drawn
     * @return its random numbers
     */
    public static Draws of(long seed, String name) {
        return new Draws(seed, name);
    }

    static long hash(String name) {
        long hash = 0xCBF29CE484222325L;
        for (int i = 0; i < name.length(); i++) {
            char unit = name.charAt(i);
            hash = (hash ^ (unit >>> 8)) * 0x100000001B3L;
            hash = (hash ^ (unit & 0xFF)) * 0x100000001B3L;
        }
        hash = (hash ^ (hash >>> 30)) * 0xBF58476D1CE4E5B9L;
        hash = (hash ^ (hash >>> 27)) * 0x94D049BB133111EBL;
        return hash ^ (hash >>> 31);
    }

    /**
     * The seed.
     *
     * @return as given
     */
    public long seed() {
        return seed;
    }

    /**
     * The name of what is drawn.
     *
     * @return as given
     */
    public String name() {
        return name;
    }

    /**
     * 64 random bits.
     *
     * @param k number of the draw
     * @param index which number of this draw, 0 or more
     * @return any long
     * @throws ValueFault if the index is negative
     */
    public long bits(long k, int index) {
        if (index < 0) {
            throw new ValueFault("index = " + index, "the numbers of a draw count from 0", name, "give 0 or more");
        }
        return words(k, index / WORDS)[index % WORDS];
    }

    private long[] words(long k, int group) {
        long[] words = {group, k, 0, 0};
        Philox.mix(words, seed, hash);
        return words;
    }

    /**
     * A uniform number in the open interval (0, 1).
     *
     * @param k number of the draw
     * @param index which number of this draw, 0 or more
     * @return an odd multiple of 2^-53; u and 1 - u are equally probable
     * @throws ValueFault if the index is negative
     */
    public double uniform(long k, int index) {
        return uniform(bits(k, index));
    }

    private static double uniform(long bits) {
        return ((bits >>> 11) | 1) * STEP;
    }

    /**
     * A standard normal number: the quantile of {@link #uniform}, by Wichura (1988), algorithm AS 241 (PPND16).
     *
     * @param k number of the draw
     * @param index which number of this draw, 0 or more
     * @return a number between -8.3 and 8.3, correct to about 1e-15
     * @throws ValueFault if the index is negative
     */
    public double normal(long k, int index) {
        return NormalQuantile.at(uniform(k, index));
    }

    /**
     * The first uniform numbers of a draw: {@code target[i] = uniform(k, i)}, at a quarter of the cost.
     *
     * @param k number of the draw
     * @param target is overwritten
     */
    public void fill(long k, double[] target) {
        for (int from = 0; from < target.length; from += WORDS) {
            long[] words = words(k, from / WORDS);
            for (int i = from; i < Math.min(target.length, from + WORDS); i++) {
                target[i] = uniform(words[i - from]);
            }
        }
    }

    /**
     * The first standard normal numbers of a draw: {@code target[i] = normal(k, i)}.
     *
     * @param k number of the draw
     * @param target is overwritten
     */
    public void fillNormal(long k, double[] target) {
        fill(k, target);
        for (int i = 0; i < target.length; i++) {
            target[i] = NormalQuantile.at(target[i]);
        }
    }

    @Override
    public String toString() {
        return "draws of " + name + " with seed " + seed;
    }
}
