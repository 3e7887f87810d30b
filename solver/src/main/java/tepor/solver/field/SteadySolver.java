package tepor.solver.field;

import java.util.Arrays;
import java.util.function.BooleanSupplier;
import tepor.mesher.mesh.Mesh;
import tepor.solver.assembly.Contribution;
import tepor.solver.assembly.FacetEffect;
import tepor.solver.assembly.FilmExchange;
import tepor.solver.assembly.FixedTemperatures;
import tepor.solver.assembly.HeatBalance;
import tepor.solver.assembly.TangentSink;
import tepor.solver.linear.LinearSolver;
import tepor.solver.linear.SolveReport;
import tepor.solver.linear.SparsityPattern;
import tepor.solver.linear.SymmetricMatrix;

/**
 * Solves heat balances on one mesh: their matrices share one pattern, and equal matrices one preconditioner.
 *
 * <p>Solved is for the difference to a common level, and the residual is taken from the balance itself, so that digits are
 * not spent on the level. Which nodes are fixed must be the same for all balances.
 */
public final class SteadySolver {
    /** Relative residual sought; a second step from the recomputed residual brings it to round-off. */
    private static final double TOLERANCE = 1e-12;

    private static final double TOLERANCE_SECOND = 1e-4;

    private final Mesh mesh;
    private final int[] unknown;
    private final int[] free;
    private final SparsityPattern pattern;
    private double[] lastValue;
    private SymmetricMatrix lastMatrix;
    private LinearSolver lastSolver;

