package tepor.solver.element;

/**
 * Quadrature on a triangle in barycentric coordinates; weights sum to 1 (multiply by the area).
 *
 * <p>Source: D. A. Dunavant, High degree efficient symmetrical Gaussian quadrature rules for the triangle, Int. J. Numer.
 * Meth. Engng 21 (1985) 1129–1148, table II; points computed here to full precision from their closed forms.
 *
 * @param l0 first barycentric coordinate of each point
 * @param l1 second
 * @param l2 third
 * @param weight of each point
 */
public record TriangleQuadrature(double[] l0, double[] l1, double[] l2, double[] weight) {
    private static final TriangleQuadrature DEGREE_1 = symmetric(new double[] {1.0}, new double[0], new double[0]);
    private static final TriangleQuadrature DEGREE_2 =
            symmetric(new double[0], new double[] {1.0 / 3}, new double[] {1.0 / 6});
    private static final TriangleQuadrature DEGREE_4 = degree4();

    public int pointCount() {
        return weight.length;
    }

    /**
     * A rule that integrates polynomials of this degree exactly.
     *
     * @param degree 0 to 4
     */
    public static TriangleQuadrature ofDegree(int degree) {
        if (degree <= 1) {
            return DEGREE_1;
        }
        if (degree <= 2) {
            return DEGREE_2;
        }
        if (degree <= 4) {
            return DEGREE_4;
        }
        throw new IllegalArgumentException("no rule of degree " + degree);
    }

    /** Six points of degree 4: two orbits (a, a, 1−2a) with the closed forms of Dunavant's table. */
    private static TriangleQuadrature degree4() {
        double root10 = Math.sqrt(10);
        double root = Math.sqrt(38 - 44 * Math.sqrt(0.4));
        double a1 = (8 - root10 + root) / 18;
        double a2 = (8 - root10 - root) / 18;
        double rootW = Math.sqrt(213125 - 53320 * root10);
        double w1 = (620 + rootW) / 3720;
        double w2 = (620 - rootW) / 3720;
        return symmetric(new double[0], new double[] {w1, w2}, new double[] {a1, a2});
    }

    /** The centroid (if it has a weight), then for each orbit its three points (1−2a, a, a) and their turns. */
    private static TriangleQuadrature symmetric(double[] centroidWeight, double[] orbitWeight, double[] orbit) {
        int n = centroidWeight.length + 3 * orbit.length;
        double[][] l = new double[3][n];
        double[] weight = new double[n];
        int p = 0;
        for (double w : centroidWeight) {
            l[0][p] = 1.0 / 3;
            l[1][p] = 1.0 / 3;
            l[2][p] = 1.0 / 3;
            weight[p++] = w;
        }
        for (int o = 0; o < orbit.length; o++) {
            for (int turn = 0; turn < 3; turn++) {
                for (int i = 0; i < 3; i++) {
                    l[i][p] = i == turn ? 1 - 2 * orbit[o] : orbit[o];
                }
                weight[p++] = orbitWeight[o];
            }
        }
        return new TriangleQuadrature(l[0], l[1], l[2], weight);
    }
}
