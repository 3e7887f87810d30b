package tepor.solver.element;

import tepor.mesher.mesh.Mesh;

/**
 * Area and gradients of one triangle at a time, straight or curved. Reused from triangle to triangle: {@link #moveTo}
 * overwrites.
 *
 * <p>A curved triangle is mapped by its own shape functions (isoparametric; P. G. Ciarlet and P.-A. Raviart, Interpolation
 * theory over curved elements, Comput. Methods Appl. Mech. Engng 1 (1972) 217–249), so the map differs from point to point:
 * {@link #gradients} takes up a point, and {@link #areaElement} then belongs to it.
 */
public final class TriangleGeometry {
    private final Mesh mesh;
    private final double[] gradient = new double[6];
    private final double[] offset = new double[12];
    private boolean curved;
    private double areaElement;

    public TriangleGeometry(Mesh mesh) {
        this.mesh = mesh;
    }

    /** Takes up a triangle. */
    public void moveTo(int triangle) {
        int a = mesh.node(triangle, 0);
        int b = mesh.node(triangle, 1);
        int c = mesh.node(triangle, 2);
        // Differences first: a section far from the origin loses no digits.
        double abx = mesh.x(b) - mesh.x(a);
        double aby = mesh.y(b) - mesh.y(a);
        double acx = mesh.x(c) - mesh.x(a);
        double acy = mesh.y(c) - mesh.y(a);
        setGradients(abx, acx, aby, acy);
        curved = mesh.isCurved(triangle);
        for (int i = 0; i < 6 && curved; i++) {
            int node = mesh.node(triangle, i);
            offset[2 * i] = mesh.x(node) - mesh.x(a);
            offset[2 * i + 1] = mesh.y(node) - mesh.y(a);
        }
    }

    /** From the derivatives of the place by λ₁ and λ₂, λ₀ making up the rest. */
    private void setGradients(double x1, double x2, double y1, double y2) {
        double twice = x1 * y2 - x2 * y1;
        areaElement = 0.5 * twice;
        gradient[2] = y2 / twice; // ∇λ₁
        gradient[3] = -x2 / twice;
        gradient[4] = -y1 / twice; // ∇λ₂
        gradient[5] = x1 / twice;
        gradient[0] = -gradient[2] - gradient[4];
        gradient[1] = -gradient[3] - gradient[5];
    }

    /**
     * Area for each unit of quadrature weight at the point last taken up by {@link #gradients}, m². In a straight triangle
     * it is the triangle's area everywhere; of a curved one that has just been moved to, it is the area between its corners.
     */
    public double areaElement() {
        return areaElement;
    }

    /** ∂λᵢ/∂x at the point last taken up, 1/m; of a curved triangle just moved to, as if its sides were straight. */
    public double dx(int i) {
        return gradient[2 * i];
    }

    /** ∂λᵢ/∂y at the point last taken up, 1/m; of a curved triangle just moved to, as if its sides were straight. */
    public double dy(int i) {
        return gradient[2 * i + 1];
    }

    /**
     * Gradients of shape functions at a point from their slopes there.
     *
     * @param slopes 3·n, as {@link TriangleShape#slopes} gives them
     * @param n number of nodes
     * @param gx n entries ∂N/∂x, 1/m
     * @param gy n entries ∂N/∂y, 1/m
     */
    public void gradients(double[] slopes, int n, double[] gx, double[] gy) {
        if (curved) {
            mapAt(slopes);
        }
        for (int i = 0; i < n; i++) {
            double s0 = slopes[3 * i];
            double s1 = slopes[3 * i + 1];
            double s2 = slopes[3 * i + 2];
            gx[i] = s0 * gradient[0] + s1 * gradient[2] + s2 * gradient[4];
            gy[i] = s0 * gradient[1] + s1 * gradient[3] + s2 * gradient[5];
        }
    }

    private void mapAt(double[] slopes) {
        double x1 = 0;
        double x2 = 0;
        double y1 = 0;
        double y2 = 0;
        for (int i = 1; i < 6; i++) {
            double s1 = slopes[3 * i + 1] - slopes[3 * i];
            double s2 = slopes[3 * i + 2] - slopes[3 * i];
            x1 += s1 * offset[2 * i];
            x2 += s2 * offset[2 * i];
            y1 += s1 * offset[2 * i + 1];
            y2 += s2 * offset[2 * i + 1];
        }
        setGradients(x1, x2, y1, y2);
    }
}
