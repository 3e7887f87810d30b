package tepor.mesher.mesh;

/**
 * The map from barycentric coordinates to places, and back, of one triangle at a time. Reused from triangle to triangle:
 * {@link #moveTo} overwrites.
 *
 * <p>A curved triangle maps λ to Σ λᵢPᵢ + 4 Σ λⱼλₖ·s, the second sum over its curved sides, where s leads from the middle of
 * the side's chord to its middle node. In straight barycentric coordinates μ that is μ = λ + 4 Σ λⱼλₖ·δ with the components
 * δ of s: what is solved, by Newton's method, for the way back.
 */
public final class TriangleMap {
    private static final int STEPS_AT_MOST = 40;
    private static final int HALVINGS_AT_MOST = 12;
    private static final double SOLVED = 1e-14;

    private final Mesh mesh;
    private boolean curved;
    private double x0;
    private double y0;
    private double x1;
    private double y1;
    private double x2;
    private double y2;
    private double twice;
    /** Components of s of each side in the directions of the corners: δᵢ of side s at 3·s + i. */
    private final double[] bulge = new double[9];

    private final double[] from = new double[3];
    private final double[] tried = new double[3];

    public TriangleMap(Mesh mesh) {
        this.mesh = mesh;
    }

    /** Takes up a triangle. */
    public void moveTo(int triangle) {
        int a = mesh.node(triangle, 0);
        int b = mesh.node(triangle, 1);
        int c = mesh.node(triangle, 2);
        x0 = mesh.x(a);
        y0 = mesh.y(a);
        x1 = mesh.x(b) - x0;
        y1 = mesh.y(b) - y0;
        x2 = mesh.x(c) - x0;
        y2 = mesh.y(c) - y0;
        twice = x1 * y2 - x2 * y1;
        curved = mesh.isCurved(triangle);
        for (int side = 0; side < 3 && curved; side++) {
            int p = mesh.node(triangle, (side + 1) % 3);
            int q = mesh.node(triangle, (side + 2) % 3);
            int m = mesh.node(triangle, 3 + side);
            double sx = mesh.x(m) - 0.5 * (mesh.x(p) + mesh.x(q));
            double sy = mesh.y(m) - 0.5 * (mesh.y(p) + mesh.y(q));
            bulge[3 * side + 1] = (sx * y2 - x2 * sy) / twice;
            bulge[3 * side + 2] = (x1 * sy - sx * y1) / twice;
            bulge[3 * side] = -bulge[3 * side + 1] - bulge[3 * side + 2];
        }
    }

    /** Place of barycentric coordinates, metres. */
    public double x(double l0, double l1, double l2) {
        return x0 + straight(l0, l1, l2, 1) * x1 + straight(l0, l1, l2, 2) * x2;
    }

    /** Place of barycentric coordinates, metres. */
    public double y(double l0, double l1, double l2) {
        return y0 + straight(l0, l1, l2, 1) * y1 + straight(l0, l1, l2, 2) * y2;
    }

    /** μᵢ of λ. */
    private double straight(double l0, double l1, double l2, int i) {
        double l = i == 0 ? l0 : i == 1 ? l1 : l2;
        return curved ? l + 4 * (l1 * l2 * bulge[i] + l2 * l0 * bulge[3 + i] + l0 * l1 * bulge[6 + i]) : l;
    }

    /** Fills the barycentric coordinates a place would have if the triangle were straight. */
    private void straight(double x, double y, double[] l) {
        double dx = x - x0;
        double dy = y - y0;
        l[1] = (dx * y2 - x2 * dy) / twice;
        l[2] = (x1 * dy - dx * y1) / twice;
        l[0] = 1 - l[1] - l[2];
    }

    /**
     * How far a place lies inside the side beyond which it lies farthest, as a share of the height over that side: negative
     * outside the triangle. Ask {@link #worstSide} which.
     */
    double margin(double x, double y) {
        straight(x, y, from);
        return margin(worst(), from);
    }

