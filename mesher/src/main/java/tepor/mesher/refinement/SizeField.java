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

    /**
     * How much the size grows or shrinks per distance at most; refinement asks less often where this is small. What the
     * field does between places where it was asked counts only as far as this tells.
     */
    default double gradation() {
        return 3;
    }

    /**
     * The same size everywhere.
     *
     * @param size metres
     */
    static SizeField even(double size) {
        return new SizeField() {
            @Override
            public double at(double x, double y) {
                return size;
            }

            @Override
            public double gradation() {
                return 0;
            }
        };
    }

    /** The smaller of two sizes at each point. */
    static SizeField least(SizeField one, SizeField other) {
        double gradation = Math.max(one.gradation(), other.gradation());
        return new SizeField() {
            @Override
            public double at(double x, double y) {
                return Math.min(one.at(x, y), other.at(x, y));
            }

            @Override
            public double gradation() {
                return gradation;
            }
        };
    }
}
