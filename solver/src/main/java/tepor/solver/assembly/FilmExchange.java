package tepor.solver.assembly;

import java.util.Arrays;
import tepor.mesher.mesh.Mesh;
import tepor.solver.element.FacetGeometry;
import tepor.solver.element.ShapeIntegrals;
import tepor.solver.element.SideShape;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Input;

/** Heat exchange with an air through a film: ∫ h (T − Tₐ) Nᵢ. A surface resistance R is a film of 1/R. */
public final class FilmExchange extends FacetEffect {
    private final double film;
    private final double airTemperature;
    private final Input filmInput;
    private final double filmPerInput;
    private final Input airInput;

    /**
     * @param film W/(m²·K)
     * @param airTemperature K
     * @param filmInput the input from which the film follows
     * @param filmPerInput d(film)/d(input)
     * @param airInput the input of the air's temperature
     */
    private FilmExchange(
            Mesh mesh,
            int[] facets,
            String owner,
            String kind,
            double film,
            double airTemperature,
            Input filmInput,
            double filmPerInput,
            Input airInput) {
        super(mesh, facets, owner, kind);
        this.film = film;
        this.airTemperature = airTemperature;
        this.filmInput = filmInput;
        this.filmPerInput = filmPerInput;
        this.airInput = airInput;
    }

    /** A film. */
    static FilmExchange of(
            Mesh mesh, int[] facets, String owner, EdgeCondition.Film film, double h, double airTemperature) {
        return new FilmExchange(
                mesh, facets, owner, film.word(), h, airTemperature, film.coefficient(), 1, film.airTemperature());
    }

    /** A surface resistance. */
    static FilmExchange of(
            Mesh mesh,
            int[] facets,
            String owner,
            EdgeCondition.SurfaceResistance resistance,
            double r,
            double airTemperature) {
        return new FilmExchange(
                mesh,
                facets,
                owner,
                resistance.word(),
                1 / r,
                airTemperature,
                resistance.resistance(),
                -1 / (r * r),
                resistance.airTemperature());
    }

    /** Input of the temperature of the air with which heat is exchanged. */
    public Input airInput() {
        return airInput;
    }

    /** W/(m²·K). */
    public double film() {
        return film;
    }

    /** K. */
    public double airTemperature() {
        return airTemperature;
    }

    @Override
    public double outwardFlux(double kelvin) {
        return film * (kelvin - airTemperature);
    }

    @Override
    public double heatIn(double[] kelvin, int facet) {
        FacetGeometry geometry = new FacetGeometry(mesh);
        geometry.moveTo(facet);
        SideShape shape = geometry.shape();
        double sum = 0;
        for (int p = 0; p < shape.pointCount(); p++) {
            sum -= shape.weight(p) * geometry.lengthElement(p) * film * excess(kelvin, facet, shape, p);
        }
        return sum;
    }

    @Override
    public void addResidual(double[] kelvin, double[] residual) {
        addExchange(film, kelvin, residual);
    }

    @Override
    public void addDerivative(double[] kelvin, Input input, double[] derivative) {
        if (input.equals(filmInput)) {
            addExchange(filmPerInput, kelvin, derivative);
        }
        if (input.equals(airInput)) {
            ShapeIntegrals integrals = new ShapeIntegrals(mesh);
            double[] length = new double[nodesPerFacet];
            for (int facet : facets) {
                integrals.overFacet(facet, length);
                for (int i = 0; i < nodesPerFacet; i++) {
                    derivative[slot(mesh, facet, i)] -= film * length[i];
                }
            }
        }
    }

    private void addExchange(double h, double[] kelvin, double[] residual) {
        FacetGeometry geometry = new FacetGeometry(mesh);
        for (int facet : facets) {
            geometry.moveTo(facet);
            SideShape shape = geometry.shape();
            for (int p = 0; p < shape.pointCount(); p++) {
                double flux = shape.weight(p) * geometry.lengthElement(p) * h * excess(kelvin, facet, shape, p);
                for (int i = 0; i < nodesPerFacet; i++) {
                    residual[slot(mesh, facet, i)] += flux * shape.value(p, i);
                }
            }
        }
    }

    /** Temperature above the air's at a point of a facet, K. */
    private double excess(double[] kelvin, int facet, SideShape shape, int p) {
        double sum = 0;
        for (int j = 0; j < nodesPerFacet; j++) {
            sum += (kelvin[mesh.facetNode(facet, j)] - airTemperature) * shape.value(p, j);
        }
        return sum;
    }

    @Override
    public void addTangent(double[] kelvin, TangentSink sink) {
        int m = nodesPerFacet;
        double[] entries = new double[m * m];
        FacetGeometry geometry = new FacetGeometry(mesh);
        for (int facet : facets) {
            geometry.moveTo(facet);
            SideShape shape = geometry.shape();
            Arrays.fill(entries, 0);
            for (int p = 0; p < shape.pointCount(); p++) {
                double weight = film * shape.weight(p) * geometry.lengthElement(p);
                for (int i = 0; i < m; i++) {
                    for (int j = 0; j < m; j++) {
                        entries[m * i + j] += weight * shape.value(p, i) * shape.value(p, j);
                    }
                }
            }
            sink.addFacet(facet, entries);
        }
    }
}
