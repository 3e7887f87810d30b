package tepor.solver.element;

import tepor.mesher.mesh.Mesh;

/**
 * Area and gradients of the barycentric coordinates of one straight triangle at a time. Reused from triangle to triangle:
 * {@link #moveTo} overwrites.
 */
public final class TriangleGeometry {
    private final Mesh mesh;
    private final double[] gradient = new double[6];
    private double area;

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
        double twice = abx * acy - acx * aby;
        area = 0.5 * twice;
        gradient[2] = acy / twice; // ∇λ₁
        gradient[3] = -acx / twice;
        gradient[4] = -aby / twice; // ∇λ₂
        gradient[5] = abx / twice;
        gradient[0] = -gradient[2] - gradient[4];
        gradient[1] = -gradient[3] - gradient[5];
    }

    /** m². */
    public double area() {
        return area;
    }

    /** ∂λᵢ/∂x, 1/m. */
    public double dx(int i) {
        return gradient[2 * i];
    }

    /** ∂λᵢ/∂y, 1/m. */
    public double dy(int i) {
        return gradient[2 * i + 1];
    }

    /**
     * Gradients of shape functions from their slopes.
     *
     * @param slopes 3·n, as {@link TriangleShape#slopes} gives them
     * @param n number of nodes
     * @param gx n entries ∂N/∂x, 1/m
     * @param gy n entries ∂N/∂y, 1/m
     */
    public void gradients(double[] slopes, int n, double[] gx, double[] gy) {
        for (int i = 0; i < n; i++) {
            double s0 = slopes[3 * i];
            double s1 = slopes[3 * i + 1];
            double s2 = slopes[3 * i + 2];
            gx[i] = s0 * gradient[0] + s1 * gradient[2] + s2 * gradient[4];
            gy[i] = s0 * gradient[1] + s1 * gradient[3] + s2 * gradient[5];
        }
    }
}
