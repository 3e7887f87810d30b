package tepor.solver.assembly;

import tepor.mesher.mesh.Mesh;

/** What effects on boundary facets have in common: which facets, and where their nodes stand in the element residual. */
public abstract class FacetEffect implements Contribution {
    final Mesh mesh;
    final int[] facets;
    final int nodesPerFacet;
    private final String owner;
    private final String kind;

    FacetEffect(Mesh mesh, int[] facets, String owner, String kind) {
        this.mesh = mesh;
        this.facets = facets.clone();
        this.owner = owner;
        this.kind = kind;
        nodesPerFacet = mesh.nodesPerTriangle() == 3 ? 2 : 3;
    }

    @Override
    public String owner() {
        return owner;
    }

    @Override
    public String kind() {
        return kind;
    }

    /** The facets on which the effect acts. */
    public int[] facets() {
        return facets.clone();
    }

    /** Heat that flows into the section through one of its facets, W/m. */
    public abstract double heatIn(double[] kelvin, int facet);

    /**
     * Heat flux out of the section where the edge has this temperature, W/m².
     *
     * @param kelvin K
     */
    public abstract double outwardFlux(double kelvin);

    /**
     * Place of node i of a boundary facet in an array of element residuals.
     *
     * @param i 0 start, 1 end, 2 middle, in the facet's direction
     */
    static int slot(Mesh mesh, int facet, int i) {
        boolean fromLeft = mesh.facetLeftTriangle(facet) != Mesh.NONE;
        int triangle = fromLeft ? mesh.facetLeftTriangle(facet) : mesh.facetRightTriangle(facet);
        int side = fromLeft ? mesh.facetLeftSide(facet) : mesh.facetRightSide(facet);
        return mesh.nodesPerTriangle() * triangle + localNode(side, fromLeft, i);
    }

    /**
     * Local node of a triangle for node i of a facet.
     *
     * @param side which side of the triangle the facet is
     * @param left whether the triangle lies on the facet's left
     */
    static int localNode(int side, boolean left, int i) {
        if (i == 2) {
            return 3 + side;
        }
        return (side + (left == (i == 0) ? 1 : 2)) % 3;
    }
}