    /** The side of which {@link #margin} tells. */
    int worstSide(double x, double y) {
        straight(x, y, from);
        return worst();
    }

    private int worst() {
        int worst = 0;
        double least = margin(0, from);
        for (int side = 1; side < 3; side++) {
            double margin = margin(side, from);
            if (margin < least) {
                least = margin;
                worst = side;
            }
        }
        return worst;
    }

    /**
     * A place a + α·(b − a) + β·s is beyond the parabola where β > 4α(1 − α), s pointing outwards; then β = μᵢ/δᵢ, and α is
     * what remains of μ. Beside the parabola its chord's line counts.
     */
    private double margin(int side, double[] l) {
        double height = curved ? bulge[3 * side + side] : 0;
        if (height == 0) {
            return l[side];
        }
        int end = (side + 2) % 3;
        double along = l[end] - l[side] / height * bulge[3 * side + end];
        return l[side] - Math.max(0, 4 * along * (1 - along)) * height;
    }

    /** Whether a place lies in the triangle or on its boundary. */
    public boolean contains(double x, double y) {
        return margin(x, y) >= 0;
    }

    /**
     * Finds the barycentric coordinates of a place. Outside the triangle it extends the map.
     *
     * @param x metres
     * @param y metres
     * @param l three entries, overwritten; those of the triangle between the corners where the map does not reach the place
     * @return whether it does
     */
    public boolean locate(double x, double y, double[] l) {
        straight(x, y, from);
        System.arraycopy(from, 0, l, 0, 3);
        return !curved || solve(l);
    }

    private boolean solve(double[] l) {
        double residual = residual(l);
        for (int step = 0; step < STEPS_AT_MOST; step++) {
            // ∂μ₁/∂λ₁, … with λ₀ making up the rest
            double f1 = 4 * l[1];
            double f0 = 4 * l[0];
            double f2 = 4 * l[2];
            double a11 = 1 + f2 * bulge[1] - f2 * bulge[4] + (f0 - f1) * bulge[7];
            double a12 = f1 * bulge[1] + (f0 - f2) * bulge[4] - f1 * bulge[7];
            double a21 = f2 * bulge[2] - f2 * bulge[5] + (f0 - f1) * bulge[8];
            double a22 = 1 + f1 * bulge[2] + (f0 - f2) * bulge[5] - f1 * bulge[8];
            double r1 = from[1] - straight(l[0], l[1], l[2], 1);
            double r2 = from[2] - straight(l[0], l[1], l[2], 2);
            double det = a11 * a22 - a12 * a21;
            if (!(det > 0)) {
                break;
            }
            double d1 = (r1 * a22 - a12 * r2) / det;
            double d2 = (a11 * r2 - r1 * a21) / det;
            double next = advance(l, d1, d2, residual);
            if (Math.abs(d1) + Math.abs(d2) < SOLVED * (1 + Math.abs(l[1]) + Math.abs(l[2]))) {
                return true;
            }
            if (!(next < residual)) {
                if (residual < SOLVED) {
                    return true;
                }
                break;
            }
            residual = next;
        }
        System.arraycopy(from, 0, l, 0, 3);
        return false;
    }

    /** Takes the step, halved until the residual falls; returns the new residual, which is not less where none did. */
    private double advance(double[] l, double d1, double d2, double residual) {
        double part = 1;
        for (int halving = 0; halving < HALVINGS_AT_MOST; halving++) {
            tried[1] = l[1] + part * d1;
            tried[2] = l[2] + part * d2;
            tried[0] = 1 - tried[1] - tried[2];
            double next = residual(tried);
            if (next < residual) {
                System.arraycopy(tried, 0, l, 0, 3);
                return next;
            }
            part *= 0.5;
        }
        return residual;
    }

    private double residual(double[] l) {
        return Math.abs(from[1] - straight(l[0], l[1], l[2], 1)) + Math.abs(from[2] - straight(l[0], l[1], l[2], 2));
    }
}
