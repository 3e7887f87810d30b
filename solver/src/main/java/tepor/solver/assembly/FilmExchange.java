package tepor.solver.assembly;

import java.util.Arrays;
import tepor.mesher.mesh.Mesh;
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
        double sum = 0;
        for (int p = 0; p < shape.pointCount(); p++) {
            sum -= shape.weight(p) * film * excess(kelvin, facet, p);
        }
        return sum * mesh.facetLength(facet);
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
            for (int facet : facets) {
                double length = mesh.facetLength(facet);
                for (int i = 0; i < shape.nodeCount(); i++) {
                    double sum = 0;
                    for (int p = 0; p < shape.pointCount(); p++) {
                        sum += shape.weight(p) * shape.value(p, i);
                    }
                    derivative[slot(mesh, facet, i)] -= film * length * sum;
                }
            }
        }
    }

    private void addExchange(double h, double[] kelvin, double[] residual) {
        for (int facet : facets) {
            double length = mesh.facetLength(facet);
            for (int p = 0; p < shape.pointCount(); p++) {
                double flux = shape.weight(p) * length * h * excess(kelvin, facet, p);
                for (int i = 0; i < shape.nodeCount(); i++) {
                    residual[slot(mesh, facet, i)] += flux * shape.value(p, i);
                }
            }
        }
    }

    /** Temperature above the air's at a point of a facet, K. */
    private double excess(double[] kelvin, int facet, int p) {
        double sum = 0;
        for (int j = 0; j < shape.nodeCount(); j++) {
            sum += (kelvin[mesh.facetNode(facet, j)] - airTemperature) * shape.value(p, j);
        }
        return sum;
    }

    @Override
    public void addTangent(double[] kelvin, TangentSink sink) {
        int m = shape.nodeCount();
        double[] entries = new double[m * m];
        for (int facet : facets) {
            double scale = film * mesh.facetLength(facet);
            Arrays.fill(entries, 0);
            for (int p = 0; p < shape.pointCount(); p++) {
                for (int i = 0; i < m; i++) {
                    for (int j = 0; j < m; j++) {
                        entries[m * i + j] += scale * shape.weight(p) * shape.value(p, i) * shape.value(p, j);
                    }
                }
            }
            sink.addFacet(facet, entries);
        }
    }
}
