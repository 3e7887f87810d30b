package tepor.solver.trust;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import tepor.mesher.mesh.Mesh;
import tepor.solver.assembly.FacetEffect;
import tepor.solver.assembly.HeatBalance;
import tepor.solver.assembly.RegionHeat;
import tepor.solver.assembly.Tensor;
import tepor.solver.element.SideShape;
import tepor.solver.element.TriangleGeometry;
import tepor.solver.field.FieldGradient;
import tepor.solver.field.TemperatureField;

/**
 * Where the energy of the error sits: for each triangle the residual of the balance inside it and the jumps of the heat
 * flux across its sides, weighted so that jumps of conductivity do not spoil it.
 *
 * <p>Source: R. Verfürth, A Review of A Posteriori Error Estimation and Adaptive Mesh-Refinement Techniques, 1996; weights
 * for jumping conductivity after C. Bernardi and R. Verfürth, Numer. Math. 85 (2000) 579–608. Only ratios between triangles
 * are used, so the constants are left out. It steers the mesh and is no statement of accuracy.
 */
public final class ErrorIndicator {
    /** The other indicators, without their constants, come out greater than the energy by about this. */
    private static final double ARC_WEIGHT = 16;

    private final HeatBalance balance;
    private final TemperatureField field;
    private final Mesh mesh;
    private final double[] flux;
    private final double[] squared;
    private final int[] facetOfSide;
    private double turnX;
    private double turnY;

    private ErrorIndicator(HeatBalance balance, TemperatureField field) {
        this.balance = balance;
        this.field = field;
        mesh = balance.mesh();
        flux = new double[6 * mesh.triangleCount()];
        squared = new double[mesh.triangleCount()];
        facetOfSide = new int[3 * mesh.triangleCount()];
    }

    /**
     * Squared indicators.
     *
     * @return one for each triangle, W·K/m (the energy of the error but for a constant)
     */
    public static double[] squared(HeatBalance balance, TemperatureField field) {
        ErrorIndicator indicator = new ErrorIndicator(balance, field);
        indicator.interior();
        indicator.sides();
        indicator.arcs();
        return indicator.squared;
    }

