package tepor.solver.field;

import java.util.Arrays;
import java.util.BitSet;
import java.util.function.IntPredicate;
import tepor.mesher.mesh.Mesh;

/**
 * The fans of triangles about nodes on open facets: two triangles at a node are of one fan if one can walk from one to the
 * other about the node without crossing an open facet.
 */
final class NodeFans {
    private final int nodesPerTriangle;
    /** For each nodesPerTriangle·triangle + i a member of the same fan, in the end its smallest; union by path halving. */
    private final int[] member;

    /**
     * @param mesh the mesh
     * @param openSides sides of triangles, as 3·triangle + side, that lie on open facets
     * @param wanted nodes whose fans are wanted
     */
    NodeFans(Mesh mesh, BitSet openSides, IntPredicate wanted) {
        nodesPerTriangle = mesh.nodesPerTriangle();
        member = new int[nodesPerTriangle * mesh.triangleCount()];
        Arrays.setAll(member, m -> m);
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int side = 0; side < 3; side++) {
                int other = mesh.neighbour(t, side);
                if (other > t && !openSides.get(3 * t + side)) {
                    join(mesh, t, (side + 1) % 3, other, wanted);
                    join(mesh, t, (side + 2) % 3, other, wanted);
                }
            }
        }
    }

    /** The fan of a triangle about its node i; fans about different nodes have different numbers. */
    int of(int triangle, int i) {
        return find(nodesPerTriangle * triangle + i);
    }

    private void join(Mesh mesh, int t, int i, int other, IntPredicate wanted) {
        int node = mesh.node(t, i);
        if (wanted.test(node)) {
            int j = mesh.node(other, 0) == node ? 0 : mesh.node(other, 1) == node ? 1 : 2;
            int a = find(nodesPerTriangle * t + i);
            int b = find(nodesPerTriangle * other + j);
            member[Math.max(a, b)] = Math.min(a, b);
        }
    }

    private int find(int start) {
        int m = start;
        while (member[m] != m) {
            member[m] = member[member[m]];
            m = member[m];
        }
        return m;
    }
}
