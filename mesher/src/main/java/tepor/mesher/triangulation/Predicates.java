package tepor.mesher.triangulation;

/**
 * Orientation and in-circle tests whose sign is always right.
 *
 * <p>A floating-point filter answers nearly all calls; where it cannot be certain the determinant is computed exactly
 * ({@link Expansion}). Constants and formulas: Shewchuk 1997, Discrete Comput. Geom. 18:305–363. Exact for coordinates whose
 * differences are zero or lie between 1e-60 and 1e70 in size. Not for use by two threads at a time.
 */
public final class Predicates {
    /** (3 + 16ε)ε with ε = 2⁻⁵³. */
    private static final double ORIENTATION_BOUND = 3.3306690738754716e-16;
    /** (10 + 96ε)ε with ε = 2⁻⁵³. */
    private static final double IN_CIRCLE_BOUND = 1.1102230246251577e-15;

    private long exactOrientations;
    private long exactInCircles;

    private final Expansion adx = new Expansion(2);
    private final Expansion ady = new Expansion(2);
    private final Expansion bdx = new Expansion(2);
    private final Expansion bdy = new Expansion(2);
    private final Expansion cdx = new Expansion(2);
    private final Expansion cdy = new Expansion(2);
    private final Expansion left = new Expansion(8);
    private final Expansion right = new Expansion(8);
    private final Expansion lift = new Expansion(16);
    private final Expansion minor = new Expansion(16);
    private final Expansion scaled = new Expansion(32);
    private final Expansion small = new Expansion(8);
    private final Expansion large = new Expansion(512);
    private final Expansion aTerm = new Expansion(512);
    private final Expansion bTerm = new Expansion(512);
    private final Expansion cTerm = new Expansion(512);
    private final Expansion abTerm = new Expansion(1024);
    private final Expansion all = new Expansion(1536);

    /**
     * Positive if a, b, c turn counter-clockwise, negative if clockwise, 0 if they lie on one line. The size is about twice
     * the triangle's area.
     */
    public double orientation(double ax, double ay, double bx, double by, double cx, double cy) {
        double leftProduct = (ax - cx) * (by - cy);
        double rightProduct = (ay - cy) * (bx - cx);
        double determinant = leftProduct - rightProduct;
        double bound = ORIENTATION_BOUND * (Math.abs(leftProduct) + Math.abs(rightProduct));
        if (determinant > bound || -determinant > bound) {
            return determinant;
        }
        return exactOrientation(ax, ay, bx, by, cx, cy);
    }

    /**
     * Positive if d lies inside the circle through a, b, c, which must turn counter-clockwise; negative outside; 0 on it.
     */
    public double inCircle(double ax, double ay, double bx, double by, double cx, double cy, double dx, double dy) {
        double adX = ax - dx;
        double adY = ay - dy;
        double bdX = bx - dx;
        double bdY = by - dy;
        double cdX = cx - dx;
        double cdY = cy - dy;
        double bc = bdX * cdY;
        double cb = cdX * bdY;
        double ca = cdX * adY;
        double ac = adX * cdY;
        double ab = adX * bdY;
        double ba = bdX * adY;
        double aLift = adX * adX + adY * adY;
        double bLift = bdX * bdX + bdY * bdY;
        double cLift = cdX * cdX + cdY * cdY;
        double determinant = aLift * (bc - cb) + bLift * (ca - ac) + cLift * (ab - ba);
        double permanent = (Math.abs(bc) + Math.abs(cb)) * aLift
                + (Math.abs(ca) + Math.abs(ac)) * bLift
                + (Math.abs(ab) + Math.abs(ba)) * cLift;
        double bound = IN_CIRCLE_BOUND * permanent;
        if (determinant > bound || -determinant > bound) {
            return determinant;
        }
        return exactInCircle(ax, ay, bx, by, cx, cy, dx, dy);
    }

    /** How many orientation tests the filter could not decide. */
    public long exactOrientations() {
        return exactOrientations;
    }

    /** How many in-circle tests the filter could not decide. */
    public long exactInCircles() {
        return exactInCircles;
    }

    private double exactOrientation(double ax, double ay, double bx, double by, double cx, double cy) {
        exactOrientations++;
        adx.setDifference(ax, cx);
        ady.setDifference(ay, cy);
        bdx.setDifference(bx, cx);
        bdy.setDifference(by, cy);
        setCross(minor, adx, ady, bdx, bdy);
        return minor.leading();
    }

    private double exactInCircle(
            double ax, double ay, double bx, double by, double cx, double cy, double dx, double dy) {
        exactInCircles++;
        adx.setDifference(ax, dx);
        ady.setDifference(ay, dy);
        bdx.setDifference(bx, dx);
        bdy.setDifference(by, dy);
        cdx.setDifference(cx, dx);
        cdy.setDifference(cy, dy);
        setLiftTimesCross(aTerm, adx, ady, bdx, bdy, cdx, cdy);
        setLiftTimesCross(bTerm, bdx, bdy, cdx, cdy, adx, ady);
        setLiftTimesCross(cTerm, cdx, cdy, adx, ady, bdx, bdy);
        abTerm.setSum(aTerm, bTerm);
        all.setSum(abTerm, cTerm);
        return all.leading();
    }

    private void setLiftTimesCross(
            Expansion result, Expansion px, Expansion py, Expansion qx, Expansion qy, Expansion rx, Expansion ry) {
        left.setProduct(px, px, scaled, small);
        right.setProduct(py, py, scaled, small);
        lift.setSum(left, right);
        setCross(minor, qx, qy, rx, ry);
        result.setProduct(lift, minor, scaled, large);
    }

    private void setCross(Expansion result, Expansion px, Expansion py, Expansion qx, Expansion qy) {
        left.setProduct(px, qy, scaled, small);
        right.setProduct(py, qx, scaled, small);
        result.setDifference(left, right);
    }
}