    /**
     * Fluxes at the corners of each triangle, and the residual inside. The flux is linear inside; in curved triangles it is
     * taken to be.
     */
    private void interior() {
        double[] heat = new double[balance.conduction().regionCount()];
        for (RegionHeat source : balance.heats()) {
            heat[source.region()] += source.density();
        }
        TriangleGeometry geometry = new TriangleGeometry(mesh);
        FieldGradient gradient = new FieldGradient(field);
        double[] g = new double[2];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            Tensor k = balance.conduction().tensor(mesh.region(t));
            geometry.moveTo(t);
            double divergence = 0;
            for (int i = 0; i < 3; i++) {
                gradient.at(t, i == 0 ? 1 : 0, i == 1 ? 1 : 0, i == 2 ? 1 : 0, g);
                double fx = -(k.xx() * g[0] + k.xy() * g[1]);
                double fy = -(k.xy() * g[0] + k.yy() * g[1]);
                flux[6 * t + 2 * i] = fx;
                flux[6 * t + 2 * i + 1] = fy;
                divergence += fx * geometry.dx(i) + fy * geometry.dy(i);
            }
            double area = mesh.area(t);
            double residual = heat[mesh.region(t)] - divergence;
            squared[t] = area * residual * residual * area / mean(k);
        }
    }

    private static double mean(Tensor k) {
        return 0.5 * (k.xx() + k.yy());
    }

    private void sides() {
        Arrays.fill(facetOfSide, -1);
        for (int f = 0; f < mesh.facetCount(); f++) {
            if (mesh.isBoundaryFacet(f)) {
                boolean left = mesh.facetLeftTriangle(f) != Mesh.NONE;
                int t = left ? mesh.facetLeftTriangle(f) : mesh.facetRightTriangle(f);
                int side = left ? mesh.facetLeftSide(f) : mesh.facetRightSide(f);
                facetOfSide[3 * t + side] = f;
            }
        }
        List<List<FacetEffect>> effects = new ArrayList<>();
        for (int f = 0; f < mesh.facetCount(); f++) {
            effects.add(List.of());
        }
        for (FacetEffect effect : balance.facetEffects()) {
            for (int f : effect.facets()) {
                List<FacetEffect> more = new ArrayList<>(effects.get(f));
                more.add(effect);
                effects.set(f, more);
            }
        }
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int side = 0; side < 3; side++) {
                int neighbour = mesh.neighbour(t, side);
                if (neighbour > t) {
                    interiorSide(t, side, neighbour);
                } else if (neighbour == Mesh.NONE) {
                    int f = facetOfSide[3 * t + side];
                    if (balance.fixed().edgeOf(f) < 0) {
                        boundarySide(t, side, effects.get(f));
                    }
                }
            }
        }
    }

    private void interiorSide(int t, int side, int neighbour) {
        int back = 0;
        while (mesh.neighbour(neighbour, back) != t) {
            back++;
        }
        int a = mesh.node(t, (side + 1) % 3);
        int b = mesh.node(t, (side + 2) % 3);
        double dx = mesh.x(b) - mesh.x(a);
        double dy = mesh.y(b) - mesh.y(a);
        takeTurn(t, side);
        // The jump is linear along the side: its square integrates to length·(j₀² + j₀j₁ + j₁²)/3. The normals are as
        // long as the side, which puts in the two factors of length that the indicator has.
        double j0 = normal(t, (side + 1) % 3, dx + turnX, dy + turnY)
                - normal(neighbour, (back + 2) % 3, dx + turnX, dy + turnY);
        double j1 = normal(t, (side + 2) % 3, dx - turnX, dy - turnY)
                - normal(neighbour, (back + 1) % 3, dx - turnX, dy - turnY);
        double k = mean(balance.conduction().tensor(mesh.region(t)))
                + mean(balance.conduction().tensor(mesh.region(neighbour)));
        double square = (j0 * j0 + j0 * j1 + j1 * j1) / 3 / k;
        squared[t] += 0.5 * square;
        squared[neighbour] += 0.5 * square;
    }

    private void boundarySide(int t, int side, List<FacetEffect> effects) {
        int start = (side + 1) % 3;
        int end = (side + 2) % 3;
        int a = mesh.node(t, start);
        int b = mesh.node(t, end);
        double dx = mesh.x(b) - mesh.x(a);
        double dy = mesh.y(b) - mesh.y(a);
        double length = Math.hypot(dx, dy);
        takeTurn(t, side);
        double q0 = normal(t, start, dx + turnX, dy + turnY) / Math.hypot(dx + turnX, dy + turnY);
        double q1 = normal(t, end, dx - turnX, dy - turnY) / Math.hypot(dx - turnX, dy - turnY);
        SideShape shape = SideShape.of(mesh.nodesPerTriangle());
        double sum = 0;
        for (int p = 0; p < shape.pointCount(); p++) {
            double s = shape.point(p);
            double kelvin = field.inside(
                    t,
                    start == 0 ? 1 - s : end == 0 ? s : 0,
                    start == 1 ? 1 - s : end == 1 ? s : 0,
                    start == 2 ? 1 - s : end == 2 ? s : 0);
            double residual = (1 - s) * q0 + s * q1;
            for (FacetEffect effect : effects) {
                residual -= effect.outwardFlux(kelvin);
            }
            sum += shape.weight(p) * residual * residual;
        }
        squared[t] += sum * length * length / mean(balance.conduction().tensor(mesh.region(t)));
    }

    /** By what the tangent of a side at its start differs from its chord, and at its end from the other way; 0 if straight. */
    private void takeTurn(int t, int side) {
        turnX = 0;
        turnY = 0;
        if (mesh.isCurved(t)) {
            int a = mesh.node(t, (side + 1) % 3);
            int b = mesh.node(t, (side + 2) % 3);
            int m = mesh.node(t, 3 + side);
            turnX = 4 * (mesh.x(m) - 0.5 * (mesh.x(a) + mesh.x(b)));
            turnY = 4 * (mesh.y(m) - 0.5 * (mesh.y(a) + mesh.y(b)));
        }
    }

    /**
     * What curved sides leave out: the parabola is off an arc of half angle φ by Rφ⁴t²(1 − t²)/8, t from −1 to 1, so that
     * between them lies an area of Rφ⁴/60 times the chord; moving a boundary by so much changes the energy by |q|²/k times
     * that area.
     */
    private void arcs() {
        for (int f = 0; f < mesh.facetCount(); f++) {
            if (mesh.isCurvedFacet(f)) {
                arc(mesh.facetLeftTriangle(f), mesh.facetLeftSide(f));
                arc(mesh.facetRightTriangle(f), mesh.facetRightSide(f));
            }
        }
    }

    private void arc(int t, int side) {
        if (t == Mesh.NONE) {
            return;
        }
        int a = mesh.node(t, (side + 1) % 3);
        int b = mesh.node(t, (side + 2) % 3);
        double chord = Math.hypot(mesh.x(b) - mesh.x(a), mesh.y(b) - mesh.y(a));
        takeTurn(t, side);
        double half = 2 * Math.atan(0.5 * Math.hypot(turnX, turnY) / chord);
        double radius = 0.5 * chord / Math.sin(half);
        double gap = chord * radius * Math.pow(half, 4) / 60;
        double square = 0;
        for (int i = 1; i < 3; i++) {
            int at = 6 * t + 2 * ((side + i) % 3);
            square += 0.5 * (flux[at] * flux[at] + flux[at + 1] * flux[at + 1]);
        }
        squared[t] += ARC_WEIGHT * gap * square / mean(balance.conduction().tensor(mesh.region(t)));
    }

    /** Flux at a corner times the outward normal of a counter-clockwise side (dx, dy), not made a unit: W/m. */
    private double normal(int t, int corner, double dx, double dy) {
        return flux[6 * t + 2 * corner] * dy - flux[6 * t + 2 * corner + 1] * dx;
    }
}
