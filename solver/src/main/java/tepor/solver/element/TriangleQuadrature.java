package tepor.solver.element;

/**
 * Quadrature on a triangle in barycentric coordinates; weights sum to 1 (multiply by the area).
 *
 * <p>Source: D. A. Dunavant, High degree efficient symmetrical Gaussian quadrature rules for the triangle, Int. J. Numer.
 * Meth. Engng 21 (1985) 1129–1148, table II; points computed here to full precision, from their closed
 * forms where they have one, else by Newton's method on the rule's moments.
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
    private static final TriangleQuadrature DEGREE_6 = degree6();

    public int pointCount() {
        return weight.length;
    }

    /**
     * A rule that integrates polynomials of this degree exactly.
     *
     * @param degree 0 to 6
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
        if (degree <= 6) {
            return DEGREE_6;
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

    /** Twelve points of degree 6: two orbits (a, a, 1−2a), and one of six points with three different coordinates. */
    private static TriangleQuadrature degree6() {
        TriangleQuadrature six =
                symmetric(new double[0], new double[] {0.11678627572637937, 0.05084490637020682}, new double[] {
                    0.24928674517091043, 0.06308901449150223
                });
        double[] coordinate = {0.3103524510337844, 0.6365024991213987, 0.053145049844816945};
        double[][] l = new double[3][12];
        double[] weight = new double[12];
        double[][] first = {six.l0, six.l1, six.l2};
        for (int i = 0; i < 3; i++) {
            System.arraycopy(first[i], 0, l[i], 0, 6);
        }
        System.arraycopy(six.weight, 0, weight, 0, 6);
        for (int p = 6; p < 12; p++) {
            int turn = p % 3;
            boolean mirrored = p >= 9;
            for (int i = 0; i < 3; i++) {
                l[i][p] = coordinate[((mirrored ? 3 - i : i) + turn) % 3];
            }
            weight[p] = 0.08285107561837357;
        }
        return new TriangleQuadrature(l[0], l[1], l[2], weight);
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