    /** @param fixed which nodes are not unknowns */
    public SteadySolver(Mesh mesh, FixedTemperatures fixed) {
        this.mesh = mesh;
        unknown = new int[mesh.nodeCount()];
        int count = 0;
        for (int i = 0; i < unknown.length; i++) {
            unknown[i] = fixed.isFixed(i) ? -1 : count++;
        }
        free = new int[count];
        for (int i = 0; i < unknown.length; i++) {
            if (unknown[i] >= 0) {
                free[unknown[i]] = i;
            }
        }
        int n = mesh.nodesPerTriangle();
        int[] elementUnknowns = new int[n * mesh.triangleCount()];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < n; i++) {
                elementUnknowns[n * t + i] = unknown[mesh.node(t, i)];
            }
        }
        pattern = new SparsityPattern(count, n, elementUnknowns);
    }

    /**
     * Solves.
     *
     * @throws UnsolvedException if the equations could not be solved
     * @throws java.util.concurrent.CancellationException if told to stop
     */
    public Solution solve(HeatBalance balance, BooleanSupplier stopped) {
        double[] kelvin = start(balance);
        if (free.length == 0) {
            return new Solution(balance, new TemperatureField(mesh, kelvin), 0, 0, 0, 0, 0);
        }
        long t0 = System.nanoTime();
        LinearSolver solver = solver(balance, kelvin);
        long t1 = System.nanoTime();
        double[] load = freeResidual(balance, kelvin);
        double scale = norm(load);
        int iterations = 0;
        double residual = 0;
        if (scale > 0) {
            iterations += step(solver, load, kelvin, TOLERANCE, stopped);
            double[] rest = freeResidual(balance, kelvin);
            if (norm(rest) > 0) {
                iterations += step(solver, rest, kelvin, TOLERANCE_SECOND, stopped);
            }
            residual = norm(freeResidual(balance, kelvin)) / scale;
        }
        long t2 = System.nanoTime();
        return new Solution(
                balance,
                new TemperatureField(mesh, kelvin),
                free.length,
                iterations,
                residual,
                1e-9 * (t1 - t0),
                1e-9 * (t2 - t1));
    }

    /**
     * The matrix of a balance, W/(m·K), one row for each free node.
     *
     * @return symmetric positive definite
     */
    public SymmetricMatrix matrix(HeatBalance balance) {
        solver(balance, start(balance));
        return lastMatrix;
    }

    /** The right-hand side to {@link #matrix} for which the solution is the temperature in kelvin, W/m. */
    public double[] rightHandSide(HeatBalance balance) {
        double[] kelvin = new double[mesh.nodeCount()];
        for (int i = 0; i < kelvin.length; i++) {
            if (unknown[i] < 0) {
                kelvin[i] = balance.fixed().at(i);
            }
        }
        double[] b = freeResidual(balance, kelvin);
        for (int i = 0; i < b.length; i++) {
            b[i] = -b[i];
        }
        return b;
    }

    /** Fixed nodes at their temperatures, free ones at the middle of all temperatures that are stated. */
    private double[] start(HeatBalance balance) {
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        FixedTemperatures fixed = balance.fixed();
        for (int i = 0; i < mesh.nodeCount(); i++) {
            if (fixed.isFixed(i)) {
                low = Math.min(low, fixed.at(i));
                high = Math.max(high, fixed.at(i));
            }
        }
        for (FacetEffect effect : balance.facetEffects()) {
            if (effect instanceof FilmExchange film) {
                low = Math.min(low, film.airTemperature());
                high = Math.max(high, film.airTemperature());
            }
        }
        double level = low <= high ? 0.5 * (low + high) : 0;
        double[] kelvin = new double[mesh.nodeCount()];
        for (int i = 0; i < kelvin.length; i++) {
            kelvin[i] = fixed.isFixed(i) ? fixed.at(i) : level;
        }
        return kelvin;
    }

    /** Takes one Newton step on the free nodes; exact for linear balances. */
    private int step(
            LinearSolver solver, double[] residual, double[] kelvin, double tolerance, BooleanSupplier stopped) {
        double[] b = new double[free.length];
        for (int i = 0; i < b.length; i++) {
            b[i] = -residual[i];
        }
        double[] x = new double[free.length];
        SolveReport report = solver.solve(b, x, tolerance, stopped);
        if (!report.usable()) {
            throw new UnsolvedException(String.format(
                    "the linear solver stopped (%s) after %d steps at a relative residual of %.1e, for %d unknowns",
                    report.reason(), report.iterations(), report.residual(), free.length));
        }
        for (int i = 0; i < x.length; i++) {
            kelvin[free[i]] += x[i];
        }
        return report.iterations();
    }

    private double[] freeResidual(HeatBalance balance, double[] kelvin) {
        double[] nodal = balance.nodalResidual(balance.elementResidual(kelvin));
        double[] r = new double[free.length];
        for (int i = 0; i < r.length; i++) {
            r[i] = nodal[free[i]];
        }
        return r;
    }

    private LinearSolver solver(HeatBalance balance, double[] kelvin) {
        Entries entries = new Entries();
        for (Contribution c : balance.contributions()) {
            c.addTangent(kelvin, entries);
        }
        if (lastValue == null || !Arrays.equals(lastValue, entries.value)) {
            lastValue = entries.value;
            lastMatrix = new SymmetricMatrix(pattern, entries.value);
            lastSolver = mesh.nodesPerTriangle() == 3
                    ? new LinearSolver(lastMatrix)
                    : LinearSolver.quadratic(lastMatrix, corners());
        }
        return lastSolver;
    }

    /** For each unknown itself twice, or for a mid-side node the unknowns of the side's corners. */
    private int[] corners() {
        int[] corners = new int[2 * free.length];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                int corner = unknown[mesh.node(t, i)];
                if (corner >= 0) {
                    corners[2 * corner] = corner;
                    corners[2 * corner + 1] = corner;
                }
                int middle = unknown[mesh.node(t, 3 + i)];
                if (middle >= 0) {
                    corners[2 * middle] = unknown[mesh.node(t, (i + 1) % 3)];
                    corners[2 * middle + 1] = unknown[mesh.node(t, (i + 2) % 3)];
                }
            }
        }
        return corners;
    }

    private static double norm(double[] v) {
        double sum = 0;
        for (double e : v) {
            sum += e * e;
        }
        return Math.sqrt(sum);
    }

    /** Adds element matrices into the slots of the pattern. */
    private final class Entries implements TangentSink {
        private final double[] value = new double[pattern.slotCount()];
        private final int nodesPerFacet = mesh.nodesPerTriangle() == 3 ? 2 : 3;

        @Override
        public void addTriangle(int triangle, double[] entries) {
            pattern.add(triangle, entries, value);
        }

        @Override
        public void addFacet(int facet, double[] entries) {
            for (int i = 0; i < nodesPerFacet; i++) {
                int row = unknown[mesh.facetNode(facet, i)];
                for (int j = 0; j < nodesPerFacet; j++) {
                    int column = unknown[mesh.facetNode(facet, j)];
                    if (row >= 0 && column >= 0) {
                        value[pattern.slot(row, column)] += entries[nodesPerFacet * i + j];
                    }
                }
            }
        }
    }
}
