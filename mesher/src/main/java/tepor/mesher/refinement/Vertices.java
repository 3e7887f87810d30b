package tepor.mesher.refinement;

import java.util.Arrays;
import tepor.mesher.triangulation.Triangulation;

/** What refinement knows of each vertex beside its place: the size wanted there, and the segment it lies on. */
final class Vertices {
    /** Lies inside a region. */
    static final int FREE = -1;
    /** Is a vertex of the section. */
    static final int GIVEN = -2;

    private final Triangulation mesh;
    private final SizeField field;
    private double[] size;
    private int[] carrier;
    private short[] patch;

    Vertices(Triangulation mesh, SizeField field) {
        this.mesh = mesh;
        this.field = field;
        int given = mesh.vertexCount();
        size = new double[2 * given + 16];
        carrier = new int[2 * given + 16];
        patch = new short[2 * given + 16];
        for (int v = 0; v < given; v++) {
            note(v, GIVEN);
        }
    }

    /** Adds a vertex. */
    int add(double x, double y, int onSegment) {
        int v = mesh.addVertex(x, y);
        if (v == size.length) {
            resize(v + v / 2);
        }
        note(v, onSegment);
        return v;
    }

    /** Makes room for so many triangles and their vertices. */
    void reserve(int triangles) {
        mesh.reserve(triangles);
        if (triangles / 2 > size.length) {
            resize(triangles / 2);
        }
    }

    private void resize(int length) {
        size = Arrays.copyOf(size, length);
        carrier = Arrays.copyOf(carrier, length);
        patch = Arrays.copyOf(patch, length);
    }

    private void note(int v, int onSegment) {
        size[v] = field.at(mesh.x(v), mesh.y(v));
        carrier[v] = onSegment;
    }

    /** Size wanted at the vertex, metres. */
    double size(int v) {
        return size[v];
    }

    /** Size wanted at a place, metres. */
    double sizeAt(double x, double y) {
        return field.at(x, y);
    }

    /** Segment inside which the vertex lies; {@link #FREE} or {@link #GIVEN}. */
    int carrier(int v) {
        return carrier[v];
    }

    /** Patch to which the triangles belong that were made when this vertex was added. */
    int patch(int v) {
        return patch[v];
    }

    void setPatch(int v, int number) {
        patch[v] = (short) number;
    }

    double distance(int a, int b) {
        double dx = mesh.x(b) - mesh.x(a);
        double dy = mesh.y(b) - mesh.y(a);
        return Math.sqrt(dx * dx + dy * dy);
    }
}
