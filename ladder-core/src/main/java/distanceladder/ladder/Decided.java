package distanceladder.ladder;

import distanceladder.relation.Points;

/**
 * What is decided for one rung: where its relation is linearised, and its intrinsic variance.
 *
 * @param points points of linearisation
 * @param variance square of the intrinsic scatter
 */
record Decided(Points points, double variance) {
    double scatter() {
        return Math.sqrt(variance);
    }
}
