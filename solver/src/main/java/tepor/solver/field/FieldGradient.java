package tepor.solver.field;

import tepor.mesher.mesh.Mesh;
import tepor.solver.element.TriangleGeometry;
import tepor.solver.element.TriangleShape;
import tepor.solver.element.TriangleShapes;

/** Temperature gradients inside triangles, one triangle at a time. Reused from point to point, so it is for one thread. */
public final class FieldGradient {
    private final TemperatureField field;
    private final Mesh mesh;
    private final TriangleShape shape;
    private final TriangleGeometry geometry;
    private final double[] slopes;
    private final double[] gx;
    private final double[] gy;
    private int current = Mesh.NONE;

    public FieldGradient(TemperatureField field) {
        this.field = field;
        mesh = field.mesh();
        shape = TriangleShapes.of(mesh.nodesPerTriangle());
        geometry = new TriangleGeometry(mesh);
        slopes = new double[3 * shape.nodeCount()];
        gx = new double[shape.nodeCount()];
        gy = new double[shape.nodeCount()];
    }

    /**
     * Gradient at barycentric coordinates of a triangle, K/m.
     *
     * @param out two entries, overwritten
     */
    public void at(int triangle, double l0, double l1, double l2, double[] out) {
        if (triangle != current) {
            geometry.moveTo(triangle);
            current = triangle;
        }
        shape.slopes(l0, l1, l2, slopes);
        geometry.gradients(slopes, gx.length, gx, gy);
        double level = field.at(mesh.node(triangle, 0));
        double x = 0;
        double y = 0;
        for (int i = 0; i < gx.length; i++) {
            double u = field.at(mesh.node(triangle, i)) - level;
            x += u * gx[i];
            y += u * gy[i];
        }
        out[0] = x;
        out[1] = y;
    }
}
