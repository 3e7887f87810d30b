package tepor.solver.element;

import tepor.mesher.mesh.Mesh;

/**
 * Length, direction and quadrature of one facet at a time, straight or curved. Reused from facet to facet: {@link #moveTo}
 * overwrites.
 *
 * <p>A curved facet is the parabola a + t·(b − a) + 4t(1 − t)·s through its nodes, s leading from the middle of its chord to
 * its middle node.
 */
public final class FacetGeometry {
    private final Mesh mesh;
    private final SideShape straight;
    private SideShape shape;
    private boolean curved;
    private double chordX;
    private double chordY;
    private double bulgeX;
    private double bulgeY;
    private double chord;

    public FacetGeometry(Mesh mesh) {
        this.mesh = mesh;
        straight = SideShape.of(mesh.nodesPerTriangle());
    }

    /** Takes up a facet. */
    public void moveTo(int facet) {
        int a = mesh.facetNode(facet, 0);
        int b = mesh.facetNode(facet, 1);
        chordX = mesh.x(b) - mesh.x(a);
        chordY = mesh.y(b) - mesh.y(a);
        chord = Math.hypot(chordX, chordY);
        curved = mesh.isCurvedFacet(facet);
        shape = straight;
        if (curved) {
            int m = mesh.facetNode(facet, 2);
            bulgeX = mesh.x(m) - mesh.x(a) - 0.5 * chordX;
            bulgeY = mesh.y(m) - mesh.y(a) - 0.5 * chordY;
            shape = SideShape.CURVED;
        }
    }

    /** Shape functions and quadrature that suit the facet. */
    public SideShape shape() {
        return shape;
    }

    /** Change of x from start to end at point t of the facet, for each unit of t, metres. */
    public double dx(double t) {
        return curved ? chordX + 4 * (1 - 2 * t) * bulgeX : chordX;
    }

    /** Change of y from start to end at point t of the facet, for each unit of t, metres. */
    public double dy(double t) {
        return curved ? chordY + 4 * (1 - 2 * t) * bulgeY : chordY;
    }

    /** Length for each unit of quadrature weight at point p of the {@link #shape}, metres. */
    public double lengthElement(int p) {
        if (!curved) {
            return chord;
        }
        double t = shape.point(p);
        return Math.hypot(dx(t), dy(t));
    }

    /** Length of the facet, metres, by the quadrature of its shape. */
    public double length() {
        if (!curved) {
            return chord;
        }
        double sum = 0;
        for (int p = 0; p < shape.pointCount(); p++) {
            sum += shape.weight(p) * lengthElement(p);
        }
        return sum;
    }
}
