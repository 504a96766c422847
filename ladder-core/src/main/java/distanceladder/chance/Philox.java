package distanceladder.chance;

/**
 * The counter-based generator Philox 4x64-10: ten rounds that turn a counter of 256 bits, under a key of 128 bits, into
 * 256 random bits.
 *
 * <p>Salmon, Moraes, Dror and Shaw (2011), Parallel random numbers: as easy as 1, 2, 3, section 3.3. Integer
 * arithmetic alone.
 */
final class Philox {
    private static final long MULTIPLIER_0 = 0xD2E7470EE14C6C93L;
    private static final long MULTIPLIER_1 = 0xCA5A826395121157L;
    private static final long WEYL_0 = 0x9E3779B97F4A7C15L;
    private static final long WEYL_1 = 0xBB67AE8584CAA73BL;
    private static final int ROUNDS = 10;

    private Philox() {}

    /** Replaces the counter by its random words. */
    static void mix(long[] words, long key0, long key1) {
        long k0 = key0;
        long k1 = key1;
        for (int round = 0; round < ROUNDS; round++) {
            long high0 = unsignedHigh(MULTIPLIER_0, words[0]);
            long low0 = MULTIPLIER_0 * words[0];
            long high1 = unsignedHigh(MULTIPLIER_1, words[2]);
            long low1 = MULTIPLIER_1 * words[2];
            words[0] = high1 ^ words[1] ^ k0;
            words[1] = low1;
            words[2] = high0 ^ words[3] ^ k1;
            words[3] = low0;
            k0 += WEYL_0;
            k1 += WEYL_1;
        }
    }

    private static long unsignedHigh(long a, long b) {
        return Math.multiplyHigh(a, b) + ((a >> 63) & b) + ((b >> 63) & a);
    }
}
