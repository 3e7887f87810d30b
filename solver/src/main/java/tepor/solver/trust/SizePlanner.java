package tepor.solver.trust;

import tepor.mesher.mesh.Mesh;

/**
 * Plans the sizes of the next mesh so that a given number of triangles lowers the energy of the error the most: with
 * indicators η² = c·h^{2p}·area, ∫h⁻² is least for a given error where h ∝ c^{−1/(2p+2)}.
 */
public final class SizePlanner {
    /** An ask moves by the error of the last mesh, so every part of it must be made finer, not only the worst. */
    private static final double LEAST_SHRINK = 0.85;

    /** A corner calls for sizes that no single round could foresee. */
    private static final double MOST_SHRINK = 0.08;

    private SizePlanner() {}

    /**
     * Plans sizes.
     *
     * @param squared one indicator for each triangle, as {@link ErrorIndicator#squared} gives them
     * @param growth wanted ratio of the next number of triangles to this one
     * @return one size for each triangle, the side of an equilateral triangle, metres
     */
    public static double[] plan(Mesh mesh, double[] squared, double growth) {
        int p = mesh.nodesPerTriangle() == 3 ? 1 : 2;
        int n = mesh.triangleCount();
        double[] density = new double[n];
        double[] present = new double[n];
        double floor = 0;
        for (int t = 0; t < n; t++) {
            present[t] = Math.sqrt(4 * mesh.area(t) / Math.sqrt(3));
            density[t] = squared[t] / Math.pow(present[t], 2 * p) / mesh.area(t);
            floor = Math.max(floor, density[t]);
        }
        double[] size = new double[n];
        if (floor == 0) {
            // Nothing to choose by: the field is exact on this mesh.
            for (int t = 0; t < n; t++) {
                size[t] = present[t] / Math.sqrt(growth);
            }
            return size;
        }
        double[] shape = new double[n];
        for (int t = 0; t < n; t++) {
            shape[t] = Math.pow(Math.max(density[t], 1e-30 * floor), -1.0 / (2 * p + 2));
        }
        // The clip makes the count a piecewise function of the scale: find the scale by bisection.
        double low = -60;
        double high = 60;
        for (int step = 0; step < 60; step++) {
            double middle = 0.5 * (low + high);
            if (count(mesh, shape, present, Math.pow(2, middle), size) > growth * n) {
                low = middle;
            } else {
                high = middle;
            }
        }
        count(mesh, shape, present, Math.pow(2, high), size);
        return size;
    }

    private static double count(Mesh mesh, double[] shape, double[] present, double scale, double[] size) {
        double sum = 0;
        double unit = present[0] / shape[0];
        for (int t = 0; t < size.length; t++) {
            double wanted = scale * unit * shape[t];
            size[t] = Math.min(LEAST_SHRINK * present[t], Math.max(MOST_SHRINK * present[t], wanted));
            sum += mesh.area(t) / (size[t] * size[t]);
        }
        return 4 / Math.sqrt(3) * sum;
    }
}
