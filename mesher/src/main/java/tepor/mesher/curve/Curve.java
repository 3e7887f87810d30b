package tepor.mesher.curve;

/** A curve in the plane, given by a parameter, of one or more spans on each of which it is smooth. */
public interface Curve {
    int spanCount();

    /** Parameter where a span begins. */
    double spanStart(int span);

    /** Parameter where a span ends; the next one begins there. */
    double spanEnd(int span);

    /**
     * Evaluates the curve.
     *
     * @param span a span
     * @param t parameter within the span; at its ends the derivative is that of this span
     * @param result takes x, y (metres) and their derivatives by t
     */
    void at(int span, double t, double[] result);
}
