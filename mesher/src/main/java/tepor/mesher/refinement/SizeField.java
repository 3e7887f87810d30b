package tepor.mesher.refinement;

/** The longest side wanted of a triangle at each point of the section. */
@FunctionalInterface
public interface SizeField {
    /**
     * The longest side wanted here, metres; {@link Double#POSITIVE_INFINITY} where there is no wish. Called for points in
     * any order; must return the same for the same point.
     *
     * @param x metres
     * @param y metres
     */
    double at(double x, double y);
}
