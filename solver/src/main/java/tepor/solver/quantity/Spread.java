package tepor.solver.quantity;

/**
 * How far off a value may be, as stated by the user.
 *
 * @param distribution what is known of the values within
 * @param halfWidth half-width a (rectangular, triangular) or expanded uncertainty U (normal), SI
 * @param coverageFactor k of the expanded uncertainty for a normal distribution; 1 otherwise
 */
public record Spread(Distribution distribution, double halfWidth, double coverageFactor) {
    /** Distributions of JCGM 100:2008, 4.3. */
    public enum Distribution {
        RECTANGULAR,
        TRIANGULAR,
        NORMAL
    }

    /** Standard uncertainty, SI: a/√3, a/√6 or U/k (JCGM 100:2008, 4.3.3, 4.3.7, 4.3.9). */
    public double standard() {
        return switch (distribution) {
            case RECTANGULAR -> halfWidth / Math.sqrt(3);
            case TRIANGULAR -> halfWidth / Math.sqrt(6);
            case NORMAL -> halfWidth / coverageFactor;
        };
    }
}
