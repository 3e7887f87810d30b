package tepor.mesher.refinement;

/**
 * What is asked of refinement.
 *
 * @param smallestAngle no smaller angle than this where the outline allows it, radians; at most 33°
 * @param size the longest side wanted at each point
 * @param trianglesAtMost refinement stops at this number of triangles
 * @param greatestTurn no side that stands for a piece of an arc turns by more than this, radians
 */
public record RefinementOptions(double smallestAngle, SizeField size, int trianglesAtMost, double greatestTurn) {
    private static final double GREATEST_ANGLE = Math.toRadians(33) * (1 + 1e-9);

    public RefinementOptions {
        if (!(smallestAngle >= 0 && smallestAngle <= GREATEST_ANGLE)) {
            throw new IllegalArgumentException(
                    "the smallest angle must lie between 0° and 33°, got " + Math.toDegrees(smallestAngle) + "°");
        }
    }
}
